import { type ReadonlySignal, signal } from "@preact/signals";
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
  const stored = <T extends string>(key: string, known: readonly T[], otherwise: T): T =>
    known.find((value) => value === keep.read(key)) ?? otherwise;
  const theme = signal<Theme>(stored("theme", THEMES, "blackout"));
  const lengthUnit = signal<LengthUnit>(stored("length-unit", LENGTH_UNITS, "m"));
  const storage = signal<StorageUse | null>(null);
  const look = async (): Promise<void> => {
    storage.value = await storageUse();
  };
  return {
    theme,
    lengthUnit,
    storage,
    setTheme: (next) => {
      theme.value = next;
      keep.write("theme", next);
    },
    setLengthUnit: (next) => {
      lengthUnit.value = next;
      keep.write("length-unit", next);
    },
    lookAtStorage: look,
    askToPersist: async () => {
      await askToPersist();
      await look();
    },
  };
}
