import type { Complex } from "./network.ts";
import { readNumber } from "./read-number.ts";

/** How the numbers of a file are to be read. */
export interface Options {
  readonly toMhz: (frequency: number) => number;
  readonly toComplex: (first: number, second: number) => Complex;
  readonly referenceOhm: number;
}

const polar = (magnitude: number, angleDeg: number): Complex => {
  const angle = (angleDeg * Math.PI) / 180;
  return { re: magnitude * Math.cos(angle), im: magnitude * Math.sin(angle) };
};

// Whole powers of ten only, so that 470125000 Hz is 470.125 MHz to the last digit.
const UNITS: ReadonlyMap<string, Options["toMhz"]> = new Map([
  ["HZ", (frequency) => frequency / 1e6],
  ["KHZ", (frequency) => frequency / 1e3],
  ["MHZ", (frequency) => frequency],
  ["GHZ", (frequency) => frequency * 1e3],
]);
const FORMATS: ReadonlyMap<string, Options["toComplex"]> = new Map([
  ["MA", polar],
  ["DB", (gainDb, angleDeg) => polar(10 ** (gainDb / 20), angleDeg)],
  ["RI", (re, im) => ({ re, im })],
]);
const PARAMETERS = ["S", "Y", "Z", "H", "G"];

/**
 * What an option line says: unit of frequency, parameter, format, and the reference resistance behind
 * R, in any order and in capitals or not. What it leaves out is GHz, S, MA and 50 ohms.
 *
 * @param words  The line cut at blanks, without "#"; an empty list for a file that has none
 * @returns      How to read the numbers, or the code of what is wrong
 */
export function readOptions(words: readonly string[]): Options | "option-line" | "parameter" {
  let toMhz: Options["toMhz"] | undefined;
  let toComplex: Options["toComplex"] | undefined;
  let parameter: string | undefined;
  let referenceOhm: number | undefined;
  const rest = words.map((word) => word.toUpperCase());
  for (let word = rest.shift(); word !== undefined; word = rest.shift()) {
    if (toMhz === undefined && UNITS.has(word)) toMhz = UNITS.get(word);
    else if (toComplex === undefined && FORMATS.has(word)) toComplex = FORMATS.get(word);
    else if (parameter === undefined && PARAMETERS.includes(word)) parameter = word;
    else if (referenceOhm === undefined && word === "R") {
      const ohm = readNumber(rest.shift() ?? "");
      if (ohm === null || ohm <= 0) return "option-line";
      referenceOhm = ohm;
    } else return "option-line";
  }
  if (parameter !== undefined && parameter !== "S") return "parameter";
  return {
    toMhz: toMhz ?? ((frequency) => frequency * 1e3),
    toComplex: toComplex ?? polar,
    referenceOhm: referenceOhm ?? 50,
  };
}
