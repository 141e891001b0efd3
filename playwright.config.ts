import { defineConfig } from "@playwright/test";
import { chromiumPath } from "./scripts/chromium.mjs";

export default defineConfig({
  testDir: "tests/browser",
  testMatch: "**/*.e2e.ts",
  outputDir: "test-results/e2e",
  workers: 1,
  fullyParallel: false,
  forbidOnly: true,
  retries: 0,
  timeout: 60_000,
  expect: { timeout: 15_000 },
  reporter: [["list"], ["json", { outputFile: "test-results/e2e.json" }]],
  use: {
    viewport: { width: 360, height: 740 },
    deviceScaleFactor: 2,
    hasTouch: true,
    locale: "en-GB",
    timezoneId: "UTC",
    trace: "off",
    serviceWorkers: "allow",
    launchOptions: {
      executablePath: chromiumPath(),
      args: [
        "--no-sandbox",
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
      ],
    },
  },
});
