import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DISTANCE_FIELD_IDS, DISTANCE_FIELDS } from "../../../src/calculators/distance/fields.ts";
import { decodeInputs, encodeInputs } from "../../../src/calculators/distance/query.ts";
import { readTyped } from "../../../src/calculators/typed.ts";
import { SEEDED } from "../../radio/samples.ts";

const TYPED = {
  fromM: "30,5",
  toM: "50 ft",
  frequencyMhz: "0.55 GHz",
  exponent: "2.46",
  wishedGainDb: "+6",
};

describe("encodeInputs", () => {
  it("writes the texts as they were typed, in the order of the fields", () => {
    expect(encodeInputs(TYPED)).toBe(
      "fromM=30%2C5&toM=50%20ft&frequencyMhz=0.55%20GHz&exponent=2.46&wishedGainDb=%2B6",
    );
  });

  it("keeps an emptied field apart from one that is not there", () => {
    expect(encodeInputs({ fromM: "", toM: "15" })).toBe("fromM=&toM=15");
    expect(encodeInputs({})).toBe("");
  });

  it("leaves out what names no field", () => {
    expect(encodeInputs({ fromM: "30", colour: "red" })).toBe("fromM=30");
  });

  it("puts the unit behind a bare length if it is told the unit, and behind nothing else", () => {
    const texts = { ...TYPED, toM: " 50. ", frequencyMhz: "550" };
    expect(decodeInputs(encodeInputs(texts, "ft"))).toEqual({
      ...texts,
      fromM: "30,5ft",
      toM: "50.ft",
    });
    expect(decodeInputs(encodeInputs({ fromM: "50 m", toM: "" }, "ft"))).toEqual({
      fromM: "50 m",
      toM: "",
    });
  });

  it("makes room for the unit behind a text of full length", () => {
    const { fromM = "" } = decodeInputs(encodeInputs({ fromM: `100.${"0".repeat(76)}` }, "ft"));
    expect(readTyped(fromM, DISTANCE_FIELDS.fromM, "m")).toEqual({ kind: "ok", value: 30.48 });
  });

  it("makes a link mean the same length on a phone that shows the other unit", () => {
    const { fromM = "" } = decodeInputs(encodeInputs({ fromM: "100" }, "ft"));
    // 100 ft is 30.48 m by the definition of the foot.
    expect(readTyped(fromM, DISTANCE_FIELDS.fromM, "m")).toEqual({ kind: "ok", value: 30.48 });
  });
});

describe("decodeInputs", () => {
  it("reads a link with or without its question mark", () => {
    expect(decodeInputs(encodeInputs(TYPED))).toEqual(TYPED);
    expect(decodeInputs(`?${encodeInputs(TYPED)}`)).toEqual(TYPED);
  });

  it.each(["", "?", "&", "&&=&", "fromM", "=30", "from=30", "__proto__=1&constructor=2"])(
    "finds nothing in %j",
    (query) => {
      expect(decodeInputs(query)).toEqual({});
    },
  );

  it("ignores unknown keys and damaged values, and keeps the rest", () => {
    expect(decodeInputs("colour=red&fromM=%E0%A4%A&toM=15")).toEqual({ toM: "15" });
  });

  it("takes the first of two values", () => {
    expect(decodeInputs("toM=15&toM=16")).toEqual({ toM: "15" });
  });

  it("reads a plus sign as a space, as forms write it", () => {
    expect(decodeInputs("toM=50+ft")).toEqual({ toM: "50 ft" });
  });

  it("cuts a text at 80 characters without halving one", () => {
    expect(decodeInputs(`toM=${"1".repeat(500)}`)).toEqual({ toM: "1".repeat(80) });
    const microphones = encodeURIComponent("\u{1F3A4}".repeat(90));
    expect(decodeInputs(`toM=${microphones}`)).toEqual({ toM: "\u{1F3A4}".repeat(80) });
  });
});

describe("a link", () => {
  const anyTexts = fc.dictionary(
    fc.constantFrom(...DISTANCE_FIELD_IDS),
    fc.string({ unit: "binary", maxLength: 100 }),
  );

  it("opens with what was typed, whatever that was", () => {
    fc.assert(
      fc.property(anyTexts, (texts) => {
        const expected = Object.fromEntries(
          Object.entries(texts).map(([id, text]) => [
            id,
            Array.from(text.trim()).slice(0, 80).join(""),
          ]),
        );
        expect(decodeInputs(encodeInputs(texts))).toEqual(expected);
      }),
      SEEDED,
    );
  });

  it("survives half of a character pair", () => {
    expect(decodeInputs(encodeInputs({ fromM: "3\ud83c" }))).toEqual({ fromM: "3\ufffd" });
  });

  it("never throws, whatever the address says", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary", maxLength: 200 }), (query) => {
        expect(decodeInputs(`fromM=${query}`)).toBeTypeOf("object");
      }),
      SEEDED,
    );
  });

  it("of texts that can be read fits the 1000 characters of a kept sum", () => {
    // The longest that a field reads, with the sign that takes most room in an address.
    const longest = {
      fromM: `${"1".repeat(3)}.${"1".repeat(75)}\u2019`,
      toM: `${"1".repeat(3)}.${"1".repeat(75)}\u2019`,
      frequencyMhz: `550.${"5".repeat(76)}`,
      exponent: `2.${"5".repeat(78)}`,
      wishedGainDb: `\u22126.${"5".repeat(77)}`,
    };
    for (const id of DISTANCE_FIELD_IDS)
      expect(readTyped(longest[id], DISTANCE_FIELDS[id], "m").kind).toBe("ok");
    expect(encodeInputs(longest).length).toBeLessThan(1000);
  });
});
