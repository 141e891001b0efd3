import Complex from "complex.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Network } from "../../../src/calculators/touchstone/network.ts";
import {
  readTouchstone,
  type TouchstoneRead,
} from "../../../src/calculators/touchstone/read-touchstone.ts";
import { SEEDED } from "../../radio/samples.ts";

/*
 * Examples 1, 2, 4, 5 and 8: EIA/IBIS Open Forum, Touchstone File Format Specification, Rev. 1.1, read
 * second-hand as a copy in a public repository, 2026-12-01. Numbers only; the layout is ours.
 */
const EXAMPLE_1 = "! one port\n# MHz S MA R 50\n! freq magS11 angS11\n2.000 0.894 -12.136";
const EXAMPLE_2 = "# MHz Z MA R 75\n100 0.99 -4\n200 0.80 -22\n";
const EXAMPLE_4 = [
  "# GHZ S RI R 50.0",
  "1.0000 0.3926 -0.1211 -0.0003 -0.0021 -0.0003 -0.0021 0.3926 -0.1211",
  "2.0000 0.3517 -0.3054 -0.0096 -0.0298 -0.0096 -0.0298 0.3517 -0.3054",
  "10.000 0.3419 0.3336 -0.0134 0.0379 -0.0134 0.0379 0.3419 0.3336",
].join("\n");
const EXAMPLE_5 = [
  "# GHZ S MA R 50",
  "5.00000 0.60 161.24 0.40 -42.20 0.42 -66.58 0.53 -79.34 ! row 1",
  "0.40 -42.20 0.60 161.20 0.53 -79.34 0.42 -66.58 ! row 2",
  "0.42 -66.58 0.53 -79.34 0.60 161.24 0.40 -42.20",
  "0.53 -79.34 0.42 -66.58 0.40 -42.20 0.60 161.24",
].join("\n");
const EXAMPLE_8 = [
  "# GHZ S MA R 50",
  "2 .95 -26 3.57 157 .04 76 .66 -14",
  "22 .60 -144 1.30 40 .14 40 .56 -85",
  "! noise parameters",
  "4 .7 .64 69 .38",
  "18 2.7 .46 -33 .40",
].join("\n");

function networkIn(text: string): Network {
  const read = readTouchstone(text);
  if (read.kind !== "ok") throw new Error(`line ${read.line}: ${read.code}`);
  return read.network;
}

function twoPortsIn(text: string) {
  const network = networkIn(text);
  if (network.portCount !== 2) throw new Error("two ports expected");
  return network;
}

/** A complex number from magnitude and degrees, by a general library. */
const polar = (abs: number, degrees: number) =>
  new Complex({ abs, arg: (degrees * Math.PI) / 180 });

function expectSame(actual: { re: number; im: number } | undefined, expected: Complex): void {
  expect(actual?.re).toBeCloseTo(expected.re, 12);
  expect(actual?.im).toBeCloseTo(expected.im, 12);
}

describe("readTouchstone", () => {
  it("reads one port in magnitude and angle", () => {
    const network = networkIn(EXAMPLE_1);
    expect(network.portCount).toBe(1);
    expect(network.referenceOhm).toBe(50);
    expect(network.points).toHaveLength(1);
    expect(network.points[0]?.frequencyMhz).toBe(2);
    expectSame(network.points[0]?.s11, polar(0.894, -12.136));
  });

  it("reads two ports in real and imaginary parts", () => {
    const network = twoPortsIn(EXAMPLE_4);
    expect(network.points.map(({ frequencyMhz }) => frequencyMhz)).toEqual([1000, 2000, 10_000]);
    expect(network.points[1]?.s11).toEqual({ re: 0.3517, im: -0.3054 });
    expect(network.points[2]?.s22).toEqual({ re: 0.3419, im: 0.3336 });
    expect(network.noiseLineCount).toBe(0);
  });

  it("takes the columns of two ports as 11, 21, 12, 22, and leaves noise parameters out", () => {
    const network = twoPortsIn(EXAMPLE_8);
    expect(network.points).toHaveLength(2);
    expect(network.noiseLineCount).toBe(2);
    // An amplifier: 3.57 forwards, 0.04 back.
    expectSame(network.points[0]?.s21, polar(3.57, 157));
    expectSame(network.points[0]?.s12, polar(0.04, 76));
    expectSame(network.points[1]?.s22, polar(0.56, -85));
  });

  it("reads decibels", () => {
    // −6.0206 dB is a half, 20·log10 2, from any table of logarithms.
    const network = networkIn("# MHz S DB R 50\n100 -6.0206 90\n");
    expect(network.points[0]?.s11.re).toBeCloseTo(0, 6);
    expect(network.points[0]?.s11.im).toBeCloseTo(0.5, 6);
  });

  it.each([
    ["Hz", "518700000"],
    ["kHz", "518700"],
    ["MHz", "518.7"],
    ["GHz", "0.5187"],
  ])("reads frequencies in %s to the last digit", (unit, figure) => {
    expect(networkIn(`# ${unit} S MA R 50\n${figure} 1 0`).points[0]?.frequencyMhz).toBe(518.7);
  });

  it("takes GHz, S, magnitude and angle, and 50 ohms where nothing is said", () => {
    for (const head of ["", "#\n", "# S\n", "! only a remark\n\n#\n"]) {
      const network = networkIn(`${head}0.5 0.25 180`);
      expect(network.points[0]?.frequencyMhz).toBe(500);
      expect(network.points[0]?.s11.re).toBeCloseTo(-0.25, 12);
      expect(network.referenceOhm).toBe(50);
    }
  });

  it("takes the options in any order and in any letters, and any resistance", () => {
    const network = networkIn("#ri r 75.5 s mhz\n100 0.5 -0.5");
    expect(network.referenceOhm).toBe(75.5);
    expect(network.points[0]).toEqual({ frequencyMhz: 100, s11: { re: 0.5, im: -0.5 } });
  });

  it("ignores a second option line, remarks, blank lines and the kind of line end", () => {
    const text = "\uFEFF! a\r\n# MHz S RI R 50\r\r\n\t 1 0.1 0 ! b\n# GHz S MA R 75\n\n2 0.2 0\r";
    const network = networkIn(text);
    expect(network.points.map(({ frequencyMhz }) => frequencyMhz)).toEqual([1, 2]);
    expect(network.points[1]?.s11).toEqual({ re: 0.2, im: 0 });
    expect(network.referenceOhm).toBe(50);
  });

  it("reads lines that end in a carriage return alone", () => {
    const network = networkIn("# MHz S RI\r1 0.1 0\r2 0.2 0");
    expect(network.points.map(({ s11 }) => s11.re)).toEqual([0.1, 0.2]);
  });

  it("reads numbers as they may be written", () => {
    const network = networkIn("# MHz S RI\n+1.E2 .5 -5e-1");
    expect(network.points[0]).toEqual({ frequencyMhz: 100, s11: { re: 0.5, im: -0.5 } });
  });
});

const TWO = "1 0 0 0 0 0 0 0 0";

describe("readTouchstone, of what it can't read,", () => {
  it.each([
    ["nothing at all", "", 1, "empty"],
    ["remarks only", "! a\n! b", 2, "empty"],
    ["options only", "# MHz S RI R 50\n\n", 3, "empty"],
    ["version 2", "! a\n[Version] 2.0\n# MHz S RI", 2, "version"],
    ["an unknown option", "# MHz S RI R 50 X", 1, "option-line"],
    ["two units", "# MHz GHz S RI", 1, "option-line"],
    ["a resistance without a number", "# MHz S RI R", 1, "option-line"],
    ["a resistance of 0", "# MHz S RI R 0", 1, "option-line"],
    ["a negative resistance", "# MHz S RI R -50", 1, "option-line"],
    ["a resistance for each port", "# MHz S RI R 50 75", 1, "option-line"],
    ["options behind numbers", "1 0 0\n# MHz S RI\n2 0 0", 2, "option-line"],
    ["impedances", EXAMPLE_2, 1, "parameter"],
    ["hybrid parameters", "# kHz H MA R 1\n2 .95 -26 3.57 157 .04 76 .66 -14", 1, "parameter"],
    ["three ports", "# GHz S MA R 50\n1 0 0 0 0 0 0\n0 0 0 0 0 0\n0 0 0 0 0 0", 2, "port-count"],
    ["four ports", EXAMPLE_5, 3, "port-count"],
    ["two columns", "1 0", 1, "column-count"],
    ["five columns at the start", "1 0 0 0 0", 1, "column-count"],
    ["two ports behind one", `1 0 0\n2 ${TWO.slice(2)}`, 2, "column-count"],
    ["half a pair behind one port", "1 0 0\n2 0", 2, "column-count"],
    ["one port behind two", `${TWO}\n2 0 0`, 2, "column-count"],
    ["noise above the sweep", `${TWO}\n2 .7 .64 69 .38`, 2, "column-count"],
    ["parameters behind noise", `${TWO}\n1 .7 .64 69 .38\n2 0 0 0 0 0 0 0 0`, 3, "column-count"],
    ["noise of one port", "1 0 0\n1 .7 .64 69 .38", 2, "column-count"],
    ["a word", "1 0 zero", 1, "number"],
    ["NaN", "1 NaN 0", 1, "number"],
    ["infinity", "1 Infinity 0", 1, "number"],
    ["a number too large", "1 1e999 0", 1, "number"],
    ["a comma for decimals", "1 0,5 0", 1, "number"],
    ["a hexadecimal number", "0x10 0 0", 1, "number"],
    ["decibels too many", "# MHz S DB\n1 9999 0", 2, "number"],
    ["a magnitude too large", "# MHz S RI\n1 1.7e308 1.7e308", 2, "number"],
    ["a frequency too large", "1e308 0 0", 1, "number"],
    ["a negative frequency", "-1 0 0", 1, "number"],
    ["a frequency twice", "1 0 0\n\n1 0 0", 3, "frequency-order"],
    ["falling frequencies", `${TWO}\n0.5 0 0 0 0 0 0 0 0`, 2, "frequency-order"],
    [
      "falling noise frequencies",
      `2 ${TWO.slice(2)}\n1 1 1 1 1\n0.5 1 1 1 1`,
      3,
      "frequency-order",
    ],
    ["bytes of a program", "\u007fELF\u0002\u0001\u0001\u0000", 1, "number"],
    ["bytes of a picture", "\u0089PNG\r\n\u001a\n\u0000\u0000", 1, "number"],
    ["a text longer than any sweep", "! ".padEnd(4_000_001, "x"), 1, "too-long"],
  ])("says where and why: %s", (_what, text, line, code) => {
    expect(readTouchstone(text)).toEqual({ kind: "problem", line, code });
  });

  it("never throws and never lets a number through that is none, whatever the text", () => {
    const words = fc.constantFrom(
      ...["1", "2", ".5", "-3", "1e9", "1e308", "1e-320", "nan", "#", "# MHz S DB R 50", "!", "["],
      ...[
        "\n",
        "\r\n",
        " ",
        "\t",
        "R",
        "0",
        "\u0000",
        "é",
        "[Version] 2.0",
        TWO,
        "3 0 0",
        "1 1 1 1 1",
      ],
    );
    const texts = fc.oneof(
      fc.string({ unit: "binary", maxLength: 200 }),
      fc.array(words, { maxLength: 60 }).map((parts) => parts.join(" ")),
      fc.array(words, { maxLength: 60 }).map((parts) => parts.join("\n")),
    );
    const seen = new Set<string>();
    fc.assert(
      fc.property(texts, (text) => {
        const read: TouchstoneRead = readTouchstone(text);
        seen.add(read.kind === "ok" ? "ok" : read.code);
        if (read.kind === "problem") {
          expect(read.line).toBeGreaterThanOrEqual(1);
          expect(read.line).toBeLessThanOrEqual(text.split(/\r\n|\r|\n/).length);
          return;
        }
        const rows = read.network.points.map(({ frequencyMhz, ...parameters }) => ({
          frequencyMhz,
          parts: Object.values(parameters).flatMap(({ re, im }) => [re, im]),
        }));
        expect(rows.flatMap(({ parts }) => parts).every(Number.isFinite)).toBe(true);
        const rising = rows.map(({ frequencyMhz }) => frequencyMhz);
        expect(new Set(rising).size).toBe(rising.length);
        expect([...rising].sort((x, y) => x - y)).toEqual(rising);
      }),
      { ...SEEDED, numRuns: 600 },
    );
    for (const kind of ["ok", "empty", "version", "option-line", "number", "column-count"])
      expect(seen).toContain(kind);
  });

  it("takes no longer than the text for a hostile word", () => {
    // A pattern that could match digits in two ways would try them all: years for a million.
    const started = performance.now();
    expect(readTouchstone(`1 ${"1".repeat(1_000_000)}x 0`)).toMatchObject({ code: "number" });
    expect(performance.now() - started).toBeLessThan(2000);
  });
});
