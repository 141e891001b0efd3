import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { hashOf, parseHash, type Route } from "../../src/models/route.ts";

const ROUTES: Route[] = [
  { place: "fault" },
  { place: "trace", fault: "f 1/ä", step: null },
  { place: "trace", fault: "f1", step: "remedy.spare-pack" },
  { place: "steps", fault: "f1" },
  { place: "marks", fault: "f1" },
  { place: "close", fault: "f1" },
  { place: "mark" },
  { place: "calculators" },
  { place: "distance", query: "fromM=30%20m&toM=15" },
  { place: "distance", query: "" },
  { place: "rig" },
  { place: "log", show: null },
  { place: "log", show: "s1" },
  { place: "show" },
  { place: "settings" },
  { place: "cautions" },
];

describe("the address", () => {
  it.each(ROUTES)("leads back to the place it was made for: $place", (route) => {
    expect(parseHash(hashOf(route))).toEqual(route);
  });

  it("leads to Fault when it names nothing", () => {
    for (const hash of ["", "#", "#/", "#/nowhere", "#/calculators/unknown", "#/%E0%A4%A"])
      expect(parseHash(hash).place).toMatch(/^(fault|calculators)$/);
    expect(parseHash("#/calculators/unknown")).toEqual({ place: "calculators" });
  });

  it("is read without an error whatever stands in it", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary" }), (text) => {
        expect(parseHash(`#/${text}`)).toHaveProperty("place");
      }),
      { seed: 20261201, numRuns: 500 },
    );
  });
});
