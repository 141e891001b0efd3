export const LOG_TEXT = {
  title: "Log",
  purpose:
    "The show's record: every dropout, answer, remedy and sum, with its time. It begins with the first thing you do.",
  share: "Share as text",
  note: "Note",
  notePlaceholder: "What the next crew should know",
  addNote: "Add",
  noteTooLong: "At most 4000 characters. Nothing is lost: shorten the note and add it again.",
  withdraw: "Take back",
  withdrawn: "taken back",
  restore: "Restore",
  openShow: "Open a show",
  reopenSum: "Open the sum",
  copyByHand: "Neither sharing nor copying works here. Select the text and copy it:",
  close: "Close",
} as const;

export const SHOW_TEXT = {
  title: "Show",
  purpose:
    "A show gathers dropouts, answers and sums. While it is open the app keeps its version, whatever happens.",
  name: "Name of the show",
  place: "Building or place",
  open: "Open the show",
  save: "Save",
  close: "Close the show",
  reopen: "Open it again",
  openedAt: "Opened",
  closedAt: "Closed",
  tooLong: "At most 120 characters each. Nothing is lost: shorten it and save again.",
  earlier: "Earlier shows",
} as const;
