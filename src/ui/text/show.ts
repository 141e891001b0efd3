export const title = "Show";
export const purpose =
  "A show gathers dropouts, answers and sums. While it is open the app keeps its version, whatever happens.";
export const name = "Name of the show";
export const place = "Building or place";
export const open = "Open the show";
export const save = "Save";
export const close = "Close the show";
export const reopen = "Open it again";
export const tooLong = "At most 120 characters. Nothing is lost: shorten it.";
export const earlier = "Earlier shows";
