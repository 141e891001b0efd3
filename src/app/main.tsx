import "../ui/styles.css";
import { computed, effect, untracked } from "@preact/signals";
import { render } from "preact";
import { createAppModels } from "../models/app-models.ts";
import { createOffline } from "../offline/registration.ts";
import { createIdbStore } from "../storage/idb-store.ts";
import { Shell } from "../ui/Shell.tsx";
import { createAddressBar } from "./address-bar.ts";
import { createBrowserSurroundings } from "./browser-surroundings.ts";
import { followPlace, restorePlace } from "./last-place.ts";
import { readExpertise } from "./read-expertise.ts";

const ASKED_KEY = "asked-to-persist";

const store = createIdbStore();
const surroundings = createBrowserSurroundings(store.kept);
const offline = createOffline({ reload: () => location.reload() });
const models = createAppModels({
  surroundings,
  store,
  address: createAddressBar(),
  offline,
  readExpertise,
});
const { journal, navigation, mishap, notices, settings, fault } = models;
addEventListener("error", ({ error, message }) => mishap.report(error ?? message));
addEventListener("unhandledrejection", ({ reason }) => mishap.report(reason));
const restoreAgain = restorePlace(surroundings.keep, navigation);

const root = document.querySelector("#app");
if (root === null) throw new Error("index.html has no element with the id app");
render(<Shell models={models} />, root);

effect(() => {
  const { dataset } = document.documentElement;
  if (dataset["theme"] !== settings.theme.value) dataset["theme"] = settings.theme.value;
});
effect(() => surroundings.keepAwake(fault.openFaults.value.length > 0));
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

offline.start();
void journal.load();
// Behind the first picture: asking for it takes time that the first tap should not wait for.
requestAnimationFrame(() => setTimeout(() => void models.expertise.load()));
void surroundings.loadKept().then(() => {
  restoreAgain();
  const isReady = computed(() => journal.phase.value !== "loading");
  followPlace(navigation, surroundings.keep, isReady);
});
