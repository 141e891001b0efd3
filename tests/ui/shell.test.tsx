// @vitest-environment happy-dom
import { h, render } from "preact";
import { act } from "preact/test-utils";
import { afterEach, describe, expect, it } from "vitest";
import { EXPERTISE } from "../../src/facts/expertise.ts";
import type { StoreFailure } from "../../src/journal/store.ts";
import { Shell } from "../../src/ui/Shell.tsx";
import { pretendApp } from "./pretend-app.ts";

type App = ReturnType<typeof pretendApp>;
let root: HTMLElement | undefined;

async function show(app: App, isLoaded = true): Promise<HTMLElement> {
  root = document.createElement("div");
  document.body.append(root);
  const place = root;
  await act(async () => {
    render(h(Shell, { models: app.models }), place);
    if (isLoaded) await Promise.all([app.models.journal.load(), app.models.expertise.load()]);
  });
  return place;
}
const press = (place: HTMLElement, label: string) =>
  act(async () => {
    const button = [...place.querySelectorAll("button")].find((b) => b.textContent === label);
    if (!button) throw new Error(`no button "${label}"`);
    button.click();
    // What a tap sets off is stored before it is shown.
    await new Promise((resolve) => setTimeout(resolve));
  });

afterEach(() => {
  if (root) render(null, root);
  root?.remove();
});

describe("the frame of every screen", () => {
  it("says that the log is being read, instead of an empty log", async () => {
    const place = await show(pretendApp("#/log"), false);
    expect(place.textContent).toContain("Reading the log");
    expect(place.textContent).not.toContain("Open a show");
  });

  it("marks the place where one is, at the very first start too", async () => {
    const place = await show(pretendApp(""));
    expect(place.querySelector("[aria-current]")?.textContent).toBe("Fault");
  });

  it("shows a calculator's answer before the log has been read", async () => {
    const place = await show(pretendApp("#/calculators/distance"), false);
    expect(place.querySelector(".answer")?.textContent).toContain("dB");
  });

  it.each<[StoreFailure, RegExp]>([
    ["blocked", /Another window/],
    ["newer", /newer version/],
    ["quota", /storage is full/],
    ["no-answer", /does not answer/],
    ["lost", /dropped the log/],
    ["unavailable", /keeps nothing here/],
  ])("says in plain words that storing failed: %s", async (reason, words) => {
    const app = pretendApp();
    const place = await show(app);
    app.store.answer = { kind: "failed", reason };
    await press(place, "Mark dropout");
    const alert = place.querySelector('[role="alert"]');
    expect(alert?.textContent).toMatch(words);
    expect(alert?.textContent).toContain("3 entries are not stored yet.");
    expect(alert?.textContent).toContain("What you enter is kept in this window");
    expect(place.querySelector(".notice")?.textContent).toContain("Not stored yet");
    app.store.answer = { kind: "stored" };
    await press(place, "Try to store again");
    expect(place.querySelector('[role="alert"]')).toBeNull();
    expect(app.store.rows).toHaveLength(3);
  });

  it("hands over what is not stored", async () => {
    const app = pretendApp();
    const place = await show(app);
    app.store.answer = { kind: "failed", reason: "quota" };
    await press(place, "Mark dropout");
    await press(place, "Share what is not stored");
    expect(app.surroundings.shared.join()).toContain("dropout.marked");
  });

  it("says what went wrong in the app itself, and can be told to be quiet", async () => {
    const app = pretendApp();
    const place = await show(app);
    await act(() => app.models.mishap.report(new TypeError("pretended")));
    expect(place.querySelector('[role="alert"]')?.textContent).toContain("The log is safe");
    await press(place, "Share what happened");
    expect(app.surroundings.shared.join()).toContain("TypeError: pretended");
    await press(place, "Hide this line");
    expect(place.querySelector('[role="alert"]')).toBeNull();
  });

  it("offers a new version only while no show is open", async () => {
    const app = pretendApp();
    const place = await show(app);
    await act(() => app.offline.set({ update: "waiting" }));
    expect(place.textContent).toContain("A new version is ready.");
    await press(place, "Mark dropout");
    expect(place.textContent).not.toContain("A new version is ready.");
    expect(app.offline.taken).toBe(0);
  });

  it("tells of a version that another window has taken, and restarts only when asked to", async () => {
    const app = pretendApp();
    const place = await show(app);
    await act(() => app.offline.set({ update: "taken-elsewhere" }));
    expect(place.textContent).toContain("Another window has taken a new version.");
    expect(app.offline.taken).toBe(0);
    await press(place, "Restart with the new version");
    expect(app.offline.taken).toBe(1);
  });
});

describe("a fault without the fault finder's data file", () => {
  it("can be marked, and traced once the file has been read", async () => {
    let answers = 0;
    const app = pretendApp("#/fault", async () => {
      answers += 1;
      return answers === 1 ? null : EXPERTISE;
    });
    const place = await show(app);
    await press(place, "Mark dropout");
    expect(app.store.rows.map(({ type }) => type)).toContain("dropout.marked");
    expect(place.textContent).toContain("could not be read");
    await press(place, "Try again");
    expect(place.querySelector("h2")?.textContent).toMatch(/\?$|spare/);
  });
});
