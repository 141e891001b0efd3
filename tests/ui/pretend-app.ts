import { EXPERTISE, type Expertise } from "../../src/facts/expertise.ts";
import { createAppModels } from "../../src/models/app-models.ts";
import type { Offline, OfflineState } from "../../src/offline/registration.ts";
import { pretendAddress, pretendStore, pretendSurroundings } from "../models/pretend.ts";

/** The whole app on a pretended phone, to be rendered without a browser. */
export function pretendApp(
  hash = "#/fault",
  readExpertise = async (): Promise<Expertise | null> => EXPERTISE,
) {
  const store = pretendStore();
  const surroundings = pretendSurroundings();
  const offline = pretendOffline();
  const address = pretendAddress(hash);
  const models = createAppModels({ surroundings, store, address, offline, readExpertise });
  return { models, store, surroundings, offline };
}

function pretendOffline(): Offline & { set(part: Partial<OfflineState>): void; taken: number } {
  let state: OfflineState = { readiness: "preparing", update: "none", version: null };
  let hear: () => void = () => {};
  const offline = {
    taken: 0,
    state: () => state,
    onChange: (listener: () => void) => {
      hear = listener;
    },
    start: () => {},
    takeUpdate: () => {
      offline.taken += 1;
    },
    checkForUpdate: async () => "none" as const,
    set: (part: Partial<OfflineState>) => {
      state = { ...state, ...part };
      hear();
    },
  };
  return offline;
}
