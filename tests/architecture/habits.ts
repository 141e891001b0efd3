import {
  childOf,
  childrenOf,
  dottedName,
  nodesOf,
  placeOf,
  type SourceFile,
  type SyntaxNode,
} from "./syntax.ts";
import { folderOf } from "./walls.ts";

/** The app hands clock and chance to the rest; nobody can hand them to a worker. */
const HAS_CLOCK = ["app", "sw"];
const CLOCK_OR_CHANCE = [
  "Date.now",
  "Math.random",
  "performance.now",
  "crypto.randomUUID",
  "crypto.getRandomValues",
];

/** Reads of clock or chance outside the folders that may: time and ids are passed in. */
export function clockOffences(files: readonly SourceFile[]): string[] {
  return files
    .filter(({ path }) => !HAS_CLOCK.includes(folderOf(path) ?? ""))
    .flatMap((file) =>
      nodesOf(file).flatMap((node) => {
        const name = clockRead(node);
        return name === null ? [] : [`${placeOf(file, node)} reads ${name}`];
      }),
    );
}

function clockRead(node: SyntaxNode): string | null {
  const isCall = node.type === "CallExpression";
  if (isCall || node.type === "NewExpression") {
    if (withoutGlobal(dottedName(childOf(node, "callee"))) !== "Date") return null;
    if (isCall) return "Date()";
    return childrenOf(node, "arguments").length === 0 ? "new Date()" : null;
  }
  const name = withoutGlobal(dottedName(node.type === "MemberExpression" ? node : null));
  return name !== null && CLOCK_OR_CHANCE.includes(name) ? name : null;
}

const withoutGlobal = (name: string | null): string | null =>
  name?.replace(/^(globalThis|window|self)\./, "") ?? null;

export function defaultExportOffences(files: readonly SourceFile[]): string[] {
  return files.flatMap((file) =>
    nodesOf(file)
      .filter(
        (node) =>
          node.type === "ExportDefaultDeclaration" ||
          (node.type === "ExportSpecifier" && dottedName(childOf(node, "exported")) === "default"),
      )
      .map((node) => `${placeOf(file, node)} exports a default`),
  );
}

const BANNED_WORDS = ["util", "utils", "helper", "helpers", "common", "misc", "manager", "data"];

/** Files and folders whose name says nothing of their job. */
export function nameOffences(paths: readonly string[]): string[] {
  return paths.flatMap((path) =>
    path
      .split("/")
      .filter((part) => BANNED_WORDS.includes(lastWord(part)))
      .map((part) => `${path} is named "${part}"`),
  );
}

const lastWord = (part: string): string =>
  (part.split(".")[0] ?? part).toLowerCase().split("-").at(-1) ?? "";

const MOST_LINES = 250;

export function lengthOffences(files: readonly SourceFile[]): string[] {
  return files.flatMap(({ path, source }) => {
    const lines = source.replace(/\n$/, "").split("\n").length;
    return lines > MOST_LINES ? [`${path} has ${lines} lines, at most ${MOST_LINES}`] : [];
  });
}

/** Files with more than one exported component: a function or constant in PascalCase. */
export function componentOffences(files: readonly SourceFile[]): string[] {
  return files
    .filter(({ path }) => path.endsWith(".tsx"))
    .flatMap((file) => {
      const components = nodesOf(file).flatMap(exportedNames).filter(isComponentName);
      return components.length > 1
        ? [`${file.path} exports ${components.length} components: ${components.join(", ")}`]
        : [];
    });
}

const isComponentName = (name: string): boolean => /^[A-Z]\w*[a-z]/.test(name);

function exportedNames(node: SyntaxNode): string[] {
  if (node.type !== "ExportNamedDeclaration" || node["exportKind"] === "type") return [];
  const declaration = childOf(node, "declaration");
  const named =
    declaration?.type === "VariableDeclaration"
      ? childrenOf(declaration, "declarations").map((one) => childOf(one, "id"))
      : declaration === null
        ? childrenOf(node, "specifiers")
            .filter((one) => one["exportKind"] !== "type")
            .map((one) => childOf(one, "exported"))
        : [childOf(declaration, "id")];
  return named.flatMap((one) => dottedName(one) ?? []);
}
