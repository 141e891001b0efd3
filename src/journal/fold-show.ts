import { foldFaults } from "./fold-fault.ts";
import type { JournalRecord, Moment } from "./records.ts";
import type { LinkView, ShowView } from "./views.ts";
import { withdrawnIds } from "./withdrawn.ts";

/**
 * One show as it stands, or null if its opening has been withdrawn. The latest record that is not
 * withdrawn stands: withdrawing an answer that had replaced an earlier one brings the earlier back.
 *
 * @param records  All records of the show, in journal order.
 */
export function foldShow(
  opened: JournalRecord<"show.opened">,
  records: readonly JournalRecord[],
): ShowView | null {
  const withdrawn = withdrawnIds(records);
  if (withdrawn.has(opened.id)) return null;
  const standing = records.filter(({ id }) => !withdrawn.has(id));
  const withdrawals = new Map<string, string[]>();
  const links = new Map<string, LinkView>();
  let { name, place } = opened.body;
  let closedAt: number | null = null;
  // Until it is said: the moment that allows least, so that nothing is switched off before an audience.
  let moment: Moment = "live";
  for (const { id, at, type, body } of standing) {
    if (type === "show.edited") ({ name, place } = body);
    else if (type === "show.closed") closedAt = at;
    else if (type === "moment.set") moment = body.moment;
    else if (type === "link.set") {
      const { link, ...set } = body;
      links.set(link, { id: link, ...set });
    } else if (type === "link.removed") links.delete(body.link);
    else if (type === "record.withdrawn")
      withdrawals.set(body.record, [...(withdrawals.get(body.record) ?? []), id]);
  }
  return {
    id: opened.id,
    name,
    place,
    timeZone: opened.body.timeZone,
    openedAt: opened.at,
    closedAt,
    moment,
    links: [...links.values()],
    faults: foldFaults(standing),
    timeline: records
      .filter(({ type }) => type !== "record.withdrawn")
      .map((record) => ({
        record,
        isWithdrawn: withdrawn.has(record.id),
        withdrawals: withdrawals.get(record.id) ?? [],
      })),
  };
}
