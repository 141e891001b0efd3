import type { Plugin } from "vite";
import { EXPERTISE } from "./src/facts/expertise.ts";

const ADDRESS_MODULE = "virtual:expertise-address";
const DEV_ADDRESS = "/expertise.json";

/** The reasons and sources beside each row are for those who correct them; the app shows none. */
const withoutReasons = (key: string, value: unknown): unknown =>
  key === "because" || key === "source" ? undefined : value;
const text = (): string => JSON.stringify(EXPERTISE, withoutReasons);

/**
 * Puts what the fault finder knows beside the script as one data file, so that a cold start does not
 * parse it as code, and asks for it together with the script, so that it is there when it is needed.
 */
export function expertise(): Plugin {
  let isBuild = false;
  return {
    name: "expertise",
    configResolved: (config) => {
      isBuild = config.command === "build";
    },
    configureServer: (server) => {
      server.middlewares.use(DEV_ADDRESS, (_request, response) => {
        response.setHeader("content-type", "application/json").end(text());
      });
    },
    resolveId: (id) => (id === ADDRESS_MODULE ? `\0${ADDRESS_MODULE}` : null),
    load(id) {
      if (id !== `\0${ADDRESS_MODULE}`) return null;
      if (!isBuild) return `export const expertiseAddress = "${DEV_ADDRESS}";`;
      const file = this.emitFile({ type: "asset", name: "expertise.json", source: text() });
      return `export const expertiseAddress = import.meta.ROLLUP_FILE_URL_${file};`;
    },
    transformIndexHtml: {
      order: "post",
      handler: (_html, { bundle }) =>
        Object.keys(bundle ?? {})
          .filter((name) => /expertise-.*\.json$/.test(name))
          .map((name) => ({
            tag: "link",
            attrs: { rel: "preload", as: "fetch", crossorigin: "", href: `./${name}` },
            injectTo: "head" as const,
          })),
    },
  };
}
