import { existsSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { ROOT } from "../architecture/tree.ts";
import { addressOffences } from "./addresses.ts";
import { type BuiltFile, gzipKb, overBudget, readBuilt, textOf } from "./built.ts";
import limits from "./limits.json" with { type: "json" };
import { linkOffences, manifestOffences, readManifest } from "./manifest.ts";
import { chunkOffences, inlineOffences, policyOffences } from "./page.ts";
import { precacheOffences } from "./precache.ts";

const file = (path: string, content: string | Buffer = "x"): BuiltFile => ({
  path,
  bytes: Buffer.from(content as string),
});

/** The head of a PNG file, which is all that is read. */
function png(width: number, height: number): Buffer {
  const bytes = Buffer.alloc(32);
  bytes.write("\x89PNG\r\n\x1a\n", "latin1");
  bytes.writeUInt32BE(width, 16);
  bytes.writeUInt32BE(height, 20);
  return bytes;
}

const POLICY = `<meta http-equiv="Content-Security-Policy" content="default-src 'none'; script-src 'self'; img-src 'self' blob:; base-uri 'none'; form-action 'none'; trusted-types worker">`;
const PAGE = `<!doctype html><html><head>${POLICY}<meta charset="utf-8">
  <link rel="manifest" href="./manifest.webmanifest">
  <link rel="apple-touch-icon" href="./icons/touch.png">
  <script src="./theme.js"></script>
  <script type="module" src="./assets/index-a1.js"></script>
  <link rel="stylesheet" href="./assets/index-b2.css"></head><body></body></html>`;
const ICON = { src: "icons/192.png", sizes: "192x192", type: "image/png" };
const BIG_ICON = { src: "icons/512.png", sizes: "512x512", type: "image/png" };
const MASKABLE = { ...BIG_ICON, purpose: "maskable" };
const MANIFEST = {
  id: "app",
  name: "App",
  start_url: "./",
  scope: "./",
  icons: [ICON, BIG_ICON, MASKABLE, { src: "icons/a.svg", sizes: "any", type: "image/svg+xml" }],
  shortcuts: [{ name: "Mark", url: "./#/mark" }],
};
const APP = [
  file("index.html", PAGE),
  file("assets/index-a1.js"),
  file("assets/index-b2.css"),
  file("theme.js"),
  file("icons/192.png", png(192, 192)),
  file("icons/512.png", png(512, 512)),
  file("icons/touch.png", png(180, 180)),
  file("icons/a.svg"),
  file("manifest.webmanifest", JSON.stringify(MANIFEST)),
];
const workerOf = (paths: readonly string[]) =>
  `const kept=[${paths.map((path) => `{"revision":null,url:"${path}"}`).join(",")}];use(kept)`;
const WORKER = workerOf(APP.map(({ path }) => path));

describe("the budget, on made-up files", () => {
  const kb = ({ bytes }: BuiltFile) => bytes.length / 1000;

  it("lets files up to the limit through and names each of them above it", () => {
    const files = [file("a.js", "x".repeat(1000)), file("b.js", "x".repeat(2000))];
    expect(overBudget(files, 3, kb)).toBeNull();
    expect(overBudget(files, 2.99, kb)).toBe("3.00 kB, at most 2.99: b.js 2.00, a.js 1.00");
  });

  it("fails when it weighs no file", () => {
    expect(overBudget([], 3, kb)).toBe("no file to weigh");
  });
});

describe("the checks of the built page, on made-up pages", () => {
  it("let a good page through", () => {
    expect(chunkOffences(PAGE, APP)).toEqual([]);
    expect(inlineOffences(PAGE)).toEqual([]);
    expect(policyOffences(PAGE)).toEqual([]);
    expect(linkOffences(PAGE, APP)).toEqual([]);
  });

  it("find a second chunk, and take a worker for none", () => {
    const more = [...APP, file("sw.js"), file("assets/forecast-worker-c3.js")];
    expect(chunkOffences(PAGE, more)).toEqual([]);
    expect(chunkOffences(PAGE, [...more, file("assets/lazy-d4.js")])).toEqual([
      "assets/lazy-d4.js is a second chunk",
    ]);
    expect(chunkOffences(PAGE, [...more, file("assets/lazy-d4.css")])).toHaveLength(1);
  });

  it("find a script or stylesheet that is missing", () => {
    const without = (ending: string) => APP.filter(({ path }) => !path.endsWith(ending));
    expect(chunkOffences(PAGE, without("a1.js"))).toHaveLength(1);
    expect(chunkOffences(PAGE, without(".css"))).toHaveLength(1);
    const page = PAGE.replace(/<link rel="stylesheet"[^>]*>/, "");
    expect(chunkOffences(page, without(".css"))).toContain("index.html loads 0 stylesheets");
  });

  it.each([
    ["<script>go()</script>", "an inline script"],
    [`<script src="./a.js">go()</script>`, "an inline script"],
    ["<style>a{}</style>", "an inline stylesheet"],
    [`<p style="color:red">a</p>`, `style="color:red"`],
    [`<p onclick="go()">a</p>`, `onclick="go()"`],
    [`<a href="javascript:go()">a</a>`, `href="javascript:go()"`],
  ])("find %s", (html, offence) => {
    expect(inlineOffences(PAGE.replace("<body>", `<body>${html}`))).toEqual([offence]);
  });

  it.each([
    [PAGE.replace(POLICY, ""), "the policy is not first in the head"],
    [PAGE.replace(POLICY, `<title>a</title>${POLICY}`), "the policy is not first in the head"],
    [PAGE.replace("base-uri 'none'", "img-src 'self'"), "the policy lacks base-uri"],
    [
      PAGE.replace("script-src 'self'", "script-src 'self' https://cdn.test"),
      "the policy allows script-src https://cdn.test",
    ],
    [
      PAGE.replace("script-src 'self'", "script-src 'unsafe-inline'"),
      "the policy allows script-src 'unsafe-inline'",
    ],
    [PAGE.replace("img-src 'self'", "img-src *"), "the policy allows img-src *"],
  ])("find a weak policy (%#)", (html, offence) => {
    expect(policyOffences(html)).toEqual([offence]);
  });

  it("find a missing or wrong icon of the home screen, and a missing manifest", () => {
    const small = APP.map((one) =>
      one.path === "icons/touch.png" ? file(one.path, png(9, 9)) : one,
    );
    expect(linkOffences(PAGE, small)).toEqual(["icons/touch.png is not 180x180"]);
    expect(linkOffences(PAGE.replaceAll("<link", "<i"), APP)).toHaveLength(2);
  });
});

describe("the checks of the manifest, on made-up manifests", () => {
  it("let a good manifest through", () => {
    expect(manifestOffences(MANIFEST, APP)).toEqual([]);
  });

  it.each([
    [{ ...MANIFEST, id: "" }, "the manifest lacks id"],
    [{ ...MANIFEST, start_url: "/" }, "/ is not relative"],
    [{ ...MANIFEST, scope: "https://a.test/" }, "https://a.test/ is not relative"],
    [{ ...MANIFEST, shortcuts: [] }, "the manifest lacks shortcuts"],
    [{ ...MANIFEST, shortcuts: [{ name: "A", url: "/#/a" }] }, "/#/a is not relative"],
    [{ ...MANIFEST, icons: [ICON, BIG_ICON] }, "no maskable icon"],
    [{ ...MANIFEST, icons: [ICON, MASKABLE] }, "no icon of 512x512"],
    [
      { ...MANIFEST, icons: [...MANIFEST.icons, { ...ICON, src: "icons/512.png" }] },
      "icons/512.png is 512x512, not 192x192",
    ],
    [
      { ...MANIFEST, icons: [...MANIFEST.icons, { ...ICON, src: "icons/none.png" }] },
      "icons/none.png is not there",
    ],
  ])("find what is wrong (%#)", (manifest, offence) => {
    expect(manifestOffences(manifest, APP)).toEqual([offence]);
  });

  it("refuse a file that only claims to be a PNG", () => {
    const fake = [...APP.filter(({ path }) => path !== ICON.src), file(ICON.src, "<svg/>")];
    expect(() => manifestOffences(MANIFEST, fake)).toThrow("not a PNG");
  });
});

describe("the checks of the service worker and the addresses, on made-up files", () => {
  it("let a full list through", () => {
    expect(precacheOffences(WORKER, [...APP, file("sw.js", WORKER)])).toEqual([]);
  });

  it("find a file that is left out, one that is not there, and one that is listed twice", () => {
    expect(precacheOffences(WORKER, [...APP, file("late.js")])).toEqual([
      "late.js is not precached",
    ]);
    expect(precacheOffences(WORKER, APP.slice(1))).toEqual(["index.html is not there"]);
    const twice = workerOf([...APP, file("theme.js")].map(({ path }) => path));
    expect(precacheOffences(twice, APP)).toEqual(["theme.js is precached twice"]);
  });

  it("find every file when the worker has no list", () => {
    expect(precacheOffences("self.skipWaiting()", APP)).toHaveLength(APP.length);
  });

  it("find an address of another host, and let a namespace through", () => {
    expect(addressOffences([file("a.svg", `<svg xmlns="http://www.w3.org/2000/svg"/>`)])).toEqual(
      [],
    );
    expect(
      addressOffences([file("a.js", 'fetch("https://a.test/b?c");go("wss://d.test")')]),
    ).toEqual(["a.js names https://a.test/b?c", "a.js names wss://d.test"]);
  });
});

describe("the built app", () => {
  const folder = join(ROOT, "dist");
  const built = existsSync(folder) ? readBuilt(folder) : [];
  const ending = (suffix: string) => built.filter(({ path }) => path.endsWith(suffix));
  const page = () => textOf(built, "index.html");
  const worker = () => textOf(built, "sw.js");

  it("is there", () => {
    expect(built.length, 'no dist/: run "npm run build" first').toBeGreaterThan(0);
  });

  it("keeps to the budget of all its JavaScript, workers included", () => {
    expect(overBudget(ending(".js"), limits.javascriptGzipKb, gzipKb)).toBeNull();
  });

  it("keeps to the budgets of stylesheet and page", () => {
    expect(overBudget(ending(".css"), limits.stylesGzipKb, gzipKb)).toBeNull();
    expect(overBudget(ending(".html"), limits.pageGzipKb, gzipKb)).toBeNull();
  });

  it("keeps to the budget of all that is stored for use without network", () => {
    const kept = built.filter(({ path }) => path !== "sw.js");
    expect(overBudget(kept, limits.precacheKb, ({ bytes }) => bytes.length / 1000)).toBeNull();
  });

  it("is one script and one stylesheet", () => {
    expect(chunkOffences(page(), built)).toEqual([]);
  });

  it("holds nothing inline, and a policy that comes first and admits no other origin", () => {
    expect(inlineOffences(page())).toEqual([]);
    expect(policyOffences(page())).toEqual([]);
  });

  it("can be installed, from any sub-path", () => {
    expect(manifestOffences(readManifest(built), built)).toEqual([]);
    expect(linkOffences(page(), built)).toEqual([]);
    expect(page()).not.toMatch(/(?:src|href)="\//);
  });

  it("has every file in the list of its service worker", () => {
    expect(precacheOffences(worker(), built)).toEqual([]);
  });

  it("names no web address", () => {
    expect(ending(".js").length).toBeGreaterThan(0);
    expect(addressOffences(built)).toEqual([]);
  });
});
