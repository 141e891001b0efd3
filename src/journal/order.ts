import { compareRecords } from "./clock.ts";
import type { JournalRecord } from "./records.ts";

/**
 * Merges two journals: each id once, in journal order. Commutative, associative and idempotent, also
 * where two different records claim the same id: then the one whose JSON text sorts first is kept.
 */
export function unionById(
  a: readonly JournalRecord[],
  b: readonly JournalRecord[],
): readonly JournalRecord[] {
  const byId = new Map<string, JournalRecord>();
  for (const record of [...a, ...b]) {
    const known = byId.get(record.id);
    if (!known || (known !== record && JSON.stringify(record) < JSON.stringify(known)))
      byId.set(record.id, record);
  }
  return [...byId.values()].sort(compareRecords);
}

/** The items in the order given, under each key they have; null is no key. */
export function groupBy<T>(
  items: readonly T[],
  keyOf: (item: T) => string | null,
): ReadonlyMap<string, readonly T[]> {
  const groups = new Map<string, T[]>();
  for (const item of items) {
    const key = keyOf(item);
    if (key === null) continue;
    const group = groups.get(key);
    if (group) group.push(item);
    else groups.set(key, [item]);
  }
  return groups;
}
