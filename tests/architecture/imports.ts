import { posix } from "node:path";
import {
  childOf,
  childrenOf,
  dottedName,
  nodesOf,
  placeOf,
  type SourceFile,
  type SyntaxNode,
  textOf,
} from "./syntax.ts";

/** One reference from a file to another module. */
export interface Import {
  /** `path:line` of the reference. */
  readonly place: string;
  /** Path from the project's root, or null for a package. */
  readonly path: string | null;
  /** As written, without a query such as `?worker`. */
  readonly specifier: string;
  /** "type" leaves nothing behind in the built program. */
  readonly kind: "value" | "type";
}

interface Reference {
  readonly node: SyntaxNode;
  readonly kind: "value" | "type";
  /** Null where the file computes what it loads. */
  readonly specifiers: readonly string[] | null;
}

/**
 * Everything a file refers to: static, type-only and dynamic imports, re-exports, `import("…")` in
 * types, `import.meta.glob`, `new URL("…", import.meta.url)` (workers too), and the runtime that
 * JSX brings in unseen.
 *
 * @throws SyntaxError naming the file, if it does not parse or computes what it imports.
 */
export function importsOf(file: SourceFile): readonly Import[] {
  const nodes = nodesOf(file);
  const references = nodes.flatMap(referenceOf);
  const element = nodes.find((node) => node.type === "JSXElement" || node.type === "JSXFragment");
  if (element) references.push(valueReference(element, ["preact/jsx-runtime"]));
  return references.flatMap(({ node, kind, specifiers }) => {
    const place = placeOf(file, node);
    if (specifiers === null) throw new SyntaxError(`${place} computes what it imports`);
    return specifiers.map((written): Import => {
      const specifier = written.split("?")[0] ?? written;
      return { place, path: resolve(file.path, specifier), specifier, kind };
    });
  });
}

const valueReference = (node: SyntaxNode, specifiers: readonly string[] | null): Reference => ({
  node,
  kind: "value",
  specifiers,
});

function referenceOf(node: SyntaxNode): Reference[] {
  switch (node.type) {
    case "ImportDeclaration":
    case "ExportNamedDeclaration":
    case "ExportAllDeclaration": {
      const source = textOf(childOf(node, "source"));
      if (source === null) return [];
      // `import { type A }` still loads the module; only `import type` leaves nothing behind.
      const isType = node["importKind"] === "type" || node["exportKind"] === "type";
      return [{ node, kind: isType ? "type" : "value", specifiers: [source] }];
    }
    case "TSImportType": {
      const source = textOf(childOf(node, "source") ?? childOf(node, "argument"));
      return [{ node, kind: "type", specifiers: source === null ? null : [source] }];
    }
    case "ImportExpression":
      return [valueReference(node, oneOf(textOf(childOf(node, "source"))))];
    case "TSExternalModuleReference":
      return [valueReference(node, oneOf(textOf(childOf(node, "expression"))))];
    case "CallExpression":
      return dottedName(childOf(node, "callee")) === "import.meta.glob"
        ? [valueReference(node, globFolders(childrenOf(node, "arguments")[0]))]
        : [];
    case "NewExpression": {
      const [address, base] = childrenOf(node, "arguments");
      const isModuleUrl =
        dottedName(childOf(node, "callee")) === "URL" &&
        dottedName(base ?? null) === "import.meta.url";
      return isModuleUrl ? [valueReference(node, oneOf(textOf(address)))] : [];
    }
    default:
      return [];
  }
}

const oneOf = (text: string | null): string[] | null => (text === null ? null : [text]);

/** The folder before the first wildcard of each pattern; patterns that only leave out are dropped. */
function globFolders(patterns: SyntaxNode | undefined): string[] | null {
  const nodes =
    patterns?.type === "ArrayExpression" ? childrenOf(patterns, "elements") : [patterns];
  const folders: string[] = [];
  for (const node of nodes) {
    const pattern = textOf(node);
    if (pattern === null) return null;
    if (!pattern.startsWith("!")) folders.push(pattern.replace(/[^/]*[*{].*$/, "*"));
  }
  return folders;
}

function resolve(fromPath: string, specifier: string): string | null {
  if (specifier.startsWith("/")) return specifier.slice(1);
  if (!specifier.startsWith(".")) return null;
  return posix.join(posix.dirname(fromPath), specifier);
}
