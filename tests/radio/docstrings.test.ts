import { describe, expect, it } from "vitest";
import { childOf, nodesOf } from "../architecture/syntax.ts";
import { sourcesBelow } from "../architecture/tree.ts";
import { ROWS } from "./rows.ts";

interface Documented {
  readonly name: string;
  readonly parameterCount: number;
  /** Without the comment marks. */
  readonly text: string;
}

/** In this order; a line that has nothing to say says "none". */
const LINES = ["Assumes:", "Not for:", "@param", "@returns", "@throws", "@accuracy", "@source"];
const LAST_LINES = ["@differs", "@checkedBy"];
const NONE_PUBLISHED = "none published, see test";

const FUNCTIONS: readonly Documented[] = sourcesBelow(["src/radio"], [".ts"]).flatMap((file) =>
  nodesOf(file)
    .filter((node) => node.type === "ExportNamedDeclaration")
    .flatMap((node) => {
      const declared = childOf(node, "declaration");
      if (declared?.type === "VariableDeclaration") {
        const isFunction = nodesOf({
          path: file.path,
          source: file.source.slice(declared.start, Number(declared["end"])),
        }).some(({ type }) => type.endsWith("FunctionExpression"));
        if (isFunction) throw new Error(`${file.path}: declare functions with "function"`);
      }
      if (declared?.type !== "FunctionDeclaration") return [];
      const before = file.source.slice(0, node.start).trimEnd();
      const start = before.lastIndexOf("/**");
      const text = before.endsWith("*/") ? before.slice(start).replace(/^\s*\*(\/| ?)/gm, "") : "";
      const parameters = declared["params"];
      return [
        {
          name: String(childOf(declared, "id")?.["name"]),
          parameterCount: Array.isArray(parameters) ? parameters.length : 0,
          text,
        },
      ];
    }),
);

const rowIds = (text: string): string[] =>
  (text.split("@checkedBy")[1] ?? "").split(/[\s,]+/).filter((id) => id !== "");

describe("docstrings of the radio functions", () => {
  it("are found", () => {
    const names = FUNCTIONS.map(({ name }) => name);
    expect(names).toEqual(expect.arrayContaining(["levelChangeDb", "requireRange", "wavelengthM"]));
  });

  it.each(FUNCTIONS.map((each) => [each.name, each] as const))(
    "of %s have every line, filled, in order",
    (_name, { text, parameterCount }) => {
      const places = [...LINES, ...LAST_LINES].map((line) => text.indexOf(line));
      expect(places).not.toContain(-1);
      expect(places).toEqual([...places].sort((a, b) => a - b));
      // The sentence and the formula, which stand before the first named line.
      expect(text.slice(0, places[0]).trim().split("\n\n").length).toBeGreaterThanOrEqual(2);
      expect(text.match(/@param /g)?.length).toBeGreaterThanOrEqual(parameterCount);
      for (const tag of text.split(/^(?=@)/m).slice(1))
        expect(tag.replace(/^@\w+/, "").trim()).not.toBe("");
    },
  );

  it.each(FUNCTIONS.map((each) => [each.name, each] as const))(
    "of %s name the rows that hold it, all of them and no others",
    (name, { text }) => {
      const rows = ROWS.filter(({ quantity }) => quantity === name).map(({ id }) => id);
      if (rows.length === 0) expect(text).toContain(`@checkedBy           ${NONE_PUBLISHED}`);
      else expect(rowIds(text).sort()).toEqual([...rows].sort());
    },
  );
});
