import { describe, expect, it } from "vitest";
import { fromElicited } from "../../src/diagnosis/elicit.ts";
import { EXPERTISE } from "../../src/facts/expertise.ts";
import { createCloseModel } from "../../src/models/close-model.ts";
import { createExpertiseModel } from "../../src/models/expertise-model.ts";
import { createFaultModel } from "../../src/models/fault-model.ts";
import { createJournalModel } from "../../src/models/journal-model.ts";
import { createNavigationModel } from "../../src/models/navigation-model.ts";
import { createNoticeModel } from "../../src/models/notice-model.ts";
import { pretendAddress, pretendStore, pretendSurroundings } from "./pretend.ts";

const KNOWLEDGE = fromElicited(EXPERTISE.elicited);

function start(hash = "#/fault") {
  const store = pretendStore();
  const surroundings = pretendSurroundings();
  const journal = createJournalModel(store, surroundings);
  const address = pretendAddress(hash);
  const navigation = createNavigationModel(address);
  const notices = createNoticeModel();
  const expertise = createExpertiseModel(async () => EXPERTISE);
  void expertise.load();
  const fault = createFaultModel({ journal, navigation, notices, surroundings, expertise });
  const close = createCloseModel(fault, navigation, notices, surroundings);
  return { store, surroundings, journal, address, navigation, notices, fault, close };
}
const firstOutcome = (check: string): string =>
  KNOWLEDGE.checks.find(({ id }) => id === check)?.outcomes[0] ?? "";

describe("marking a dropout", () => {
  it("stores show, fault and mark together and goes to the fault", async () => {
    const { store, fault, navigation, notices } = start("#/calculators");
    await fault.markDropout();
    expect(store.rows.map(({ type }) => type)).toEqual([
      "show.opened",
      "fault.opened",
      "dropout.marked",
    ]);
    expect(navigation.route.value.place).toBe("trace");
    expect(fault.traced.value?.fault.marks).toHaveLength(1);
    expect(notices.notice.value).toMatchObject({ code: "marked", count: 1 });
  });

  it("adds to the fault that is open", async () => {
    const { fault, notices } = start();
    await fault.markDropout();
    await fault.markDropout();
    expect(fault.openFaults.value).toHaveLength(1);
    expect(fault.traced.value?.fault.marks).toHaveLength(2);
    expect(notices.notice.value).toMatchObject({ code: "marked", count: 2 });
  });

  it("leaves nothing in the history that would mark again after a restart", async () => {
    const { fault, address } = start("#/mark");
    await fault.markDropout();
    expect(address.entries).toHaveLength(1);
    expect(address.entries[0]).toMatch(/^#\/fault\/id-/);
  });

  it("says so when the phone did not store it", async () => {
    const { store, fault, notices } = start();
    store.answer = { kind: "failed", reason: "quota" };
    await fault.markDropout();
    expect(notices.notice.value).toEqual({ code: "not-stored" });
    expect(fault.traced.value?.fault.marks).toHaveLength(1);
  });
});

describe("tracing a fault", () => {
  it("moves the suspects with an answer and back when it is withdrawn", async () => {
    const { fault } = start();
    await fault.markDropout();
    const before = fault.suspects.value;
    const step = fault.steps.value.find(({ kind }) => kind === "check");
    if (!step) throw new Error("no check is offered for a fresh fault");
    await fault.answer(step.id, firstOutcome(step.id));
    expect(fault.suspects.value).not.toEqual(before);
    const given = fault.traced.value?.fault.answers[0];
    if (!given) throw new Error("the answer is not in the fault");
    await fault.withdraw(given.record);
    expect(fault.suspects.value).toEqual(before);
  });

  it("never offers again what was answered, tried or skipped, and comes to an end", async () => {
    const { fault } = start();
    await fault.markDropout();
    const offered: string[] = [];
    for (let turn = 0; turn < 200 && fault.advice.value?.kind === "step"; turn += 1) {
      const step = fault.step.value;
      if (!step) break;
      offered.push(`${step.kind}.${step.id}`);
      if (turn % 3 === 0) await fault.skip(step);
      else if (step.kind === "check") await fault.answer(step.id, "cant-tell");
      else await fault.tried(step.id, "no-change");
    }
    expect(offered.length).toBeGreaterThan(10);
    expect(new Set(offered).size).toBe(offered.length);
    expect(fault.advice.value?.kind).not.toBe("step");
  });

  it("shows the step that was picked until it is answered", async () => {
    const { fault, navigation } = start();
    await fault.markDropout();
    const other = fault.steps.value.findLast(({ kind }) => kind === "check");
    if (!other) throw new Error("only one step is offered");
    fault.pick(other);
    expect(fault.step.value).toEqual(other);
    await fault.answer(other.id, "cant-tell");
    expect(fault.step.value).not.toEqual(other);
    expect(navigation.route.value).toMatchObject({ place: "trace", step: null });
  });

  it("takes the microphone to be live until it is told otherwise, and saves the show first", async () => {
    const { fault } = start();
    await fault.markDropout();
    expect(fault.moment.value).toBe("live");
    expect(fault.traced.value?.fault.moment).toBe("live");
    // First save the show, then learn: common practice, no source.
    expect(fault.step.value).toEqual({ kind: "remedy", id: "hand-over-spare" });
  });

  it("offers nothing that the moment of the show does not allow", async () => {
    const { fault } = start();
    await fault.markDropout();
    await fault.setMoment("live");
    const earliest = new Map(
      [...KNOWLEDGE.checks, ...KNOWLEDGE.remedies].map(({ id, earliest }) => [id, earliest]),
    );
    expect(fault.steps.value.length).toBeGreaterThan(0);
    for (const { id } of fault.steps.value) expect(earliest.get(id)).toBe("live");
  });
});

describe("closing a fault", () => {
  it("fills itself from what helped and writes the verdict", async () => {
    const { fault, close, navigation } = start();
    await fault.markDropout();
    const remedy = KNOWLEDGE.remedies.find(({ isWorkaround }) => !isWorkaround);
    if (!remedy) throw new Error("the knowledge has no remedy");
    await fault.tried(remedy.id, "cured");
    expect(close.remedy.value).toBe(remedy.id);
    expect(close.ending.value).toBe("cured");
    await close.close();
    expect(fault.openFaults.value).toEqual([]);
    expect(fault.show.value?.faults[0]?.verdict).toMatchObject({
      ending: "cured",
      remedy: remedy.id,
    });
    expect(navigation.route.value.place).toBe("fault");
  });

  it("calls a work-around by its name", async () => {
    const { fault, close } = start();
    await fault.markDropout();
    const swap = KNOWLEDGE.remedies.find(({ isWorkaround }) => isWorkaround);
    if (!swap) throw new Error("the knowledge has no work-around");
    await fault.tried(swap.id, "cured");
    expect(close.ending.value).toBe("worked-around");
  });

  it("refuses a note that is too long and keeps it", async () => {
    const { fault, close } = start();
    await fault.markDropout();
    close.note.set("x".repeat(4001));
    await close.close();
    expect(close.isNoteTooLong.value).toBe(true);
    expect(fault.openFaults.value).toHaveLength(1);
    expect(close.note.text.value).toHaveLength(4001);
  });

  it("forgets the choices made for one fault when another is closed", async () => {
    const { fault, close } = start();
    await fault.markDropout();
    close.pickEnding("unsolved");
    await close.close();
    await fault.markDropout();
    expect(close.ending.value).toBe("stopped-by-itself");
  });
});
