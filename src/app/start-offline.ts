import { createOffline, type Offline } from "../offline/registration.ts";

/** Registers the worker of a built app and hands its state to the models. */
export function startOffline(): Offline {
  const offline = createOffline({ reload: () => location.reload() });
  offline.start();
  return offline;
}
