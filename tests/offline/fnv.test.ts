import { describe, expect, it } from "vitest";
import { fnv1a } from "../../sw/fnv.ts";

describe("fnv1a", () => {
  // Fowler, Noll, Vo, Eastlake: "The FNV Non-Cryptographic Hash Algorithm", Internet-Draft
  // draft-eastlake-fnv-14, appendix C, "A Few Test Vectors".
  it.each([
    ["", "811c9dc5"],
    ["a", "e40c292c"],
    ["foobar", "bf9cf968"],
  ])("agrees with the published value for %j", (text, hash) => {
    expect(fnv1a(text)).toBe(hash);
  });

  it("is eight digits long whatever the text", () => {
    const texts = Array.from({ length: 200 }, (_, index) => `release ${index} of the page`);
    const hashes = texts.map(fnv1a);
    expect(hashes.filter((hash) => !/^[0-9a-f]{8}$/.test(hash))).toEqual([]);
    expect(hashes.some((hash) => hash.startsWith("0"))).toBe(true);
    expect(new Set(hashes).size).toBe(texts.length);
  });
});
