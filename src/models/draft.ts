import { type Signal, signal } from "@preact/signals";
import type { Keep } from "./surroundings.ts";

/** A text somebody is typing: kept at each change, so that a killed app gives it back. */
export interface Draft {
  readonly text: Signal<string>;
  set(text: string): void;
  clear(): void;
}

export function createDraft(keep: Keep, key: string): Draft {
  const stored = `draft.${key}`;
  const text = signal(keep.read(stored) ?? "");
  const set = (next: string): void => {
    text.value = next;
    keep.write(stored, next === "" ? null : next);
  };
  return { text, set, clear: () => set("") };
}
