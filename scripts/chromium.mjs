import { accessSync, constants } from "node:fs";
import { delimiter, join } from "node:path";
import { chromium } from "@playwright/test";

const NAMES = ["chromium", "chromium-browser", "google-chrome", "google-chrome-stable"];

/**
 * Path of a Chromium to run: the one that $CHROMIUM names, one on the PATH, or the one that
 * Playwright has downloaded.
 *
 * @throws Error  If there is none, with what to do about it.
 */
export function chromiumPath() {
  const folders = (process.env.PATH ?? "").split(delimiter).filter(Boolean);
  const onPath = folders.flatMap((folder) => NAMES.map((name) => join(folder, name)));
  const candidates = [process.env.CHROMIUM ?? "", ...onPath, chromium.executablePath()];
  const found = candidates.find((path) => path !== "" && isExecutable(path));
  if (found === undefined) {
    throw new Error(
      'no Chromium found: install one, name it in $CHROMIUM, or run "npx playwright install chromium"',
    );
  }
  return found;
}

function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch (error) {
    if (["ENOENT", "EACCES", "ENOTDIR"].includes(error.code)) return false;
    throw error;
  }
}
