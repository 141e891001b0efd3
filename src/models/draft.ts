import { computed, type ReadonlySignal, signal } from "@preact/signals";
import type { Keep } from "./surroundings.ts";

/** A text somebody is typing: kept at each change, so that a killed app gives it back. */
export interface Draft {
  readonly text: ReadonlySignal<string>;
  set(text: string): void;
  clear(): void;
}

export function createDraft(keep: Keep, key: string): Draft {
  const stored = `draft.${key}`;
  const typed = signal<string | null>(null);
  const set = (next: string): void => {
    typed.value = next;
    keep.write(stored, next === "" ? null : next);
  };
  return {
    text: computed(() => typed.value ?? keep.read(stored) ?? ""),
    set,
    clear: () => set(""),
  };
}
