import { type ReadonlySignal, signal } from "@preact/signals";

/** One short acknowledgement at the thumb; the sentence for each code stands in ui/text. */
export type Notice =
  | { readonly code: "marked"; readonly at: number; readonly count: number }
  | { readonly code: "stored" | "not-stored" | "shared" | "copied" | "saved" };

export interface NoticeModel {
  readonly notice: ReadonlySignal<Notice | null>;
  say(notice: Notice): void;
  /** The user has moved on: the last acknowledgement goes. */
  clear(): void;
}

export function createNoticeModel(): NoticeModel {
  const notice = signal<Notice | null>(null);
  return {
    notice,
    say: (next) => {
      notice.value = next;
    },
    clear: () => {
      notice.value = null;
    },
  };
}
