import { messageSW, Workbox } from "workbox-window";
import { workerAddress } from "./worker-address.ts";
import { isFinal, isSettled, untilState } from "./worker-state.ts";

export interface OfflineState {
  /** "ready" only after the worker has found every file of the version in its store. */
  readonly readiness: "unsupported" | "preparing" | "ready" | "failed";
  /** "taken-elsewhere": the version was changed, but not from here; this window runs the older on. */
  readonly update: "none" | "waiting" | "taken-elsewhere";
  /** Null until the worker has named it. */
  readonly version: string | null;
}

export interface Offline {
  state(): OfflineState;
  onChange(hear: () => void): void;
  /** Registers the worker after the page has loaded. To be called once. */
  start(): void;
  /** Changes to the newer version and loads this window anew. Without one, does nothing. */
  takeUpdate(): void;
  /** Never called by itself: the look costs traffic, and the user decides when. */
  checkForUpdate(): Promise<UpdateCheck>;
}

/** "refused-by-lock": there is a newer version, and a show is open. */
type UpdateCheck = "found" | "none" | "refused-by-lock" | "unreachable";

/** The worker's answer on what the app is started from. */
interface Completeness {
  readonly complete: boolean;
  readonly version: string;
  /** An older version is started, because a show was open when the worker's own became active. */
  readonly held: boolean;
}

/** @param reload  Loads this window anew. */
export function createOffline({ reload }: { readonly reload: () => void }): Offline {
  const hearers: (() => void)[] = [];
  let state: OfflineState = { readiness: "preparing", update: "none", version: null };
  let registration: ServiceWorkerRegistration | undefined;
  /** The worker that this window was loaded under; null during the very first installation. */
  let ours: ServiceWorker | null = null;
  let taken: ServiceWorker | null = null;
  let isHeld = false;

  const change = (part: Partial<OfflineState>): void => {
    state = { ...state, ...part };
    for (const hear of hearers) hear();
  };

  const hasUpdate = (): boolean =>
    isHeld || (registration?.active != null && registration.waiting !== null);

  const lookForWaiting = (): void => {
    if (state.update !== "taken-elsewhere") change({ update: hasUpdate() ? "waiting" : "none" });
  };

  const ask = async (worker: ServiceWorker): Promise<void> => {
    const answer: Completeness = await messageSW(worker, { type: "completeness" });
    isHeld = answer.held;
    change({ readiness: answer.complete ? "ready" : "failed", version: answer.version });
    lookForWaiting();
  };

  const register = async (): Promise<void> => {
    const isAsked = ours !== null;
    // "none": else the browser may compare with its own cached copy of the worker for a day.
    const workbox = new Workbox(workerAddress(), { updateViaCache: "none" });
    const registered = await workbox.register();
    if (registered === undefined) throw new RangeError("start: called twice");
    registration = registered;
    // A window that was loaded past the worker has no controller to compare with.
    ours ??= registered.active;
    // Workbox's own "waiting" event stops after the first update that another window has set off.
    registered.addEventListener("updatefound", () => {
      const { installing } = registered;
      if (installing !== null) void untilState(installing, isSettled).then(lookForWaiting);
    });
    lookForWaiting();
    if (isAsked) return;
    const first = registered.installing ?? registered.waiting;
    // A registration comes before the files do. Only an activated worker has stored them.
    if (registered.active === null && first !== null) await untilState(first, isFinal);
    if (registered.active === null) change({ readiness: "failed" });
    else await ask(registered.active);
  };

  return {
    state: () => state,

    onChange(hear) {
      hearers.push(hear);
    },

    start() {
      if (!("serviceWorker" in navigator)) return change({ readiness: "unsupported" });
      const container = navigator.serviceWorker;
      ours = container.controller;
      // Not left to the end of the registration, which waits for any installation under way.
      if (ours !== null) void ask(ours);
      container.addEventListener("controllerchange", () => {
        const { controller } = container;
        // The first worker claims the window that it was installed from: no change of version.
        if (ours === null) ours = controller;
        else if (controller !== ours && taken === null) change({ update: "taken-elsewhere" });
      });
      register().catch((error: unknown) => {
        if (ours !== null) return;
        const isRefused = error instanceof DOMException && error.name === "SecurityError";
        change({ readiness: isRefused ? "unsupported" : "failed" });
      });
    },

    takeUpdate() {
      const waiting = registration?.waiting ?? null;
      if (waiting === null) {
        if (state.update === "taken-elsewhere") return reload();
        if (isHeld && ours !== null) void messageSW(ours, { type: "release" }).then(reload);
        return;
      }
      // Asked again, because a busy browser can leave a worker waiting; but loaded once.
      waiting.postMessage({ type: "take-over" });
      if (taken === waiting) return;
      taken = waiting;
      // Not earlier: until then the older version would still answer the load.
      void untilState(waiting, isFinal).then((reached) => {
        if (reached === "activated") return reload();
        taken = null;
        lookForWaiting();
      });
    },

    async checkForUpdate() {
      if (registration?.active == null) return "unreachable";
      const { active } = registration;
      try {
        await registration.update();
      } catch {
        return hasUpdate() ? "found" : "unreachable";
      }
      // The update is reported as done when the installation has only begun.
      const { installing } = registration;
      if (installing !== null) await untilState(installing, isSettled);
      lookForWaiting();
      if (hasUpdate()) return "found";
      if (installing?.state !== "redundant") return "none";
      return (await messageSW(active, { type: "show-open" })) ? "refused-by-lock" : "unreachable";
    },
  };
}
