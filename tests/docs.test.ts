import { existsSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { headingsOf, sectionOf, tableOf } from "./architecture/markdown.ts";
import { ROOT, readText } from "./architecture/tree.ts";
import limits from "./build/limits.json" with { type: "json" };

const readme = readText("README.md");
const developers = readText("DEVELOPERS.md");
const packed = JSON.parse(readText("package.json")) as {
  readonly scripts: Readonly<Record<string, string>>;
  readonly dependencies: Readonly<Record<string, string>>;
};

/** What a build or a test leaves behind, as .gitignore names it. */
const MADE = readText(".gitignore").split("\n");

const CODE = /`([^`\n]+)`/g;
const LINK = /\]\(([^)#\s]+)\)/g;
const PICTURE = /<img src="([^"]+)"/g;
/** A path has a folder or a known ending, and nothing of a sentence, a pattern or an address. */
const PATH = /^(?!@|https?:|\.\/#)(?:[\w.@-]+\/)+[\w.@-]*$|^[\w-]+\.(?:md|json|html|ts|mjs|js)$/;
/** Entries of packages look like paths. */
const PACKAGE_ENTRY = /^zod\/mini$/;

function pathsIn(markdown: string): string[] {
  const map = [...markdown.matchAll(/^```\n([^`]*)^```/gm)].flatMap(([, body = ""]) =>
    body.split("\n").map((line) => line.split(" ")[0] ?? ""),
  );
  const inline = [CODE, LINK, PICTURE].flatMap((pattern) =>
    [...markdown.matchAll(pattern)].map(([, text = ""]) => text.split(" ").at(-1) ?? ""),
  );
  return [...map, ...inline].filter((text) => PATH.test(text) && !PACKAGE_ENTRY.test(text));
}

const missingPaths = (markdown: string): string[] =>
  pathsIn(markdown).filter((path) => !MADE.includes(path) && !existsSync(join(ROOT, path)));

function missingScripts(markdown: string): string[] {
  const named = [...markdown.matchAll(/npm (?:run ([\w:-]+)|(start|test)\b)/g)];
  return named.flatMap(([, script, short]) => {
    const name = script ?? short ?? "";
    return packed.scripts[name] === undefined ? [name] : [];
  });
}

const longRecipes = (markdown: string): string[] =>
  headingsOf(markdown, 3).filter((title) => {
    const lines = sectionOf(markdown, title).split("\n");
    return lines.filter((line) => line.trim() !== "").length > 10;
  });

describe("the reading of documents, on a made-up one", () => {
  const page = [
    "# Page",
    "Run `npm run build` or `npm run vanish`, then `npm start`.",
    "See `src/nowhere.ts`, `src/app/`, `zod/mini`, `a/b c`, [this](gone.md) and [that](README.md).",
    `<img src="lost/a.png">`,
    "",
    "```",
    "src/lost/      a folder",
    "```",
    "",
    "### Add a thing",
    ...Array.from({ length: 11 }, (_, index) => `${index + 1}. step`),
  ].join("\n");

  it("finds the paths that do not exist, in text, links and maps", () => {
    expect(missingPaths(page)).toEqual(["src/lost/", "src/nowhere.ts", "gone.md", "lost/a.png"]);
    expect(pathsIn(page)).toContain("src/app/");
  });

  it("finds the scripts that do not exist", () => {
    expect(missingScripts(page)).toEqual(["vanish"]);
  });

  it("finds a recipe of more than ten lines", () => {
    expect(longRecipes(page)).toEqual(["Add a thing"]);
    expect(longRecipes(page.replace("11. step", ""))).toEqual([]);
  });
});

describe.each([
  ["README.md", readme],
  ["DEVELOPERS.md", developers],
])("%s", (_name, page) => {
  it("names paths that exist", () => {
    expect(pathsIn(page).length).toBeGreaterThan(2);
    expect(missingPaths(page)).toEqual([]);
  });

  it("names npm scripts that exist", () => {
    expect(page).toContain("npm test");
    expect(missingScripts(page)).toEqual([]);
  });
});

describe("README.md", () => {
  it("gives the two commands, and both have a program behind them", () => {
    for (const name of ["start", "test"]) {
      expect(readme).toMatch(new RegExp(`^    npm ${name}\\b`, "m"));
      const [, program = ""] = /^node (\S+)$/.exec(packed.scripts[name] ?? "") ?? [];
      expect(program, `script ${name}`).not.toBe("");
      expect(existsSync(join(ROOT, program)), program).toBe(true);
    }
  });

  it("says first what the app is for, and has limits, cautions and the licence", () => {
    expect(readme).toMatch(/^# Fadewright\n\nFadewright helps /);
    expect(headingsOf(readme, 2)).toEqual(
      expect.arrayContaining(["Limits", "Cautions", "Licence", "On a phone"]),
    );
  });
});

describe("DEVELOPERS.md", () => {
  it("has every folder of src in its map", () => {
    const map = sectionOf(developers, "Map");
    const folders = readdirSync(join(ROOT, "src"), { withFileTypes: true })
      .filter((entry) => entry.isDirectory())
      .filter(({ name }) => readdirSync(join(ROOT, "src", name)).length > 0)
      .map(({ name }) => `src/${name}/`);
    expect(folders.length).toBeGreaterThan(0);
    expect(folders.filter((folder) => !map.includes(`\n${folder} `))).toEqual([]);
  });

  it("has each runtime dependency with its size and reason, and no other", () => {
    const rows = tableOf(developers, ["package", "gzip", "why"]);
    expect(rows.map(([name]) => name).sort()).toEqual(Object.keys(packed.dependencies).sort());
    for (const [name, size, why = ""] of rows) {
      expect(size, name).toMatch(/^\d+\.\d kB$/);
      expect(why.length, name).toBeGreaterThan(10);
    }
  });

  it("quotes the budgets that are enforced", () => {
    const rows = tableOf(developers, ["what", "at most", "limit"]);
    const quoted = rows.map(([, size = "", name = ""]) => [name, size]);
    const enforced = Object.entries(limits).map(([name, kB]) => [name, `${kB} kB`]);
    expect(quoted).toEqual(enforced);
  });

  it("has a glossary with each word once, and a meaning for it", () => {
    const rows = tableOf(sectionOf(developers, "Glossary"), ["word", "what it means"]);
    const words = rows.map(([word = ""]) => word);
    expect(words).toEqual(expect.arrayContaining(["dropout", "fault", "mark", "check", "remedy"]));
    expect(words.filter((word, index) => words.indexOf(word) !== index)).toEqual([]);
    for (const [word, meaning = ""] of rows) expect(meaning.length, word).toBeGreaterThan(10);
  });

  it("has recipes of at most ten lines", () => {
    expect(headingsOf(developers, 3).length).toBeGreaterThan(5);
    expect(longRecipes(developers)).toEqual([]);
  });

  it("names every npm script", () => {
    const table = tableOf(developers, ["command", "what it does"]).flat().join("\n");
    const names = Object.keys(packed.scripts).filter(
      (name) => !table.includes(`npm run ${name}`) && !table.includes(`npm ${name}`),
    );
    expect(names).toEqual([]);
  });
});
