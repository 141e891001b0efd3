/// <reference types="vitest/config" />
import { fileURLToPath } from "node:url";
import { defineConfig, type Plugin } from "vite";
import { VitePWA } from "vite-plugin-pwa";
import { expertise } from "./expertise.plugin.ts";
import { manifest } from "./manifest.config.ts";

/**
 * The policy of the built page. It stands in the page because a static host may not let us set
 * headers; the dev server injects inline styles, so it is added to builds only.
 */
const CONTENT_SECURITY_POLICY = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self'",
  "img-src 'self' blob:",
  "connect-src 'self'",
  "manifest-src 'self'",
  "worker-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "require-trusted-types-for 'script'",
  "trusted-types fadewright-worker",
].join("; ");

const contentSecurityPolicy: Plugin = {
  name: "content-security-policy",
  apply: "build",
  transformIndexHtml: () => [
    {
      tag: "meta",
      attrs: { "http-equiv": "Content-Security-Policy", content: CONTENT_SECURITY_POLICY },
      injectTo: "head-prepend",
    },
  ],
};

export default defineConfig({
  // Relative, so that the built folder works from any sub-path of any static host.
  base: "./",
  // The classic form is smaller: children are arguments, and the runtime of the automatic form stays out.
  oxc: {
    jsx: { runtime: "classic", pragma: "h", pragmaFrag: "Fragment" },
    jsxInject: 'import { h, Fragment } from "preact";',
  },
  // The package names its build for old browsers first, which is 1 kB larger.
  resolve: { alias: { "workbox-window": "workbox-window/build/workbox-window.prod.mjs" } },
  build: {
    target: ["chrome111", "safari16.4", "firefox115"],
    modulePreload: { polyfill: false },
    assetsInlineLimit: 0,
    reportCompressedSize: false,
    // A fiftieth smaller than the built-in minifier's output.
    minify: "terser",
    terserOptions: { ecma: 2020, module: true, compress: { passes: 3, keep_fargs: false } },
  },
  plugins: [
    contentSecurityPolicy,
    expertise(),
    VitePWA({
      strategies: "injectManifest",
      // Absolute: the browser tests build a page of their own with this worker and these settings.
      srcDir: fileURLToPath(new URL("sw", import.meta.url)),
      filename: "sw.ts",
      injectRegister: false,
      includeManifestIcons: false,
      manifest,
      integration: {
        configureCustomSWViteBuild: (worker) => {
          worker.logLevel = "warn";
        },
      },
      // The manifest is not named here: the plugin adds it by itself, and would twice.
      injectManifest: {
        rollupFormat: "iife",
        globPatterns: ["**/*.{html,js,css,json,svg,png}"],
      },
    }),
  ],
  test: {
    environment: "node",
    include: ["tests/**/*.test.{ts,tsx}"],
    setupFiles: ["tests/setup.ts"],
    reporters: ["default", "json"],
    outputFile: { json: "test-results/unit.json" },
    env: { TZ: "UTC", LC_ALL: "C" },
  },
});
