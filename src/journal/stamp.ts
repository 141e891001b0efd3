import { afterSeeing, nextClock } from "./clock.ts";
import { readRow } from "./reading.ts";
import { type Entry, type JournalRecord, RECORD_VERSION } from "./records.ts";
import type { ShowLock } from "./store.ts";
import type { ShowView } from "./views.ts";

/** What the app adds to an entry. */
export interface StampContext {
  /** Show that the entry belongs to; not used by `show.opened`. */
  readonly show: string;
  readonly device: string;
  /** Wall clock of the device. [ms since 1970-01-01 UTC] */
  readonly nowMs: number;
  /** Makes a UUID version 7. */
  readonly newId: () => string;
  /** Latest clock made here or seen, null before the first. */
  readonly lastClock: string | null;
}

/**
 * Makes the record of an entry; `show.opened` belongs to itself.
 *
 * @throws RangeError  If the record could not be read back: it would be set aside at the next start.
 */
export function stampEntry<E extends Entry>(
  entry: E,
  { show, device, nowMs, newId, lastClock }: StampContext,
): JournalRecord<E["type"]> {
  const id = newId();
  const row = readRow({
    id,
    v: RECORD_VERSION,
    show: entry.type === "show.opened" ? id : show,
    at: nowMs,
    device,
    clock: nextClock(lastClock, nowMs, device),
    type: entry.type,
    body: entry.body,
  });
  if (row.kind !== "record")
    throw new RangeError(
      `stampEntry: entry ${entry.type}: ${row.kind === "damaged" ? row.reason : row.kind}`,
    );
  return row.record as JournalRecord<E["type"]>;
}

/**
 * Latest clock after records have been read from storage, another window or another device. Own
 * ones count in full, so that a device whose wrong date was set right still goes on after them;
 * others' as `afterSeeing` says.
 */
export function lastClockAfter(
  own: string | null,
  records: readonly JournalRecord[],
  { device, nowMs }: Pick<StampContext, "device" | "nowMs">,
): string | null {
  let last = own;
  for (const record of records)
    last = afterSeeing(last, record.clock, record.device === device ? Infinity : nowMs);
  return last;
}

/**
 * What the worker is told: the open show, or null where there is none.
 *
 * @param latestAt  Time of the latest record of the show. [ms since 1970-01-01 UTC]
 */
export function lockFor(show: ShowView | null, latestAt: number): ShowLock | null {
  return show === null || show.closedAt !== null ? null : { show: show.id, at: latestAt };
}
