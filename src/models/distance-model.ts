import { computed, type ReadonlySignal, signal } from "@preact/signals";
import {
  DISTANCE_FIELD_IDS,
  DISTANCE_FIELDS,
  type DistanceFieldId,
  EXPONENT_PRESETS,
} from "../calculators/distance/fields.ts";
import {
  type DistanceInputs,
  type DistanceOutcome,
  distanceOutcome,
} from "../calculators/distance/outcome.ts";
import { type DistanceCurve, distanceCurve } from "../calculators/distance/picture.ts";
import { decodeInputs, encodeInputs } from "../calculators/distance/query.ts";
import type { LengthUnit, NumberField } from "../calculators/field.ts";
import { formatForField, readTyped, stepped, type TypedProblem } from "../calculators/typed.ts";
import type { JournalModel } from "./journal-model.ts";
import type { NavigationModel } from "./navigation-model.ts";
import type { NoticeModel } from "./notice-model.ts";
import type { SettingsModel } from "./settings-model.ts";
import type { Surroundings } from "./surroundings.ts";

export type PresetId = (typeof EXPONENT_PRESETS)[number]["id"];
type Texts = Readonly<Record<DistanceFieldId, string>>;

/** What stands on the screen for one field. */
export interface FieldState {
  readonly field: NumberField;
  /** The ends of the range as they may be typed, in the unit that the user chose. */
  readonly minText: string;
  readonly maxText: string;
  readonly text: string;
  readonly problem: TypedProblem | null;
}

export interface DistanceModel {
  readonly fields: ReadonlySignal<Readonly<Record<DistanceFieldId, FieldState>>>;
  /** Null while a field is empty or wrong: the answer is blank then, never stale. */
  readonly inputs: ReadonlySignal<DistanceInputs | null>;
  readonly outcome: ReadonlySignal<DistanceOutcome | null>;
  readonly curve: ReadonlySignal<DistanceCurve | null>;
  /** The published exponent that stands in the field; null for one of the user's own. */
  readonly preset: ReadonlySignal<PresetId | null>;
  pickPreset(id: string): void;
  type(id: DistanceFieldId, text: string): void;
  step(id: DistanceFieldId, direction: 1 | -1): void;
  reset(): void;
  /** Keeps the result, as the sentence that is on the screen, in the log of the show. */
  keep(sentence: string): Promise<void>;
}

const CURVE_POINTS = 48;
const KEPT_KEY = "calculator.distance";

/**
 * Texts of an address for fields that show lengths in `unit`: a length in that unit loses its
 * suffix; one in the other unit keeps it, which says the same number and rounds nothing.
 */
function textsFor(query: string, unit: LengthUnit): Partial<Record<DistanceFieldId, string>> {
  const texts = decodeInputs(query);
  for (const id of ["fromM", "toM"] as const) {
    const text = texts[id];
    if (text?.endsWith(unit)) texts[id] = text.slice(0, -unit.length).trimEnd();
  }
  return texts;
}

export function createDistanceModel(parts: {
  journal: JournalModel;
  navigation: NavigationModel;
  notices: NoticeModel;
  settings: SettingsModel;
  surroundings: Surroundings;
}): DistanceModel {
  const { journal, navigation, notices, settings, surroundings } = parts;
  const unit = settings.lengthUnit;
  const typedHere = signal<{ texts: Texts; query: string; unit: LengthUnit } | null>(null);
  /** The address wins: a link reopens the calculator with its inputs. Then what was last typed. */
  const texts = computed<Texts>(() => {
    const route = navigation.route.value;
    const address = route.place === "distance" ? route.query : "";
    const typed = typedHere.value;
    if (typed !== null && typed.unit === unit.value && (address === "" || address === typed.query))
      return typed.texts;
    const query = address || typed?.query || surroundings.keep.read(KEPT_KEY) || "";
    const initial = {} as Record<DistanceFieldId, string>;
    for (const id of DISTANCE_FIELD_IDS)
      initial[id] = formatForField(DISTANCE_FIELDS[id].initial, DISTANCE_FIELDS[id], unit.value);
    return { ...initial, ...textsFor(query, unit.value) };
  });
  const fields = computed(() => {
    const states = {} as Record<DistanceFieldId, FieldState>;
    for (const id of DISTANCE_FIELD_IDS) {
      const field = DISTANCE_FIELDS[id];
      const typed = readTyped(texts.value[id], field, unit.value);
      states[id] = {
        field,
        minText: formatForField(field.min, field, unit.value),
        maxText: formatForField(field.max, field, unit.value),
        text: texts.value[id],
        problem: typed.kind === "ok" ? null : typed.kind,
      };
    }
    return states;
  });
  const inputs = computed<DistanceInputs | null>(() => {
    const values = {} as Record<DistanceFieldId, number>;
    for (const id of DISTANCE_FIELD_IDS) {
      const typed = readTyped(texts.value[id], DISTANCE_FIELDS[id], unit.value);
      if (typed.kind !== "ok") return null;
      values[id] = typed.value;
    }
    return values;
  });
  const put = (next: Texts): void => {
    const query = encodeInputs(next, unit.value);
    typedHere.value = { texts: next, query, unit: unit.value };
    surroundings.keep.write(KEPT_KEY, query);
    navigation.retype({ place: "distance", query });
  };

  return {
    fields,
    inputs,
    outcome: computed(() => (inputs.value === null ? null : distanceOutcome(inputs.value))),
    curve: computed(() => {
      const known = inputs.value;
      return known === null ? null : distanceCurve(known, CURVE_POINTS);
    }),
    preset: computed(() => {
      const exponent = inputs.value?.exponent;
      return EXPONENT_PRESETS.find(({ value }) => value === exponent)?.id ?? null;
    }),
    pickPreset: (id) => {
      const preset = EXPONENT_PRESETS.find((known) => known.id === id);
      if (preset) put({ ...texts.value, exponent: String(preset.value) });
    },
    type: (id, text) => put({ ...texts.value, [id]: text }),
    step: (id, direction) => {
      const field = DISTANCE_FIELDS[id];
      const typed = readTyped(texts.value[id], field, unit.value);
      // From a text that is no number the stepper leads back to a number that is.
      const next =
        typed.kind === "ok" ? stepped(typed.value, field, direction, unit.value) : field.initial;
      put({ ...texts.value, [id]: formatForField(next, field, unit.value) });
    },
    reset: () => {
      typedHere.value = null;
      surroundings.keep.write(KEPT_KEY, null);
      navigation.replace({ place: "distance", query: "" });
    },
    keep: async (sentence) => {
      const query = encodeInputs(texts.value, unit.value);
      const stored = await journal.record((make) =>
        make({ type: "sum.kept", body: { calculator: "distance", query, sentence } }),
      );
      notices.say({ code: stored ? "stored" : "not-stored" });
    },
  };
}
