import type { CloseModel } from "./close-model.ts";
import type { DistanceModel } from "./distance-model.ts";
import type { ExpertiseModel } from "./expertise-model.ts";
import type { FaultModel } from "./fault-model.ts";
import type { JournalModel } from "./journal-model.ts";
import type { LogModel } from "./log-model.ts";
import type { MishapModel } from "./mishap-model.ts";
import type { NavigationModel } from "./navigation-model.ts";
import type { NoticeModel } from "./notice-model.ts";
import type { OfflineModel } from "./offline-model.ts";
import type { RigModel } from "./rig-model.ts";
import type { SettingsModel } from "./settings-model.ts";
import type { ShowModel } from "./show-model.ts";

/** All that the screens are given, made once in src/app. */
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
