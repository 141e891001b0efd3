import { cellsOf, type DecimalMark, type Delimiter, numberIn } from "./cells.ts";
import { SCAN_LIMITS, type ScanProblemCode } from "./scan.ts";

/** How the lines of a scan are to be read. */
export interface LineFormat {
  readonly delimiter: Delimiter;
  readonly decimal: DecimalMark;
  readonly frequencyColumn: number;
  readonly levelColumn: number;
  /** The lines before the first row, the nearest first; comment marks included. */
  readonly preamble: readonly string[];
  readonly firstRow: string;
}

/** Of equally good ones the first is taken. Quotes let a comma stand for both. */
const MARKS: readonly (readonly [Delimiter, DecimalMark])[] = [
  [";", "."],
  [";", ","],
  ["\t", "."],
  ["\t", ","],
  [",", "."],
  [",", ","],
  [" ", "."],
  [" ", ","],
];

export const COMMENT = /^\s*(?:#|\/\/|%|!)/;

/** What columns are called, the surer word first. */
const FREQUENCY_NAMES = [/freq/i, /(?<![a-z])[kmg]?hz(?![a-z])/i];
const LEVEL_NAMES = [/level|power|ampl|magn|signal|rssi/i, /db/i];

/** Two columns of whole numbers, or one with decimal commas: only names above them can tell. */
const WHOLE_BY_COMMA = /^\s*\d+,\d+\s*$/;

/** One way to read the sample. */
interface Reading {
  readonly delimiter: Delimiter;
  readonly decimal: DecimalMark;
  /** Columns that hold a number in at least half of the lines that hold two. */
  readonly numeric: readonly number[];
  /** Places in the sample of the lines that hold numbers in two of these. */
  readonly rows: readonly number[];
  readonly cellCount: number;
}

/**
 * How to read the lines of which these are the first, or why that cannot be told.
 *
 * @param sample  Lines that are not blank, comments among them
 */
export function formatOf(sample: readonly string[]): LineFormat | ScanProblemCode {
  const readings = MARKS.map(([delimiter, decimal]) => readWith(sample, delimiter, decimal));
  const best = readings.reduce((one, next) => (isBetter(next, one) ? next : one));
  const { delimiter, decimal, rows } = best;
  const [first] = rows;
  if (first === undefined) {
    const isNumber = (line: string) =>
      !Number.isNaN(numberIn(line, ".")) || !Number.isNaN(numberIn(line, ","));
    return sample.some(isNumber) ? "one-column" : "no-numbers";
  }
  if (best.cellCount > SCAN_LIMITS.columns) return "too-many-columns";
  const preamble = sample.slice(0, first).reverse();
  const columns = columnsOf(best, preamble[0] ?? "");
  const texts = rows.map((place) => sample[place] ?? "");
  if (columns === null) {
    const isByComma = delimiter === "," && texts.every((text) => !text.includes("."));
    return isByComma ? "ambiguous-commas" : "which-columns";
  }
  const isWhole = delimiter === "," && texts.every((text) => WHOLE_BY_COMMA.test(text));
  if (isWhole && cellsOf(preamble[0] ?? "", delimiter).length < 2) return "ambiguous-commas";
  return { delimiter, decimal, ...columns, preamble, firstRow: sample[first] ?? "" };
}

function readWith(sample: readonly string[], delimiter: Delimiter, decimal: DecimalMark): Reading {
  const lines: { place: number; columns: number[] }[] = [];
  let cellCount = 0;
  sample.forEach((line, place) => {
    if (COMMENT.test(line)) return;
    const cells = cellsOf(line, delimiter);
    const columns = [...cells.keys()].filter(
      (column) => !Number.isNaN(numberIn(cells[column] ?? "", decimal)),
    );
    if (columns.length < 2) return;
    lines.push({ place, columns });
    cellCount = Math.max(cellCount, cells.length);
  });
  const has = (column: number) => lines.filter(({ columns }) => columns.includes(column)).length;
  const numeric = Array.from({ length: cellCount }, (_, column) => column).filter(
    (column) => has(column) * 2 >= lines.length,
  );
  const rows = lines
    .filter(({ columns }) => columns.filter((column) => numeric.includes(column)).length > 1)
    .map(({ place }) => place);
  return { delimiter, decimal, numeric, rows, cellCount };
}

/** More rows are better; as many with fewer columns too: "470,5 -90,2" also looks like three by comma. */
function isBetter(one: Reading, two: Reading): boolean {
  if (one.rows.length !== two.rows.length) return one.rows.length > two.rows.length;
  return one.cellCount < two.cellCount;
}

/** Which column is which: of two, frequency stands first unless the names say otherwise. */
function columnsOf(
  { delimiter, numeric, cellCount }: Reading,
  header: string,
): { frequencyColumn: number; levelColumn: number } | null {
  const [first, second] = numeric;
  if (first === undefined || second === undefined) return null;
  if (numeric.length === 2) {
    const level = placeOf(header, LEVEL_NAMES);
    const isSwapped = level >= 0 && level < placeOf(header, FREQUENCY_NAMES);
    return isSwapped
      ? { frequencyColumn: second, levelColumn: first }
      : { frequencyColumn: first, levelColumn: second };
  }
  const names = cellsOf(header, delimiter);
  if (names.length !== cellCount) return null;
  const frequencyColumn = theOnly(FREQUENCY_NAMES, names, numeric);
  const levelColumn = theOnly(LEVEL_NAMES, names, numeric);
  if (frequencyColumn === null || levelColumn === null || frequencyColumn === levelColumn)
    return null;
  return { frequencyColumn, levelColumn };
}

/** Where a text has the surest of some words that it has; -1 for none. */
function placeOf(text: string, patterns: readonly RegExp[]): number {
  return patterns.map((pattern) => text.search(pattern)).find((place) => place >= 0) ?? -1;
}

/** The one column whose name has one of the words; null where there is none, or several. */
function theOnly(
  patterns: readonly RegExp[],
  names: readonly string[],
  columns: readonly number[],
): number | null {
  for (const pattern of patterns) {
    const named = columns.filter((column) => pattern.test(names[column] ?? ""));
    if (named.length > 0) return named.length === 1 ? (named[0] ?? null) : null;
  }
  return null;
}
