import { readdirSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import { cycleOffences } from "./architecture/cycles.ts";
import {
  clockOffences,
  componentOffences,
  defaultExportOffences,
  lengthOffences,
  nameOffences,
} from "./architecture/habits.ts";
import { importsOf } from "./architecture/imports.ts";
import type { SourceFile } from "./architecture/syntax.ts";
import { filesBelow, ROOT, readText, sourcesBelow } from "./architecture/tree.ts";
import { readWalls, wallOffences } from "./architecture/walls.ts";

const file = (path: string, source: string): SourceFile => ({ path, source });

const TABLE = `
| folder | may import | packages |
| --- | --- | --- |
| \`radio\` | nothing | none |
| \`facts\` | shared/, types of the rest | none |
| \`rig\`, \`regions\` | radio | none |
| \`journal\` | *types of* rig | zod/mini |
| \`storage\` | journal | idb |
| \`models\` | all of the above | @preact/signals |
| \`ui\` | models, types of the rest | preact, @preact/signals |
| \`app\` | everything | preact, uuid |
| \`sw\` | storage/names.ts | none |
`;
const WALLS = readWalls(TABLE);

describe("the walls between folders, on made-up files", () => {
  it.each([
    ["a file beside it", "src/radio/a.ts", `import { b } from "./b.ts";`],
    ["an allowed folder", "src/rig/a.ts", `import { b } from "../radio/b.ts";`],
    ["types where types are allowed", "src/journal/a.ts", `import type { B } from "../rig/b.ts";`],
    ["types in a type", "src/journal/a.ts", `export type B = import("../rig/b.ts").B;`],
    ["re-exported types", "src/journal/a.ts", `export type { B } from "../rig/b.ts";`],
    ["an allowed package", "src/storage/a.ts", `import { openDB } from "idb";`],
    ["a further entry of it", "src/ui/a.ts", `import { useRef } from "preact/hooks";`],
    ["JSX in the interface", "src/ui/a.tsx", `export const A = () => <p />;`],
    ["facts from shared", "src/facts/a.ts", `import causes from "../../shared/causes.json";`],
    [
      "a name of the storage in the worker",
      "sw/sw.ts",
      `import { L } from "../src/storage/names.ts";`,
    ],
    ["a string that reads like an import", "src/radio/a.ts", `const a = 'import "idb"';`],
  ])("let %s through", (_what, path, source) => {
    expect(wallOffences([file(path, source)], WALLS)).toEqual([]);
  });

  it.each([
    [
      "a forbidden folder",
      "src/radio/a.ts",
      `\nimport { b } from "../ui/b.ts";`,
      "src/radio/a.ts:2 imports src/ui/b.ts, which radio may not",
    ],
    [
      "a forbidden folder loaded later",
      "src/radio/a.ts",
      `const later = () => import("../storage/b.ts");`,
      "src/radio/a.ts:1 imports src/storage/b.ts, which radio may not",
    ],
    [
      "a forbidden re-export",
      "src/rig/a.ts",
      `export * from "../journal/b.ts";`,
      "src/rig/a.ts:1 imports src/journal/b.ts, which rig may not",
    ],
    [
      "a forbidden glob",
      "src/rig/a.ts",
      `const all = import.meta.glob(["../../shared/*.json", "!../../shared/b.json"]);`,
      "src/rig/a.ts:1 imports shared/*, which rig may not",
    ],
    [
      "a forbidden worker",
      "src/storage/a.ts",
      `new Worker(new URL("../rig/b-worker.ts", import.meta.url), { type: "module" });`,
      "src/storage/a.ts:1 imports src/rig/b-worker.ts, which storage may not",
    ],
    [
      "a type from a forbidden folder",
      "src/radio/a.ts",
      `import type { B } from "../rig/b.ts";`,
      "src/radio/a.ts:1 imports src/rig/b.ts, which radio may not",
    ],
    [
      "a value where only types are allowed",
      "src/journal/a.ts",
      `import { b } from "../rig/b.ts";`,
      "src/journal/a.ts:1 imports src/rig/b.ts by value, journal may import its types only",
    ],
    [
      "a type import that still loads the module",
      "src/ui/a.ts",
      `import { type B } from "../rig/b.ts";`,
      "src/ui/a.ts:1 imports src/rig/b.ts by value, ui may import its types only",
    ],
    [
      "a forbidden package",
      "src/models/a.ts",
      `import { h } from "preact";`,
      "src/models/a.ts:1 imports package preact, which models may not",
    ],
    [
      "another entry of a package allowed by one entry",
      "src/journal/a.ts",
      `import { z } from "zod";`,
      "src/journal/a.ts:1 imports package zod, which journal may not",
    ],
    [
      "JSX outside the interface",
      "src/models/a.tsx",
      `export const a = <p />;`,
      "src/models/a.tsx:1 imports package preact/jsx-runtime, which models may not",
    ],
    [
      "a module of the test machine",
      "src/radio/a.ts",
      `import { readFileSync } from "node:fs";`,
      "src/radio/a.ts:1 imports package node:fs, which radio may not",
    ],
    [
      "another file of the storage in the worker",
      "sw/sw.ts",
      `import { open } from "../src/storage/open.ts";`,
      "sw/sw.ts:1 imports src/storage/open.ts, which sw may not",
    ],
    [
      "something outside the program",
      "src/app/a.ts",
      `import "../../tests/setup.ts";`,
      "src/app/a.ts:1 imports tests/setup.ts, which is outside the program",
    ],
    [
      "a folder that the table lacks",
      "src/tools/a.ts",
      "",
      "src/tools/a.ts stands in a folder that the import table lacks",
    ],
    [
      "a file that stands in no folder",
      "src/a.ts",
      "",
      "src/a.ts stands in a folder that the import table lacks",
    ],
  ])("stop %s", (_what, path, source, offence) => {
    expect(wallOffences([file(path, source)], WALLS)).toEqual([offence]);
  });

  it("refuse an import that the file computes", () => {
    const computed = file("src/app/a.ts", "export const load = (name: string) => import(name);");
    expect(() => wallOffences([computed], WALLS)).toThrow(
      "src/app/a.ts:1 computes what it imports",
    );
  });

  it("refuse a file that does not parse", () => {
    expect(() => importsOf(file("src/app/a.ts", "const = 1;"))).toThrow("src/app/a.ts");
  });

  it("refuse a table that names an unknown folder", () => {
    const table = TABLE.replace("| radio |", "| wireless |");
    expect(() => readWalls(table)).toThrow('rig: "wireless" is no folder');
  });
});

describe("the other rules, on made-up files", () => {
  it("find a ring of files, and one only", () => {
    const ring = [
      file("src/rig/a.ts", `import { b } from "./b.ts";`),
      file("src/rig/b.ts", `import type { C } from "./c.ts";`),
      file("src/rig/c.ts", `export { a } from "./a.ts";`),
      file("src/rig/d.ts", `import { a } from "./a.ts";`),
    ];
    expect(cycleOffences(ring)).toEqual([
      "src/rig/a.ts -> src/rig/b.ts -> src/rig/c.ts -> src/rig/a.ts is a cycle",
    ]);
    expect(cycleOffences(ring.slice(0, 2))).toEqual([]);
  });

  it.each([
    ["Date.now()", "Date.now"],
    [`Date["now"]()`, "Date.now"],
    ["const now = Date.now;", "Date.now"],
    ["globalThis.Date.now()", "Date.now"],
    ["new Date()", "new Date()"],
    ["new Date", "new Date()"],
    ["Date()", "Date()"],
    ["Math.random()", "Math.random"],
    ["performance.now()", "performance.now"],
    ["crypto.randomUUID()", "crypto.randomUUID"],
  ])("find %s outside the app", (source, name) => {
    expect(clockOffences([file("src/rig/a.ts", source)])).toEqual([`src/rig/a.ts:1 reads ${name}`]);
    expect(clockOffences([file("src/app/a.ts", source)])).toEqual([]);
  });

  it.each([
    "new Date(0)",
    "// Date.now() in a comment",
    `const said = "Math.random()";`,
    "record.Date.now",
    "Math.round(1)",
  ])("let %s through", (source) => {
    expect(clockOffences([file("src/rig/a.ts", source)])).toEqual([]);
  });

  it.each(["export default 1;", "const a = 1;\nexport { a as default };"])(
    "find the default export in %j",
    (source) => {
      expect(defaultExportOffences([file("src/rig/a.ts", source)])).toHaveLength(1);
    },
  );

  it("let named exports through", () => {
    expect(defaultExportOffences([file("src/rig/a.ts", "export const a = 1;")])).toEqual([]);
  });

  it.each([
    "src/utils/a.ts",
    "src/rig/helpers.ts",
    "src/rig/rig-utils.ts",
    "src/common/a.ts",
    "src/rig/misc.test.ts",
    "src/rig/link-manager.tsx",
    "src/data/a.ts",
  ])("find the empty name in %s", (path) => {
    expect(nameOffences([path])).toHaveLength(1);
  });

  it("let names that say something through", () => {
    expect(nameOffences(["src/rig/database.ts", "src/rig/data-rate.ts"])).toEqual([]);
  });

  it("find a file of 251 lines and let 250 through", () => {
    expect(lengthOffences([file("src/rig/a.ts", "a;\n".repeat(250))])).toEqual([]);
    expect(lengthOffences([file("src/rig/a.ts", "a;\n".repeat(251))])).toEqual([
      "src/rig/a.ts has 251 lines, at most 250",
    ]);
  });

  it("find two exported components in one file", () => {
    const two = `export function Bar() { return <p />; }\nexport const Row = () => <p />;`;
    expect(componentOffences([file("src/ui/a.tsx", two)])).toEqual([
      "src/ui/a.tsx exports 2 components: Bar, Row",
    ]);
    const listed = "const Bar = 1; const Row = 2; export { Bar, Row };";
    expect(componentOffences([file("src/ui/a.tsx", listed)])).toHaveLength(1);
  });

  it("let one exported component with its types and constants through", () => {
    const one = `export interface BarProps {}\nexport type Kind = "a";\nexport const MOST = 1;
      export const widthOf = () => 1;\nfunction Inner() { return <p />; }
      export function Bar() { return <Inner />; }`;
    expect(componentOffences([file("src/ui/a.tsx", one)])).toEqual([]);
  });
});

describe("the program", () => {
  const program = sourcesBelow(["src", "sw"], [".ts", ".tsx"]);
  const walls = readWalls(readText("DEVELOPERS.md"));

  it("is there to be judged", () => {
    expect(program.length).toBeGreaterThan(0);
    expect(program.flatMap(importsOf).length).toBeGreaterThan(0);
  });

  it("has each folder of src in the import table", () => {
    const folders = readdirSync(join(ROOT, "src"), { withFileTypes: true })
      .filter((entry) => entry.isDirectory())
      .map((entry) => entry.name);
    expect(folders.length).toBeGreaterThan(0);
    expect(folders.filter((folder) => !walls.has(folder))).toEqual([]);
  });

  it("keeps to the import table", () => {
    expect(wallOffences(program, walls)).toEqual([]);
  });

  it("has no import cycles", () => {
    expect(cycleOffences(program)).toEqual([]);
  });

  it("reads clock and chance in the app and the worker only", () => {
    expect(clockOffences(program)).toEqual([]);
  });

  it("has no default exports", () => {
    expect(defaultExportOffences(program)).toEqual([]);
  });

  it("has names that say what a file is for", () => {
    expect(nameOffences(["src", "sw", "scripts", "bench", "tests"].flatMap(filesBelow))).toEqual(
      [],
    );
  });

  it("has files that can be read at one sitting", () => {
    const tools = sourcesBelow(["scripts", "bench"], [".mjs", ".js", ".jsx"]);
    // Sentences are data.
    const code = program.filter(({ path }) => !path.startsWith("src/ui/text/"));
    expect(lengthOffences([...code, ...tools])).toEqual([]);
  });

  it("has one exported component per file", () => {
    expect(componentOffences(program)).toEqual([]);
  });
});
