import { computed, type ReadonlySignal, signal } from "@preact/signals";
import { fromElicited } from "../diagnosis/elicit.ts";
import type { Knowledge } from "../diagnosis/knowledge.ts";
import type { Expertise } from "../facts/expertise.ts";
import { createWords, type Words } from "./words.ts";

/** What the fault finder knows and says, read once after the first paint. */
export interface ExpertiseModel {
  readonly phase: ReadonlySignal<"loading" | "ready" | "failed">;
  /** Null until it has been read. Marking, the log and the sums do without it. */
  readonly knowledge: ReadonlySignal<Knowledge | null>;
  readonly words: ReadonlySignal<Words>;
  load(): Promise<void>;
}

/** @param read  Reads the data file; null if it can't be had. */
export function createExpertiseModel(read: () => Promise<Expertise | null>): ExpertiseModel {
  const phase = signal<"loading" | "ready" | "failed">("loading");
  const expertise = signal<Expertise | null>(null);
  return {
    phase,
    knowledge: computed(() =>
      expertise.value === null ? null : fromElicited(expertise.value.elicited),
    ),
    words: computed(() => createWords(expertise.value?.wording ?? null)),
    load: async () => {
      phase.value = "loading";
      expertise.value = await read();
      phase.value = expertise.value === null ? "failed" : "ready";
    },
  };
}
