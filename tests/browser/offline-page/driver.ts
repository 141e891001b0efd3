import { fileURLToPath } from "node:url";
import type { Page } from "@playwright/test";
import { test as base, expect } from "../fixtures.ts";
import type { Site } from "../site.ts";
import { buildOfflinePage } from "./build.ts";

const RELEASES = ["first", "second", "third"] as const;
type Release = (typeof RELEASES)[number];

const folderOf = (release: Release): string =>
  fileURLToPath(new URL(`../../../test-results/offline-page/${release}`, import.meta.url));

/** `site` begins with the first of three releases of the page, each built once. */
export const test = base.extend<object, { readonly pages: Readonly<Record<Release, string>> }>({
  pages: [
    // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the names of the parameter
    async ({}, use) => {
      for (const release of RELEASES) await buildOfflinePage(folderOf(release), release);
      await use({
        first: folderOf("first"),
        second: folderOf("second"),
        third: folderOf("third"),
      });
    },
    { scope: "worker" },
  ],
  built: async ({ pages }, use) => use(pages.first),
});

export const field = (page: Page, name: string) => page.locator(`[data-field="${name}"]`);

export const press = (page: Page, action: string): Promise<void> =>
  page.locator(`[data-action="${action}"]`).click();

/** The release is drawn, and its worker has said that everything is stored. */
export async function expectReady(page: Page, release: Release): Promise<void> {
  await expect(page.locator("h1")).toHaveText(release);
  await expect(field(page, "readiness")).toHaveText("ready");
}

/** Asks for a newer version. */
export async function check(page: Page, outcome: string): Promise<void> {
  await press(page, "check");
  await expect(field(page, "check")).toHaveText(outcome);
}

/** The first release runs, a later one is installed and waits. */
export async function withWaiting(page: Page, site: Site, folder: string): Promise<void> {
  await page.goto(site.url);
  await expectReady(page, "first");
  await site.publish(folder);
  await check(page, "found");
  await expect(field(page, "update")).toHaveText("waiting");
}

export const cacheNames = (page: Page): Promise<string[]> => page.evaluate(() => caches.keys());

/** How often the page has been loaded since the call. */
export function countLoads(page: Page): () => number {
  let loads = 0;
  page.on("load", () => {
    loads += 1;
  });
  return () => loads;
}
