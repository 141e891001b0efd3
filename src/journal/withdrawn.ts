import type { JournalRecord } from "./records.ts";

/**
 * Ids of the records of one show that no longer count. A record is withdrawn while at least one
 * withdrawal of it stands; a withdrawal stands unless it is withdrawn itself. What belongs to a
 * withdrawn fault or mark goes with it.
 *
 * Settled by who names whom, not by clock: a phone with a slow clock can withdraw a record that
 * sorts after the withdrawal. Withdrawals that name each other in a ring have no effect.
 */
export function withdrawnIds(records: readonly JournalRecord[]): ReadonlySet<string> {
  const named = new Map<string, string>();
  const openCount = new Map<string, number>();
  for (const { id, type, body } of records) {
    if (type !== "record.withdrawn") continue;
    named.set(id, body.record);
    openCount.set(body.record, (openCount.get(body.record) ?? 0) + 1);
  }
  const gone = new Set<string>();
  const settled = [...named.keys()].filter((id) => !openCount.has(id));
  // Grows while it is walked: a withdrawal is settled once all that name it are.
  for (const id of settled) {
    const target = named.get(id);
    if (target === undefined) continue;
    if (!gone.has(id)) gone.add(target);
    const left = (openCount.get(target) ?? 0) - 1;
    openCount.set(target, left);
    if (left === 0) settled.push(target);
  }
  for (const { id, body } of records) if ("fault" in body && gone.has(body.fault)) gone.add(id);
  for (const { id, body } of records) if ("mark" in body && gone.has(body.mark)) gone.add(id);
  return gone;
}
