import type { StepName } from "../diagnosis/next-step.ts";
import type { CautionWording, Wording } from "../facts/wording.ts";

/**
 * The fault finder's words by id. An id without words (from a newer journal, or while the words have
 * not been read) stands for itself, so that nothing that was recorded is hidden.
 */
export interface Words {
  causeName(cause: string): string;
  causePlain(cause: string): string;
  question(check: string): string;
  checkHow(check: string): string;
  outcome(check: string, outcome: string): string;
  remedyTitle(remedy: string): string;
  remedyHow(remedy: string): string;
  stepTitle(step: StepName): string;
  caution(id: string): CautionWording | null;
  readonly cautions: readonly CautionWording[];
  /** Of a step whose kind was not recorded: ids are used once among checks and remedies. */
  anyTitle(step: string): string;
}

export function createWords(wording: Wording | null): Words {
  const causes = wording?.causes ?? {};
  const checks = wording?.checks ?? {};
  const remedies = wording?.remedies ?? {};
  const cautions = wording?.cautions ?? {};
  const words: Words = {
    causeName: (cause) => causes[cause]?.name ?? cause,
    causePlain: (cause) => causes[cause]?.plain ?? "",
    question: (check) => checks[check]?.question ?? check,
    checkHow: (check) => checks[check]?.how ?? "",
    outcome: (check, outcome) => checks[check]?.outcomes[outcome] ?? outcome,
    remedyTitle: (remedy) => remedies[remedy]?.title ?? remedy,
    remedyHow: (remedy) => remedies[remedy]?.how ?? "",
    stepTitle: ({ kind, id }) => (kind === "check" ? words.question(id) : words.remedyTitle(id)),
    caution: (id) => cautions[id] ?? null,
    cautions: Object.values(cautions),
    anyTitle: (step) => (checks[step] ? words.question(step) : words.remedyTitle(step)),
  };
  return words;
}
