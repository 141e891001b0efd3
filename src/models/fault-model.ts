import { computed, type ReadonlySignal } from "@preact/signals";
import type { Evidence, Knowledge } from "../diagnosis/knowledge.ts";
import { type Advice, adviseNext, type StepName } from "../diagnosis/next-step.ts";
import { suspects } from "../diagnosis/suspects.ts";
import {
  type EvidenceWeight,
  evidenceWeights,
  roundedPercent,
  type Strength,
  strengthWord,
} from "../diagnosis/weights.ts";
import type { Ending, Moment, StagePlace, TrialResult } from "../journal/records.ts";
import type { FaultView, ShowView } from "../journal/views.ts";
import type { ExpertiseModel } from "./expertise-model.ts";
import type { JournalModel, Make } from "./journal-model.ts";
import type { NavigationModel } from "./navigation-model.ts";
import type { NoticeModel } from "./notice-model.ts";
import type { Surroundings } from "./surroundings.ts";
import type { Words } from "./words.ts";

/** A suspect as the screen shows it: never more precise than it is known. */
interface SuspectView {
  readonly cause: string;
  readonly probability: number;
  readonly strength: Strength;
  readonly percent: string;
}

export interface FaultModel {
  readonly show: ReadonlySignal<ShowView | null>;
  readonly moment: ReadonlySignal<Moment>;
  readonly openFaults: ReadonlySignal<readonly FaultView[]>;
  /** The fault that the address names, and the show it belongs to; null where there is none. */
  readonly traced: ReadonlySignal<{ fault: FaultView; show: ShowView } | null>;
  readonly suspects: ReadonlySignal<readonly SuspectView[]>;
  readonly advice: ReadonlySignal<Advice | null>;
  /** The step on the screen: the one the user picked, else the advised one. */
  readonly step: ReadonlySignal<StepName | null>;
  /** Every step that is still to be had in this moment, the advised one first. */
  readonly steps: ReadonlySignal<readonly StepName[]>;
  /** Null while what the fault finder knows has not been read. */
  readonly knowledge: ReadonlySignal<Knowledge | null>;
  readonly words: ReadonlySignal<Words>;
  weights(cause: string): readonly EvidenceWeight[];
  markDropout(): Promise<void>;
  setMoment(moment: Moment): Promise<void>;
  detailMark(mark: string, links: readonly string[], place: StagePlace | null): Promise<void>;
  /** Answers a check; the latest answer stands. */
  answer(check: string, outcome: string): Promise<void>;
  skip(step: StepName): Promise<void>;
  pick(step: StepName): void;
  tried(remedy: string, result: TrialResult): Promise<void>;
  withdraw(record: string): Promise<void>;
  close(verdict: {
    causes: readonly string[];
    ending: Ending;
    remedy: string | null;
    note: string;
  }): Promise<boolean>;
}

const NO_EVIDENCE: Evidence = { answers: [], trials: [], skipped: [] };

export function createFaultModel(parts: {
  journal: JournalModel;
  navigation: NavigationModel;
  notices: NoticeModel;
  surroundings: Surroundings;
  expertise: ExpertiseModel;
}): FaultModel {
  const { journal, navigation, notices, surroundings } = parts;
  const { knowledge, words } = parts.expertise;
  const show = journal.openShow;
  const openFaults = computed(() => (show.value?.faults ?? []).filter((f) => f.verdict === null));
  const traced = computed(() => {
    const route = navigation.route.value;
    if (!("fault" in route)) return null;
    for (const candidate of journal.view.value.shows) {
      const fault = candidate.faults.find(({ id }) => id === route.fault);
      if (fault) return { fault, show: candidate };
    }
    return null;
  });
  const moment = computed<Moment>(() => (traced.value?.show ?? show.value)?.moment ?? "live");
  const evidence = computed<Evidence>(() => {
    const fault = traced.value?.fault;
    if (!fault) return NO_EVIDENCE;
    return { answers: fault.answers, trials: fault.trials, skipped: fault.skipped };
  });
  const advice = computed(() =>
    traced.value === null || knowledge.value === null
      ? null
      : adviseNext(knowledge.value, evidence.value, moment.value),
  );
  const steps = computed<readonly StepName[]>(() => {
    const next = advice.value;
    if (next?.kind !== "step") return [];
    return [next.step, ...next.others];
  });
  const step = computed<StepName | null>(() => {
    const route = navigation.route.value;
    const picked = route.place === "trace" ? readStep(route.step) : null;
    return steps.value.find((ref) => isSameStep(ref, picked)) ?? steps.value[0] ?? null;
  });

  const entryFor = async (build: (make: Make, fault: string) => void): Promise<boolean> => {
    const target = traced.value;
    if (target === null) return false;
    const stored = await journal.record((make) =>
      build((entry) => make(entry, target.show.id), target.fault.id),
    );
    if (!stored) notices.say({ code: "not-stored" });
    return stored;
  };
  const backToAdvice = (): void => {
    const route = navigation.route.value;
    if (route.place === "trace" && route.step !== null)
      navigation.replace({ place: "trace", fault: route.fault, step: null });
  };

  return {
    show,
    moment,
    openFaults,
    traced,
    suspects: computed(() =>
      knowledge.value === null
        ? []
        : suspects(knowledge.value, evidence.value).map(({ cause, probability }) => ({
            cause,
            probability,
            strength: strengthWord(probability),
            percent: roundedPercent(probability),
          })),
    ),
    advice,
    step,
    steps,
    knowledge,
    words,
    weights: (cause) =>
      knowledge.value === null ? [] : evidenceWeights(knowledge.value, evidence.value, cause),
    markDropout: async () => {
      let fault = "";
      const marked = { at: 0, count: 1 };
      const stored = await journal.record((make) => {
        // Decided here, after the log has been read: an open fault may have come back with it.
        const open = openFaults.value.at(-1);
        fault =
          open?.id ??
          make({ type: "fault.opened", body: { moment: show.value?.moment ?? "live" } }).id;
        marked.count = (open?.marks.length ?? 0) + 1;
        marked.at = make({ type: "dropout.marked", body: { fault } }).at;
      });
      const route = navigation.route.value;
      const next = { place: "trace", fault, step: null } as const;
      if (route.place === "mark") navigation.replace(next);
      else if (!("fault" in route) || route.fault !== fault) navigation.go(next);
      surroundings.nudge();
      notices.say(stored ? { code: "marked", ...marked } : { code: "not-stored" });
    },
    setMoment: async (next) => {
      const target = traced.value?.show ?? show.value;
      if (target === null) return;
      await journal.record((make) =>
        make({ type: "moment.set", body: { moment: next } }, target.id),
      );
    },
    detailMark: async (mark, links, place) => {
      await entryFor((make) =>
        make({ type: "dropout.detailed", body: { mark, links: [...links], place } }),
      );
    },
    answer: async (check, outcome) => {
      await entryFor((make, fault) =>
        make({ type: "check.answered", body: { fault, check, outcome } }),
      );
      backToAdvice();
    },
    skip: async (ref) => {
      await entryFor((make, fault) =>
        make({ type: "step.skipped", body: { fault, step: ref.id } }),
      );
      backToAdvice();
    },
    pick: (ref) => {
      const fault = traced.value?.fault.id;
      if (fault !== undefined)
        navigation.replace({ place: "trace", fault, step: `${ref.kind}.${ref.id}` });
    },
    tried: async (remedy, result) => {
      await entryFor((make, fault) =>
        make({ type: "remedy.tried", body: { fault, remedy, result } }),
      );
      backToAdvice();
    },
    withdraw: async (record) => {
      await entryFor((make) => make({ type: "record.withdrawn", body: { record } }));
    },
    close: (verdict) =>
      entryFor((make, fault) =>
        make({ type: "fault.closed", body: { ...verdict, causes: [...verdict.causes], fault } }),
      ),
  };
}

function readStep(text: string | null): StepName | null {
  const [kind, id] = text?.split(/\.(.*)/s) ?? [];
  if (id === undefined || (kind !== "check" && kind !== "remedy")) return null;
  return { kind, id };
}

function isSameStep(a: StepName, b: StepName | null): boolean {
  return b !== null && a.kind === b.kind && a.id === b.id;
}
