import { describe, expect, it } from "vitest";
import { createDistanceModel } from "../../src/models/distance-model.ts";
import { createJournalModel } from "../../src/models/journal-model.ts";
import { createNavigationModel } from "../../src/models/navigation-model.ts";
import { createNoticeModel } from "../../src/models/notice-model.ts";
import { createSettingsModel } from "../../src/models/settings-model.ts";
import { pretendAddress, pretendStore, pretendSurroundings } from "./pretend.ts";

function start(hash = "#/calculators/distance", kept = new Map<string, string>()) {
  const store = pretendStore();
  const surroundings = pretendSurroundings(kept);
  const journal = createJournalModel(store, surroundings);
  const address = pretendAddress(hash);
  const navigation = createNavigationModel(address);
  const notices = createNoticeModel();
  const settings = createSettingsModel(surroundings);
  const distance = createDistanceModel({ journal, navigation, notices, settings, surroundings });
  return { store, kept, address, navigation, settings, distance };
}

describe("the distance calculator's model", () => {
  it("answers at once with the inputs it starts with", () => {
    expect(start().distance.outcome.value?.kind).toBe("ok");
  });

  it.each(["", "text", "-3", "0", "1e308", "30 apples", "1.234,5", "x".repeat(80)])(
    "has no answer, and no stale one, while a field says %j",
    (text) => {
      const { distance } = start();
      distance.type("fromM", text);
      expect(distance.outcome.value).toBeNull();
      expect(distance.curve.value).toBeNull();
      expect(distance.fields.value.fromM).toMatchObject({ text });
      expect(distance.fields.value.fromM.problem).not.toBeNull();
    },
  );

  it("keeps the typed text in the address, so that a link and a killed app give it back", () => {
    const first = start();
    first.distance.type("fromM", "30,5");
    const reopened = start(first.address.entries.at(-1));
    expect(reopened.distance.fields.value.fromM.text).toBe("30,5");
    const restarted = start("#/calculators/distance", first.kept);
    expect(restarted.distance.fields.value.fromM.text).toBe("30,5");
  });

  it("means the same length after the unit is changed", () => {
    const { distance, settings } = start();
    distance.type("fromM", "40");
    const before = distance.inputs.value;
    settings.setLengthUnit("ft");
    expect(distance.inputs.value?.fromM).toBe(before?.fromM);
  });

  it("steps from a text that is no number back to a number", () => {
    const { distance } = start();
    distance.type("toM", "junk");
    distance.step("toM", 1);
    expect(distance.outcome.value?.kind).toBe("ok");
  });

  it("resets to the inputs it starts with", () => {
    const { distance } = start();
    const initial = distance.inputs.value;
    distance.type("fromM", "7");
    distance.reset();
    expect(distance.inputs.value).toEqual(initial);
  });

  it("keeps the sentence and the way back to it in the log", async () => {
    const { store, distance } = start();
    distance.type("fromM", "12");
    await distance.keep("Twelve metres.");
    expect(store.rows.at(-1)).toMatchObject({
      type: "sum.kept",
      body: { calculator: "distance", sentence: "Twelve metres." },
    });
    expect(store.rows.at(-1)?.body).toHaveProperty("query", expect.stringContaining("fromM=12m"));
  });
});
