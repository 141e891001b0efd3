import { describe, expect, it } from "vitest";
import { foldJournal } from "../../src/journal/fold.ts";
import { RECORD_TYPES, type RecordType } from "../../src/journal/records.ts";
import { entryLine, type Known, type ReportWording, showText } from "../../src/journal/report.ts";
import type { ShowView } from "../../src/journal/views.ts";
import { BODY, START_MS, writeJournal } from "./samples.ts";

const said = (name: string, words: object = {}) => `<${name} ${JSON.stringify(words)}>`;
/** The sentence of a test names all that it was given, and what it asked of the show. */
const names = RECORD_TYPES.map((type) => [
  type,
  ({ fault: _f, record: _r, at: _a, ...body }: Record<string, unknown>, known: Known) => {
    if (type === "link.removed") return said(type, { name: known.linkName(String(body["link"])) });
    if (type !== "dropout.detailed") return said(type, body);
    const { mark, links, place } = body as { mark: string; links: string[]; place: unknown };
    return said(type, { time: known.markTime(mark), links: links.map(known.linkName), place });
  },
]);
const wording: ReportWording = {
  time: (at, timeZone) =>
    new Intl.DateTimeFormat("en-GB", { timeZone, hour: "2-digit", minute: "2-digit" }).format(at),
  date: (at, timeZone) => new Intl.DateTimeFormat("en-CA", { timeZone }).format(at),
  unknownLink: "unknown link",
  entry: Object.fromEntries(names),
  title: (words) => said("title", words),
  linksHeading: "<links>",
  timelineHeading: "<timeline>",
  faultHeading: (words) => said("fault", words),
  markLine: (words) => said("mark", words),
  faultStillOpen: "<still open>",
};

/** A show that holds one entry of every type, 10:30 UTC and a minute on for each. */
function fullShow() {
  const { add, records } = writeJournal();
  add("show.opened", BODY["show.opened"]);
  add("link.set", BODY["link.set"]);
  add("moment.set", { moment: "live" });
  const fault = add("fault.opened", { moment: "live" }).id;
  const mark = add("dropout.marked", { fault }).id;
  add("dropout.detailed", { mark, links: ["l1", "l9"], place: "up-left" });
  for (const type of ["check.answered", "step.skipped", "remedy.tried", "fault.closed"] as const)
    add(type, { ...BODY[type], fault });
  add("sum.kept", BODY["sum.kept"]);
  add("link.removed", BODY["link.removed"]);
  add("show.edited", BODY["show.edited"]);
  const note = add("note.added", BODY["note.added"]);
  add("show.closed", {});
  return { add, records, note, view: () => foldJournal(records).shows[0] as ShowView };
}

/** What each entry of that show must say. */
const SENTENCE: Record<Exclude<RecordType, "record.withdrawn">, object> = {
  "show.opened": BODY["show.opened"],
  "show.edited": BODY["show.edited"],
  "show.closed": {},
  "moment.set": { moment: "live" },
  "link.set": { link: "l1", name: "Lead vocal", kind: "handheld", frequencyMhz: 614.4 },
  "link.removed": { name: "Lead vocal" },
  "fault.opened": { moment: "live" },
  "dropout.marked": {},
  "dropout.detailed": {
    time: "23:34",
    links: ["Lead vocal", "unknown link"],
    place: "up-left",
  },
  "check.answered": { check: "c1", outcome: "yes" },
  "step.skipped": { step: "c2" },
  "remedy.tried": { remedy: "r1", result: "better" },
  "fault.closed": {
    causes: ["k1"],
    ending: "cured",
    remedy: "r1",
    note: "Swapped.",
  },
  "sum.kept": {
    calculator: "distance",
    query: BODY["sum.kept"].query,
    sentence: "30 m costs 57.7 dB.",
  },
  "note.added": { text: "Second line array is new." },
};

describe("showText", () => {
  // Auckland is 13 hours ahead of UTC in December (time zone database): 10:30 UTC is 23:30 there.
  it("says each entry as a sentence with its time in the show's zone", () => {
    const { view } = fullShow();
    const lines = showText(view(), wording).split("\n");
    const timeline = lines.slice(lines.indexOf("<timeline>") + 1);
    expect(timeline[0]).toBe(`- 23:30 ${said("show.opened", SENTENCE["show.opened"])}`);
    expect(timeline[3]).toBe(`- 23:33 ${said("fault.opened", SENTENCE["fault.opened"])}`);
    for (const { record } of view().timeline) {
      const type = record.type as keyof typeof SENTENCE;
      const sentence = said(type, SENTENCE[type]);
      expect(timeline.filter((line) => line.endsWith(` ${sentence}`))).toHaveLength(1);
    }
    expect(timeline.filter((line) => line.startsWith("- "))).toHaveLength(15);
    expect(new Set(view().timeline.map(({ record }) => record.type)).size).toBe(15);
  });

  it("begins with name, place and date as they stand", () => {
    const { view } = fullShow();
    const title = { name: "Late show", place: "Hall by the river", date: "2026-12-01" };
    expect(showText(view(), wording).split("\n")[0]).toBe(said("title", title));
  });

  it("names the new day where the show runs past midnight", () => {
    const { add, records } = writeJournal("phone-a", START_MS + 29 * 60_000);
    add("show.opened", BODY["show.opened"]);
    add("note.added", { text: "t" });
    add("note.added", { text: "u" });
    const text = showText(foldJournal(records).shows[0] as ShowView, wording);
    expect(text.split("<timeline>\n")[1]).toBe(
      [
        `- 23:59 ${said("show.opened", BODY["show.opened"])}`,
        "2026-12-02",
        `- 00:00 ${said("note.added", { text: "t" })}`,
        `- 00:01 ${said("note.added", { text: "u" })}`,
        "",
      ].join("\n"),
    );
  });

  it("lists the links, and each fault with its marks and its verdict", () => {
    const { add, records, view } = fullShow();
    const open = add("fault.opened", { moment: "between" });
    const link = { link: "l2", name: "Bass", kind: "in-ear", frequencyMhz: null };
    add("link.set", { link: "l2", name: "Bass", kind: "in-ear", frequencyMhz: null });
    const head = showText(view(), wording).split("\n\n");
    expect(head[1]).toBe(`<links>\n- ${said("link.set", link)}`);
    const first = { number: 1, date: "2026-12-01", time: "23:33", moment: "live" };
    const { "dropout.detailed": mark, "fault.closed": verdict } = SENTENCE;
    expect(head[2]).toBe(
      `${said("fault", first)}\n- ${said("mark", mark)}\n- ${said("fault.closed", verdict)}`,
    );
    const second = { number: 2, date: "2026-12-01", time: "23:45", moment: "between" };
    expect(head[3]).toBe(`${said("fault", second)}\n- <still open>`);
    expect(records).toContain(open);
  });

  it("leaves out what is withdrawn", () => {
    const { add, note, view } = fullShow();
    const before = showText(view(), wording);
    expect(before).toContain("Second line array is new.");
    add("record.withdrawn", { record: note.id });
    const after = showText(view(), wording);
    expect(after).not.toContain("Second line array is new.");
    expect(after).not.toContain("record.withdrawn");
    expect(after.split("\n")).toHaveLength(before.split("\n").length - 1);
  });

  it("keeps the further lines of a note under its first, so that none looks like an entry", () => {
    const { add, records } = writeJournal();
    add("show.opened", BODY["show.opened"]);
    add("note.added", { text: "one\n- 23:59 two\r\nthree\rfour" });
    const plain = {
      ...wording,
      entry: { ...wording.entry, "note.added": ({ text }: { text: string }) => text },
    };
    expect(showText(foldJournal(records).shows[0] as ShowView, plain)).toContain(
      "- 23:31 one\n  - 23:59 two\n  three\n  four\n",
    );
  });
});

describe("entryLine", () => {
  it("says what it can of records whose partner is missing", () => {
    const { add, records } = writeJournal();
    add("show.opened", BODY["show.opened"]);
    const detail = add("dropout.detailed", { mark: "m9", links: ["l9"], place: null });
    const removal = add("link.removed", { link: "l9" });
    const verdict = add("fault.closed", { ...BODY["fault.closed"], causes: [], remedy: null });
    const withdrawal = add("record.withdrawn", { record: "x9" });
    const show = foldJournal(records).shows[0] as ShowView;
    expect(entryLine(detail, show, wording)).toBe(
      said("dropout.detailed", { time: null, links: ["unknown link"], place: null }),
    );
    expect(entryLine(removal, show, wording)).toBe(said("link.removed", { name: "unknown link" }));
    expect(entryLine(verdict, show, wording)).toContain('"causes":[],');
    expect(entryLine(verdict, show, wording)).toContain('"remedy":null');
    expect(entryLine(withdrawal, show, wording)).toBe(said("record.withdrawn"));
  });

  it("uses the name that a link has now: not the one it had then, nor one that was withdrawn", () => {
    const { add, records } = writeJournal();
    add("show.opened", BODY["show.opened"]);
    add("link.set", BODY["link.set"]);
    const detail = add("dropout.detailed", { mark: "m1", links: ["l1"], place: null });
    add("link.set", { ...BODY["link.set"], name: "Second vocal" });
    const renamed = add("link.set", { ...BODY["link.set"], name: "Third vocal" });
    add("record.withdrawn", { record: renamed.id });
    const show = foldJournal(records).shows[0] as ShowView;
    expect(entryLine(detail, show, wording)).toContain('"Second vocal"');
  });
});
