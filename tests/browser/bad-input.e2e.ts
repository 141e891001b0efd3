import { expect, test } from "./fixtures.ts";
import { goTo, openShow } from "./steps.ts";

const JUNK = ["", "text", "-3", "0", "1e308", "1.234,5", "30 apples", "🎤", "9".repeat(70)];

test("the calculator answers bad input with a sentence and a blank, and goes on", async ({
  page,
  site,
}) => {
  await page.goto(`${site.url}/#/calculators/distance`);
  const from = page.getByLabel("From (m)");
  for (const text of JUNK) {
    await from.fill(text);
    await expect(from).toHaveAttribute("aria-invalid", "true");
    await expect(page.locator(".problem")).toContainText("0.1 to 2000");
    await expect(page.locator(".answer")).toHaveText("–");
    await expect(page.locator(".picture")).toHaveCount(0);
    await page.getByRole("button", { name: "Keep in log" }).click({ force: true });
  }
  for (const text of ["30 m", "30,5", " 98 ft ", "0.03 km"]) {
    await from.fill(text);
    await expect(from).toHaveAttribute("aria-invalid", "false");
    await expect(page.locator(".answer")).toContainText("dB");
  }
  await goTo(page, "Log");
  // No sum was kept while a field was wrong: the log has not even begun.
  await expect(page.getByRole("link", { name: "Open a show" })).toBeVisible();
});

test("a link's frequency is refused with its range and nothing is stored", async ({
  page,
  site,
}) => {
  await page.goto(site.url);
  await openShow(page);
  await goTo(page, "Rig");
  await page.getByLabel("Name", { exact: true }).fill("Bass pack");
  for (const text of ["abc", "0", "606125000"]) {
    await page.getByLabel("Carrier in MHz (optional)").fill(text);
    await page.getByRole("button", { name: "Add link" }).click();
    await expect(page.getByRole("alert")).toContainText("25 to 7200");
  }
  await expect(page.getByRole("heading", { name: "Links of the show" })).toHaveCount(0);
  await expect(page.getByLabel("Name", { exact: true })).toHaveValue("Bass pack");
});

test("a hand-damaged record is set aside, counted and handed over; the rest is shown", async ({
  page,
  site,
}) => {
  await page.goto(site.url);
  await openShow(page);
  await page.evaluate(
    () =>
      new Promise<void>((resolve, reject) => {
        const open = indexedDB.open("fadewright");
        open.onerror = () => reject(open.error);
        open.onsuccess = () => {
          const transaction = open.result.transaction("records", "readwrite");
          const store = transaction.objectStore("records");
          store.put({ id: "x", v: 1, type: "note.added", body: { text: 7 } }, "0-damaged");
          store.put({ id: "y", v: 99, type: "from.the.future", body: {} }, "0-later");
          transaction.oncomplete = () => {
            open.result.close();
            resolve();
          };
        };
      }),
  );
  await page.reload();
  await expect(page.getByText("1 damaged record was set aside")).toBeVisible();
  await expect(page.getByText("1 record was made by a newer version")).toBeVisible();
  await expect(page.getByRole("link", { name: "Lantern Parade" })).toBeVisible();
  await page.getByRole("link", { name: "Settings", exact: true }).click();
  const download = page.waitForEvent("download");
  await page.getByRole("button", { name: "Hand over the set-aside records" }).click();
  expect((await download).suggestedFilename()).toBe("fadewright-set-aside.txt");
});

test("an address that names nothing opens the app", async ({ page, site }) => {
  for (const hash of [
    "#/nowhere",
    "#/fault/unknown",
    "#/calculators/distance?fromM=%E0%A4%A",
    "#%",
  ]) {
    await page.goto(`${site.url}/${hash}`);
    await expect(page.getByRole("button", { name: "Mark dropout" })).toBeVisible();
    await page.goto("about:blank");
  }
});
