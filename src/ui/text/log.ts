export const title = "Log";
export const purpose =
  "The show's record: every dropout, answer, remedy and sum, with its time. It begins with the first thing you do.";
export const share = "Share as text";
export const note = "Note";
export const notePlaceholder = "What the next crew should know";
export const addNote = "Add";
export const noteTooLong = "At most 4000 characters. Nothing is lost: shorten the note.";
export const withdraw = "Take back";
export const withdrawn = "taken back";
export const restore = "Restore";
export const openShow = "Open a show";
export const reopenSum = "Open the sum";
export const copyByHand = "Neither sharing nor copying works here. Select the text and copy it:";
export const close = "Close";
