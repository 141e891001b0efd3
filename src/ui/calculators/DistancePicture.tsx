import type { DistanceCurve } from "../../calculators/distance/picture.ts";
import type { LengthUnit } from "../../calculators/field.ts";
import { FIELD_LABEL } from "../text/distance.ts";
import { decibels, lengthIn } from "../text/format.ts";

const WIDTH = 320;
const HEIGHT = 78;
const LEFT = 8;
const RIGHT = WIDTH - 8;
const TOP = 20;
const BOTTOM = HEIGHT - 20;

/** Level against distance, with both places on the curve; the same is said in text for readers. */
export function DistancePicture({ curve, unit }: { curve: DistanceCurve; unit: LengthUnit }) {
  const { points, from, to } = curve;
  const first = points[0];
  const last = points.at(-1);
  if (!first || !last) return null;
  const spanM = last.distanceM - first.distanceM;
  const spanDb = first.changeDb - last.changeDb;
  const x = (distanceM: number): number =>
    LEFT + ((distanceM - first.distanceM) / spanM) * (RIGHT - LEFT);
  const y = (changeDb: number): number =>
    TOP + ((first.changeDb - changeDb) / spanDb) * (BOTTOM - TOP);
  const path = points.map((p) => `${x(p.distanceM).toFixed(1)},${y(p.changeDb).toFixed(1)}`);
  const places = [
    { name: FIELD_LABEL.fromM, point: from, isTo: false },
    { name: FIELD_LABEL.toM, point: to, isTo: true },
  ];
  const summary = places
    .map(
      ({ name, point }) =>
        `${name} ${lengthIn(point.distanceM, unit)}: ${decibels(point.changeDb)}`,
    )
    .join("; ");
  return (
    <svg class="picture" viewBox={`0 0 ${WIDTH} ${HEIGHT}`} role="img" aria-label={summary}>
      <line x1={LEFT} x2={RIGHT} y1={BOTTOM} y2={BOTTOM} stroke="currentColor" opacity="0.5" />
      <polyline points={path.join(" ")} fill="none" stroke="currentColor" stroke-width="2" />
      {places.map(({ name, point, isTo }) => {
        const px = x(point.distanceM);
        const py = y(point.changeDb);
        const anchor = px < WIDTH / 2 ? "start" : "end";
        return (
          <g key={name}>
            <line
              x1={px}
              x2={px}
              y1={py}
              y2={BOTTOM}
              stroke="currentColor"
              stroke-dasharray="3 3"
            />
            {isTo ? (
              <path d={`M${px - 6} ${py - 6} h12 v12 h-12 z`} fill="var(--accent)" />
            ) : (
              <circle
                cx={px}
                cy={py}
                r="6"
                fill="var(--ground)"
                stroke="currentColor"
                stroke-width="2"
              />
            )}
            <text x={px} y={HEIGHT - 5} text-anchor={anchor}>
              {name} {lengthIn(point.distanceM, unit)}
            </text>
            <text
              x={px + (anchor === "start" ? 10 : -10)}
              y={Math.max(14, py - 6)}
              text-anchor={anchor}
            >
              {decibels(point.changeDb)}
            </text>
          </g>
        );
      })}
    </svg>
  );
}
