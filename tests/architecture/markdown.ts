/** The few things that the tests read out of a Markdown document. */

/** Text below a heading, down to the next heading of the same or a higher rank. */
export function sectionOf(markdown: string, heading: string): string {
  const lines = markdown.split("\n");
  const first = lines.findIndex((line) => /^#+ /.test(line) && titleOf(line) === heading);
  if (first < 0) throw new RangeError(`sectionOf: heading: no "${heading}" in the document`);
  const rank = rankOf(lines[first] ?? "");
  const rest = outsideFences(lines.slice(first + 1));
  const end = rest.findIndex((line) => /^#+ /.test(line) && rankOf(line) <= rank);
  return lines.slice(first + 1, end < 0 ? undefined : first + 1 + end).join("\n");
}

/** Headings of one rank, in order. */
export function headingsOf(markdown: string, rank: number): string[] {
  const isWanted = (line: string) => /^#+ /.test(line) && rankOf(line) === rank;
  return outsideFences(markdown.split("\n")).filter(isWanted).map(titleOf);
}

/** Rows of the first table whose head is the one asked for, each cell without emphasis and code marks. */
export function tableOf(markdown: string, head: readonly string[]): string[][] {
  const lines = markdown.split("\n");
  const first = lines.findIndex((line) => cellsOf(line).join("|") === head.join("|"));
  if (first < 0) throw new RangeError(`tableOf: head: no table "${head.join(" | ")}"`);
  const rest = lines.slice(first + 2);
  const end = rest.findIndex((line) => !line.startsWith("|"));
  return rest.slice(0, end < 0 ? undefined : end).map(cellsOf);
}

const titleOf = (line: string): string => line.replace(/^#+ +/, "").trim();
const rankOf = (line: string): number => /^#*/.exec(line)?.[0].length ?? 0;

const cellsOf = (line: string): string[] =>
  line.startsWith("|")
    ? line
        .replace(/^\||\|\s*$/g, "")
        .split("|")
        .map((cell) => cell.replace(/[*`]/g, "").trim())
    : [];

/** The lines with those inside code fences emptied, so that a comment there is no heading. */
function outsideFences(lines: readonly string[]): string[] {
  let isInside = false;
  return lines.map((line) => {
    const isFence = line.startsWith("```");
    if (isFence) isInside = !isInside;
    return isFence || isInside ? "" : line;
  });
}
