import { posix } from "node:path";
import { Window } from "happy-dom";
import type { BuiltFile } from "./built.ts";

const RUNS_AT_ONCE = "theme.js";
const POLICY = "Content-Security-Policy";

export function parsePage(html: string) {
  const window = new Window({
    url: "http://localhost/",
    // A page that is only looked at asks for nothing; the library would follow its preload links.
    settings: {
      fetch: {
        interceptor: {
          beforeAsyncRequest: async ({ window: { Response } }) => new Response(""),
        },
      },
    },
  });
  return new window.DOMParser().parseFromString(html, "text/html");
}

/** Addresses of the scripts and stylesheets that a page loads, in order. */
function loadedBy(html: string): { scripts: string[]; styles: string[] } {
  const page = parsePage(html);
  const addresses = (selector: string, name: string) =>
    [...page.querySelectorAll(selector)].map((one) =>
      posix.normalize(one.getAttribute(name) ?? ""),
    );
  return {
    scripts: addresses("script[src]", "src"),
    styles: addresses('link[rel="stylesheet"]', "href"),
  };
}

/** Whatever keeps the app from being one script (and the one that sets the theme) and one stylesheet. */
export function chunkOffences(html: string, files: readonly BuiltFile[]): string[] {
  const { scripts, styles } = loadedBy(html);
  const app = scripts.filter((path) => path !== RUNS_AT_ONCE);
  const [script = "", style = ""] = [app[0], styles[0]];
  const built = (ending: string) =>
    files.map(({ path }) => path).filter((path) => path.endsWith(ending));
  // Workers are built from files named …-worker.ts; sw.js is the service worker.
  const isWorker = (path: string) => /^(sw\.js|assets\/[\w-]*-worker-[\w-]+\.js)$/.test(path);
  const known = [script, style, RUNS_AT_ONCE];
  const others = [...built(".js"), ...built(".css")].filter(
    (path) => !known.includes(path) && !isWorker(path),
  );
  return [
    ...(app.length === 1 ? [] : [`index.html loads ${app.length} app scripts`]),
    ...(styles.length === 1 ? [] : [`index.html loads ${styles.length} stylesheets`]),
    ...[script, style]
      .filter((path) => !files.some((file) => file.path === path))
      .map((path) => `index.html loads "${path}", which is not there`),
    ...others.map((path) => `${path} is a second chunk`),
  ];
}

/** Whatever a strict policy would refuse, or an attacker could use. */
export function inlineOffences(html: string): string[] {
  const page = parsePage(html);
  const offences = [
    ...[...page.querySelectorAll("script")]
      .filter((one) => !one.hasAttribute("src") || one.textContent.trim() !== "")
      .map(() => "an inline script"),
    ...[...page.querySelectorAll("style")].map(() => "an inline stylesheet"),
  ];
  for (const element of page.querySelectorAll("*")) {
    for (const { name, value } of element.attributes) {
      const isHandler = name.startsWith("on");
      const isAddress = /^\s*(javascript|data):/i.test(value ?? "");
      if (isHandler || name === "style" || isAddress) offences.push(`${name}="${value}"`);
    }
  }
  return offences;
}

/** Whatever is wrong with the policy in the page: not first, or open to another origin. */
export function policyOffences(html: string): string[] {
  const first = parsePage(html).head.firstElementChild;
  if (first?.getAttribute("http-equiv") !== POLICY) return ["the policy is not first in the head"];
  const directives = (first.getAttribute("content") ?? "")
    .split(";")
    .map((directive) => directive.trim().split(/\s+/))
    .filter(([name]) => name !== "trusted-types" && name !== "require-trusted-types-for");
  const names = directives.map(([name]) => name);
  return [
    ...["default-src", "script-src", "base-uri", "form-action"]
      .filter((name) => !names.includes(name))
      .map((name) => `the policy lacks ${name}`),
    ...directives.flatMap(([name, ...sources]) =>
      sources
        .filter((source) => !["'self'", "'none'", "blob:"].includes(source))
        .map((source) => `the policy allows ${name} ${source}`),
    ),
  ];
}
