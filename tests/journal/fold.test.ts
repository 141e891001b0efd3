import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { foldJournal } from "../../src/journal/fold.ts";
import type { JournalRecord } from "../../src/journal/records.ts";
import type { FaultView, ShowView } from "../../src/journal/views.ts";
import { anySoundJournal, RUNS } from "./arbitraries.ts";
import { BODY, START_MS, writeJournal } from "./samples.ts";

const MINUTE_MS = 60_000;

function onlyShow(records: readonly JournalRecord[]): ShowView {
  const { shows } = foldJournal(records);
  expect(shows).toHaveLength(1);
  return shows[0] as ShowView;
}
function onlyFault(records: readonly JournalRecord[]): FaultView {
  const { faults } = onlyShow(records);
  expect(faults).toHaveLength(1);
  return faults[0] as FaultView;
}
const open = (writer = writeJournal()) => {
  const show = writer.add("show.opened", BODY["show.opened"]);
  return { ...writer, show };
};
const openFault = () => {
  const writer = open();
  const fault = writer.add("fault.opened", { moment: "live" }).id;
  return { ...writer, fault };
};

describe("a journal", () => {
  it("is empty without records", () => {
    expect(foldJournal([])).toEqual({ shows: [], openShow: null });
  });

  it("lists shows with the latest opened first, and takes the latest that is not closed as open", () => {
    const { add, records } = writeJournal();
    const first = add("show.opened", BODY["show.opened"]).id;
    const second = add("show.opened", BODY["show.opened"]).id;
    const third = add("show.opened", BODY["show.opened"]).id;
    add("show.closed", {});
    const { shows, openShow } = foldJournal(records);
    expect(shows.map(({ id }) => id)).toEqual([third, second, first]);
    expect(openShow?.id).toBe(second);
  });

  it("has no open show once all are closed", () => {
    const { add, records } = open();
    const closed = add("show.closed", {});
    expect(foldJournal(records).openShow).toBeNull();
    expect(onlyShow(records).closedAt).toBe(closed.at);
  });

  it("leaves out a show whose opening is missing, and shows it when it arrives", () => {
    const { add, records } = open();
    add("note.added", { text: "t" });
    const other = open(writeJournal("phone-b"));
    const [opening, ...rest] = records;
    expect(foldJournal([...rest, ...other.records]).shows.map(({ id }) => id)).toEqual([
      other.show.id,
    ]);
    expect(foldJournal([...rest, opening as JournalRecord]).shows).toHaveLength(1);
  });

  it("does not take a second opening inside a show for a show", () => {
    const { records, show } = open();
    const odd = { ...show, id: "odd", body: { ...show.body, name: "odd" } };
    expect(onlyShow([...records, odd]).name).toBe("Evening show");
  });

  it("takes the same one of two openings that claim one id, whichever comes first", () => {
    const { show } = open();
    for (const name of ["A show", "Zero hour"]) {
      const other = { ...structuredClone(show), body: { ...show.body, name } };
      expect(foldJournal([show, other])).toEqual(foldJournal([other, show]));
    }
  });

  it("is the same whatever the order of its records, and when some come twice", () => {
    fc.assert(
      fc.property(
        anySoundJournal.chain((journal) =>
          fc.tuple(
            fc.constant(journal),
            fc.shuffledSubarray(journal, { minLength: journal.length }),
            fc.subarray(journal),
          ),
        ),
        ([journal, shuffled, again]) => {
          expect(foldJournal([...shuffled, ...again])).toEqual(foldJournal(journal));
        },
      ),
      RUNS,
    );
  });

  it("is the same when it grows record by record as when it is read at once", () => {
    fc.assert(
      fc.property(anySoundJournal, (journal) => {
        for (let count = 0; count <= journal.length; count += 7) {
          const grown = journal.slice(0, count);
          // A copy shares no record with what was folded before.
          expect(foldJournal(grown)).toEqual(foldJournal(structuredClone(grown)));
        }
      }),
      RUNS,
    );
  });

  it("keeps the view of a show that has not changed, and makes the other anew", () => {
    const [one, two] = [open(), open(writeJournal("phone-b"))];
    const viewsById = () => {
      const { shows } = foldJournal([...one.records, ...two.records]);
      return new Map(shows.map((show) => [show.id, show]));
    };
    const before = viewsById();
    two.add("note.added", { text: "t" });
    const after = viewsById();
    expect(after.get(one.show.id)).toBe(before.get(one.show.id));
    expect(after.get(two.show.id)?.timeline).toHaveLength(2);
    // As many records as before, but not the same.
    two.records.pop();
    two.add("moment.set", { moment: "live" });
    expect(viewsById().get(two.show.id)?.moment).toBe("live");
  });

  it("takes records that name each other in any way, and keeps every other show whole", () => {
    const { add, records } = open(writeJournal("quiet"));
    add("fault.opened", { moment: "live" });
    const alone = foldJournal(records).shows[0];
    let showCount = 0;
    fc.assert(
      fc.property(anySoundJournal, (journal) => {
        const { shows } = foldJournal([...journal, ...records]);
        showCount += shows.length - 1;
        expect(shows).toContainEqual(alone);
      }),
      RUNS,
    );
    expect(showCount).toBeGreaterThan(50);
  });
});

describe("a show", () => {
  it("has the name and place of the latest edit", () => {
    const { add, records } = open();
    expect(onlyShow(records)).toMatchObject({
      name: "Evening show",
      place: "Hall by the river",
      timeZone: "Pacific/Auckland",
      openedAt: START_MS,
      closedAt: null,
      moment: "live",
    });
    const edit = add("show.edited", { name: "Late show", place: "Yard" });
    expect(onlyShow(records)).toMatchObject({ name: "Late show", place: "Yard" });
    add("record.withdrawn", { record: edit.id });
    expect(onlyShow(records)).toMatchObject({ name: "Evening show", place: "Hall by the river" });
  });

  it("is in the moment last set", () => {
    const { add, records } = open();
    add("moment.set", { moment: "live" });
    const between = add("moment.set", { moment: "between" });
    expect(onlyShow(records).moment).toBe("between");
    add("record.withdrawn", { record: between.id });
    expect(onlyShow(records).moment).toBe("live");
  });

  it("lists links in the order they were added, as last set, without the removed", () => {
    const { add, records } = open();
    add("link.set", { ...BODY["link.set"], link: "l1", name: "One" });
    add("link.set", { ...BODY["link.set"], link: "l2", name: "Two" });
    add("link.set", { ...BODY["link.set"], link: "l1", name: "One again", frequencyMhz: null });
    const kind = "handheld";
    const one = { id: "l1", name: "One again", kind, frequencyMhz: null };
    const two = { id: "l2", name: "Two", kind, frequencyMhz: 614.4 };
    expect(onlyShow(records).links).toEqual([one, two]);
    const removal = add("link.removed", { link: "l1" });
    expect(onlyShow(records).links).toEqual([two]);
    add("record.withdrawn", { record: removal.id });
    expect(onlyShow(records).links).toEqual([one, two]);
  });

  it("vanishes when its opening is withdrawn, and opens again when its closing is", () => {
    const { add, records, show } = open();
    const closing = add("show.closed", {});
    add("record.withdrawn", { record: closing.id });
    expect(foldJournal(records).openShow?.id).toBe(show.id);
    add("record.withdrawn", { record: show.id });
    expect(foldJournal(records).shows).toEqual([]);
  });

  it("keeps every record in its timeline but the withdrawals, and marks what is withdrawn", () => {
    const { add, records, show } = open();
    const note = add("note.added", { text: "t" });
    const withdrawal = add("record.withdrawn", { record: note.id });
    const lost = add("dropout.marked", { fault: "never-arrived" });
    expect(onlyShow(records).timeline).toEqual([
      { record: show, isWithdrawn: false, withdrawals: [] },
      { record: note, isWithdrawn: true, withdrawals: [withdrawal.id] },
      { record: lost, isWithdrawn: false, withdrawals: [] },
    ]);
  });

  it("names the withdrawals that stand, so that withdrawing those restores the record", () => {
    const { add, records } = open();
    const note = add("note.added", { text: "t" });
    const first = add("record.withdrawn", { record: note.id });
    add("record.withdrawn", { record: first.id });
    const second = add("record.withdrawn", { record: note.id });
    const entry = onlyShow(records).timeline.find(({ record }) => record.id === note.id);
    expect(entry?.withdrawals).toEqual([second.id]);
    add("record.withdrawn", { record: second.id });
    expect(onlyShow(records).timeline.at(-1)).toMatchObject({ isWithdrawn: false });
  });
});

describe("a fault", () => {
  it("holds its marks with what was told of them later", () => {
    const { add, records, fault } = openFault();
    const first = add("dropout.marked", { fault });
    const second = add("dropout.marked", { fault });
    add("dropout.detailed", { mark: first.id, links: ["l1"], place: null });
    add("dropout.detailed", { mark: first.id, links: ["l1", "l2"], place: "centre" });
    add("dropout.detailed", { mark: "never-arrived", links: ["l9"], place: null });
    expect(onlyFault(records)).toMatchObject({ openedAt: START_MS + MINUTE_MS, moment: "live" });
    expect(onlyFault(records).marks).toEqual([
      { id: first.id, at: START_MS + 2 * MINUTE_MS, links: ["l1", "l2"], place: "centre" },
      { id: second.id, at: START_MS + 3 * MINUTE_MS, links: [], place: null },
    ]);
  });

  it("loses a mark that is withdrawn, with what was told of it", () => {
    const { add, records, fault } = openFault();
    const mark = add("dropout.marked", { fault }).id;
    const detail = add("dropout.detailed", { mark, links: [], place: "centre" }).id;
    add("record.withdrawn", { record: mark });
    expect(onlyFault(records).marks).toEqual([]);
    const withdrawn = onlyShow(records).timeline.filter(({ isWithdrawn }) => isWithdrawn);
    expect(withdrawn.map(({ record }) => record.id)).toEqual([mark, detail]);
  });

  it("keeps the latest answer to each check, in the order they were given", () => {
    const { add, records, fault } = openFault();
    add("check.answered", { fault, check: "c1", outcome: "yes" });
    add("check.answered", { fault, check: "c2", outcome: "no" });
    const changed = add("check.answered", { fault, check: "c1", outcome: "no" });
    const answers = () =>
      onlyFault(records).answers.map(({ check, outcome }) => `${check} ${outcome}`);
    expect(answers()).toEqual(["c2 no", "c1 no"]);
    expect(onlyFault(records).answers[1]).toMatchObject({ record: changed.id, at: changed.at });
  });

  it("goes back to the earlier answer when the later is withdrawn, and to none when both are", () => {
    const { add, records, fault } = openFault();
    const first = add("check.answered", { fault, check: "c1", outcome: "yes" }).id;
    const second = add("check.answered", { fault, check: "c1", outcome: "no" }).id;
    add("record.withdrawn", { record: second });
    expect(onlyFault(records).answers).toMatchObject([{ record: first, outcome: "yes" }]);
    add("record.withdrawn", { record: first });
    expect(onlyFault(records).answers).toEqual([]);
  });

  it("does not let a withdrawn earlier answer come back with the later one", () => {
    const { add, records, fault } = openFault();
    const first = add("check.answered", { fault, check: "c1", outcome: "yes" }).id;
    add("record.withdrawn", { record: first });
    const second = add("check.answered", { fault, check: "c1", outcome: "no" }).id;
    add("record.withdrawn", { record: second });
    expect(onlyFault(records).answers).toEqual([]);
  });

  it("lists every trial, and each skipped step once", () => {
    const { add, records, fault } = openFault();
    const trial = add("remedy.tried", { fault, remedy: "r1", result: "better" });
    add("remedy.tried", { fault, remedy: "r1", result: "cured" });
    for (const step of ["c1", "r2", "c1"]) add("step.skipped", { fault, step });
    const { trials, skipped } = onlyFault(records);
    expect(trials.map(({ remedy, result }) => `${remedy} ${result}`)).toEqual([
      "r1 better",
      "r1 cured",
    ]);
    expect(trials[0]).toMatchObject({ record: trial.id, at: trial.at });
    expect(skipped).toEqual(["c1", "r2"]);
  });

  it("is closed by its latest verdict, and open again when that is withdrawn", () => {
    const { add, records, fault } = openFault();
    expect(onlyFault(records).verdict).toBeNull();
    const closing = add("fault.closed", { ...BODY["fault.closed"], fault });
    const { fault: _fault, ...verdict } = closing.body;
    expect(onlyFault(records).verdict).toEqual({ record: closing.id, at: closing.at, ...verdict });
    add("record.withdrawn", { record: closing.id });
    expect(onlyFault(records).verdict).toBeNull();
  });

  it("is hidden with all that belongs to it when its opening is withdrawn, and comes back whole", () => {
    const { add, records, fault } = openFault();
    const mark = add("dropout.marked", { fault }).id;
    add("dropout.detailed", { mark, links: [], place: "centre" });
    add("check.answered", { fault, check: "c1", outcome: "yes" });
    const whole = onlyFault(records);
    const undo = add("record.withdrawn", { record: fault }).id;
    expect(onlyShow(records).faults).toEqual([]);
    expect(onlyShow(records).timeline.map(({ isWithdrawn }) => isWithdrawn)).toEqual([
      false,
      true,
      true,
      true,
      true,
    ]);
    add("record.withdrawn", { record: undo });
    expect(onlyFault(records)).toEqual(whole);
  });

  it("does not disturb others when its opening is missing", () => {
    const { add, records, fault } = openFault();
    const mark = add("dropout.marked", { fault: "never-arrived" }).id;
    add("dropout.detailed", { mark, links: [], place: "centre" });
    for (const type of ["check.answered", "step.skipped", "remedy.tried", "fault.closed"] as const)
      add(type, { ...BODY[type], fault: "never-arrived" });
    expect(onlyFault(records)).toMatchObject({ id: fault, marks: [], answers: [], verdict: null });
    expect(onlyShow(records).timeline).toHaveLength(8);
  });
});
