import { cp } from "node:fs/promises";
import { join } from "node:path";
import { expect, offlineReady, test } from "./fixtures.ts";
import { answerFirst, dock, goTo, mark, openShow, SHOW, stepTitle, tour } from "./steps.ts";

test("a fault goes from the first tap to the log, and nothing is asked of any other host", async ({
  page,
  site,
  context,
}) => {
  const foreign: string[] = [];
  const complaints: string[] = [];
  context.on("request", (request) => {
    if (new URL(request.url()).origin !== new URL(site.url).origin) foreign.push(request.url());
  });
  page.on("console", (message) => complaints.push(message.text()));
  page.on("pageerror", (error) => complaints.push(error.message));
  await page.goto(site.url);
  await page.evaluate(() => {
    document.addEventListener("securitypolicyviolation", (event) => {
      throw new Error(`policy: ${event.violatedDirective} ${event.blockedURI}`);
    });
  });
  await tour(page);
  expect(foreign).toEqual([]);
  expect(complaints).toEqual([]);
});

test("the show is shared as text that a stranger can read", async ({ page, site, context }) => {
  await context.grantPermissions(["clipboard-read", "clipboard-write"]);
  await page.goto(site.url);
  await tour(page);
  await page.getByRole("button", { name: "Share as text" }).click();
  await expect(dock(page).getByRole("status")).toContainText("Copied");
  const text = await page.evaluate(() => navigator.clipboard.readText());
  expect(text).toContain(`${SHOW.name}, ${SHOW.place}`);
  expect(text).toMatch(/Lead vocal: handheld, 606\.125\sMHz\./);
  expect(text).toMatch(/Fault 1: .+\n- Dropout at \d\d:\d\d:\d\d: Lead vocal; Down left\./);
  expect(text).toContain("Worked around");
  expect(text).toMatch(/\+12\.0\sdB/);
});

test("everything works from the first visit on, once the page says that it is ready", async ({
  page,
  site,
}) => {
  await page.goto(site.url);
  await page.getByRole("link", { name: "Settings" }).click();
  await expect(page.getByText("Ready without network")).toBeVisible();
  await site.stop();
  await expect(fetch(site.url)).rejects.toThrow();
  await page.reload();
  await goTo(page, "Fault");
  await tour(page);
});

test("a new browser process starts offline at the place where the user was", async ({
  site,
  openBrowser,
}) => {
  const first = await openBrowser();
  await first.page.goto(site.url);
  await offlineReady(first.page);
  await openShow(first.page);
  await goTo(first.page, "Rig");
  await first.close();
  await site.stop();
  const second = await openBrowser();
  await second.page.goto(site.url);
  await expect(second.page.getByRole("heading", { name: "Rig" })).toBeVisible();
  await expect(second.page.getByRole("link", { name: SHOW.name })).toBeVisible();
});

test("the app can be installed and works without network from any sub-path", async ({
  built,
  site,
  openBrowser,
}) => {
  await cp(built, join(site.folder, "venue", "app"), { recursive: true });
  const { page } = await openBrowser();
  await page.goto(`${site.url}/venue/app/`);
  await offlineReady(page);
  const devtools = await page.context().newCDPSession(page);
  const { installabilityErrors } = await devtools.send("Page.getInstallabilityErrors");
  expect(installabilityErrors).toEqual([]);
  await site.stop();
  await page.reload();
  await mark(page);
  await expect(stepTitle(page)).toBeVisible();
});

test("nothing acknowledged is lost when the browser is killed between two taps", async ({
  site,
  openBrowser,
}) => {
  const first = await openBrowser();
  await first.page.goto(site.url);
  await offlineReady(first.page);
  await openShow(first.page);
  await mark(first.page);
  const given = await answerFirst(first.page);
  const asked = (await stepTitle(first.page).textContent()) ?? "";
  await first.kill();
  await site.stop();

  const second = await openBrowser();
  await second.page.goto(site.url);
  await expect(stepTitle(second.page)).toHaveText(asked);
  await expect(second.page.locator(".entries")).toContainText(given.title);
  await expect(second.page.locator(".entries")).toContainText(given.answer);
  await mark(second.page, 2);
  await second.kill();

  const third = await openBrowser();
  await third.page.goto(site.url);
  await expect(third.page.getByText(/^2 dropouts: /)).toBeVisible();
});

test("a half typed note and a sum's inputs are there again after a kill", async ({
  site,
  openBrowser,
}) => {
  const first = await openBrowser();
  await first.page.goto(site.url);
  await openShow(first.page);
  await goTo(first.page, "Log");
  await first.page.getByLabel("Note").fill("The left antenna hangs on the");
  await first.page.goto(`${site.url}/#/calculators/distance`);
  await first.page.getByLabel("From (m)").fill("77,5");
  // The browser gives localStorage to its own process at once; the kill is of that process.
  await expect(first.page.getByText("+14.3 dB", { exact: true }).first()).toBeVisible();
  await first.close();
  const second = await openBrowser();
  await second.page.goto(site.url);
  await expect(second.page.getByLabel("From (m)")).toHaveValue("77,5");
  await goTo(second.page, "Log");
  await expect(second.page.getByLabel("Note")).toHaveValue("The left antenna hangs on the");
});

test("the shortcut of the installed icon marks at once, and only once", async ({ page, site }) => {
  await page.goto(`${site.url}/#/mark`);
  await expect(dock(page).getByRole("status")).toContainText("Stored: dropout 1 at ");
  await page.reload();
  await expect(page.getByText(/^1 dropout: /)).toBeVisible();
});

test("an acknowledgement goes with the screen on which it was given", async ({ page, site }) => {
  await page.goto(site.url);
  await mark(page);
  await goTo(page, "Rig");
  await expect(dock(page).getByRole("status")).toBeEmpty();
});

test("two windows show each other's entries", async ({ page, site, context }) => {
  await page.goto(site.url);
  await openShow(page);
  const other = await context.newPage();
  await other.goto(site.url);
  await expect(other.getByRole("link", { name: SHOW.name })).toBeVisible();
  await mark(other);
  await goTo(page, "Log");
  await expect(page.locator("ol.entries")).toContainText("Dropout.");
});

test("answers can be taken back, entries withdrawn and restored", async ({ page, site }) => {
  await page.goto(site.url);
  await openShow(page);
  await mark(page);
  const asked = (await stepTitle(page).textContent()) ?? "";
  await answerFirst(page);
  await page.getByRole("button", { name: `Take back: ${asked}` }).click();
  await expect(stepTitle(page)).toHaveText(asked);
  await goTo(page, "Log");
  await page.getByRole("button", { name: /^Take back: Fault opened/ }).click();
  await goTo(page, "Fault");
  await expect(page.getByText("No dropout marked in this show so far.")).toBeVisible();
  await goTo(page, "Log");
  await page.getByRole("button", { name: /^Restore: Fault opened/ }).click();
  await goTo(page, "Fault");
  await expect(page.getByRole("link", { name: /^Trace it/ })).toBeVisible();
});

test("back leads to the screen before, with its scroll", async ({ page, site }) => {
  await page.goto(site.url);
  await openShow(page);
  await mark(page);
  await page.getByRole("link", { name: "Something else" }).click();
  await page.evaluate(() => scrollTo(0, 600));
  await expect.poll(() => page.evaluate(() => scrollY)).toBe(600);
  // The app notes the scroll when it has come to rest.
  await expect.poll(() => page.evaluate(() => localStorage["fadewright.scroll"])).toContain(" 600");
  await goTo(page, "Log");
  await expect(page.getByRole("heading", { name: "Log" })).toBeVisible();
  await page.goBack();
  await expect.poll(() => page.evaluate(() => scrollY)).toBe(600);
});
