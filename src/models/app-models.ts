import type { Expertise } from "../facts/expertise.ts";
import type { JournalStore } from "../journal/store.ts";
import type { Offline } from "../offline/registration.ts";
import { type CloseModel, createCloseModel } from "./close-model.ts";
import { createDistanceModel, type DistanceModel } from "./distance-model.ts";
import { createExpertiseModel, type ExpertiseModel } from "./expertise-model.ts";
import { createFaultModel, type FaultModel } from "./fault-model.ts";
import { createJournalModel, type JournalModel } from "./journal-model.ts";
import { createLogModel, type LogModel } from "./log-model.ts";
import { createMishapModel, type MishapModel } from "./mishap-model.ts";
import {
  type AddressBar,
  createNavigationModel,
  type NavigationModel,
} from "./navigation-model.ts";
import { createNoticeModel, type NoticeModel } from "./notice-model.ts";
import { createOfflineModel, type OfflineModel } from "./offline-model.ts";
import { createRigModel, type RigModel } from "./rig-model.ts";
import { createSettingsModel, type SettingsModel } from "./settings-model.ts";
import { createShowModel, type ShowModel } from "./show-model.ts";
import type { Surroundings } from "./surroundings.ts";

/** All that the screens are given. */
export interface AppModels {
  readonly journal: JournalModel;
  readonly navigation: NavigationModel;
  readonly mishap: MishapModel;
  readonly notices: NoticeModel;
  readonly settings: SettingsModel;
  readonly expertise: ExpertiseModel;
  readonly offline: OfflineModel;
  readonly show: ShowModel;
  readonly fault: FaultModel;
  readonly close: CloseModel;
  readonly distance: DistanceModel;
  readonly rig: RigModel;
  readonly log: LogModel;
}

/** Makes the models and joins them: of a browser in src/app, of a pretended phone in the tests. */
export function createAppModels(phone: {
  readonly surroundings: Surroundings;
  readonly store: JournalStore;
  readonly address: AddressBar;
  readonly offline: Offline;
  readonly readExpertise: () => Promise<Expertise | null>;
}): AppModels {
  const { surroundings } = phone;
  const journal = createJournalModel(phone.store, surroundings);
  const navigation = createNavigationModel(phone.address);
  const notices = createNoticeModel();
  const settings = createSettingsModel(surroundings);
  const expertise = createExpertiseModel(phone.readExpertise);
  const fault = createFaultModel({ journal, navigation, notices, surroundings, expertise });
  return {
    journal,
    navigation,
    mishap: createMishapModel(),
    notices,
    settings,
    expertise,
    offline: createOfflineModel(phone.offline, journal),
    show: createShowModel(journal, surroundings),
    fault,
    close: createCloseModel(fault, navigation, notices, surroundings),
    distance: createDistanceModel({ journal, navigation, notices, settings, surroundings }),
    rig: createRigModel(journal, surroundings),
    log: createLogModel(journal, navigation, notices, surroundings),
  };
}
