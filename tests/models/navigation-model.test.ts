import { describe, expect, it } from "vitest";
import { createNavigationModel } from "../../src/models/navigation-model.ts";
import { pretendAddress } from "./pretend.ts";

describe("the navigation model", () => {
  it("is in the place Fault where the address names none", () => {
    const { route, place } = createNavigationModel(pretendAddress(""));
    expect(route.value).toEqual({ place: "fault" });
    expect(place.value).toBe("#/fault");
  });

  it("stays in one place while the fields of a calculator are typed in", () => {
    const address = pretendAddress("#/calculators/distance");
    const navigation = createNavigationModel(address);
    const before = navigation.place.value;
    navigation.retype({ place: "distance", query: "fromM=3" });
    expect(navigation.place.value).toBe(before);
    expect(address.entries).toEqual(["#/calculators/distance?fromM=3"]);
  });

  it("gives the back button a stop for each place that was gone to, and none for a replaced one", () => {
    const address = pretendAddress("#/fault");
    const navigation = createNavigationModel(address);
    navigation.go({ place: "rig" });
    navigation.replace({ place: "settings" });
    expect(address.entries).toEqual(["#/fault", "#/settings"]);
  });
});
