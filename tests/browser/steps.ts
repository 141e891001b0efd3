import type { Page } from "@playwright/test";
import { expect } from "./fixtures.ts";

/** What a user does, in the words of the screen. The show is invented. */
export const SHOW = { name: "Lantern Parade", place: "Old Ropeworks" };

export const dock = (page: Page) => page.locator(".dock");
export const goTo = (page: Page, place: "Fault" | "Calculators" | "Rig" | "Log") =>
  page.getByRole("navigation", { name: "Places" }).getByRole("link", { name: place }).click();

export async function openShow(page: Page): Promise<void> {
  await page.getByRole("link", { name: "No show open" }).click();
  await page.getByLabel("Name of the show").fill(SHOW.name);
  await page.getByLabel("Building or place").fill(SHOW.place);
  await page.getByRole("button", { name: "Open the show" }).click();
  await expect(page.getByRole("link", { name: SHOW.name })).toBeVisible();
  // A fresh show counts as live; here there is time to ask.
  await goTo(page, "Fault");
  await page.getByRole("radio", { name: "Off air" }).check();
  await page.getByRole("link", { name: SHOW.name }).click();
}

export async function addLink(page: Page): Promise<void> {
  await goTo(page, "Rig");
  await page.getByLabel("Name", { exact: true }).fill("Lead vocal");
  await page.getByLabel("Carrier in MHz (optional)").fill("606,125");
  await page.getByRole("button", { name: "Add link" }).click();
  await expect(page.getByText("606.125 MHz")).toBeVisible();
}

/** Marks and waits for the acknowledgement, which comes only once it is stored. */
export async function mark(page: Page, count = 1): Promise<void> {
  await page.getByRole("button", { name: /^Mark (dropout|again)$/ }).click();
  await expect(dock(page).getByRole("status")).toContainText(`Stored: dropout ${count} at `);
}

/** The step card's own question or remedy. */
export const stepTitle = (page: Page) =>
  page.getByRole("region", { name: "Next step" }).locator("h2");
const answers = (page: Page) =>
  page.getByRole("region", { name: "Next step" }).locator(".answers button");

/** Taps the first answer of the step on the screen and returns what was asked and answered. */
export async function answerFirst(page: Page): Promise<{ title: string; answer: string }> {
  const title = (await stepTitle(page).textContent()) ?? "";
  const answer = (await answers(page).first().textContent()) ?? "";
  await answers(page).first().click();
  await expect(stepTitle(page)).not.toHaveText(title);
  return { title, answer };
}

/** A whole fault, a sum and a note, read back in the log. */
export async function tour(page: Page): Promise<void> {
  await openShow(page);
  await addLink(page);
  await mark(page);
  const before = await page.locator(".unfold strong").allTextContents();
  const given = await answerFirst(page);
  await answerFirst(page);
  await answerFirst(page);
  expect(await page.locator(".unfold strong").allTextContents()).not.toEqual(before);

  await page.getByRole("link", { name: "Links and place" }).click();
  await page.getByRole("button", { name: "Lead vocal" }).click();
  await page.getByRole("button", { name: "Down left" }).click();
  await expect(page.getByRole("button", { name: "Down left" })).toHaveAttribute(
    "aria-pressed",
    "true",
  );
  await page.getByRole("link", { name: "Done" }).click();

  await page.getByRole("radio", { name: "Live" }).click();
  await page.getByRole("link", { name: "Something else" }).click();
  await page.getByRole("button", { name: "Hand over the spare" }).click();
  await page.getByRole("button", { name: "Audio is back" }).click();
  await page.getByRole("link", { name: "It's cured" }).click();
  await expect(page.getByRole("button", { name: "Worked around" })).toHaveAttribute(
    "aria-pressed",
    "true",
  );
  await page.getByRole("button", { name: "Close the fault" }).click();
  await expect(page.getByRole("heading", { name: "Closed" })).toBeVisible();

  await goTo(page, "Calculators");
  await page.getByRole("link", { name: /Distance and level/ }).click();
  await page.getByLabel("From (m)").fill("40 m");
  await page.getByLabel("To (m)").fill("10,0");
  // 20·log10(4) dB: four times the distance is four times the field strength, or 12.04 dB.
  await expect(page.getByText("+12.0 dB", { exact: true }).first()).toBeVisible();
  await page.getByRole("button", { name: "Keep in log" }).click();
  await expect(dock(page).getByRole("status")).toContainText("Stored in the log.");

  await goTo(page, "Log");
  await page.getByLabel("Note").fill("Spare pack lives in the left wing.");
  await page.getByRole("button", { name: "Add", exact: true }).click();
  const timeline = page.locator("ol.entries");
  await expect(timeline).toContainText("Spare pack lives in the left wing.");
  await expect(timeline).toContainText("Moving from 40 m to 10 m changes the level by +12.0 dB");
  await expect(timeline).toContainText("Tried: Hand over the spare.");
  await expect(timeline).toContainText("Lead vocal; Down left");
  await expect(timeline).toContainText(given.title);
  await expect(timeline).toContainText(given.answer);
}
