import { expect, offlineReady, test } from "./fixtures.ts";
import { mark, openShow } from "./steps.ts";

/** Changes a copy of the built app on its host into a newer version of itself. */
const NEWER = "Fadewright, newer";

test("a new version is offered quietly, refused by doing nothing, and taken by one tap", async ({
  page,
  site,
}) => {
  await page.goto(site.url);
  await offlineReady(page);
  await site.publishTitle(NEWER);
  await page.getByRole("link", { name: "Settings", exact: true }).click();
  await page.getByRole("button", { name: "Look for a new version" }).click();
  const offer = page.getByRole("button", { name: "Restart with the new version" });
  await expect(offer).toBeVisible();
  await page.reload();
  await expect(page).toHaveTitle("Fadewright");
  await offer.click();
  await expect(page).toHaveTitle(NEWER);
  await expect(page.getByRole("heading", { name: "Settings" })).toBeVisible();
  await expect(offer).toHaveCount(0);
});

test("no version is offered, let in or changed while a show is open, and again when it is closed", async ({
  site,
  openBrowser,
}) => {
  const first = await openBrowser();
  await first.page.goto(site.url);
  await offlineReady(first.page);
  await openShow(first.page);
  await mark(first.page);
  await site.publishTitle(NEWER);
  await first.page.getByRole("link", { name: "Settings", exact: true }).click();
  await expect(first.page.getByText("A show is open: the version stays as it is")).toBeVisible();
  await first.close();

  const second = await openBrowser();
  await second.page.goto(site.url);
  await expect(second.page).toHaveTitle("Fadewright");
  await second.page.getByRole("link", { name: "Lantern Parade" }).click();
  await second.page.getByRole("button", { name: "Close the show" }).click();
  await second.page.getByRole("link", { name: "Settings", exact: true }).click();
  await second.page.getByRole("button", { name: "Look for a new version" }).click();
  await second.page.getByRole("button", { name: "Restart with the new version" }).click();
  await expect(second.page).toHaveTitle(NEWER);
});
