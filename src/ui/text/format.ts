import type { LengthUnit } from "../../calculators/field.ts";
import { METRES_PER } from "../../models/vocabulary.ts";

const LANGUAGE = "en-GB";
const MINUS = "\u2212";

/** Formatters are costly to make on a slow phone: one for each zone and form. */
const made = new Map<string, Intl.DateTimeFormat>();
function dateFormat(key: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  let format = made.get(key);
  if (!format) {
    format = new Intl.DateTimeFormat(LANGUAGE, options);
    made.set(key, format);
  }
  return format;
}

/** A journal may name a zone that this phone does not know: its times are told in UTC then. */
function inZone(timeZone: string, atMs: number, options: Intl.DateTimeFormatOptions): string {
  const key = `${timeZone} ${Object.keys(options)[0]}`;
  try {
    return dateFormat(key, { timeZone, ...options }).format(atMs);
  } catch (cause) {
    if (!(cause instanceof RangeError)) throw cause;
    return `${dateFormat(`UTC ${key}`, { timeZone: "UTC", ...options }).format(atMs)}\u00a0UTC`;
  }
}

/** "20:41:07" in the given zone. */
export function timeOf(atMs: number, timeZone: string): string {
  return inZone(timeZone, atMs, { timeStyle: "medium" });
}

/** "Tue, 1 Dec 2026" in the given zone. */
export function dateOf(atMs: number, timeZone: string): string {
  return inZone(timeZone, atMs, {
    weekday: "short",
    day: "numeric",
    month: "short",
    year: "numeric",
  });
}

/** Two figures of a decibel number are more than any site gives: one decimal, true minus sign. */
export function decibels(valueDb: number): string {
  const rounded = Math.round(valueDb * 10) / 10;
  const sign = rounded < 0 ? MINUS : rounded > 0 ? "+" : "";
  return `${sign}${Math.abs(rounded).toFixed(1)}\u00a0dB`;
}

/** A length with three figures, in the unit that the user chose. */
export function lengthIn(metres: number, unit: LengthUnit): string {
  return `${threeFigures(metres / METRES_PER[unit])}\u00a0${unit}`;
}

export function threeFigures(value: number): string {
  if (value === 0) return "0";
  const decimals = Math.max(0, Math.min(6, 2 - Math.floor(Math.log10(Math.abs(value)))));
  const text = value.toFixed(decimals);
  return decimals > 0 ? text.replace(/\.?0+$/, "") : text;
}

export function megabytes(bytes: number): string {
  return bytes < 1e6 ? `${Math.ceil(bytes / 1e3)}\u00a0kB` : `${(bytes / 1e6).toFixed(1)}\u00a0MB`;
}

/** "606.125 MHz": a carrier to the kilohertz. */
export function megahertz(frequencyMhz: number): string {
  return `${Number(frequencyMhz.toFixed(3))}\u00a0MHz`;
}
