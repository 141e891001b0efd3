import { computed, type ReadonlySignal, signal } from "@preact/signals";
import type { LengthUnit } from "../calculators/field.ts";
import type { StorageUse, Surroundings } from "./surroundings.ts";

/** The first is the default. public/theme.js applies the stored one before the first paint. */
export const THEMES = ["blackout", "daylight", "deep-red"] as const;
export type Theme = (typeof THEMES)[number];

export const LENGTH_UNITS: readonly LengthUnit[] = ["m", "ft"];

export interface SettingsModel {
  readonly theme: ReadonlySignal<Theme>;
  readonly lengthUnit: ReadonlySignal<LengthUnit>;
  readonly storage: ReadonlySignal<StorageUse | null>;
  setTheme(theme: Theme): void;
  setLengthUnit(unit: LengthUnit): void;
  /** Reads anew how much is used and whether the browser may clear it. */
  lookAtStorage(): Promise<void>;
  askToPersist(): Promise<void>;
}

export function createSettingsModel({
  keep,
  askToPersist,
  storageUse,
}: Surroundings): SettingsModel {
  const setting = <T extends string>(key: string, known: readonly T[], otherwise: T) => {
    const chosen = signal<T | null>(null);
    return {
      value: computed(
        () => chosen.value ?? known.find((value) => value === keep.read(key)) ?? otherwise,
      ),
      choose: (next: T): void => {
        chosen.value = next;
        keep.write(key, next);
      },
    };
  };
  const theme = setting<Theme>("theme", THEMES, "blackout");
  const lengthUnit = setting<LengthUnit>("length-unit", LENGTH_UNITS, "m");
  const storage = signal<StorageUse | null>(null);
  const look = async (): Promise<void> => {
    storage.value = await storageUse();
  };
  return {
    theme: theme.value,
    lengthUnit: lengthUnit.value,
    storage,
    setTheme: theme.choose,
    setLengthUnit: lengthUnit.choose,
    lookAtStorage: look,
    askToPersist: async () => {
      await askToPersist();
      await look();
    },
  };
}
