import { computed, type ReadonlySignal, signal } from "@preact/signals";
import { entryLine, type ReportWording, showText } from "../journal/report.ts";
import type { ShowView, TimelineEntry } from "../journal/views.ts";
import { createDraft, type Draft } from "./draft.ts";
import type { JournalModel } from "./journal-model.ts";
import type { NavigationModel } from "./navigation-model.ts";
import type { NoticeModel } from "./notice-model.ts";
import type { Shared, Surroundings } from "./surroundings.ts";

export const NOTE_LENGTH_MOST = 4000;

export interface LogModel {
  /** The show that the address names, else the open one, else the latest. */
  readonly show: ReadonlySignal<ShowView | null>;
  readonly shows: ReadonlySignal<readonly ShowView[]>;
  readonly note: Draft;
  readonly isNoteTooLong: ReadonlySignal<boolean>;
  /** The text that could be neither shared nor copied, to be shown for copying by hand. */
  readonly shownText: ReadonlySignal<string | null>;
  addNote(): Promise<void>;
  withdraw(record: string): Promise<void>;
  /** Takes back what withdraws a record, so that it counts again. */
  restore(record: string): Promise<void>;
  /** An entry as one sentence. */
  lineOf(entry: TimelineEntry, show: ShowView, wording: ReportWording): string;
  /** Hands the show over as plain text. */
  share(title: string, wording: ReportWording): Promise<void>;
  shareFile(name: string, text: string): Promise<void>;
  hideText(): void;
}

export function createLogModel(
  journal: JournalModel,
  navigation: NavigationModel,
  notices: NoticeModel,
  surroundings: Surroundings,
): LogModel {
  const note = createDraft(surroundings.keep, "note");
  const isNoteTooLong = signal(false);
  const shownText = signal<string | null>(null);
  const shows = computed(() => journal.view.value.shows);
  const show = computed(() => {
    const route = navigation.route.value;
    const named = route.place === "log" ? route.show : null;
    return (
      shows.value.find(({ id }) => id === named) ?? journal.openShow.value ?? shows.value[0] ?? null
    );
  });
  const sayShared = (outcome: Shared): void => {
    if (outcome === "shared" || outcome === "copied" || outcome === "saved")
      notices.say({ code: outcome });
  };
  const say = (stored: boolean): void => notices.say({ code: stored ? "stored" : "not-stored" });
  return {
    show,
    shows,
    note,
    isNoteTooLong,
    shownText,
    addNote: async () => {
      const text = note.text.value.trim();
      isNoteTooLong.value = text.length > NOTE_LENGTH_MOST;
      const home = show.value;
      if (text === "" || isNoteTooLong.value || home === null) return;
      note.clear();
      say(await journal.record((make) => make({ type: "note.added", body: { text } }, home.id)));
    },
    withdraw: async (record) => {
      const home = show.value;
      if (home === null) return;
      say(
        await journal.record((make) =>
          make({ type: "record.withdrawn", body: { record } }, home.id),
        ),
      );
    },
    restore: async (record) => {
      const home = show.value;
      const entry = home?.timeline.find((one) => one.record.id === record);
      if (!home || !entry) return;
      say(
        await journal.record((make) => {
          for (const withdrawal of entry.withdrawals)
            make({ type: "record.withdrawn", body: { record: withdrawal } }, home.id);
        }),
      );
    },
    lineOf: (entry, home, wording) => entryLine(entry.record, home, wording),
    share: async (title, wording) => {
      if (show.value === null) return;
      const text = showText(show.value, wording);
      const outcome = await surroundings.shareText(title, text);
      shownText.value = outcome === "shown" ? text : null;
      sayShared(outcome);
    },
    shareFile: async (name, text) => {
      sayShared(await surroundings.shareFile(name, text));
    },
    hideText: () => {
      shownText.value = null;
    },
  };
}
