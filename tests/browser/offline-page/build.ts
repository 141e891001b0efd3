import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { build } from "vite";

const ROOT = fileURLToPath(new URL("../../../", import.meta.url));

/** Builds the page with the app's own settings, worker and security policy. */
export async function buildOfflinePage(outDir: string, release: string): Promise<void> {
  await build({
    configFile: join(ROOT, "vite.config.ts"),
    root: join(ROOT, "tests/browser/offline-page"),
    logLevel: "error",
    define: { __RELEASE__: JSON.stringify(release) },
    build: { outDir, emptyOutDir: true },
  });
}
