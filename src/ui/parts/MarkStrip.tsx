import type { MarkView } from "../../journal/views.ts";
import { markCount } from "../text/fault.ts";
import { timeOf } from "../text/format.ts";

const WIDTH = 320;
const EDGE = 8;
const SHORTEST_MS = 60_000;

/** The marks of a fault on a line of time, first to last; a screen reader hears the same as text. */
export function MarkStrip({ marks, timeZone }: { marks: readonly MarkView[]; timeZone: string }) {
  const first = marks[0];
  const last = marks.at(-1);
  if (!first || !last) return null;
  const spanMs = Math.max(last.at - first.at, SHORTEST_MS);
  const x = (at: number): number => EDGE + ((at - first.at) / spanMs) * (WIDTH - 2 * EDGE);
  const from = timeOf(first.at, timeZone);
  const summary =
    marks.length === 1
      ? `${markCount(1)}: ${from}`
      : `${markCount(marks.length)}: ${from} to ${timeOf(last.at, timeZone)}`;
  return (
    <figure>
      <figcaption class="number">{summary}</figcaption>
      <svg
        class="picture strip"
        viewBox={`0 0 ${WIDTH} 24`}
        preserveAspectRatio="xMinYMid meet"
        aria-hidden="true"
      >
        <line x1={EDGE} x2={WIDTH - EDGE} y1="18" y2="18" stroke="currentColor" />
        {marks.map((mark) => (
          <path
            key={mark.id}
            d={`M${x(mark.at)} 18 v-14 l5 5 h-5`}
            fill="currentColor"
            stroke="currentColor"
            stroke-width="2"
          />
        ))}
      </svg>
    </figure>
  );
}
