import type { AddressBar } from "../models/navigation-model.ts";

/** Safari refuses more than 100 changes of the address in 30 s; typing makes more than that. */
const QUIET_MS = 400;

/** The browser's address and history. Changes in place are gathered and written when typing rests. */
export function createAddressBar(): AddressBar {
  let waiting: string | null = null;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const flush = (): void => {
    clearTimeout(timer);
    if (waiting !== null) history.replaceState(null, "", waiting);
    waiting = null;
  };
  addEventListener("pagehide", flush);
  return {
    hash: () => location.hash,
    push: (hash) => {
      flush();
      history.pushState(null, "", hash);
    },
    replace: (hash) => {
      waiting = hash;
      flush();
    },
    replaceSoon: (hash) => {
      waiting = hash;
      clearTimeout(timer);
      timer = setTimeout(flush, QUIET_MS);
    },
    onChange: (hear) => {
      // Fires for links, for typed addresses and for back; not for our own pushState.
      addEventListener("popstate", () => {
        waiting = null;
        hear();
      });
      addEventListener("hashchange", hear);
    },
  };
}
