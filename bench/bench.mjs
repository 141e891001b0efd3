import { existsSync, rmSync } from "node:fs";
import { cpus, loadavg } from "node:os";
import { fileURLToPath } from "node:url";
import { parseArgs } from "node:util";
import { chromiumPath } from "../scripts/chromium.mjs";
import { compare, freshFolder, prepare } from "./cold-start.mjs";
import { buildFloor } from "./floor.mjs";
import { median, pairRatio, quantile } from "./statistics.mjs";

const HELP = `npm run bench -- [options]
Times the start of the built app without network beside an empty page of the same kind.

  --runs N          starts that count, for each page and rate (9)
  --throttle 1,4    by how much the page's main thread is slowed (1,4)
  --app FOLDER      the built app (dist)
  --itself          the empty page against itself: how much of a difference is noise
  --help`;

const projectFile = (path) => fileURLToPath(new URL(`../${path}`, import.meta.url));

const { values: options } = parseArgs({
  options: {
    runs: { type: "string", default: "9" },
    throttle: { type: "string", default: "1,4" },
    app: { type: "string", default: projectFile("dist") },
    itself: { type: "boolean", default: false },
    help: { type: "boolean", default: false },
  },
});
if (options.help) {
  console.log(HELP);
  process.exit(0);
}

const runs = Number(options.runs);
const rates = options.throttle.split(",").map(Number);
if (!Number.isInteger(runs) || runs < 1) throw new RangeError(`--runs: got ${options.runs}`);
if (!rates.every((rate) => rate >= 1)) throw new RangeError(`--throttle: got ${options.throttle}`);

const FLOOR = {
  name: "floor",
  folder: projectFile("bench-results/floor"),
  ready: "button",
  tap: "button",
  effect: 'button:not([data-taps="0"])',
};
const CALCULATORS = '.places a[href="#/calculators"]';
/** `ready` matches only what the app itself has drawn, not the still picture in index.html. */
const APP = {
  name: "app",
  folder: options.app,
  ready: ".places [aria-current]",
  tap: CALCULATORS,
  effect: `${CALCULATORS}[aria-current]`,
};

const ours = options.itself ? { ...FLOOR, name: "floor again" } : APP;
if (!options.itself && !existsSync(`${ours.folder}/index.html`)) {
  throw new Error(`no built app in ${ours.folder}; run "npm run build" first`);
}

console.log(`Cold start without network, ${ours.name} beside floor. In ms from the navigation's start.
Each start: new browser process, copy of a profile in which the page is installed, server stopped.
The browser's own start is left out. The throttle slows the page's main thread, not the worker.
A "tap" is a click made by script, once for each frame until it takes effect.
"ratio" is the median over pairs of neighbouring starts. On a busy machine trust it, not the ms.
${cpus().length} cores, load ${loadavg()[0].toFixed(1)}, ${runs} counted starts of each page and rate, after one that is not.
`);

await buildFloor(FLOOR.folder);
const workFolder = freshFolder(projectFile("bench-results/profiles"));
try {
  const executable = chromiumPath();
  const pages = [
    await prepare(executable, ours, workFolder),
    await prepare(executable, FLOOR, workFolder),
  ];
  for (const throttle of rates) {
    const [a, b] = await compare(executable, pages, { runs, throttle, workFolder });
    print(throttle, a, b);
  }
} finally {
  rmSync(workFolder, { recursive: true, force: true, maxRetries: 5, retryDelay: 200 });
}

function print(throttle, a, b) {
  const words = ["median", "quartiles", "min"].map((word) => word.padStart(12)).join("");
  const names = [ours.name, FLOOR.name].map((name) => name.padStart(36)).join("");
  console.log(
    `${`CPU ${throttle}x`.padEnd(14)}${names}    ratio\n${"".padEnd(14)}${words}${words}`,
  );
  for (const metric of ["paint", "ready", "tap", "interactive"]) {
    const [mine, theirs] = [a, b].map((times) => times.map((one) => one[metric]));
    const ratio = pairRatio(mine, theirs).toFixed(2).padStart(9);
    console.log(metric.padEnd(14) + columns(mine) + columns(theirs) + ratio);
  }
  console.log("");
}

function columns(samples) {
  const [low, high] = [0.25, 0.75].map((share) => quantile(samples, share).toFixed(0));
  const cells = [median(samples).toFixed(0), `${low}..${high}`, Math.min(...samples).toFixed(0)];
  return cells.map((cell) => cell.padStart(12)).join("");
}
