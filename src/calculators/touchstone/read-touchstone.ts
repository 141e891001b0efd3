import type { Complex, Network, OnePortPoint, TwoPortPoint } from "./network.ts";
import { type Options, readOptions } from "./option-line.ts";
import { readNumber } from "./read-number.ts";

type TouchstoneCode =
  /** No line of numbers in it. */
  | "empty"
  /** Longer than any measurement: another kind of file. */
  | "too-long"
  /** A keyword in brackets: version 2, which is another format. */
  | "version"
  /** The option line has a word that it can't have, one twice, or stands behind numbers. */
  | "option-line"
  /** Y-, Z-, H- or G-parameters, which the format has and this reader does not. */
  | "parameter"
  /** Three ports or more. */
  | "port-count"
  /** Another number of columns than one or two ports, or the lines before, have. */
  | "column-count"
  /** Something that is no finite number, or a frequency below zero. */
  | "number"
  /** A frequency that is not above the one before. */
  | "frequency-order";

/** What came of a text. Lines count from 1. */
export type TouchstoneRead =
  | { readonly kind: "ok"; readonly network: Network }
  | { readonly kind: "problem"; readonly line: number; readonly code: TouchstoneCode };

/** In characters: three times what 10 000 points of two ports take. */
const LONGEST_TEXT = 4_000_000;
const ONE_PORT_COLUMNS = 3;
const TWO_PORT_COLUMNS = 9;
/** Three ports have a row of the matrix to a line, the first with the frequency. */
const THREE_PORT_COLUMNS = 7;
const NOISE_COLUMNS = 5;

/** What has been read so far. */
interface Reading {
  /** Null until a line states them or needs the defaults. */
  options: Options | null;
  isStated: boolean;
  readonly onePort: OnePortPoint[];
  readonly twoPort: TwoPortPoint[];
  noiseLineCount: number;
  lastMhz: number;
}

/**
 * Reads a Touchstone file of version 1.0 or 1.1 with S-parameters of one or two ports, as network
 * analysers write them. Never throws, whatever the text. Noise parameters are recognised by their five
 * columns, checked for form and left out.
 *
 * The columns tell the number of ports, because the text comes without the file's name. Without an
 * option line the defaults of the format hold; a second option line is ignored, as the format wants.
 *
 * Source: EIA/IBIS Open Forum, Touchstone File Format Specification, Rev. 1.1. Read second-hand, as a
 * copy in a public repository, 2026-12-01.
 *
 * @param text  The whole file
 * @returns     The network, or the first line that can't be read and why
 */
export function readTouchstone(text: string): TouchstoneRead {
  if (text.length > LONGEST_TEXT) return { kind: "problem", line: 1, code: "too-long" };
  const reading: Reading = {
    options: null,
    isStated: false,
    onePort: [],
    twoPort: [],
    noiseLineCount: 0,
    lastMhz: -1,
  };
  const lines = text.split(/\r\n|\r|\n/);
  for (const [index, line] of lines.entries()) {
    const words = (line.split("!", 1)[0] ?? "").split(/\s+/).filter((word) => word !== "");
    const code = words.length === 0 ? null : takeLine(words, reading);
    if (code !== null) return { kind: "problem", line: index + 1, code };
  }
  const network = networkOf(reading);
  if (network === null) return { kind: "problem", line: lines.length, code: "empty" };
  return { kind: "ok", network };
}

function networkOf({ options, onePort, twoPort, noiseLineCount }: Reading): Network | null {
  if (options === null) return null;
  const { referenceOhm } = options;
  if (onePort.length > 0) return { portCount: 1, referenceOhm, points: onePort };
  if (twoPort.length === 0) return null;
  return { portCount: 2, referenceOhm, points: twoPort, noiseLineCount };
}

function takeLine(words: readonly string[], reading: Reading): TouchstoneCode | null {
  const [first = ""] = words;
  if (first.startsWith("[")) return "version";
  if (!first.startsWith("#")) return takeNumbers(words, reading);
  if (reading.isStated) return null;
  // Numbers came first and were read by the defaults: whatever this line says, it says it too late.
  if (reading.options !== null) return "option-line";
  const options = readOptions([first.slice(1), ...words.slice(1)].filter((word) => word !== ""));
  if (typeof options === "string") return options;
  reading.options = options;
  reading.isStated = true;
  return null;
}

function takeNumbers(words: readonly string[], reading: Reading): TouchstoneCode | null {
  const numbers = words.map(readNumber);
  if (!isAllNumbers(numbers)) return "number";
  const options = reading.options ?? readOptions([]);
  if (typeof options === "string") return options;
  reading.options = options;

  const [frequency = 0, ...values] = numbers;
  const frequencyMhz = options.toMhz(frequency);
  if (!(frequencyMhz >= 0 && Number.isFinite(frequencyMhz))) return "number";
  const { onePort, twoPort, lastMhz } = reading;
  const isNoise =
    numbers.length === NOISE_COLUMNS &&
    twoPort.length > 0 &&
    (reading.noiseLineCount > 0 || frequencyMhz <= lastMhz);
  const columns = columnProblem(numbers.length, reading);
  if (!isNoise && columns !== null) return columns;
  const isFirstNoise = isNoise && reading.noiseLineCount === 0;
  if (frequencyMhz <= lastMhz && !isFirstNoise) return "frequency-order";
  reading.lastMhz = frequencyMhz;
  if (isNoise) {
    reading.noiseLineCount += 1;
    return null;
  }

  const [s11, s21, s12, s22] = pairsOf(values, options);
  if (s11 === undefined) return "number";
  if (numbers.length === ONE_PORT_COLUMNS) onePort.push({ frequencyMhz, s11 });
  else if (s21 === undefined || s12 === undefined || s22 === undefined) return "number";
  else twoPort.push({ frequencyMhz, s11, s21, s12, s22 });
  return null;
}

/** Whether a line that is no noise has the columns that the lines before it ask for. */
function columnProblem(count: number, reading: Reading): TouchstoneCode | null {
  const { onePort, twoPort, noiseLineCount } = reading;
  if (onePort.length + twoPort.length === 0) {
    if (count === ONE_PORT_COLUMNS || count === TWO_PORT_COLUMNS) return null;
    return count === THREE_PORT_COLUMNS ? "port-count" : "column-count";
  }
  const expected = onePort.length > 0 ? ONE_PORT_COLUMNS : TWO_PORT_COLUMNS;
  if (count === expected && noiseLineCount === 0) return null;
  // Four ports and more begin like two; then rows without a frequency follow.
  return twoPort.length === 1 && count % 2 === 0 ? "port-count" : "column-count";
}

/** Real and imaginary parts in order, up to the first that is not finite. */
function pairsOf(values: readonly number[], { toComplex }: Options): readonly Complex[] {
  const pairs: Complex[] = [];
  for (let place = 0; place + 1 < values.length; place += 2) {
    const pair = toComplex(values[place] ?? 0, values[place + 1] ?? 0);
    if (!Number.isFinite(Math.hypot(pair.re, pair.im))) break;
    pairs.push(pair);
  }
  return pairs;
}

const isAllNumbers = (numbers: readonly (number | null)[]): numbers is readonly number[] =>
  !numbers.includes(null);
