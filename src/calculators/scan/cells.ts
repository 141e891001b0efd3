import { SCAN_LIMITS } from "./scan.ts";

export type Delimiter = ";" | "\t" | "," | " ";
export type DecimalMark = "." | ",";

const NUMBER_WITH: Readonly<Record<DecimalMark, RegExp>> = {
  ".": /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d{1,3})?$/i,
  ",": /^[+-]?(?:\d+,?\d*|,\d+)(?:e[+-]?\d{1,3})?$/i,
};

/** The cells of a line without the quotes around them; more than the limits allow are left out. */
export function cellsOf(line: string, delimiter: Delimiter): string[] {
  if (line.includes('"')) return quotedCellsOf(line, delimiter);
  const most = SCAN_LIMITS.columns + 1;
  return delimiter === " " ? line.trim().split(/\s+/, most) : line.split(delimiter, most);
}

function quotedCellsOf(line: string, delimiter: Delimiter): string[] {
  const cells = [""];
  let isQuoted = false;
  for (const mark of line) {
    if (mark === '"') isQuoted = !isQuoted;
    else if (mark === delimiter && !isQuoted) {
      if (cells.length > SCAN_LIMITS.columns) return cells;
      cells.push("");
    } else cells[cells.length - 1] += mark;
  }
  return delimiter === " " ? cells.filter((cell) => cell !== "") : cells;
}

/** The number in a cell; NaN where it holds none, words for numbers such as "NaN" and "inf" included. */
export function numberIn(cell: string, decimal: DecimalMark): number {
  const pattern = NUMBER_WITH[decimal];
  let text = cell;
  if (!pattern.test(text)) {
    text = text.trim().replace("\u2212", "-");
    if (!pattern.test(text)) return Number.NaN;
  }
  return Number(decimal === "," ? text.replace(",", ".") : text);
}
