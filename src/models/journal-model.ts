import { batch, computed, type ReadonlySignal, signal } from "@preact/signals";
import { foldJournal, type JournalView } from "../journal/fold.ts";
import type { Entry, JournalRecord, RecordType } from "../journal/records.ts";
import { lastClockAfter, lockFor, stampEntry } from "../journal/stamp.ts";
import type { Appended, JournalStore, SetAside, ShowLock, StoreFailure } from "../journal/store.ts";
import type { ShowView } from "../journal/views.ts";
import { createEmergencySlot } from "./emergency-slot.ts";
import type { Surroundings } from "./surroundings.ts";

const CHANGES_OPEN_SHOW: ReadonlySet<RecordType> = new Set([
  "show.opened",
  "show.closed",
  "record.withdrawn",
]);

/**
 * Makes one record out of an entry; the next one made in the same go sorts after it. Where no show
 * is named it belongs to the open one, and where none is open an unnamed show is opened for it: a
 * tap is never refused for want of a form.
 */
export type Make = <E extends Entry>(entry: E, show?: string) => JournalRecord<E["type"]>;

export interface JournalModel {
  readonly phase: ReadonlySignal<"loading" | "ready" | "memory-only">;
  readonly view: ReadonlySignal<JournalView>;
  readonly openShow: ReadonlySignal<ShowView | null>;
  readonly failure: ReadonlySignal<StoreFailure | null>;
  /** Records that are only in memory (and in the emergency slot) so far. */
  readonly unsaved: ReadonlySignal<readonly JournalRecord[]>;
  readonly setAside: ReadonlySignal<readonly SetAside[]>;
  readonly newerCount: ReadonlySignal<number>;
  /** True once another window with a newer version has taken the database over. */
  readonly isReplaced: ReadonlySignal<boolean>;
  load(): Promise<void>;
  /**
   * Records what `build` makes, all or none. Resolves true only when the phone has stored it;
   * false when it is held in memory and the emergency slot.
   */
  record(build: (make: Make) => void): Promise<boolean>;
  /** Tries to store what waits in memory. */
  retry(): Promise<boolean>;
}

export function createJournalModel(store: JournalStore, surroundings: Surroundings): JournalModel {
  const phase = signal<"loading" | "ready" | "memory-only">("loading");
  const records = signal<readonly JournalRecord[]>([]);
  const unsaved = signal<readonly JournalRecord[]>([]);
  const failure = signal<StoreFailure | null>(null);
  const setAside = signal<readonly SetAside[]>([]);
  const newerCount = signal(0);
  const isReplaced = signal(false);
  const view = computed(() => foldJournal(records.value));
  const openShow = computed(() => view.value.openShow);
  let loading: Promise<void> | undefined;
  let lastClock: string | null = null;

  const slot = createEmergencySlot(surroundings.emergencyKeep);
  const stampContext = { device: surroundings.device, newId: surroundings.newId };
  const add = (fresh: readonly JournalRecord[]): void => {
    const known = new Set(records.value.map((record) => record.id));
    const added = fresh.filter((record) => !known.has(record.id));
    if (added.length > 0) records.value = [...records.value, ...added];
    lastClock = lastClockAfter(lastClock, added, {
      device: surroundings.device,
      nowMs: surroundings.nowMs(),
    });
  };
  const hold = (held: readonly JournalRecord[]): void => {
    // Nothing to hold and nothing held: the usual case, and another window may use the slot.
    if (held.length === 0 && unsaved.value.length === 0) return;
    unsaved.value = held;
    slot.write(held);
  };

  const commit = async (fresh: readonly JournalRecord[]): Promise<boolean> => {
    const waiting = [...unsaved.value, ...fresh];
    const outcome: Appended =
      phase.value === "memory-only"
        ? { kind: "failed", reason: failure.value ?? "unavailable" }
        : await store.append(waiting, lockAfter(fresh));
    const isStored = outcome.kind === "stored";
    // Shown only now: what the screen confirms is stored, or held and said to be not stored.
    batch(() => {
      add(fresh);
      failure.value = isStored ? null : outcome.reason;
      hold(isStored ? [] : waiting);
    });
    return isStored;
  };
  const lockAfter = (fresh: readonly JournalRecord[]): ShowLock | null => {
    const isSameShow = fresh.every(({ type }) => !CHANGES_OPEN_SHOW.has(type));
    const show = isSameShow ? openShow.value : foldJournal([...records.value, ...fresh]).openShow;
    return lockFor(show, surroundings.nowMs());
  };
  /** One after the other: each entry is made with what the one before it has changed in sight. */
  let turn: Promise<unknown> = Promise.resolve();
  const inTurn = (work: () => Promise<boolean>): Promise<boolean> => {
    const done = turn.then(work);
    turn = done.catch(() => undefined);
    return done;
  };

  const load = async (): Promise<void> => {
    const loaded = await store.load();
    batch(() => {
      if (loaded.kind === "ok") {
        add(loaded.records);
        setAside.value = loaded.setAside;
        newerCount.value = loaded.newerCount;
        phase.value = "ready";
      } else {
        failure.value = loaded.reason;
        phase.value = "memory-only";
      }
      const waiting = slot.read();
      setAside.value = [...setAside.value, ...waiting.damaged];
      add(waiting.records);
      unsaved.value = waiting.records;
    });
    if (unsaved.value.length > 0 && loaded.kind === "ok") await commit([]);
  };

  store.onForeign((fresh) => add(fresh));
  store.onReplaced(() => {
    isReplaced.value = true;
  });

  const model: JournalModel = {
    phase,
    view,
    openShow,
    failure,
    unsaved,
    setAside,
    newerCount,
    isReplaced,
    load: () => {
      loading ??= load();
      return loading;
    },
    record: (build) => {
      // The time is that of the tap, even where the log is still being read.
      const nowMs = surroundings.nowMs();
      return inTurn(async () => {
        await model.load();
        const fresh: JournalRecord[] = [];
        let home = openShow.value?.id;
        const stamp = <E extends Entry>(entry: E, show: string): JournalRecord<E["type"]> => {
          const made = stampEntry(entry, { ...stampContext, show, nowMs, lastClock });
          lastClock = made.clock;
          fresh.push(made as JournalRecord);
          if (made.type === "show.opened") home = made.id;
          return made;
        };
        const unnamed = (): Entry<"show.opened"> => ({
          type: "show.opened",
          body: { name: "", place: "", timeZone: surroundings.timeZone() },
        });
        build((entry, show) => {
          if (entry.type === "show.opened") return stamp(entry, "");
          if (show === undefined) home ??= stamp(unnamed(), "").id;
          return stamp(entry, show ?? home ?? "");
        });
        return commit(fresh);
      });
    },
    retry: () =>
      inTurn(async () => {
        if (phase.value === "memory-only") {
          const again = await store.load();
          if (again.kind === "failed") {
            failure.value = again.reason;
            return false;
          }
          batch(() => {
            add(again.records);
            setAside.value = again.setAside;
            newerCount.value = again.newerCount;
            phase.value = "ready";
          });
        }
        return commit([]);
      }),
  };
  return model;
}
