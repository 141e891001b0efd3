import type { JournalRecord } from "../../src/journal/records.ts";
import type { Appended, JournalStore, Loaded, ShowLock } from "../../src/journal/store.ts";
import type { AddressBar } from "../../src/models/navigation-model.ts";
import type { Surroundings } from "../../src/models/surroundings.ts";

/** A journal in memory whose answers a test sets. */
export function pretendStore(): JournalStore & {
  rows: JournalRecord[];
  lock: ShowLock | null;
  loaded: Loaded;
  answer: Appended;
  arrive(records: readonly JournalRecord[]): void;
} {
  let hearForeign: (records: readonly JournalRecord[]) => void = () => {};
  const store = {
    rows: [] as JournalRecord[],
    lock: null as ShowLock | null,
    loaded: { kind: "ok", records: [], setAside: [], newerCount: 0 } as Loaded,
    answer: { kind: "stored" } as Appended,
    load: async () => store.loaded,
    append: async (records: readonly JournalRecord[], lock: ShowLock | null) => {
      if (store.answer.kind === "stored") {
        store.rows.push(...records);
        store.lock = lock;
      }
      return store.answer;
    },
    onForeign: (hear: typeof hearForeign) => {
      hearForeign = hear;
    },
    onReplaced: () => {},
    arrive: (records: readonly JournalRecord[]) => hearForeign(records),
  };
  return store;
}

/** A phone whose clock stands still until a test moves it. Invented data. */
export function pretendSurroundings(kept = new Map<string, string>()): Surroundings & {
  clock: { nowMs: number };
  kept: Map<string, string>;
  shared: string[];
} {
  const clock = { nowMs: Date.UTC(2026, 11, 1, 20, 41, 7) };
  const shared: string[] = [];
  let count = 0;
  const keep = {
    read: (key: string) => kept.get(key) ?? null,
    write: (key: string, text: string | null) => {
      if (text === null) kept.delete(key);
      else kept.set(key, text);
      return true;
    },
  };
  return {
    clock,
    kept,
    shared,
    nowMs: () => clock.nowMs,
    newId: () => {
      count += 1;
      return `id-${String(count).padStart(4, "0")}`;
    },
    timeZone: () => "UTC",
    device: "phone-a",
    keep,
    emergencyKeep: keep,
    nudge: () => {},
    askToPersist: async () => true,
    storageUse: async () => ({ isPersistent: true, usedBytes: 1000 }),
    shareText: async (_title, text) => {
      shared.push(text);
      return "shared";
    },
    shareFile: async (_name, text) => {
      shared.push(text);
      return "saved";
    },
    keepAwake: () => {},
  };
}

export function pretendAddress(start = "#/fault"): AddressBar & { entries: string[] } {
  const entries = [start];
  const replace = (hash: string): void => {
    entries[entries.length - 1] = hash;
  };
  return {
    entries,
    hash: () => entries.at(-1) ?? "",
    push: (hash) => {
      entries.push(hash);
    },
    replace,
    replaceSoon: replace,
    onChange: () => {},
  };
}
