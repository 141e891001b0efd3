import { AxeBuilder } from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { expect, test } from "./fixtures.ts";
import { addLink, answerFirst, goTo, mark, openShow } from "./steps.ts";

const THEMES = ["blackout", "daylight", "deep-red"] as const;

/** Leads to each screen in turn, with something on it, and lets a test look. */
async function everyScreen(
  page: Page,
  url: string,
  look: (name: string) => Promise<void>,
): Promise<void> {
  await page.goto(`${url}/#/fault`);
  await expect(page.getByRole("link", { name: "Name the show first" })).toBeVisible();
  await look("fault-empty");
  await goTo(page, "Log");
  await look("log-empty");
  await page.getByRole("link", { name: "No show open" }).click();
  await look("show-empty");
  await goTo(page, "Rig");
  await look("rig-empty");
  await openShow(page);
  await look("show");
  await addLink(page);
  await look("rig");
  await mark(page);
  await look("trace-fresh");
  await answerFirst(page);
  await answerFirst(page);
  await page.locator(".unfold summary").first().click();
  await look("trace");
  await page.getByRole("link", { name: "Something else" }).click();
  await look("steps");
  await page.goBack();
  await page.getByRole("link", { name: "Links and place" }).click();
  await look("marks");
  await page.getByRole("link", { name: "Done" }).click();
  await page.getByRole("link", { name: "It's cured" }).click();
  await look("close");
  await goTo(page, "Fault");
  await look("fault");
  await goTo(page, "Calculators");
  await look("calculators");
  await page.getByRole("link", { name: /Distance and level/ }).click();
  await look("distance");
  await page.getByLabel("From (m)").fill("zero");
  await look("distance-problem");
  await goTo(page, "Log");
  await look("log");
  await page.getByRole("link", { name: "Settings", exact: true }).click();
  await expect(page.getByText("used on this phone")).toBeVisible();
  await look("settings");
  await page.getByRole("link", { name: "Cautions" }).click();
  await look("cautions");
}

/** Mean relative luminance of a picture, by the formula of WCAG 2.2. */
async function meanLuminance(page: Page): Promise<number> {
  const picture = (await page.screenshot()).toString("base64");
  // Reckoned on a blank page: the app's own policy allows no such picture.
  const blank = await page.context().newPage();
  const mean = await blank.evaluate(async (source) => {
    const image = new Image();
    image.src = `data:image/png;base64,${source}`;
    await image.decode();
    const canvas = new OffscreenCanvas(image.width, image.height);
    const brush = canvas.getContext("2d");
    if (!brush) throw new Error("no canvas");
    brush.drawImage(image, 0, 0);
    const { data } = brush.getImageData(0, 0, image.width, image.height);
    const linear = Array.from({ length: 256 }, (_, level) => {
      const share = level / 255;
      return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
    });
    let sum = 0;
    for (let at = 0; at < data.length; at += 4)
      sum +=
        0.2126 * (linear[data[at] ?? 0] ?? 0) +
        0.7152 * (linear[data[at + 1] ?? 0] ?? 0) +
        0.0722 * (linear[data[at + 2] ?? 0] ?? 0);
    return sum / (data.length / 4);
  }, picture);
  await blank.close();
  return mean;
}

for (const theme of THEMES)
  test(`axe finds nothing on any screen in the theme ${theme}`, async ({ page, site }, info) => {
    await page.addInitScript((chosen) => {
      localStorage.setItem("fadewright.theme", chosen);
    }, theme);
    const found: string[] = [];
    let count = 0;
    await everyScreen(page, site.url, async (name) => {
      count += 1;
      await page.screenshot({ path: info.outputPath(`${name}.png`) });
      // As tall as its content: what lies half under the dock until it is scrolled is not too small.
      const height = await page.evaluate(() => document.documentElement.scrollHeight);
      await page.setViewportSize({ width: 360, height });
      const { violations } = await new AxeBuilder({ page })
        .withTags(["wcag2a", "wcag2aa", "wcag21a", "wcag21aa", "wcag22aa", "best-practice"])
        .analyze();
      for (const { id, nodes } of violations)
        found.push(`${name}: ${id}: ${nodes.map(({ html }) => html).join(" | ")}`);
      await page.setViewportSize({ width: 360, height: 740 });
    });
    expect(found).toEqual([]);
    expect(count).toBeGreaterThanOrEqual(18);
  });

test("spills no light in the default theme, on any screen", async ({ page, site }) => {
  const bright: string[] = [];
  await everyScreen(page, site.url, async (name) => {
    const mean = await meanLuminance(page);
    if (!(mean <= 0.03)) bright.push(`${name}: ${mean.toFixed(4)}`);
  });
  expect(bright).toEqual([]);
});

test("every target takes a thumb: 48 px and 8 px from its neighbour, upright, narrow and lying", async ({
  page,
  site,
}) => {
  const wrong: string[] = [];
  for (const viewport of [
    { width: 360, height: 740 },
    { width: 320, height: 568 },
    { width: 740, height: 360 },
  ]) {
    await page.setViewportSize(viewport);
    await page.context().clearCookies();
    await everyScreen(page, site.url, async (name) => {
      wrong.push(
        ...(await page.evaluate((screen) => {
          const problems: string[] = [];
          // Links inside a sentence are exempt (WCAG 2.2, 2.5.8, exception "inline").
          const targets = [
            ...document.querySelectorAll<HTMLElement>(
              "button, a.button, input:not([type=radio]), .segment span, select, textarea, summary, nav a",
            ),
          ];
          const boxes = targets.map((target) => ({
            text: target.textContent || target.id,
            box: target.getBoundingClientRect(),
            isDocked: target.closest(".dock") !== null,
          }));
          for (const { text, box } of boxes)
            if (box.width < 47.5 || box.height < 47.5)
              problems.push(`${screen}: ${text}: ${box.width} x ${box.height}`);
          boxes.forEach((a, index) => {
            for (const b of boxes.slice(index + 1)) {
              // The dock floats over what is scrolled beneath it.
              if (a.isDocked !== b.isDocked) continue;
              const across = Math.max(a.box.left, b.box.left) - Math.min(a.box.right, b.box.right);
              const down = Math.max(a.box.top, b.box.top) - Math.min(a.box.bottom, b.box.bottom);
              if (Math.max(across, down) < 7.5)
                problems.push(`${screen}: ${a.text} / ${b.text}: ${Math.max(across, down)} px`);
            }
          });
          for (const { text, box } of boxes)
            if (box.right > innerWidth + 0.5 || box.left < -0.5)
              problems.push(`${screen}: ${text} reaches beyond the screen`);
          if (document.documentElement.scrollWidth > innerWidth)
            problems.push(`${screen}: wider than the screen`);
          return problems;
        }, `${viewport.width} ${name}`)),
      );
    });
    await page.evaluate(async () => {
      for (const { name } of await indexedDB.databases()) if (name) indexedDB.deleteDatabase(name);
      localStorage.clear();
    });
    await page.goto("about:blank");
  }
  expect(wrong).toEqual([]);
});

test("a calculator is one screen without scrolling at 360x640", async ({ page, site }) => {
  await page.setViewportSize({ width: 360, height: 640 });
  await page.goto(`${site.url}/#/calculators/distance`);
  await expect(page.locator(".picture")).toBeVisible();
  expect(await page.evaluate(() => document.documentElement.scrollHeight)).toBeLessThanOrEqual(640);
});

test("the chosen theme stands before anything is drawn, without a white flash", async ({
  page,
  site,
}) => {
  await page.addInitScript(() => localStorage.setItem("fadewright.theme", "deep-red"));
  // The page without its script chunk: what the first paint is made of.
  await page.route(/assets\/index-.*\.js$/, (route) => route.abort());
  await page.goto(site.url);
  await expect(page.locator("html")).toHaveAttribute("data-theme", "deep-red");
  await expect(page.getByText("Reading the log")).toBeVisible();
  expect(await meanLuminance(page)).toBeLessThanOrEqual(0.03);
});

test("text at twice its size loses nothing at 320 px", async ({ page, site }) => {
  await page.setViewportSize({ width: 320, height: 568 });
  await page.goto(site.url);
  await page.evaluate(() => {
    document.documentElement.style.fontSize = "34px";
  });
  for (const place of ["Fault", "Calculators", "Rig", "Log"] as const) {
    await goTo(page, place);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBeLessThanOrEqual(
      320,
    );
  }
  await expect(page.getByRole("button", { name: "Mark dropout" })).toBeInViewport();
});
