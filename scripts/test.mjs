// Everything that a change must pass, from a fresh clone on.   npm test
import { spawnSync } from "node:child_process";
import { existsSync, rmSync } from "node:fs";
import { join } from "node:path";
import { ROOT, run, setUpPackages } from "./set-up.mjs";
import { readTotals } from "./totals.mjs";

/** Scripts of package.json, in this order: what is quick and says most comes first. */
const STEPS = ["types", "lint", "unused", "test:unit", "build", "test:build", "test:browser"];

if (!setUpPackages()) process.exit(1);
if (!(await setUpBrowser())) {
  console.error("The browser tests need Chromium: install it, or name it in $CHROMIUM.");
  process.exit(1);
}
const results = join(ROOT, "test-results");
// What an earlier run has left there would be counted as this one's.
rmSync(results, { recursive: true, force: true });
const failed = STEPS.find((step) => {
  console.log(`\n== ${step}`);
  return !run("npm", "run", "-s", step);
});
if (failed !== undefined) console.log(`\n== ${failed} failed`);
const totals = readTotals(results);
// A step that fails without a failed test, as types do, is one failure.
if (failed !== undefined && totals.failed === 0) totals.failed = 1;
console.log(`\n${totals.passed} passed, ${totals.failed} failed, ${totals.skipped} skipped`);
process.exitCode = totals.failed === 0 ? 0 : 1;

async function setUpBrowser() {
  // Not above: it imports a package, and there may have been none.
  const { chromiumPath } = await import("./chromium.mjs");
  const isThere = () => {
    try {
      return existsSync(chromiumPath());
    } catch {
      return false;
    }
  };
  if (isThere()) return true;
  const hasAptGet = spawnSync("apt-get", ["--version"], { stdio: "ignore" }).status === 0;
  if (process.getuid?.() !== 0 || !hasAptGet) return false;
  const aptGet = (...options) => run("apt-get", "-o", "DPkg::Lock::Timeout=300", "-qq", ...options);
  return (
    aptGet("update") &&
    // A font too: without one, nothing on the screen has the width and the light that tests look at.
    aptGet("-y", "--no-install-recommends", "install", "chromium", "fonts-dejavu-core") &&
    isThere()
  );
}
