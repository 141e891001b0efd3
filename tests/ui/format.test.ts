import { describe, expect, it } from "vitest";
import {
  dateOf,
  decibels,
  lengthIn,
  megahertz,
  threeFigures,
  timeOf,
} from "../../src/ui/text/format.ts";

const AT = Date.UTC(2026, 11, 1, 20, 41, 7);

describe("numbers and times on the screen", () => {
  it("tell the time in the show's zone, wherever the phone is", () => {
    // Auckland is 13 hours ahead of UTC in December (time zone database).
    expect(timeOf(AT, "UTC")).toBe("20:41:07");
    expect(timeOf(AT, "Pacific/Auckland")).toBe("09:41:07");
    expect(dateOf(AT, "Pacific/Auckland")).toContain("2 Dec 2026");
  });

  it("fall back to UTC, and say so, for a zone that this phone does not know", () => {
    expect(timeOf(AT, "Atlantis/Harbour")).toBe("20:41:07\u00a0UTC");
    expect(dateOf(AT, "")).toMatch(/1 Dec 2026\u00a0UTC$/);
  });

  it("carry a true minus sign, a plus sign and one decimal for decibels", () => {
    expect(decibels(-6.02)).toBe("\u22126.0\u00a0dB");
    expect(decibels(12.04)).toBe("+12.0\u00a0dB");
    expect(decibels(-0.04)).toBe("0.0\u00a0dB");
  });

  it("show lengths with three figures in the chosen unit", () => {
    // 1 ft is 0.3048 m exactly: international yard and pound agreement of 1959.
    expect(lengthIn(30.48, "ft")).toBe("100\u00a0ft");
    expect(lengthIn(0.5451, "m")).toBe("0.545\u00a0m");
    expect(lengthIn(2000, "m")).toBe("2000\u00a0m");
  });

  it("drop zeros that say nothing, and keep those that do", () => {
    expect(threeFigures(100)).toBe("100");
    expect(threeFigures(2.5)).toBe("2.5");
    expect(threeFigures(0)).toBe("0");
    expect(megahertz(606.125)).toBe("606.125\u00a0MHz");
    expect(megahertz(600)).toBe("600\u00a0MHz");
  });
});
