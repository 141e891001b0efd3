/** A page with nothing but the offline part of the app, so that its life cycle is tested alone. */
import { createOffline } from "../../../src/offline/registration.ts";
import { RELEASE } from "./release.ts";

const show = (field: string, text: string | null): void => {
  const place = document.querySelector(`[data-field="${field}"]`);
  if (place !== null) place.textContent = text;
};
const onClick = (action: string, act: () => void): void =>
  document.querySelector(`[data-action="${action}"]`)?.addEventListener("click", act);

const offline = createOffline({ reload: () => location.reload() });
const draw = (): void => {
  const { readiness, update, version } = offline.state();
  show("readiness", readiness);
  show("update", update);
  show("version", version);
};

const heading = document.querySelector("h1");
if (heading !== null) heading.textContent = RELEASE;
onClick("check", () => {
  show("check", null);
  void offline.checkForUpdate().then((outcome) => show("check", outcome));
});
onClick("take", () => offline.takeUpdate());
onClick("late", () => {
  void import("./late-part.ts").then(
    ({ text }) => show("late", text),
    () => show("late", "missing"),
  );
});
offline.onChange(draw);
draw();
offline.start();
