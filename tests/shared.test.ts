import { describe, expect, it } from "vitest";
import { rowOffences } from "./architecture/rows.ts";
import { traceOffences } from "./architecture/traces.ts";
import { filesBelow, projectFiles, readText } from "./architecture/tree.ts";

const ROW = {
  id: "one",
  quantity: "lossDb",
  input: { distanceM: 10, exponent: 2 },
  expected: 1,
  tolerance: 0.1,
  toleranceReason: "printed to one decimal",
  basis: "printed worked example",
  source: {
    body: "a body",
    document: "a document",
    edition: "1",
    where: "page 1",
    readAt: "not read",
    readOn: "2026-12-01",
    standing: "from-memory",
  },
};

describe("the check of published examples, on made-up rows", () => {
  const judge = (...rows: unknown[]) => rowOffences([{ path: "a.json", rows }]);

  it("lets a full row through", () => {
    expect(judge(ROW)).toEqual([]);
  });

  it.each(Object.keys(ROW))("misses %s", (field) => {
    expect(judge({ ...ROW, [field]: undefined })).not.toEqual([]);
    expect(judge({ ...ROW, [field]: "" })).not.toEqual([]);
  });

  it.each(Object.keys(ROW.source))("misses source.%s", (field) => {
    expect(judge({ ...ROW, source: { ...ROW.source, [field]: undefined } })).not.toEqual([]);
  });

  it("finds an id that is used twice, in other files too", () => {
    const twice = [
      { path: "a.json", rows: [ROW] },
      { path: "b.json", rows: [ROW] },
    ];
    expect(rowOffences(twice)).toEqual(["b.json: one has the id of a row in a.json"]);
  });

  it.each([
    [{ ...ROW, source: { ...ROW.source, standing: "sure" } }, 'has the standing "sure"'],
    [{ ...ROW, source: { ...ROW.source, readOn: "lately" } }, "has no date in source.readOn"],
    [{ ...ROW, tolerance: 0 }, "has no tolerance above 0"],
    [{ ...ROW, input: { distance: 10 } }, "names no unit in input.distance"],
  ])("finds what is wrong (%#)", (row, offence) => {
    expect(judge(row)).toEqual([`a.json: one ${offence}`]);
  });
});

describe("the check for traces of a machine, on made-up lines", () => {
  const judge = (source: string) => traceOffences([{ path: "a.ts", source }]);
  const dots = (...labels: string[]) => labels.join(".");

  it.each([
    `"resolved": "https://${dots("registry", "npmjs", "org")}/a.tgz"`,
    `see ${dots("www", "npmjs", "com")}`,
    `index-url = https://${dots("pypi", "internal", "test")}/simple`,
    `"https://${dots("artifactory", "example", "test")}/npm/"`,
    `const path = "${["", "home", "anna", "a.txt"].join("/")}";`,
    `cd ${["", "work", "main"].join("/")}`,
    `# ${["", "usr", "bin", "node"].join("/")}`,
    `C${":"}\\Users\\anna`,
  ])("finds %s", (line) => {
    expect(judge(`first line\n${line}`)).toHaveLength(1);
    expect(judge(`first line\n${line}`)[0]).toMatch(/^a\.ts:2 names /);
  });

  it.each([
    "#!/usr/bin/env bash",
    `import { a } from "../work/a.ts";`,
    "https://example.test/home/page",
    "npm run build",
    `"url": "https://github.com/sponsors/someone"`,
  ])("lets %s through", (line) => {
    expect(judge(line)).toEqual([]);
  });
});

describe("the project", () => {
  const vectors = filesBelow("shared/vectors").map((path) => ({
    path,
    rows: JSON.parse(readText(path)) as readonly unknown[],
  }));

  it("has published examples, each with all that a test may lean on", () => {
    expect(vectors.length).toBeGreaterThan(0);
    for (const { path, rows } of vectors) expect(rows.length, path).toBeGreaterThan(0);
    expect(rowOffences(vectors)).toEqual([]);
  });

  it("names no package registry and no path of a machine", () => {
    const texts = projectFiles()
      .filter((path) => !path.endsWith(".png"))
      .map((path) => ({ path, source: readText(path) }));
    expect(texts.length).toBeGreaterThan(50);
    expect(traceOffences(texts)).toEqual([]);
  });
});
