/** Names in IndexedDB. The service worker reads them too: constants only. */

export const DATABASE_NAME = "fadewright";
/** Raised for stores and indexes only; what a record means is versioned by the journal. */
export const DATABASE_VERSION = 1;
/** Records under their id. */
export const RECORDS = "records";
/** Rows that could not be read as a record, raw, with the reason. */
export const SET_ASIDE = "set-aside";
/** One row under LOCK_KEY while a show is open. */
export const LOCK = "lock";
export const LOCK_KEY = "show";
/** Short texts under their key: place, drafts, settings. */
export const KEPT = "kept";
/** Channel on which the windows of the app tell each other what they have stored. */
export const CHANNEL_NAME = "fadewright-journal";
