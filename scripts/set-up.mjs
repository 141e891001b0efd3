import { spawnSync } from "node:child_process";
import { existsSync, readdirSync, statSync } from "node:fs";
import { join } from "node:path";
import { fileURLToPath } from "node:url";

export const ROOT = fileURLToPath(new URL("..", import.meta.url));

const BUILT_FROM = [
  "src",
  "sw",
  "shared",
  "public",
  "index.html",
  "vite.config.ts",
  "manifest.config.ts",
  "expertise.plugin.ts",
  "package-lock.json",
];
/** The build writes the service worker last. */
const LAST_BUILT = "dist/sw.js";
/** npm writes its record of what is installed when it has done so. */
const INSTALLED = "node_modules/.package-lock.json";

/** Runs a program in the project, without input. @returns Whether it ended well. */
export function run(program, ...options) {
  const { status, error } = spawnSync(program, options, {
    cwd: ROOT,
    stdio: ["ignore", "inherit", "inherit"],
    // No package of the system may ask questions: there is nobody to answer.
    env: { ...process.env, DEBIAN_FRONTEND: "noninteractive" },
    // npm is a batch file on Windows, which only a shell starts.
    shell: process.platform === "win32",
  });
  if (error) throw error;
  return status === 0;
}

/** Installs the packages of the lock file, unless they are there. @returns Whether they are. */
export const setUpPackages = () =>
  newest(INSTALLED) >= newest("package-lock.json") || run("npm", "ci");

/** Builds the app, unless it is newer than everything it is built from. @returns Whether it is there. */
export const setUpBuild = () =>
  newest(LAST_BUILT) >= Math.max(...BUILT_FROM.map(newest)) || run("npm", "run", "-s", "build");

/** Time of the latest change to a file, or to anything in a folder; 0 if there is none. [ms] */
function newest(path) {
  const place = join(ROOT, path);
  if (!existsSync(place)) return 0;
  const stats = statSync(place);
  if (!stats.isDirectory()) return stats.mtimeMs;
  return Math.max(stats.mtimeMs, ...readdirSync(place).map((name) => newest(join(path, name))));
}
