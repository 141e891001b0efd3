import type { ScanReading } from "../../../src/calculators/scan/scan.ts";
import { scanReader } from "../../../src/calculators/scan/scan-reader.ts";

/** Reads a text in pieces of the given length, as a worker would, or all at once. */
export function readWhole(text: string, sliceLength = text.length): ScanReading {
  const reader = scanReader(text.length);
  for (let start = 0; start < text.length; start += Math.max(1, sliceLength)) {
    if (!reader.take(text.slice(start, start + Math.max(1, sliceLength)))) break;
  }
  return reader.end();
}

/** The points of a text that can be read; an error where it cannot. */
export function pointsOf(text: string): (readonly [mhz: number, level: number])[] {
  const reading = readWhole(text);
  if (reading.kind !== "ok") throw new Error(`not read: ${reading.code}`);
  const { frequencyMhz, level } = reading.points;
  return [...frequencyMhz].map((mhz, n) => [mhz, level[n] ?? Number.NaN] as const);
}

export function codeOf(text: string): string {
  const reading = readWhole(text);
  return reading.kind === "problem" ? reading.code : "ok";
}
