import { describe, expect, it } from "vitest";
import { MIGRATIONS, type Migration, migrate } from "../../src/journal/migrations.ts";
import { RECORD_VERSION } from "../../src/journal/records.ts";

/** A pretend past: version 2 named the place, version 3 split the name. */
const PRETEND: readonly Migration[] = [
  { to: 2, why: "place is named", up: (old) => ({ ...old, place: "unknown" }) },
  { to: 3, why: "names are lists", up: ({ name, ...old }) => ({ ...old, names: [name] }) },
];

describe("migrate", () => {
  it("leads from version 1 to the present one with the list that ships", () => {
    expect(MIGRATIONS.map(({ to }) => to)).toEqual(
      Array.from({ length: RECORD_VERSION - 1 }, (_, index) => index + 2),
    );
    expect(migrate({ v: 1 }, 1)["v"]).toBe(RECORD_VERSION);
  });

  it("runs each step once, in order, and writes the version reached", () => {
    expect(migrate({ v: 1, name: "a" }, 1, PRETEND, 3)).toEqual({
      v: 3,
      place: "unknown",
      names: ["a"],
    });
    expect(migrate({ v: 2, name: "a", place: "b" }, 2, PRETEND, 3)).toEqual({
      v: 3,
      place: "b",
      names: ["a"],
    });
  });

  it("leaves the stored form as it was, also when a step writes into what it is given", () => {
    const spoil: Migration = {
      to: 2,
      why: "careless",
      up: (old) => {
        (old["body"] as { list: number[] }).list.push(2);
        return old;
      },
    };
    const stored = { v: 1, body: { list: [1] } };
    expect(migrate(stored, 1, [spoil], 2)).toEqual({ v: 2, body: { list: [1, 2] } });
    expect(stored).toEqual({ v: 1, body: { list: [1] } });
  });

  it.each([
    ["is missing", PRETEND.slice(0, 1)],
    ["comes out of turn", [...PRETEND].reverse()],
  ])("refuses a list in which a step %s", (_what, list) => {
    expect(() => migrate({ v: 1 }, 1, list, 3)).toThrow(RangeError);
  });
});
