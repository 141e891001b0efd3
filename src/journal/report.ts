import type {
  Ending,
  JournalRecord,
  LinkKind,
  Moment,
  StagePlace,
  TrialResult,
} from "./records.ts";
import type { FaultView, LinkView, ShowView } from "./views.ts";

/** The sentence of each entry, without its time. Names arrive in words already. */
export interface EntrySentences {
  "show.opened"(words: { name: string; place: string }): string;
  "show.edited"(words: { name: string; place: string }): string;
  "show.closed"(): string;
  "moment.set"(words: { moment: string }): string;
  "link.set"(words: { name: string; kind: string; frequencyMhz: number | null }): string;
  "link.removed"(words: { name: string }): string;
  "fault.opened"(words: { moment: string }): string;
  "dropout.marked"(): string;
  /** `time` is that of the mark, null where the mark is missing. */
  "dropout.detailed"(words: { time: string | null; links: string[]; place: string | null }): string;
  "check.answered"(words: { question: string; outcome: string }): string;
  "step.skipped"(words: { step: string }): string;
  "remedy.tried"(words: { remedy: string; result: string }): string;
  "fault.closed"(words: {
    causes: string[];
    ending: string;
    remedy: string | null;
    note: string;
  }): string;
  "sum.kept"(words: { calculator: string; sentence: string }): string;
  "note.added"(words: { text: string }): string;
  "record.withdrawn"(): string;
}

/** Every word of the report: the journal has none of its own. Ids may be unknown to it. */
export interface ReportWording {
  /** Time of day. Must take any zone name, also one that the phone does not know. */
  time(atMs: number, timeZone: string): string;
  /** Calendar day, likewise. */
  date(atMs: number, timeZone: string): string;
  causeName(cause: string): string;
  checkQuestion(check: string): string;
  outcomeLabel(check: string, outcome: string): string;
  remedyTitle(remedy: string): string;
  /** Title of a check or a remedy. */
  stepTitle(step: string): string;
  calculatorName(calculator: string): string;
  linkKind(kind: LinkKind): string;
  moment(moment: Moment): string;
  place(place: StagePlace): string;
  trialResult(result: TrialResult): string;
  ending(ending: Ending): string;
  /** Stands for a link whose record is missing. */
  readonly unknownLink: string;
  readonly entry: EntrySentences;
  /** First line. Name and place may be empty. */
  title(words: { name: string; place: string; date: string }): string;
  readonly linksHeading: string;
  readonly timelineHeading: string;
  /** `number` counts the faults of the show from 1. */
  faultHeading(words: { number: number; date: string; time: string; moment: string }): string;
  markLine(words: { time: string; links: string[]; place: string | null }): string;
  readonly faultStillOpen: string;
}

/** What an entry of the show says, as one sentence without its time. */
export function entryLine(record: JournalRecord, show: ShowView, wording: ReportWording): string {
  const { entry } = wording;
  switch (record.type) {
    case "show.opened":
    case "show.edited":
      return entry[record.type](record.body);
    case "show.closed":
    case "dropout.marked":
    case "record.withdrawn":
      return entry[record.type]();
    case "moment.set":
    case "fault.opened":
      return entry[record.type]({ moment: wording.moment(record.body.moment) });
    case "link.set":
      return linkLine(record.body, wording);
    case "link.removed":
      return entry["link.removed"]({ name: linkName(record.body.link, show, wording) });
    case "dropout.detailed": {
      const { mark, ...where } = record.body;
      const marked = show.timeline.find((other) => other.record.id === mark)?.record;
      return entry["dropout.detailed"]({
        time: marked ? wording.time(marked.at, show.timeZone) : null,
        ...placeWords(where, show, wording),
      });
    }
    case "check.answered": {
      const { check, outcome } = record.body;
      return entry["check.answered"]({
        question: wording.checkQuestion(check),
        outcome: wording.outcomeLabel(check, outcome),
      });
    }
    case "step.skipped":
      return entry["step.skipped"]({ step: wording.stepTitle(record.body.step) });
    case "remedy.tried": {
      const { remedy, result } = record.body;
      return entry["remedy.tried"]({
        remedy: wording.remedyTitle(remedy),
        result: wording.trialResult(result),
      });
    }
    case "fault.closed":
      return verdictLine(record.body, wording);
    case "sum.kept": {
      const { calculator, sentence } = record.body;
      return entry["sum.kept"]({ calculator: wording.calculatorName(calculator), sentence });
    }
    case "note.added":
      return entry["note.added"](record.body);
  }
}

/** The show as plain text to hand over, in the show's own time zone. Withdrawn entries are left out. */
export function showText(show: ShowView, wording: ReportWording): string {
  const { name, place, timeZone, links } = show;
  const date = wording.date(show.openedAt, timeZone);
  const lines = [wording.title({ name, place, date })];
  if (links.length > 0) lines.push("", wording.linksHeading);
  for (const link of links) lines.push(item(linkLine(link, wording)));
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
  const time = (atMs: number): string => wording.time(atMs, show.timeZone);
  return [
    wording.faultHeading({
      number,
      date: wording.date(fault.openedAt, show.timeZone),
      time: time(fault.openedAt),
      moment: wording.moment(fault.moment),
    }),
    ...fault.marks.map((mark) =>
      item(wording.markLine({ time: time(mark.at), ...placeWords(mark, show, wording) })),
    ),
    item(fault.verdict ? verdictLine(fault.verdict, wording) : wording.faultStillOpen),
  ];
}

function linkLine(
  { name, kind, frequencyMhz }: Omit<LinkView, "id">,
  wording: ReportWording,
): string {
  return wording.entry["link.set"]({ name, kind: wording.linkKind(kind), frequencyMhz });
}

function verdictLine(
  verdict: { causes: readonly string[]; ending: Ending; remedy: string | null; note: string },
  wording: ReportWording,
): string {
  return wording.entry["fault.closed"]({
    causes: verdict.causes.map((cause) => wording.causeName(cause)),
    ending: wording.ending(verdict.ending),
    remedy: verdict.remedy === null ? null : wording.remedyTitle(verdict.remedy),
    note: verdict.note,
  });
}

function placeWords(
  where: { links: readonly string[]; place: StagePlace | null },
  show: ShowView,
  wording: ReportWording,
): { links: string[]; place: string | null } {
  return {
    links: where.links.map((link) => linkName(link, show, wording)),
    place: where.place === null ? null : wording.place(where.place),
  };
}

/** A removed link keeps the name it last had. */
function linkName(link: string, show: ShowView, wording: ReportWording): string {
  const listed = show.links.find(({ id }) => id === link);
  if (listed) return listed.name;
  const last = show.timeline.findLast(
    ({ record }) => record.type === "link.set" && record.body.link === link,
  )?.record;
  return last?.type === "link.set" ? last.body.name : wording.unknownLink;
}

/** One line of a list; further lines of a note stay under it. */
const item = (text: string): string => `- ${text.replace(/\r\n?|\n/g, "\n  ")}`;
