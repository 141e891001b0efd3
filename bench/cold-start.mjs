import { cpSync, mkdirSync, mkdtempSync, readdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { createStaticServer } from "../scripts/static-server.mjs";
import { openBrowser } from "./browser.mjs";
import { install, timeLoad } from "./load.mjs";

/**
 * Makes a profile in which a page has been installed, and stops its server for good.
 *
 * @returns The page with its address and the folder of the profile.
 */
export async function prepare(executable, page, workFolder) {
  const profile = mkdtempSync(join(workFolder, "installed-"));
  const server = createStaticServer(page.folder);
  await server.start(0);
  const installed = { ...page, url: server.url, profile };
  try {
    const browser = await openBrowser(executable, profile);
    try {
      await install(browser, installed);
    } finally {
      await browser.close();
    }
  } finally {
    await server.stop();
  }
  for (const name of readdirSync(profile)) {
    // Names of a lock that a browser leaves for itself, and that would keep a copy from starting.
    if (name.startsWith("Singleton")) rmSync(join(profile, name), { force: true });
  }
  return installed;
}

/** One cold start without network: a new browser process on a fresh copy of the profile. */
export async function coldStart(executable, page, throttle, workFolder) {
  const profile = mkdtempSync(join(workFolder, "cold-"));
  cpSync(page.profile, profile, { recursive: true });
  try {
    const browser = await openBrowser(executable, profile);
    try {
      return await timeLoad(browser, page, throttle);
    } finally {
      await browser.close();
    }
  } finally {
    rmSync(profile, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
  }
}

/** Times two pages in turn, A B B A, so that a drift of the machine meets both alike. */
export async function compare(executable, pages, { runs, throttle, workFolder }) {
  const samples = pages.map(() => []);
  // The first round fills the machine's file cache and is not counted.
  for (let run = -1; run < runs; run += 1) {
    const order = run % 2 === 0 ? [0, 1] : [1, 0];
    for (const index of order) {
      const times = await coldStart(executable, pages[index], throttle, workFolder);
      if (run >= 0) samples[index].push(times);
    }
  }
  return samples;
}

/** An empty folder for the profiles of one bench. */
export function freshFolder(path) {
  rmSync(path, { recursive: true, force: true });
  mkdirSync(path, { recursive: true });
  return path;
}
