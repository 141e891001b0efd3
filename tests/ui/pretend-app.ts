import { EXPERTISE } from "../../src/facts/expertise.ts";
import type { AppModels } from "../../src/models/app-models.ts";
import { createCloseModel } from "../../src/models/close-model.ts";
import { createDistanceModel } from "../../src/models/distance-model.ts";
import { createExpertiseModel } from "../../src/models/expertise-model.ts";
import { createFaultModel } from "../../src/models/fault-model.ts";
import { createJournalModel } from "../../src/models/journal-model.ts";
import { createLogModel } from "../../src/models/log-model.ts";
import { createMishapModel } from "../../src/models/mishap-model.ts";
import { createNavigationModel } from "../../src/models/navigation-model.ts";
import { createNoticeModel } from "../../src/models/notice-model.ts";
import { createOfflineModel } from "../../src/models/offline-model.ts";
import { createRigModel } from "../../src/models/rig-model.ts";
import { createSettingsModel } from "../../src/models/settings-model.ts";
import { createShowModel } from "../../src/models/show-model.ts";
import type { Offline, OfflineState } from "../../src/offline/registration.ts";
import { pretendAddress, pretendStore, pretendSurroundings } from "../models/pretend.ts";

/** The whole app on a pretended phone, to be rendered without a browser. */
export function pretendApp(hash = "#/fault", readExpertise = async () => EXPERTISE as never) {
  const store = pretendStore();
  const surroundings = pretendSurroundings();
  const journal = createJournalModel(store, surroundings);
  const navigation = createNavigationModel(pretendAddress(hash));
  const notices = createNoticeModel();
  const settings = createSettingsModel(surroundings);
  const expertise = createExpertiseModel(readExpertise);
  const fault = createFaultModel({ journal, navigation, notices, surroundings, expertise });
  const offline = pretendOffline();
  const models: AppModels = {
    mishap: createMishapModel(),
    journal,
    navigation,
    notices,
    settings,
    expertise,
    fault,
    offline: createOfflineModel(offline, journal),
    close: createCloseModel(fault, navigation, notices, surroundings),
    show: createShowModel(journal, surroundings),
    distance: createDistanceModel({ journal, navigation, notices, settings, surroundings }),
    rig: createRigModel(journal, surroundings),
    log: createLogModel(journal, navigation, notices, surroundings),
  };
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
