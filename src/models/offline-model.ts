import { batch, computed, type ReadonlySignal, signal } from "@preact/signals";
import type { Offline, OfflineState } from "../offline/registration.ts";
import type { JournalModel } from "./journal-model.ts";

export interface OfflineModel {
  readonly readiness: ReadonlySignal<OfflineState["readiness"]>;
  readonly version: ReadonlySignal<string | null>;
  /** A new version waits, or was taken by another window, and there is nothing that it could disturb. */
  readonly canOffer: ReadonlySignal<boolean>;
  readonly isTakenElsewhere: ReadonlySignal<boolean>;
  /** What came of the last look for a new version; null before the first. */
  readonly looked: ReadonlySignal<"found" | "none" | "locked" | "unreachable" | null>;
  takeUpdate(): void;
  look(): Promise<void>;
}

export function createOfflineModel(offline: Offline, journal: JournalModel): OfflineModel {
  const state = signal(offline.state());
  const looked = signal<"found" | "none" | "locked" | "unreachable" | null>(null);
  offline.onChange(() => {
    batch(() => {
      state.value = offline.state();
    });
  });
  return {
    readiness: computed(() => state.value.readiness),
    version: computed(() => state.value.version),
    canOffer: computed(
      () =>
        state.value.update !== "none" &&
        journal.phase.value !== "loading" &&
        journal.openShow.value === null,
    ),
    isTakenElsewhere: computed(() => state.value.update === "taken-elsewhere"),
    looked,
    takeUpdate: () => offline.takeUpdate(),
    look: async () => {
      const outcome = await offline.checkForUpdate();
      looked.value = outcome === "refused-by-lock" ? "locked" : outcome;
    },
  };
}
