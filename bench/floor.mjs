import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { build } from "vite";

const SOURCE = fileURLToPath(new URL("./floor/", import.meta.url));

/** Builds the empty page into a folder, with the settings that the app is built with. */
export async function buildFloor(outDir) {
  await build({
    configFile: false,
    root: SOURCE,
    base: "./",
    logLevel: "error",
    oxc: { jsx: { runtime: "automatic", importSource: "preact" } },
    build: {
      outDir,
      emptyOutDir: true,
      target: ["chrome111", "safari16.4", "firefox115"],
      modulePreload: { polyfill: false },
      assetsInlineLimit: 0,
      reportCompressedSize: false,
    },
    plugins: [precachingWorker],
  });
}

const precachingWorker = {
  name: "precaching-worker",
  enforce: "post",
  generateBundle(_options, bundle) {
    const files = Object.keys(bundle).map((name) => `./${name}`);
    const source = readFileSync(`${SOURCE}sw.js`, "utf8");
    this.emitFile({
      type: "asset",
      fileName: "sw.js",
      source: source.replace("addAll(FILES)", `addAll(${JSON.stringify(files)})`),
    });
  },
};
