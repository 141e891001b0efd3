import { cp, rm } from "node:fs/promises";
import { join } from "node:path";
import { expect } from "./fixtures.ts";
import {
  cacheNames,
  check,
  countLoads,
  expectReady,
  field,
  press,
  test,
  withWaiting,
} from "./offline-page/driver.ts";

test.describe("a new version", () => {
  test("is not there when nothing has been published", async ({ page, site }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    await check(page, "none");
    await expect(field(page, "update")).toHaveText("none");
  });

  test("waits until it is asked for, and is then loaded once", async ({ page, site, pages }) => {
    await withWaiting(page, site, pages.second);
    const version = String(await field(page, "version").textContent());
    await page.reload();
    await expectReady(page, "first");
    await expect(field(page, "update")).toHaveText("waiting");
    await expect(field(page, "version")).toHaveText(version);

    const loads = countLoads(page);
    await press(page, "take");
    await expectReady(page, "second");
    await expect(field(page, "update")).toHaveText("none");
    await expect(field(page, "version")).not.toHaveText(version);
    expect(loads()).toBe(1);
    expect(await cacheNames(page)).toEqual([
      `fadewright-${await field(page, "version").textContent()} /`,
    ]);
    await site.stop();
    await page.reload();
    await expectReady(page, "second");
  });

  test("takes over by itself when the app is started anew and no show is open", async ({
    openBrowser,
    site,
    pages,
  }) => {
    const { page, kill } = await openBrowser();
    await withWaiting(page, site, pages.second);
    await kill();
    await site.stop();
    const again = await openBrowser();
    await again.page.goto(site.url);
    await expectReady(again.page, "second");
    await expect(field(again.page, "update")).toHaveText("none");
    expect(await cacheNames(again.page)).toHaveLength(1);
  });

  test("does not wait for a window that was loaded past the worker, nor loads it anew", async ({
    page,
    site,
    pages,
  }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    const protocol = await page.context().newCDPSession(page);
    const isLoaded = page.waitForEvent("load");
    await protocol.send("Page.reload", { ignoreCache: true });
    await isLoaded;
    await expectReady(page, "first");
    expect(await page.evaluate(() => navigator.serviceWorker.controller)).toBeNull();
    await site.publish(pages.second);
    const loads = countLoads(page);
    await check(page, "found");
    await expect(field(page, "update")).toHaveText("taken-elsewhere");
    await expectReady(page, "first");
    expect(loads()).toBe(0);
    await press(page, "take");
    await expectReady(page, "second");
    expect(loads()).toBe(1);
  });

  test("is loaded in the window that asks only; the other one is told and goes on", async ({
    context,
    page,
    site,
    pages,
  }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    const other = await context.newPage();
    await other.goto(site.url);
    await expectReady(other, "first");
    await site.publish(pages.second);
    await check(page, "found");
    await expect(field(other, "update")).toHaveText("waiting");

    const loads = countLoads(other);
    await press(page, "take");
    await expectReady(page, "second");
    await expect(field(page, "update")).toHaveText("none");
    await expect(field(other, "update")).toHaveText("taken-elsewhere");
    await expectReady(other, "first");
    expect(loads()).toBe(0);
    // Its own files are kept for it. The host has none of them any more.
    await press(other, "late");
    await expect(field(other, "late")).toHaveText("late part of first");
    await other.reload();
    await expectReady(other, "second");
  });

  test("is heard of by a window that has seen another window's update refused before", async ({
    context,
    page,
    site,
    pages,
  }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    const other = await context.newPage();
    await other.goto(site.url);
    await expectReady(other, "first");
    await site.publish(pages.second);
    let isComplete = false;
    site.intercept = (path, response) => {
      if (isComplete || !path.includes("late-part")) return false;
      response.writeHead(404).end();
      return true;
    };
    await check(page, "unreachable");
    await check(page, "unreachable");
    isComplete = true;
    await check(page, "found");
    await expect(field(other, "update")).toHaveText("waiting");
  });

  test("leaves the running one whole when its download breaks off", async ({
    page,
    site,
    pages,
  }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    const before = await cacheNames(page);
    await site.publish(pages.second);
    site.intercept = (path, response) => {
      if (!path.includes("late-part")) return false;
      response.destroy();
      return true;
    };
    await check(page, "unreachable");
    await expect(field(page, "update")).toHaveText("none");
    expect(await cacheNames(page)).toEqual(before);
    await site.stop();
    await page.reload();
    await expectReady(page, "first");
    await check(page, "unreachable");
  });

  test("survives that the version before it is taken while it is still being installed", async ({
    page,
    site,
    pages,
  }) => {
    await withWaiting(page, site, pages.second);
    await site.publish(pages.third);
    let letGo = (): void => {};
    const isHeld = new Promise<void>((resolve) => {
      letGo = resolve;
    });
    site.requests.length = 0;
    site.intercept = async (path) => {
      if (path.includes("late-part")) await isHeld;
      return false;
    };
    await press(page, "check");
    await expect.poll(() => site.requests.some((path) => path.includes("late-part"))).toBe(true);
    await expect.poll(() => cacheNames(page)).toHaveLength(3);
    await press(page, "take");
    await expectReady(page, "second");
    letGo();
    await expect(field(page, "update")).toHaveText("waiting");
    // The first attempt has succeeded; a load of the page sets off another one if it failed.
    expect(site.requests.filter((path) => path.includes("late-part"))).toHaveLength(1);
    await press(page, "take");
    await expectReady(page, "third");
    await expect(field(page, "update")).toHaveText("none");
    expect(await cacheNames(page)).toHaveLength(1);
    await site.stop();
    await page.reload();
    await expectReady(page, "third");
  });

  test("of one copy of the app leaves a copy in another folder as it is", async ({
    context,
    page,
    site,
    pages,
  }) => {
    await cp(pages.first, join(site.folder, "copy"), { recursive: true });
    await page.goto(`${site.url}/copy/`);
    await expectReady(page, "first");
    const other = await context.newPage();
    await other.goto(site.url);
    await expectReady(other, "first");
    expect(await cacheNames(page)).toHaveLength(2);
    await other.close();

    await rm(join(site.folder, "copy"), { recursive: true });
    await cp(pages.second, join(site.folder, "copy"), { recursive: true });
    await check(page, "found");
    await press(page, "take");
    await expectReady(page, "second");
    expect(await cacheNames(page)).toHaveLength(2);
    await site.stop();
    await page.goto(site.url);
    await expectReady(page, "first");
    await page.goto(`${site.url}/copy/#/log`);
    await expectReady(page, "second");
  });

  test("touches no caches of others on the same origin", async ({ page, site, pages }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    const others = ["another-app", "fadewright-0badcafe /elsewhere/", "fadewright"];
    await page.evaluate(async (names) => {
      for (const name of names) await caches.open(name);
    }, others);
    await site.publish(pages.second);
    await check(page, "found");
    await press(page, "take");
    await expectReady(page, "second");
    const names = await cacheNames(page);
    expect(names).toEqual(expect.arrayContaining(others));
    expect(names).toHaveLength(others.length + 1);
  });
});
