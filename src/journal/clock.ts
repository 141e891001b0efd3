import type { JournalRecord } from "./records.ts";

/**
 * Hybrid logical clock, written so that plain string order is its order:
 * `<ms>-<counter>-<device>`, both numbers in base 36 and of fixed width. It never runs backwards on
 * one device, and a record made after another was seen sorts after it.
 *
 * @source Kulkarni, Demirbas, Madappa, Avva, Leone: Logical Physical Clocks. LNCS 8878 (2014),
 *         pp. 17–32, doi 10.1007/978-3-319-14472-6_2.
 * @differs The counter is carried into the milliseconds when it is full, and a clock too far ahead
 *          is not followed (see `afterSeeing`).
 */

const RADIX = 36;
const MS_WIDTH = 9;
const COUNTER_WIDTH = 4;
const COUNTER_END = RADIX ** COUNTER_WIDTH;
/** Below it the first digit is 0 or 1: until the year 2148, and far from where the width ends. */
const MS_END = 2 * RADIX ** (MS_WIDTH - 1);
const PATTERN = /^[01][0-9a-z]{8}-[0-9a-z]{4}-./s;
/** A device id is at most this long, so that a clock fits into 64 characters. */
const DEVICE_LENGTH_MOST = 49;
/** How far ahead of our own wall time another device's clock may pull ours. [ms] */
const PULL_MOST_MS = 5 * 60_000;

export const isClock = (text: string): boolean => PATTERN.test(text);

const msOf = (clock: string): number => Number.parseInt(clock.slice(0, MS_WIDTH), RADIX);
const digits = (value: number, width: number): string => value.toString(RADIX).padStart(width, "0");

/**
 * The clock of the next record of this device.
 *
 * @param previous  The latest clock made here or seen (`afterSeeing`); null before the first.
 * @param nowMs     Own wall time. [ms since 1970-01-01 UTC], whole, 0 to the year 2148
 * @param device    1 to 49 characters.
 * @returns         A clock that sorts after `previous`.
 * @throws RangeError  If an argument is outside its range, or `previous` is no clock.
 */
export function nextClock(previous: string | null, nowMs: number, device: string): string {
  if (!(Number.isInteger(nowMs) && nowMs >= 0 && nowMs < MS_END))
    throw new RangeError(`nextClock: nowMs must be whole and from 0 to ${MS_END}, got ${nowMs}`);
  if (device.length < 1 || device.length > DEVICE_LENGTH_MOST)
    throw new RangeError(`nextClock: device must have 1 to 49 characters, got "${device}"`);
  if (previous !== null && !isClock(previous))
    throw new RangeError(`nextClock: previous is no clock, got "${previous}"`);
  let ms = nowMs;
  let counter = 0;
  if (previous !== null && msOf(previous) >= nowMs) {
    ms = msOf(previous);
    counter = 1 + Number.parseInt(previous.slice(MS_WIDTH + 1, MS_WIDTH + 5), RADIX);
    if (counter === COUNTER_END) {
      ms += 1;
      counter = 0;
    }
  }
  return `${digits(ms, MS_WIDTH)}-${digits(counter, COUNTER_WIDTH)}-${device}`;
}

/**
 * Own latest clock after another device's has been read: the later of the two. One that is more
 * than 5 minutes ahead of our wall time is not followed: a phone with a wrong date must not drag
 * all the others along.
 */
export function afterSeeing(own: string | null, seen: string, nowMs: number): string | null {
  if (!isClock(seen) || msOf(seen) > nowMs + PULL_MOST_MS) return own;
  return own === null || seen > own ? seen : own;
}

/** Journal order: by clock, then by id. */
export function compareRecords(
  a: Pick<JournalRecord, "clock" | "id">,
  b: Pick<JournalRecord, "clock" | "id">,
): number {
  if (a.clock !== b.clock) return a.clock < b.clock ? -1 : 1;
  return a.id === b.id ? 0 : a.id < b.id ? -1 : 1;
}
