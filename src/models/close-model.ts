import { computed, type ReadonlySignal, signal } from "@preact/signals";
import { NONE_OF_THESE } from "../diagnosis/knowledge.ts";
import type { Ending } from "../journal/records.ts";
import { createDraft, type Draft } from "./draft.ts";
import type { FaultModel } from "./fault-model.ts";
import { NOTE_LENGTH_MOST } from "./log-model.ts";
import type { NavigationModel } from "./navigation-model.ts";
import type { NoticeModel } from "./notice-model.ts";
import type { Surroundings } from "./surroundings.ts";

const SUGGESTED = 5;

/** The form that closes a fault. What is not chosen by hand follows the evidence. */
export interface CloseModel {
  readonly ending: ReadonlySignal<Ending>;
  /** Causes worth offering, likeliest first. */
  readonly offered: ReadonlySignal<readonly string[]>;
  readonly cause: ReadonlySignal<string | null>;
  /** Remedies that were tried and did something. */
  readonly helped: ReadonlySignal<readonly string[]>;
  readonly remedy: ReadonlySignal<string | null>;
  readonly note: Draft;
  readonly isNoteTooLong: ReadonlySignal<boolean>;
  pickEnding(ending: Ending): void;
  pickCause(cause: string | null): void;
  pickRemedy(remedy: string | null): void;
  close(): Promise<void>;
}

export function createCloseModel(
  fault: FaultModel,
  navigation: NavigationModel,
  notices: NoticeModel,
  surroundings: Surroundings,
): CloseModel {
  /** What was chosen by hand, and for which fault; a choice of null means "not known". */
  const chosen = signal<{
    fault: string;
    ending?: Ending;
    cause?: string | null;
    remedy?: string | null;
  }>({ fault: "" });
  const isNoteTooLong = signal(false);
  const note = createDraft(surroundings.keep, "closing-note");
  const id = computed(() => fault.traced.value?.fault.id ?? "");
  const own = computed(() =>
    chosen.value.fault === id.value ? chosen.value : { fault: id.value },
  );
  const helped = computed(() => {
    const trials = fault.traced.value?.fault.trials ?? [];
    return [
      ...new Set(
        trials
          .filter(({ result }) => result === "cured" || result === "better")
          .map(({ remedy }) => remedy)
          .reverse(),
      ),
    ];
  });
  const remedy = computed(
    () => own.value.remedy ?? (own.value.remedy === null ? null : (helped.value[0] ?? null)),
  );
  const isWorkaround = computed(
    () =>
      fault.knowledge.value?.remedies.find(({ id }) => id === remedy.value)?.isWorkaround ?? false,
  );
  const ending = computed<Ending>(
    () =>
      own.value.ending ??
      (isWorkaround.value
        ? "worked-around"
        : remedy.value !== null
          ? "cured"
          : "stopped-by-itself"),
  );
  const offered = computed(() =>
    fault.suspects.value
      .map(({ cause }) => cause)
      .filter((cause) => cause !== NONE_OF_THESE)
      .slice(0, SUGGESTED),
  );
  const cause = computed(() => {
    if (own.value.cause !== undefined) return own.value.cause;
    const leading = fault.suspects.value[0];
    return leading?.strength === "leading" && leading.cause !== NONE_OF_THESE
      ? leading.cause
      : null;
  });
  const choose = (choice: { ending?: Ending; cause?: string | null; remedy?: string | null }) => {
    chosen.value = { ...own.value, ...choice };
  };

  return {
    ending,
    offered,
    cause,
    helped,
    remedy,
    note,
    isNoteTooLong,
    pickEnding: (next) => choose({ ending: next }),
    pickCause: (next) => choose({ cause: next }),
    pickRemedy: (next) => choose({ remedy: next }),
    close: async () => {
      const text = note.text.value.trim();
      isNoteTooLong.value = text.length > NOTE_LENGTH_MOST;
      if (isNoteTooLong.value) return;
      const verdict = {
        causes: cause.value === null ? [] : [cause.value],
        ending: ending.value,
        remedy: remedy.value,
        note: text,
      };
      note.clear();
      const stored = await fault.close(verdict);
      navigation.go({ place: "fault" });
      notices.say({ code: stored ? "stored" : "not-stored" });
    },
  };
}
