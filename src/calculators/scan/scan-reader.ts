import { cellsOf, numberIn } from "./cells.ts";
import { COMMENT, formatOf, type LineFormat } from "./line-format.ts";
import {
  SCAN_LIMITS,
  type ScanProblem,
  type ScanProblemCode,
  type ScanReading,
  type SkippedLines,
} from "./scan.ts";
import { type ReadPoints, sortedPoints } from "./sorted-points.ts";
import { frequencyUnitOf, levelUnitOf, PER_MHZ } from "./units.ts";

/** Reads a scan piece by piece, so that a worker can tell how far it is and stop in between. */
export interface ScanReader {
  /** Takes the next piece, of any length; false once a problem stands, when more is of no use. */
  readonly take: (slice: string) => boolean;
  /** What came of it all; to be called once, after the last piece. */
  readonly end: () => ScanReading;
}

/** Lines by which the format is told: enough for any preamble, few enough to try eight formats. */
const SAMPLE_LINES = 200;
/** Control characters that no text has; a file in a two-byte encoding is full of zeros. */
const NOT_TEXT = /\p{Cc}(?<!\s)/u;
const LEVEL_LIMIT = 300;
/** The highest frequency of the Radio Regulations in the smallest unit. [Hz] */
const FREQUENCY_LIMIT = 3e12;

/**
 * Begins to read delimited text with two columns of numbers, frequency and level. Delimiter, decimal
 * mark, order of the columns and units are told from the text. Never throws, whatever the text holds.
 * A byte order mark needs no care: it counts as a blank.
 *
 * @param byteCount  Size of the whole text, told beforehand: too large a one is not begun
 */
export function scanReader(byteCount: number): ScanReader {
  const skipped: SkippedLines = {
    blank: 0,
    comment: 0,
    preamble: 0,
    unreadable: 0,
    outOfRange: 0,
    duplicate: 0,
  };
  const sample: { readonly text: string; readonly line: number }[] = [];
  let problem: ScanProblem | null = null;
  let format: LineFormat | null = null;
  let frequencies = new Float64Array(1024);
  let levels = new Float64Array(1024);
  let count = 0;
  let line = 0;
  let pending = "";

  const fail = (code: ScanProblemCode, at: number | null): void => {
    problem ??= { kind: "problem", code, line: at };
  };
  if (!(byteCount <= SCAN_LIMITS.bytes)) fail("too-large", null);

  function settleFormat(): void {
    const settled = formatOf(sample.map(({ text }) => text));
    if (typeof settled === "string") {
      fail(sample.length === 0 ? "empty" : settled, null);
      return;
    }
    format = settled;
    for (const { text, line: at } of sample) takeRow(text, at, settled);
  }

  function takeRow(text: string, at: number, known: LineFormat): void {
    if (COMMENT.test(text)) {
      skipped.comment += 1;
      return;
    }
    const cells = cellsOf(text, known.delimiter);
    const frequency = numberIn(cells[known.frequencyColumn] ?? "", known.decimal);
    const level = numberIn(cells[known.levelColumn] ?? "", known.decimal);
    if (Number.isNaN(frequency) || Number.isNaN(level)) {
      skipped[count === 0 ? "preamble" : "unreadable"] += 1;
    } else if (!(frequency > 0 && frequency <= FREQUENCY_LIMIT && Math.abs(level) <= LEVEL_LIMIT)) {
      skipped.outOfRange += 1;
    } else if (count === SCAN_LIMITS.points) {
      fail("too-many-points", at);
    } else {
      if (count === frequencies.length) {
        frequencies = grown(frequencies);
        levels = grown(levels);
      }
      frequencies[count] = frequency;
      levels[count] = level;
      count += 1;
    }
  }

  function takeLine(text: string, isSuspect: boolean): void {
    line += 1;
    // Only as far as a line that goes on would be looked at, however the text is cut into pieces.
    if (isSuspect && NOT_TEXT.test(text.slice(0, SCAN_LIMITS.lineLength + 1)))
      fail("not-text", line);
    else if (text.length > SCAN_LIMITS.lineLength) fail("line-too-long", line);
    else if (text.trim() === "") skipped.blank += 1;
    else if (format !== null) takeRow(text, line, format);
    else {
      sample.push({ text, line });
      if (sample.length === SAMPLE_LINES) settleFormat();
    }
  }

  /** Takes all lines that have ended; one that may go on waits, but not for ever. */
  function takeText(text: string): void {
    const isSuspect = NOT_TEXT.test(text);
    const lines = text.split("\n");
    pending = lines.pop() ?? "";
    for (const one of lines) {
      if (problem !== null) return;
      takeLine(one, isSuspect);
    }
    if (problem === null && pending.length > SCAN_LIMITS.lineLength) takeLine(pending, isSuspect);
  }

  return {
    take(slice) {
      if (problem !== null) return false;
      const text = pending + slice;
      // A carriage return at the end may be the first half of a line's end.
      const isHalf = text.endsWith("\r");
      takeText((isHalf ? text.slice(0, -1) : text).replace(/\r\n?/g, "\n"));
      if (isHalf) pending += "\r";
      return problem === null;
    },
    end() {
      if (problem === null && pending !== "") takeLine(pending.replace("\r", ""), true);
      if (problem === null && format === null) settleFormat();
      if (problem !== null || format === null) {
        return problem ?? { kind: "problem", code: "empty", line: null };
      }
      return readingOf(format, { frequencies, levels, count }, skipped);
    },
  };
}

function grown(values: Float64Array): Float64Array<ArrayBuffer> {
  const larger = new Float64Array(Math.min(values.length * 2, SCAN_LIMITS.points));
  larger.set(values);
  return larger;
}

function readingOf(format: LineFormat, read: ReadPoints, skipped: SkippedLines): ScanReading {
  const { frequencies, levels, duplicateCount } = sortedPoints(read);
  const highest = frequencies.at(-1);
  if (highest === undefined || frequencies.length < 2)
    return { kind: "problem", code: "too-few-points", line: null };
  const frequencyUnit = frequencyUnitOf(format, highest);
  const perMhz = PER_MHZ[frequencyUnit.unit];
  const negativeShare = levels.filter((level) => level < 0).length / levels.length;
  return {
    kind: "ok",
    points: { frequencyMhz: frequencies.map((value) => value / perMhz), level: levels },
    frequencyUnit,
    levelUnit: levelUnitOf(format, negativeShare),
    skipped: { ...skipped, duplicate: duplicateCount },
  };
}
