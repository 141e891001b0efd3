// Draws the PNG icons from public/icons/icon.svg.   npm run icons
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { chromium } from "@playwright/test";
import { chromiumPath } from "./chromium.mjs";

const folder = new URL("../public/icons/", import.meta.url);
const svg = readFileSync(new URL("icon.svg", folder), "utf8");
const GROUND = "#120d09";

/** Share of the square that stays when a launcher cuts a maskable icon to its smallest circle. */
const SAFE_RADIUS = 0.4;
/** The point of the drawing that is farthest from its middle, as a share of the square: an end of the ground line. */
const FARTHEST = Math.hypot(428 + 17 - 256, 428 + 17 - 256) / 512;

const ICONS = [
  { name: "icon-192.png", px: 192, scale: 1, ground: "transparent" },
  { name: "icon-512.png", px: 512, scale: 1, ground: "transparent" },
  { name: "icon-maskable-512.png", px: 512, scale: SAFE_RADIUS / FARTHEST, ground: GROUND },
  // The home screen rounds the corners itself and paints transparent ones black.
  { name: "apple-touch-icon.png", px: 180, scale: 1, ground: GROUND },
];

const browser = await chromium.launch({
  executablePath: chromiumPath(),
  args: ["--no-sandbox", "--force-color-profile=srgb"],
});
try {
  const page = await browser.newPage();
  for (const { name, px, scale, ground } of ICONS) {
    await page.setViewportSize({ width: px, height: px });
    await page.setContent(`<style>
        html { background: ${ground} }
        body { margin: 0; height: 100vh; display: grid; place-items: center }
        svg { width: ${100 * scale}vmin }
      </style>${svg}`);
    await page.screenshot({
      path: fileURLToPath(new URL(name, folder)),
      omitBackground: ground === "transparent",
    });
    console.log(`public/icons/${name}`);
  }
} finally {
  await browser.close();
}
