import { posix } from "node:path";
import { childOf, childrenOf, dottedName, nodesOf, textOf } from "../architecture/syntax.ts";
import type { BuiltFile } from "./built.ts";

/** Paths in the list of files that the built service worker keeps: its `{ url, revision }` objects. */
function precachedBy(worker: string): string[] {
  return nodesOf({ path: "sw.js", source: worker }).flatMap((node) => {
    if (node.type !== "ObjectExpression") return [];
    const fields = new Map(
      childrenOf(node, "properties").map((property) => {
        const key = childOf(property, "key");
        return [textOf(key) ?? dottedName(key), childOf(property, "value")];
      }),
    );
    const url = textOf(fields.get("url"));
    return url !== null && fields.has("revision") ? [posix.normalize(url)] : [];
  });
}

/** Files that would be missing without network, and entries that would stop the installation. */
export function precacheOffences(worker: string, files: readonly BuiltFile[]): string[] {
  const kept = precachedBy(worker);
  const built = files.map(({ path }) => path).filter((path) => path !== "sw.js");
  return [
    ...built.filter((path) => !kept.includes(path)).map((path) => `${path} is not precached`),
    ...kept.filter((path) => !built.includes(path)).map((path) => `${path} is not there`),
    ...kept
      .filter((path, index) => kept.indexOf(path) !== index)
      .map((path) => `${path} is precached twice`),
  ];
}
