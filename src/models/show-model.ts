import { computed, type ReadonlySignal, signal } from "@preact/signals";
import type { ShowView } from "../journal/views.ts";
import { createDraft, type Draft } from "./draft.ts";
import type { JournalModel } from "./journal-model.ts";
import type { Surroundings } from "./surroundings.ts";

export const NAME_LENGTH_MOST = 120;

export interface ShowModel {
  readonly open: ReadonlySignal<ShowView | null>;
  readonly shows: ReadonlySignal<readonly ShowView[]>;
  readonly name: Draft;
  readonly place: Draft;
  /** True when the last attempt was refused because a name or place is too long. */
  readonly isTooLong: ReadonlySignal<boolean>;
  /** Opens a show, or renames the one that is open. */
  save(): Promise<boolean>;
  close(): Promise<boolean>;
  reopen(show: ShowView): Promise<boolean>;
}

export function createShowModel(journal: JournalModel, surroundings: Surroundings): ShowModel {
  const open = journal.openShow;
  const name = createDraft(surroundings.keep, "show-name");
  const place = createDraft(surroundings.keep, "show-place");
  const isTooLong = signal(false);
  return {
    open,
    shows: computed(() => journal.view.value.shows),
    name,
    place,
    isTooLong,
    save: async () => {
      // An empty field leaves what the show has: it stands there as the placeholder.
      const body = {
        name: name.text.value.trim() || (open.value?.name ?? ""),
        place: place.text.value.trim() || (open.value?.place ?? ""),
      };
      isTooLong.value = body.name.length > NAME_LENGTH_MOST || body.place.length > NAME_LENGTH_MOST;
      if (isTooLong.value) return false;
      name.clear();
      place.clear();
      return journal.record((make) => {
        if (open.value) make({ type: "show.edited", body });
        else make({ type: "show.opened", body: { ...body, timeZone: surroundings.timeZone() } });
      });
    },
    close: () => journal.record((make) => make({ type: "show.closed", body: {} })),
    reopen: async (show) => {
      const closing = show.timeline.findLast(
        ({ record, isWithdrawn }) => record.type === "show.closed" && !isWithdrawn,
      );
      if (!closing) return false;
      return journal.record((make) =>
        make({ type: "record.withdrawn", body: { record: closing.record.id } }, show.id),
      );
    },
  };
}
