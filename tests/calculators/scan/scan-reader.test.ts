import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { SCAN_LIMITS } from "../../../src/calculators/scan/scan.ts";
import { scanReader } from "../../../src/calculators/scan/scan-reader.ts";
import { SEEDED } from "../../radio/samples.ts";
import { codeOf, pointsOf, readWhole } from "./read-whole.ts";

const TWO = [
  [470.5, -90.25],
  [471, -95],
];

describe("a scan that can be read", () => {
  it.each([
    ["commas, points, no header", "470.5,-90.25\n471.0,-95.0\n"],
    ["semicolons, decimal commas", "470,5;-90,25\n471,0;-95,0"],
    ["semicolons, decimal points", "470.5;-90.25\n471.0;-95.0"],
    ["tabs, decimal commas", "470,5\t-90,25\n471,0\t-95,0"],
    ["tabs, decimal points", "470.5\t-90.25\n471.0\t-95.0"],
    ["one blank, decimal commas", "470,5 -90,25\n471,0 -95,0"],
    ["aligned with blanks", "  470.5   -90.25\n  471.0   -95.0"],
    ["comma and blank", "470.5, -90.25\n471.0, -95.0"],
    ["quoted cells", '"470.5","-90.25"\n"471.0","-95.0"'],
    ["quoted cells, decimal commas", '"470,5","-90,25"\n"471,0","-95,0"'],
    ["a header", "Frequency (MHz),Level (dBm)\n470.5,-90.25\n471,-95"],
    ["a header without words for the columns", "x;y\n470.5;-90.25\n471;-95"],
    ["a header in a comment", "# MHz dBm\n470.5 -90.25\n471 -95"],
    ["settings above", "Sweep 3\nRBW;25 kHz\n\nMHz;dBm\n470.5;-90.25\n471;-95"],
    ["the end of lines of other systems", "470.5;-90.25\r\n471;-95\r\n"],
    ["the end of lines of old systems", "470.5;-90.25\r471;-95\r"],
    ["a byte order mark", "\uFEFF470.5;-90.25\n471;-95"],
    ["a byte order mark before a comment", "\uFEFF# sweep\n470.5;-90.25\n471;-95"],
    ["a byte order mark before quotes", '\uFEFF"470.5","-90.25"\n"471","-95"'],
    ["a byte order mark before a header", "\uFEFFMHz;dBm\r\n470.5;-90.25\r\n471;-95"],
    ["a delimiter at the end of lines", "470.5;-90.25;\n471;-95;"],
    ["comments and blank lines between", "470.5;-90.25\n\n// pause\n  \n% x\n! y\n471;-95\n\n"],
    ["columns of words", "a;470.5;-90.25;ok\nb;471;-95;ok"],
    ["columns of times", "12:00:01,470.5,-90.25\n12:00:02,471,-95"],
    ["level before frequency, named so", "Level dBm;Frequency MHz\n-90.25;470.5\n-95;471"],
    ["more columns of numbers, named", "No,Freq,RBW,Level\n1,470.5,25,-90.25\n2,471.0,25,-95"],
    ["frequency named alone", "MHz;x\n470.5;-90.25\n471;-95"],
    ["many comments with numbers", `${"#;1;2\n".repeat(5)}470.5;-90.25\n471;-95`],
    ["units in the cells", "470.5 MHz -90.25 dBm\n471 MHz -95 dBm"],
    ["powers of ten", "4.705e2;-9.025E+01\n4.71E2;-9.5e1"],
    ["plus signs and the minus sign of typesetters", "+470.5;\u221290.25\n+471;\u221295"],
    ["falling frequencies", "471;-95\n470.5;-90.25"],
    ["mixed order", "471;-95\n470.5;-99\n470.5;-90.25"],
    ["hertz", "Hz;dBm\n470500000;-90.25\n471000000;-95"],
    ["kilohertz", "Frequency [kHz];dBm\n470500;-90.25\n471000;-95"],
    ["gigahertz", "GHz;dBm\n0.4705;-90.25\n0.471;-95"],
    ["hertz that nobody names", "470500000;-90.25\n471000000;-95"],
    ["kilohertz that nobody names", "470500;-90.25\n471000;-95"],
    ["gigahertz that nobody names", "0.4705;-90.25\n0.471;-95"],
  ])("may have %s", (_what, text) => {
    const points = pointsOf(text);
    expect(points).toHaveLength(2);
    for (const [n, [mhz, level]] of points.entries()) {
      expect(mhz).toBeCloseTo(TWO[n]?.[0] ?? 0, 9);
      expect(level).toBe(TWO[n]?.[1]);
    }
  });

  it("gives whole kilohertz and hertz back without rounding", () => {
    expect(pointsOf("470100000;-90\n470200000;-91").map(([mhz]) => mhz)).toEqual([470.1, 470.2]);
  });

  it("keeps the higher level where a frequency comes twice, and says so", () => {
    const reading = readWhole("470;-90\n471;-95\n470;-80\n470;-85");
    if (reading.kind !== "ok") throw new Error(reading.code);
    expect([...reading.points.level]).toEqual([-80, -95]);
    expect(reading.skipped.duplicate).toBe(2);
  });

  it("counts what it skips, by reason", () => {
    const text = [
      "A sweep",
      "MHz;dBm",
      "# begin",
      "470;-90",
      "",
      "471;NaN",
      "472;",
      "473;inf",
      "474;n/a",
      "0;-90",
      "-475;-90",
      "475;1e9",
      "1e999;-90",
      "476;-91",
      "476;-92",
    ].join("\n");
    const reading = readWhole(text);
    if (reading.kind !== "ok") throw new Error(reading.code);
    expect(reading.skipped).toEqual({
      blank: 1,
      comment: 1,
      preamble: 2,
      unreadable: 4,
      outOfRange: 4,
      duplicate: 1,
    });
    expect([...reading.points.frequencyMhz]).toEqual([470, 476]);
  });

  it("never takes an empty cell or a word for a 0", () => {
    const reading = readWhole("470;-90\n471;\n472; \n473;0x10\n474;-91\n475;1_0");
    if (reading.kind !== "ok") throw new Error(reading.code);
    expect([...reading.points.frequencyMhz]).toEqual([470, 474]);
  });

  it("leaves gaps between frequencies as they are", () => {
    expect(pointsOf("470;-90\n470.1;-91\n600;-92").map(([mhz]) => mhz)).toEqual([470, 470.1, 600]);
  });
});

describe("the units of a scan", () => {
  const unitsOf = (text: string) => {
    const reading = readWhole(text);
    if (reading.kind !== "ok") throw new Error(reading.code);
    return [reading.frequencyUnit, reading.levelUnit];
  };

  it.each([
    ["MHz;dBm\n470;-90\n471;-91", "mhz", true, "dbm", true],
    ["Freq [kHz];Level [dB\u00B5V]\n470000;20\n471000;21", "khz", true, "dbuv", true],
    ["Hz;dBuV\n470000000;20\n471000000;21", "hz", true, "dbuv", true],
    ["GHz;dB\uFFFDV\n0.47;20\n0.471;21", "ghz", true, "dbuv", true],
    ["# Frequency in kHz, level in dBm\n470000,-90\n471000,-91", "khz", true, "dbm", true],
    ["470;-90\n471;-91", "mhz", false, "dbm", false],
    ["470;20\n471;21", "mhz", false, "dbuv", false],
    ["2412;-40\n5800;-41", "mhz", false, "dbm", false],
    ["2.412;-40\n5.8;-41", "ghz", false, "dbm", false],
    // The bandwidth of the filter is not the unit of the column.
    ["RBW: 25 kHz\nx;y\n470;-90\n471;-91", "mhz", false, "dbm", false],
    // Nor are the numbers of a setting a row.
    ["Span;470;698\nMHz;dBuV\n470;-90\n471;-91", "mhz", true, "dbuv", true],
    ["kHz or MHz;dBm or dBuV\n470;-90\n471;-91", "mhz", false, "dbm", false],
    // Field strength is no level.
    ["MHz;dBuV/m\n470;20\n471;21", "mhz", true, "dbuv", false],
  ])("are told from the text: %j", (text, frequency, isNamed, level, isLevelNamed) => {
    expect(unitsOf(text)).toEqual([
      { unit: frequency, isNamed },
      { unit: level, isNamed: isLevelNamed },
    ]);
  });

  it("are not believed where they would put the scan beyond all radio", () => {
    expect(unitsOf("MHz;dBm\n470000000;-90\n471000000;-91")[0]).toEqual({
      unit: "hz",
      isNamed: false,
    });
  });
});

describe("a text that is no scan", () => {
  it.each([
    ["empty", ""],
    ["empty", "\n\r\n  \n\t\n"],
    ["empty", "\uFEFF"],
    ["no-numbers", "MHz;dBm"],
    ["no-numbers", "# only a comment"],
    ["no-numbers", "<html><body>404</body></html>"],
    ["no-numbers", '{"a": [1, 2]}'],
    ["one-column", "470.5\n471\n"],
    ["one-column", "470.5\t\n471\t"],
    ["ambiguous-commas", "470,5\n471,5"],
    ["ambiguous-commas", "Level\n470,5\n471,5"],
    ["which-columns", "470.5;-90;-80\n471;-91;-81"],
    ["which-columns", "Freq;Level A;Level B\n470.5;-90;-80\n471;-91;-81"],
    ["ambiguous-commas", "470,5,-90,2\n471,0,-91,5"],
    ["ambiguous-commas", "Frequency,Level\n470,5,-90,2\n471,0,-91,5"],
    ["ambiguous-commas", "470,5\n470,6\n470,7"],
    ["too-few-points", "470;-90"],
    ["too-few-points", "470;-90\n470;-91"],
    ["too-few-points", "0;-90\n0;-91"],
    ["not-text", "470;-90\n471;-91\n\u0000\u0001"],
    ["not-text", "P\u0000K\u0003\u0004 470;-90"],
    ["too-many-columns", `${Array.from({ length: 100 }, () => "1").join(";")}\n`.repeat(3)],
    ["line-too-long", Array.from({ length: 1_000_000 }, () => "1").join(";")],
    ["line-too-long", `470;-90\n${"x".repeat(5000)}`],
  ])("gives the code %s", (code, text) => {
    expect(codeOf(text)).toBe(code);
  });

  it("is refused by its size before a byte of it is read", () => {
    const reader = scanReader(300_000_000);
    expect(reader.take("470;-90\n471;-91")).toBe(false);
    expect(reader.end()).toEqual({ kind: "problem", code: "too-large", line: null });
    expect(scanReader(SCAN_LIMITS.bytes).take("470;-90")).toBe(true);
    expect(scanReader(Number.NaN).take("470;-90")).toBe(false);
  });

  it("names the line where a problem is met", () => {
    expect(readWhole(`470;-90\n\n${"x".repeat(5000)}\n`)).toEqual({
      kind: "problem",
      code: "line-too-long",
      line: 3,
    });
    expect(readWhole("470;-90\r\n471;-91\r\n\u0000")).toMatchObject({ code: "not-text", line: 3 });
  });

  it("is given up in the middle of a line without end", () => {
    const reader = scanReader(SCAN_LIMITS.bytes);
    const piece = "1;".repeat(500);
    expect([1, 2, 3, 4, 5].map(() => reader.take(piece))).toEqual([true, true, true, true, false]);
    expect(reader.end()).toMatchObject({ code: "line-too-long", line: 1 });
  });

  it("keeps refusing after a problem", () => {
    const reader = scanReader(100);
    expect(reader.take("470;-90\n\u0000\n")).toBe(false);
    expect(reader.take("471;-91\n")).toBe(false);
    expect(reader.end()).toMatchObject({ code: "not-text" });
  });

  it("may have 200 000 points but not one more", () => {
    const lines = Array.from({ length: SCAN_LIMITS.points }, (_, n) => `${470 + n / 1e4};-90\n`);
    const points = pointsOf(lines.join(""));
    expect(points).toHaveLength(SCAN_LIMITS.points);
    for (const n of [0, 1023, 1024, 100_000, 199_999])
      expect(points[n]?.[0]).toBeCloseTo(470 + n / 1e4, 9);
    expect(readWhole(`${lines.join("")}999;-90\n`)).toEqual({
      kind: "problem",
      code: "too-many-points",
      line: SCAN_LIMITS.points + 1,
    });
  });
});

/** A scan as a device might write it, and what it holds. */
const written = fc
  .record({
    points: fc.uniqueArray(
      fc.tuple(fc.integer({ min: 100_000, max: 9_000_000 }), fc.integer({ min: -1400, max: -1 })),
      { selector: ([tenthsOfKhz]) => tenthsOfKhz, minLength: 2, maxLength: 300 },
    ),
    delimiter: fc.constantFrom(";", "\t", " ", ","),
    hasCommas: fc.boolean(),
    unit: fc.constantFrom("Hz", "kHz", "MHz", "GHz"),
    hasHeader: fc.boolean(),
    lineEnd: fc.constantFrom("\n", "\r\n", "\r"),
    mark: fc.constantFrom("", "\uFEFF"),
    noise: fc.array(fc.constantFrom("", "# remark", "   "), { maxLength: 5 }),
  })
  .map(({ points, delimiter, hasCommas, unit, hasHeader, lineEnd, mark, noise }) => {
    const decimals = { Hz: -2, kHz: 1, MHz: 4, GHz: 7 }[unit];
    // Decimal points by hand, so that the text holds every digit.
    const placed = (whole: number, places: number): string => {
      if (places <= 0) return `${whole}${"0".repeat(-places)}`;
      const digits = String(Math.abs(whole)).padStart(places + 1, "0");
      const sign = whole < 0 ? "-" : "";
      const text = `${sign}${digits.slice(0, -places)}.${digits.slice(-places)}`;
      return hasCommas && delimiter !== "," ? text.replace(".", ",") : text;
    };
    const rows = points.map(
      ([tenths, level]) => `${placed(tenths, decimals)}${delimiter}${placed(level, 1)}`,
    );
    const header = hasHeader ? [`Frequency[${unit}]${delimiter}Level[dBm]`] : [];
    return { text: mark + [...header, ...noise, ...rows].join(lineEnd), points };
  });

describe("any scan", () => {
  it("is read as what was written", () => {
    fc.assert(
      fc.property(written, ({ text, points }) => {
        const sorted = [...points].sort(([one], [two]) => one - two);
        const read = pointsOf(text);
        expect(read).toHaveLength(sorted.length);
        for (const [n, [mhz, level]] of read.entries()) {
          expect(mhz).toBeCloseTo((sorted[n]?.[0] ?? 0) / 1e4, 9);
          expect(level).toBeCloseTo((sorted[n]?.[1] ?? 0) / 10, 12);
        }
      }),
      SEEDED,
    );
  });

  it("is read the same however it is cut into pieces", () => {
    fc.assert(
      fc.property(written, fc.integer({ min: 1, max: 40 }), ({ text }, sliceLength) => {
        expect(readWhole(text, sliceLength)).toEqual(readWhole(text));
      }),
      SEEDED,
    );
  });

  it("has rising frequencies, each once, and no NaN", () => {
    fc.assert(
      fc.property(written, ({ text }) => {
        const read = pointsOf(text);
        for (const [n, [mhz, level]] of read.entries()) {
          expect(Number.isFinite(mhz) && Number.isFinite(level)).toBe(true);
          if (n > 0) expect(mhz).toBeGreaterThan(read[n - 1]?.[0] ?? Number.NaN);
        }
      }),
      SEEDED,
    );
  });

  it("loses no more points than lines when it is damaged, and invents none", () => {
    const junk = fc.constantFrom("", "NaN", "-", "470", "x;y", "\u00B5", "1;2;3", ";;;", '"', "e");
    fc.assert(
      fc.property(written, fc.array(fc.tuple(fc.nat(), junk), { maxLength: 8 }), (scan, damage) => {
        const lines = scan.text.split("\n");
        for (const [place, text] of damage) lines[place % lines.length] = text;
        const reading = readWhole(lines.join("\n"));
        if (reading.kind === "ok")
          expect(reading.points.level.length).toBeLessThanOrEqual(scan.points.length + 8);
      }),
      SEEDED,
    );
  });
});

describe("any text at all", () => {
  const soup = fc.array(
    fc.constantFrom(..."0123456789.,;\t -+eE\n\r\"'#/%µ\uFEFF\uFFFDxHzdBm".split(""), "MHz", "NaN"),
    { maxLength: 400 },
  );

  it.each([
    ["characters of scans", soup.map((parts) => parts.join(""))],
    ["characters of any kind", fc.string({ unit: "binary", maxLength: 500 })],
    ["bytes", fc.uint8Array({ maxLength: 500 }).map((bytes) => new TextDecoder().decode(bytes))],
  ])("gives an outcome and never throws, whole or in pieces: %s", (_what, texts) => {
    let count = 0;
    fc.assert(
      fc.property(texts, fc.integer({ min: 1, max: 50 }), (text, sliceLength) => {
        const reading = readWhole(text);
        expect(readWhole(text, sliceLength)).toEqual(reading);
        if (reading.kind === "ok") {
          expect(reading.points.frequencyMhz.every((mhz) => mhz > 0 && mhz <= 3e6)).toBe(true);
          expect(reading.points.level.every((level) => Math.abs(level) <= 300)).toBe(true);
        }
        count += 1;
      }),
      { ...SEEDED, numRuns: 500 },
    );
    expect(count).toBeGreaterThanOrEqual(500);
  });
});
