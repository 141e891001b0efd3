import type { Entry, JournalRecord, Moment, RecordType, StagePlace } from "./records.ts";
import type { FaultView, ShowView } from "./views.ts";

/** What a sentence may ask of the show that its entry belongs to. */
export interface Known {
  /** Name that a link has now; a removed one keeps the name it last had. */
  linkName(link: string): string;
  /** Time of day of a mark; null where the mark is missing. */
  markTime(mark: string): string | null;
}

/** The sentence of each entry, without its time. Ids in the body may be unknown to the wording. */
type EntrySentences = {
  readonly [T in RecordType]: (body: Entry<T>["body"], known: Known) => string;
};

/** Every word of the report: the journal has none of its own. */
export interface ReportWording {
  /** Time of day. Must take any zone name, also one that the phone does not know. */
  time(atMs: number, timeZone: string): string;
  /** Calendar day, likewise. */
  date(atMs: number, timeZone: string): string;
  /** Stands for a link whose record is missing. */
  readonly unknownLink: string;
  readonly entry: EntrySentences;
  /** First line. Name and place may be empty. */
  title(words: { name: string; place: string; date: string }): string;
  readonly linksHeading: string;
  readonly timelineHeading: string;
  /** `number` counts the faults of the show from 1. */
  faultHeading(words: { number: number; date: string; time: string; moment: Moment }): string;
  markLine(words: { time: string; links: readonly string[]; place: StagePlace | null }): string;
  readonly faultStillOpen: string;
}

/** What an entry of the show says, as one sentence without its time. */
export function entryLine(record: JournalRecord, show: ShowView, wording: ReportWording): string {
  const say = wording.entry[record.type] as (body: unknown, known: Known) => string;
  return say(record.body, knownOf(show, wording));
}

/** The show as plain text to hand over, in the show's own time zone. Withdrawn entries are left out. */
export function showText(show: ShowView, wording: ReportWording): string {
  const { name, place, timeZone, links } = show;
  const known = knownOf(show, wording);
  const date = wording.date(show.openedAt, timeZone);
  const lines = [wording.title({ name, place, date })];
  if (links.length > 0) lines.push("", wording.linksHeading);
  for (const { id, ...link } of links)
    lines.push(item(wording.entry["link.set"]({ link: id, ...link }, known)));
  for (const [index, fault] of show.faults.entries())
    lines.push("", ...faultLines(fault, index + 1, show, wording));
  lines.push("", wording.timelineHeading);
  let day = date;
  for (const { record, isWithdrawn } of show.timeline) {
    if (isWithdrawn) continue;
    const today = wording.date(record.at, timeZone);
    // A show that runs past midnight.
    if (today !== day) lines.push(today);
    day = today;
    const time = wording.time(record.at, timeZone);
    lines.push(item(`${time} ${entryLine(record, show, wording)}`));
  }
  return `${lines.join("\n")}\n`;
}

function faultLines(
  fault: FaultView,
  number: number,
  show: ShowView,
  wording: ReportWording,
): readonly string[] {
  const known = knownOf(show, wording);
  const time = (atMs: number): string => wording.time(atMs, show.timeZone);
  const { verdict, moment } = fault;
  return [
    wording.faultHeading({
      number,
      date: wording.date(fault.openedAt, show.timeZone),
      time: time(fault.openedAt),
      moment,
    }),
    ...fault.marks.map(({ at, links, place }) =>
      item(wording.markLine({ time: time(at), links: links.map(known.linkName), place })),
    ),
    item(
      verdict === null
        ? wording.faultStillOpen
        : wording.entry["fault.closed"](
            { ...verdict, fault: fault.id, causes: [...verdict.causes] },
            known,
          ),
    ),
  ];
}

function knownOf(show: ShowView, wording: ReportWording): Known {
  return {
    linkName: (link) => {
      const listed = show.links.find(({ id }) => id === link);
      if (listed) return listed.name;
      const last = show.timeline.findLast(
        ({ record }) => record.type === "link.set" && record.body.link === link,
      )?.record;
      return last?.type === "link.set" ? last.body.name : wording.unknownLink;
    },
    markTime: (mark) => {
      const marked = show.timeline.find(({ record }) => record.id === mark)?.record;
      return marked ? wording.time(marked.at, show.timeZone) : null;
    },
  };
}

/** One line of a list; further lines of a note stay under it. */
const item = (text: string): string => `- ${text.replace(/\r\n?|\n/g, "\n  ")}`;
