import { expect } from "./fixtures.ts";
import { cacheNames, expectReady, field, press, test } from "./offline-page/driver.ts";
import type { Site } from "./site.ts";

/** Answers the request for the part that is loaded late. */
function answerLatePart(site: Site, status: number, type: string): void {
  site.intercept = (path, response) => {
    if (!path.includes("late-part")) return false;
    response.writeHead(status, { "content-type": type }).end("<!doctype html>");
    return true;
  };
}

test.describe("use without network", () => {
  test("works in the window of the first visit, once ready has been said", async ({
    page,
    site,
  }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    await site.stop();
    await expect(fetch(site.url)).rejects.toThrow();
    await press(page, "late");
    await expect(field(page, "late")).toHaveText("late part of first");
    await page.reload();
    await expectReady(page, "first");
    await page.goto(`${site.url}/?from=icon#/log`);
    await expectReady(page, "first");
  });

  test("works in a new browser process", async ({ openBrowser, site }) => {
    const { page, kill } = await openBrowser();
    await page.goto(site.url);
    await expectReady(page, "first");
    await kill();
    await site.stop();
    const again = await openBrowser();
    await again.page.goto(site.url);
    await expectReady(again.page, "first");
  });

  test("asks the host for nothing but news of the worker", async ({ page, site }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    site.requests.length = 0;
    await page.reload();
    await expectReady(page, "first");
    await press(page, "late");
    await expect(field(page, "late")).toHaveText("late part of first");
    expect(site.requests.filter((path) => path !== "/sw.js")).toEqual([]);
  });

  test("leaves what is not of the app to the network, and stores none of it", async ({
    page,
    site,
  }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    const statusOf = (path: string) => page.evaluate(async (at) => (await fetch(at)).status, path);
    expect(await statusOf("missing.txt")).toBe(404);
    expect(await statusOf("sw.js")).toBe(200);
    const isStored = await page.evaluate(async () => Boolean(await caches.match("sw.js")));
    expect(isStored).toBe(false);
  });

  test("is not claimed before everything is stored", async ({ page, site }) => {
    let letGo = (): void => {};
    const isHeld = new Promise<void>((resolve) => {
      letGo = resolve;
    });
    site.intercept = async (path) => {
      if (path.includes("late-part")) await isHeld;
      return false;
    };
    await page.goto(site.url);
    await expect.poll(() => site.requests.some((path) => path.includes("late-part"))).toBe(true);
    await expect(field(page, "readiness")).toHaveText("preparing");
    letGo();
    await expectReady(page, "first");
  });

  test("is not claimed when a file is missing, and nothing is kept", async ({ page, site }) => {
    answerLatePart(site, 404, "text/plain");
    await page.goto(site.url);
    await expect(field(page, "readiness")).toHaveText("failed");
    expect(await cacheNames(page)).toEqual([]);
  });

  test("is not claimed when the host answers a missing file with its start page", async ({
    page,
    site,
  }) => {
    answerLatePart(site, 200, "text/html");
    await page.goto(site.url);
    await expect(field(page, "readiness")).toHaveText("failed");
  });

  test("is not claimed when a stored file has gone", async ({ page, site }) => {
    await page.goto(site.url);
    await expectReady(page, "first");
    const removed = await page.evaluate(async () => {
      const [name = ""] = await caches.keys();
      const cache = await caches.open(name);
      const late = (await cache.keys()).find(({ url }) => url.includes("late-part"));
      return late !== undefined && (await cache.delete(late));
    });
    expect(removed).toBe(true);
    await page.reload();
    await expect(field(page, "readiness")).toHaveText("failed");
  });

  test("works from a host that says that its files vary", async ({ page, site }) => {
    site.intercept = (_path, response) => {
      response.setHeader("vary", "accept, origin");
      return false;
    };
    await page.goto(site.url);
    await expectReady(page, "first");
    await site.stop();
    await page.reload();
    await expectReady(page, "first");
    await press(page, "late");
    await expect(field(page, "late")).toHaveText("late part of first");
  });

  test("works from a host that redirects the page to its folder", async ({ page, site }) => {
    site.intercept = (path, response) => {
      if (path !== "/index.html") return false;
      response.writeHead(301, { location: "/" }).end();
      return true;
    };
    await page.goto(site.url);
    await expectReady(page, "first");
    expect(site.requests).toContain("/index.html");
    await site.stop();
    await page.reload();
    await expectReady(page, "first");
  });
});
