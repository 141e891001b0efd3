import type { Page } from "@playwright/test";
import { DATABASE_NAME } from "../../src/storage/names.ts";
import { expect } from "./fixtures.ts";
import {
  cacheNames,
  check,
  expectReady,
  field,
  press,
  test,
  withWaiting,
} from "./offline-page/driver.ts";
import {
  HOUR_MS,
  lockShow,
  makeStrangeDatabase,
  occupyDatabase,
  unlockShow,
  writeLock,
} from "./show-lock.ts";

const hasWaiting = (page: Page) =>
  page.evaluate(async () => (await navigator.serviceWorker.getRegistration())?.waiting != null);
const databaseNames = (page: Page) =>
  page.evaluate(async () => (await indexedDB.databases()).map(({ name }) => name));

test.describe("an open show", () => {
  test("lets no new version in, and costs no download", async ({ openBrowser, site, pages }) => {
    const { page, kill } = await openBrowser();
    await page.goto(site.url);
    await expectReady(page, "first");
    await lockShow(page);
    await site.publish(pages.second);
    site.requests.length = 0;
    await check(page, "refused-by-lock");
    await expect(field(page, "update")).toHaveText("none");
    expect(new Set(site.requests)).toEqual(new Set(["/sw.js"]));
    expect(await cacheNames(page)).toHaveLength(1);
    await kill();

    const { page: again } = await openBrowser();
    await again.goto(site.url);
    await expectReady(again, "first");
    await check(again, "refused-by-lock");
    await unlockShow(again);
    await check(again, "found");
    await press(again, "take");
    await expectReady(again, "second");
  });

  test("lets the very first version in", async ({ page, site }) => {
    // A page of the same origin that has no worker.
    await page.goto(`${site.url}/sw.js`);
    await lockShow(page);
    await page.goto(site.url);
    await expectReady(page, "first");
  });

  test("keeps the running version although the new one was waiting already", async ({
    openBrowser,
    site,
    pages,
  }) => {
    const { page, kill } = await openBrowser();
    await withWaiting(page, site, pages.second);
    const version = String(await field(page, "version").textContent());
    await lockShow(page);
    await kill();
    await site.stop();

    const { page: again, kill: killAgain } = await openBrowser();
    await again.goto(site.url);
    await expectReady(again, "first");
    await expect(field(again, "version")).toHaveText(version);
    // The new version's worker is the one that serves the old version.
    expect(await hasWaiting(again)).toBe(false);
    await expect(field(again, "update")).toHaveText("waiting");
    await press(again, "late");
    await expect(field(again, "late")).toHaveText("late part of first");
    await again.reload();
    await expectReady(again, "first");
    await killAgain();

    const { page: last } = await openBrowser();
    await last.goto(site.url);
    await expectReady(last, "first");
    await unlockShow(last);
    await press(last, "late");
    await expect(field(last, "late")).toHaveText("late part of first");
    await last.reload();
    await expectReady(last, "second");
    await expect(field(last, "version")).not.toHaveText(version);
    await expect(field(last, "update")).toHaveText("none");
    expect(await cacheNames(last)).toHaveLength(1);
    await lockShow(last);
    await last.reload();
    await expectReady(last, "second");
  });

  test("goes on with the version that was kept when yet another one comes in between", async ({
    openBrowser,
    site,
    pages,
  }) => {
    const { page, kill } = await openBrowser();
    await withWaiting(page, site, pages.second);
    await lockShow(page);
    await kill();
    const { page: held, kill: killHeld } = await openBrowser();
    await held.goto(site.url);
    await expectReady(held, "first");
    // Closed for a moment, in which the third version is fetched; the page is not loaded anew.
    await unlockShow(held);
    await site.publish(pages.third);
    await check(held, "found");
    await expect.poll(() => hasWaiting(held)).toBe(true);
    await lockShow(held);
    await killHeld();
    await site.stop();
    const { page: last } = await openBrowser();
    await last.goto(site.url);
    await expectReady(last, "first");
    await unlockShow(last);
    await last.reload();
    await expectReady(last, "third");
    expect(await cacheNames(last)).toHaveLength(1);
  });

  test("keeps the running version, not a forgotten older one", async ({
    openBrowser,
    site,
    pages,
  }) => {
    const { page, kill } = await openBrowser();
    await withWaiting(page, site, pages.second);
    // As a clearing would leave it that was cut short.
    await page.evaluate(async () => {
      const cache = await caches.open("fadewright-00000000 /");
      const page = new URL("./", location.href).href;
      await cache.put(page, new Response("<h1>forgotten</h1>"));
      await cache.put("./~complete", new Response(JSON.stringify({ at: 1, keys: [page] })));
    });
    await lockShow(page);
    await kill();
    const { page: held } = await openBrowser();
    await held.goto(site.url);
    await expectReady(held, "first");
    expect(await cacheNames(held)).toHaveLength(2);
  });

  test("gives way to the version after it, when a third one waits already", async ({
    openBrowser,
    site,
    pages,
  }) => {
    const { page, kill } = await openBrowser();
    await withWaiting(page, site, pages.second);
    await lockShow(page);
    await kill();
    const { page: held } = await openBrowser();
    await held.goto(site.url);
    await expectReady(held, "first");
    await unlockShow(held);
    await site.publish(pages.third);
    await check(held, "found");
    await expect.poll(() => hasWaiting(held)).toBe(true);
    await held.reload();
    await expectReady(held, "second");
    await expect(field(held, "update")).toHaveText("waiting");
    await site.stop();
    await press(held, "take");
    await expectReady(held, "third");
    expect(await cacheNames(held)).toHaveLength(1);
  });

  test("holds nothing back if the database can't tell of it when the version changes", async ({
    context,
    page,
    site,
    pages,
  }) => {
    await withWaiting(page, site, pages.second);
    await lockShow(page);
    // A window past the worker: the change of version does not wait for it.
    const other = await context.newPage();
    await other.goto(site.url);
    const protocol = await context.newCDPSession(other);
    const isLoaded = other.waitForEvent("load");
    await protocol.send("Page.reload", { ignoreCache: true });
    await isLoaded;
    await expect(other.locator("h1")).toHaveText("second");
    await occupyDatabase(other);
    await page.close();
    await expect.poll(() => hasWaiting(other)).toBe(false);
    const last = await context.newPage();
    await last.goto(site.url);
    await expectReady(last, "second");
    await expect(field(last, "update")).toHaveText("none");
  });

  test("is taken to go on while the database does not answer", async ({
    openBrowser,
    site,
    pages,
  }) => {
    const { page, kill } = await openBrowser();
    await withWaiting(page, site, pages.second);
    await lockShow(page);
    await kill();
    const { page: held } = await openBrowser();
    await held.goto(site.url);
    await expectReady(held, "first");
    const other = await held.context().newPage();
    await other.goto(site.url);
    await occupyDatabase(other);
    await held.reload();
    await expectReady(held, "first");
  });

  test("does not stand against the user's own tap", async ({ page, site, pages }) => {
    await withWaiting(page, site, pages.second);
    await lockShow(page);
    await press(page, "take");
    await expectReady(page, "second");
    await page.reload();
    await expectReady(page, "second");
    expect(await cacheNames(page)).toHaveLength(1);
  });

  test("lets the user take the new version that it kept back", async ({
    openBrowser,
    site,
    pages,
  }) => {
    const { page, kill } = await openBrowser();
    await withWaiting(page, site, pages.second);
    await lockShow(page);
    await kill();
    const { page: held } = await openBrowser();
    await held.goto(site.url);
    await expectReady(held, "first");
    await press(held, "take");
    await expectReady(held, "second");
    await expect(field(held, "update")).toHaveText("none");
    expect(await cacheNames(held)).toHaveLength(1);
  });
});

test.describe("the note of an open show", () => {
  const notes: readonly { name: string; lock: unknown; outcome: string }[] = [
    { name: "holds for 17 hours", lock: -17, outcome: "refused-by-lock" },
    { name: "is ignored after 19 hours", lock: -19, outcome: "found" },
    { name: "is ignored if it is dated 19 hours ahead", lock: 19, outcome: "found" },
  ];
  for (const { name, lock, outcome } of notes) {
    test(name, async ({ page, site, pages }) => {
      await page.goto(site.url);
      await expectReady(page, "first");
      await lockShow(page, -Number(lock) * HOUR_MS);
      await site.publish(pages.second);
      await check(page, outcome);
    });
  }

  for (const lock of ["yes", 1, { show: "show-1" }, { at: "now" }, null]) {
    test(`is ignored if it reads ${JSON.stringify(lock)}`, async ({ page, site, pages }) => {
      await page.goto(site.url);
      await expectReady(page, "first");
      await writeLock(page, lock);
      await site.publish(pages.second);
      await check(page, "found");
    });
  }

  test("is looked for without making the database", async ({ page, site, pages }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    await site.publish(pages.second);
    await check(page, "found");
    expect(await databaseNames(page)).toEqual([]);
    await lockShow(page);
    expect(await databaseNames(page)).toEqual([DATABASE_NAME]);
  });

  test("stops nothing if the database has no place for it", async ({ page, site, pages }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    await makeStrangeDatabase(page);
    await site.publish(pages.second);
    await check(page, "found");
  });

  test("stops nothing if the database does not answer", async ({ context, page, site, pages }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    await lockShow(page);
    const other = await context.newPage();
    await other.goto(site.url);
    await occupyDatabase(other);
    await site.publish(pages.second);
    await check(page, "found");
  });
});
