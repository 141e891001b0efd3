import "../ui/styles.css";
import { computed, effect, untracked } from "@preact/signals";
import { render } from "preact";
import type { AppModels } from "../models/app-models.ts";
import { createCloseModel } from "../models/close-model.ts";
import { createDistanceModel } from "../models/distance-model.ts";
import { createExpertiseModel } from "../models/expertise-model.ts";
import { createFaultModel } from "../models/fault-model.ts";
import { createJournalModel } from "../models/journal-model.ts";
import { createLogModel } from "../models/log-model.ts";
import { createMishapModel } from "../models/mishap-model.ts";
import { createNavigationModel } from "../models/navigation-model.ts";
import { createNoticeModel } from "../models/notice-model.ts";
import { createOfflineModel } from "../models/offline-model.ts";
import { createRigModel } from "../models/rig-model.ts";
import { createSettingsModel } from "../models/settings-model.ts";
import { createShowModel } from "../models/show-model.ts";
import { createIdbStore } from "../storage/idb-store.ts";
import { Shell } from "../ui/Shell.tsx";
import { createAddressBar } from "./address-bar.ts";
import { createBrowserSurroundings } from "./browser-surroundings.ts";
import { followPlace, restorePlace } from "./last-place.ts";
import { readExpertise } from "./read-expertise.ts";
import { startOffline } from "./start-offline.ts";

const ASKED_KEY = "asked-to-persist";

const store = createIdbStore();
const surroundings = createBrowserSurroundings(store.kept);
const mishap = createMishapModel();
addEventListener("error", ({ error, message }) => mishap.report(error ?? message));
addEventListener("unhandledrejection", ({ reason }) => mishap.report(reason));

const journal = createJournalModel(store, surroundings);
const navigation = createNavigationModel(createAddressBar());
const restoreAgain = restorePlace(surroundings.keep, navigation);
const notices = createNoticeModel();
const settings = createSettingsModel(surroundings);
const expertise = createExpertiseModel(readExpertise);
const fault = createFaultModel({ journal, navigation, notices, surroundings, expertise });
const models: AppModels = {
  mishap,
  journal,
  navigation,
  notices,
  settings,
  expertise,
  fault,
  offline: createOfflineModel(startOffline(), journal),
  close: createCloseModel(fault, navigation, notices, surroundings),
  show: createShowModel(journal, surroundings),
  distance: createDistanceModel({ journal, navigation, notices, settings, surroundings }),
  rig: createRigModel(journal, surroundings),
  log: createLogModel(journal, navigation, notices, surroundings),
};

const root = document.querySelector("#app");
if (root === null) throw new Error("index.html has no element with the id app");
render(<Shell models={models} />, root);

effect(() => {
  document.documentElement.dataset["theme"] = settings.theme.value;
});
effect(() => surroundings.keepAwake(fault.openFaults.value.length > 0));
void surroundings.loadKept().then(() => {
  restoreAgain();
  const isReady = computed(() => journal.phase.value !== "loading");
  followPlace(navigation, surroundings.keep, isReady);
});

// An acknowledgement belongs to the screen on which it was given.
navigation.place.subscribe(() => notices.clear());
// The shortcut of the installed icon opens the place "mark": that tap is the mark.
effect(() => {
  if (navigation.route.value.place === "mark") untracked(() => void fault.markDropout());
});
// Once, and from something the user did: the first record.
effect(() => {
  if (journal.openShow.value === null || surroundings.keep.read(ASKED_KEY) !== null) return;
  surroundings.keep.write(ASKED_KEY, "yes");
  untracked(() => void settings.askToPersist());
});
void journal.load();
void expertise.load();
