// Takes the pictures of the README from the built app, with an invented show.   npm run screenshots
import { mkdirSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { chromium } from "@playwright/test";
import { chromiumPath } from "./chromium.mjs";
import { createStaticServer } from "./static-server.mjs";

const projectFile = (path) => fileURLToPath(new URL(`../${path}`, import.meta.url));
const OUTPUT = projectFile("docs/screens/");
/** An evening like any other, so that two runs give the same pictures. */
const START = new Date("2026-05-16T19:31:00Z");

const LINKS = [
  { name: "Mayor", frequencyMhz: "518.4" },
  { name: "Narrator", frequencyMhz: "521.15" },
  { name: "Old sailor", frequencyMhz: "524.9" },
];
/** What the invented technician would say to the first few questions, whichever of these come. */
const ANSWERS = [
  "Only one",
  "Hiss, buzz or hash",
  "At some spots or movements",
  "All fell",
  "Which way they face",
  "Pack with microphone",
  "No, another band",
  "Still dropping out",
];
const CANT_TELL = "Can't tell";

const server = createStaticServer(projectFile("dist"));
await server.start(0);
const browser = await chromium.launch({ executablePath: chromiumPath(), args: ["--no-sandbox"] });
try {
  const context = await browser.newContext({
    viewport: { width: 390, height: 844 },
    deviceScaleFactor: 2,
    isMobile: true,
    hasTouch: true,
    locale: "en-GB",
    timezoneId: "UTC",
    reducedMotion: "reduce",
    // The pictures are of the app as it was just built.
    serviceWorkers: "block",
  });
  const page = await context.newPage();
  await page.clock.install({ time: START });
  page.setDefaultTimeout(10_000);
  mkdirSync(OUTPUT, { recursive: true });

  await open(page, "#/show");
  await page.fill("#show-name", "The Tide Comes In");
  await page.fill("#show-place", "Old Rope Works");
  await page.click('main button[type="submit"]');
  await later(page, 180);

  await open(page, "#/rig");
  for (const { name, frequencyMhz } of LINKS) {
    await page.fill("#link-name", name);
    await page.fill("#link-frequency", frequencyMhz);
    await page.getByRole("radio", { name: "Bodypack" }).check();
    await page.click('main button[type="submit"]');
    await page.getByText(name, { exact: true }).waitFor();
  }

  await open(page, "#/fault");
  await page.getByRole("radio", { name: "Between" }).check();
  await later(page, 420);
  await page.click(".dock button.main");
  await page.waitForURL(/#\/fault\/./);
  await later(page, 95);
  await page.click(".dock button.main");
  for (let step = 0; step < 4; step += 1) await answer(page);
  await picture(page, "fault");

  await open(page, "#/calculators/distance");
  await picture(page, "calculator");
  await page.click(".dock-actions button:not(.main)");
  await later(page, 60);

  await open(page, "#/log");
  await picture(page, "log");
} finally {
  await browser.close();
  await server.stop();
}

async function open(page, place) {
  await page.goto(server.url + place);
  await page.locator(".places").waitFor();
  await page.locator("main").waitFor();
}

/** Gives the wall clock of the page some seconds. */
async function later(page, seconds) {
  await page.clock.fastForward(seconds * 1000);
}

async function answer(page) {
  await later(page, 20);
  const labels = await page.locator(".answers button").allTextContents();
  const label = labels.find((one) => ANSWERS.includes(one)) ?? CANT_TELL;
  const asked = await page.locator("h2.question").textContent();
  await page.locator("main").getByRole("button", { name: label, exact: true }).click();
  await page.waitForFunction(
    (before) => document.querySelector("h2.question")?.textContent !== before,
    asked,
  );
}

async function picture(page, name) {
  await page.evaluate(() => scrollTo(0, 0));
  await page.screenshot({ path: `${OUTPUT}${name}.png`, animations: "disabled" });
  console.log(`docs/screens/${name}.png`);
}
