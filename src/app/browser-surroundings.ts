import { v7 as newId } from "uuid";
import type { Surroundings } from "../models/surroundings.ts";
import type { KeptStore } from "../storage/kept-store.ts";
import { createKeptTexts, createLocalTexts } from "./kept-texts.ts";
import { createScreenLock } from "./screen-lock.ts";
import { shareFile, shareText } from "./sharing.ts";

const DEVICE_KEY = "device";
const NUDGE_MS = 30;

/** The phone as the models see it. The only place with clock, ids, randomness and navigator. */
export function createBrowserSurroundings(
  kept: KeptStore,
): Surroundings & { loadKept(): Promise<void> } {
  const emergencyKeep = createLocalTexts();
  const keep = createKeptTexts(emergencyKeep, kept);
  const device = emergencyKeep.read(DEVICE_KEY) ?? newId().slice(-12);
  emergencyKeep.write(DEVICE_KEY, device);
  return {
    emergencyKeep,
    loadKept: keep.load,
    nowMs: () => Date.now(),
    newId: () => newId(),
    timeZone: () => Intl.DateTimeFormat().resolvedOptions().timeZone,
    device,
    keep,
    nudge: () => {
      navigator.vibrate?.(NUDGE_MS);
    },
    askToPersist: async () => (await navigator.storage?.persist?.()) ?? null,
    storageUse: async () => ({
      isPersistent: (await navigator.storage?.persisted?.()) ?? null,
      usedBytes: (await navigator.storage?.estimate?.())?.usage ?? null,
    }),
    shareText,
    shareFile,
    keepAwake: createScreenLock(),
  };
}
