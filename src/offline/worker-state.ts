/** Waits for a change of a worker's state; never ends well if the worker never gets there. */
export function untilState(
  worker: ServiceWorker,
  isReached: (state: ServiceWorkerState) => boolean,
): Promise<ServiceWorkerState> {
  return new Promise((resolve) => {
    const look = (): void => {
      if (!isReached(worker.state)) return;
      worker.removeEventListener("statechange", look);
      resolve(worker.state);
    };
    worker.addEventListener("statechange", look);
    look();
  });
}

/** The installation has ended, well or badly. */
export const isSettled = (state: ServiceWorkerState): boolean => state !== "installing";

/** The worker serves, or never will. */
export const isFinal = (state: ServiceWorkerState): boolean =>
  state === "activated" || state === "redundant";
