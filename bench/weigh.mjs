import { gzipSync } from "node:zlib";
import { build } from "vite";

/** What the app takes from each runtime dependency. */
const USES = {
  preact: `export { render } from "preact";
    export { useEffect, useRef } from "preact/hooks";
    export { Fragment, h } from "preact";`,
  "@preact/signals": `export { batch, computed, effect, signal, untracked } from "@preact/signals";`,
  idb: `export { openDB } from "idb";`,
  "zod/mini": `import * as z from "zod/mini";
    export const uses = [z.custom, z.object];`,
  "workbox-window": `export { messageSW, Workbox } from "workbox-window";`,
  uuid: `export { v7 } from "uuid";`,
};

console.log(
  "Each dependency bundled alone as the app uses it, minified, gzip -9. Preact is counted once.",
);
for (const [name, entry] of Object.entries(USES)) {
  const code = await bundle(entry, name === "preact" ? [] : [/^preact/]);
  const kB = (gzipSync(code, { level: 9 }).length / 1000).toFixed(1);
  console.log(
    `${name.padEnd(16)}${kB.padStart(6)} kB gzip${String(code.length).padStart(9)} bytes`,
  );
}

async function bundle(entry, external) {
  const result = await build({
    configFile: false,
    logLevel: "error",
    build: {
      write: false,
      target: ["chrome111", "safari16.4", "firefox115"],
      modulePreload: false,
      reportCompressedSize: false,
      rolldownOptions: { input: "virtual:uses", external, preserveEntrySignatures: "strict" },
    },
    plugins: [
      {
        name: "uses",
        enforce: "pre",
        resolveId: (id) => (id === "virtual:uses" ? "\0uses" : null),
        load: (id) => (id === "\0uses" ? entry : null),
      },
    ],
  });
  return Buffer.from(result.output[0].code);
}
