import { compareRecords } from "./clock.ts";
import { foldShow } from "./fold-show.ts";
import { groupBy, unionById } from "./order.ts";
import type { JournalRecord } from "./records.ts";
import type { ShowView } from "./views.ts";

export interface JournalView {
  /** Latest opened first. */
  readonly shows: readonly ShowView[];
  /** The latest opened that is not closed. */
  readonly openShow: ShowView | null;
}

interface Folded {
  readonly records: readonly JournalRecord[];
  readonly opened: JournalRecord<"show.opened">;
  readonly view: ShowView | null;
}

/** What was made of each show last time: all but one are long closed, and years of them add up. */
const lastFolded = new WeakMap<JournalRecord, Folded>();

/**
 * Everything the app shows, made from the records alone: the same whatever their order, and
 * whichever of them come twice. Records of a show whose opening is missing (a part of another
 * phone's journal) are left out until it arrives; a record that names something unknown stands in
 * the timeline and nowhere else. A show none of whose records has changed keeps its view.
 */
export function foldJournal(records: readonly JournalRecord[]): JournalView {
  const shows = [...groupBy(records, ({ show }) => show).values()]
    .flatMap((group) => foldGroup(group) ?? [])
    .sort((a, b) => compareRecords(b.opened, a.opened))
    .flatMap(({ view }) => view ?? []);
  return { shows, openShow: shows.find(({ closedAt }) => closedAt === null) ?? null };
}

function foldGroup(records: readonly JournalRecord[]): Folded | null {
  const key = records.find(isOpening);
  if (!key) return null;
  const last = lastFolded.get(key);
  if (last?.records.length === records.length && last.records.every((r, i) => r === records[i]))
    return last;
  const ordered = unionById(records, []);
  const opened = ordered.find(isOpening) ?? key;
  const folded = { records, opened, view: foldShow(opened, ordered) };
  lastFolded.set(key, folded);
  return folded;
}

const isOpening = (record: JournalRecord): record is JournalRecord<"show.opened"> =>
  record.type === "show.opened" && record.id === record.show;
