import { mkdtemp, readlink, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { test as base, chromium, type Page } from "@playwright/test";
import { openSite, type Site } from "./site.ts";

/** One browser process on a profile that outlives it. */
export interface RunningBrowser {
  readonly page: Page;
  close(): Promise<void>;
  /** Ends the process at once, as a phone ends an app. */
  kill(): Promise<void>;
}

interface Fixtures {
  /** The folder that `site` serves a copy of. */
  readonly built: string;
  readonly site: Site;
  /** Starts a browser process; each start of a test finds what the one before has stored. */
  readonly openBrowser: () => Promise<RunningBrowser>;
}

export const test = base.extend<Fixtures>({
  built: [fileURLToPath(new URL("../../dist", import.meta.url)), { option: true }],

  site: async ({ built }, use) => {
    const site = await openSite(built);
    await use(site);
    await site.end();
  },

  openBrowser: async (
    { launchOptions, viewport, deviceScaleFactor, hasTouch, isMobile, locale, timezoneId },
    use,
  ) => {
    const profile = await mkdtemp(join(tmpdir(), "fadewright-profile-"));
    const running = new Set<RunningBrowser>();
    await use(async () => {
      const context = await chromium.launchPersistentContext(profile, {
        ...launchOptions,
        viewport,
        hasTouch,
        isMobile,
        ...(deviceScaleFactor === undefined ? {} : { deviceScaleFactor }),
        ...(locale === undefined ? {} : { locale }),
        ...(timezoneId === undefined ? {} : { timezoneId }),
      });
      const browser: RunningBrowser = {
        page: context.pages()[0] ?? (await context.newPage()),
        async close() {
          running.delete(browser);
          await context.close();
        },
        async kill() {
          running.delete(browser);
          // A link that Chromium makes to keep other processes off the profile: "host-process id".
          const owner = await readlink(join(profile, "SingletonLock"));
          const isGone = context.waitForEvent("close");
          process.kill(Number(owner.split("-").at(-1)), "SIGKILL");
          await isGone;
          await rm(join(profile, "SingletonLock"));
        },
      };
      running.add(browser);
      return browser;
    });
    for (const browser of running) await browser.close();
    await rm(profile, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
  },
});

export { expect } from "@playwright/test";

/** Waits until the worker serves and has found everything in its store. */
export async function offlineReady(page: Page): Promise<void> {
  await page.waitForFunction(async () => {
    const { active } = await navigator.serviceWorker.ready;
    if (active?.state !== "activated") return false;
    const { port1, port2 } = new MessageChannel();
    const answer = new Promise<boolean>((resolve) => {
      port1.onmessage = ({ data }) => resolve(data.complete === true);
    });
    active.postMessage({ type: "completeness" }, [port2]);
    return answer;
  });
}
