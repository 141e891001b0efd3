import { cellsOf } from "./cells.ts";
import type { LineFormat } from "./line-format.ts";
import type { FrequencyUnit, LevelUnit, UnitGuess } from "./scan.ts";

/** How many of the unit make one megahertz. */
export const PER_MHZ: Readonly<Record<FrequencyUnit, number>> = {
  hz: 1e6,
  khz: 1e3,
  mhz: 1,
  ghz: 1e-3,
};

/** The bands that the Radio Regulations number end here (No. 2.1, from memory, to be verified). [MHz] */
const HIGHEST_MHZ = 3e6;

const FREQUENCY_UNIT = /(?<![a-z])([kmg]?hz)(?![a-z])/gi;
/** U+FFFD is what is left of the micro sign of an old one-byte encoding. */
const LEVEL_UNIT = /db\s?[([]?(m|[uµμ\uFFFD]v)(?![a-z/])/gi;

/** The unit that a text names; undefined where it names none, or two. */
function unitIn(text: string, pattern: RegExp): string | undefined {
  const units = new Set([...text.matchAll(pattern)].map((found) => found[1]?.toLowerCase()));
  const [unit] = units;
  return units.size === 1 ? unit : undefined;
}

function firstUnit(texts: readonly string[], pattern: RegExp): string | undefined {
  for (const text of texts) {
    const unit = unitIn(text, pattern);
    if (unit !== undefined) return unit;
  }
  return undefined;
}

/**
 * The unit of the frequencies: as named above the column, in its first row or in a line on frequency;
 * else by size, as if the scan ended at 15 GHz or below. A name that would put the scan beyond all
 * radio is not believed.
 *
 * @param highest  Largest of the frequencies as written
 */
export function frequencyUnitOf(format: LineFormat, highest: number): UnitGuess<FrequencyUnit> {
  const others = format.preamble.slice(1).filter((line) => /freq/i.test(line));
  const texts = [...namesOf(format, format.frequencyColumn), ...others];
  const named = firstUnit(texts, FREQUENCY_UNIT);
  if (isFrequencyUnit(named) && highest / PER_MHZ[named] <= HIGHEST_MHZ)
    return { unit: named, isNamed: true };
  const unit = highest < 15 ? "ghz" : highest < 15e3 ? "mhz" : highest < 15e6 ? "khz" : "hz";
  return { unit, isNamed: false };
}

const isFrequencyUnit = (name: string | undefined): name is FrequencyUnit =>
  name !== undefined && name in PER_MHZ;

/**
 * The unit of the levels: as named above the column, in its first row or above; else by sign: what a
 * receiver hears is mostly negative in dBm and mostly positive in dBuV.
 *
 * @param negativeShare  Share of the levels that are below 0, from 0 to 1
 */
export function levelUnitOf(format: LineFormat, negativeShare: number): UnitGuess<LevelUnit> {
  const texts = [...namesOf(format, format.levelColumn), ...format.preamble.slice(1)];
  const named = firstUnit(texts, LEVEL_UNIT);
  if (named !== undefined) return { unit: named === "m" ? "dbm" : "dbuv", isNamed: true };
  return { unit: negativeShare >= 0.5 ? "dbm" : "dbuv", isNamed: false };
}

/** Where a column is named, best place first. */
function namesOf({ delimiter, preamble, firstRow }: LineFormat, column: number): string[] {
  const header = preamble[0] ?? "";
  return [cellsOf(header, delimiter)[column] ?? "", header, firstRow];
}
