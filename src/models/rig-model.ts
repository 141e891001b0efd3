import { computed, type ReadonlySignal, signal } from "@preact/signals";
import type { NumberField } from "../calculators/field.ts";
import { readTyped, type TypedProblem } from "../calculators/typed.ts";
import type { LinkKind } from "../journal/records.ts";
import type { LinkView } from "../journal/views.ts";
import { createDraft, type Draft } from "./draft.ts";
import type { JournalModel } from "./journal-model.ts";
import { NAME_LENGTH_MOST } from "./show-model.ts";
import type { Surroundings } from "./surroundings.ts";

const CARRIER_FIELD: NumberField = {
  id: "frequencyMhz",
  quantity: "frequency",
  min: 25,
  max: 7200,
  initial: 550,
  step: 0.025,
  stepIs: "sum",
};

/** The field as its problem sentence needs it. */
export const CARRIER = {
  field: CARRIER_FIELD,
  minText: String(CARRIER_FIELD.min),
  maxText: String(CARRIER_FIELD.max),
};

export interface RigModel {
  readonly links: ReadonlySignal<readonly LinkView[]>;
  readonly name: Draft;
  readonly frequency: Draft;
  readonly kind: ReadonlySignal<LinkKind>;
  readonly problem: ReadonlySignal<TypedProblem | "no-name" | "name-too-long" | null>;
  pickKind(kind: LinkKind): void;
  /** Fills the form with a link that is there, to change it. */
  edit(link: LinkView): void;
  readonly edited: ReadonlySignal<string | null>;
  save(): Promise<boolean>;
  remove(link: LinkView): Promise<boolean>;
}

export function createRigModel(journal: JournalModel, surroundings: Surroundings): RigModel {
  const name = createDraft(surroundings.keep, "link-name");
  const frequency = createDraft(surroundings.keep, "link-frequency");
  const kind = signal<LinkKind>("handheld");
  const edited = signal<string | null>(null);
  const problem = signal<TypedProblem | "no-name" | "name-too-long" | null>(null);
  const links = computed(() => journal.openShow.value?.links ?? []);

  const read = (): { name: string; frequencyMhz: number | null } | null => {
    const trimmed = name.text.value.trim();
    const typed = readTyped(frequency.text.value, CARRIER_FIELD, "m");
    if (trimmed === "") problem.value = "no-name";
    else if (trimmed.length > NAME_LENGTH_MOST) problem.value = "name-too-long";
    else if (typed.kind !== "ok" && typed.kind !== "empty") problem.value = typed.kind;
    else problem.value = null;
    if (problem.value !== null) return null;
    return { name: trimmed, frequencyMhz: typed.kind === "ok" ? typed.value : null };
  };

  return {
    links,
    name,
    frequency,
    kind,
    problem,
    edited,
    pickKind: (next) => {
      kind.value = next;
    },
    edit: (link) => {
      name.set(link.name);
      frequency.set(link.frequencyMhz === null ? "" : String(link.frequencyMhz));
      kind.value = link.kind;
      edited.value = link.id;
      problem.value = null;
    },
    save: async () => {
      const form = read();
      if (form === null) return false;
      const link = edited.value ?? surroundings.newId();
      const body = { link, kind: kind.value, ...form };
      // Before the phone has stored it: what is typed meanwhile belongs to the next link.
      name.clear();
      frequency.clear();
      edited.value = null;
      return journal.record((make) => make({ type: "link.set", body }));
    },
    remove: (link) =>
      journal.record((make) => make({ type: "link.removed", body: { link: link.id } })),
  };
}
