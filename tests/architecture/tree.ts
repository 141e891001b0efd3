import { readdirSync, readFileSync } from "node:fs";
import { join, sep } from "node:path";
import { fileURLToPath } from "node:url";
import type { SourceFile } from "./syntax.ts";

export const ROOT = fileURLToPath(new URL("../../", import.meta.url));

export const readText = (path: string): string => readFileSync(join(ROOT, path), "utf8");

/** Paths of all files below a folder of the project, sorted. */
export function filesBelow(folder: string): string[] {
  return readdirSync(join(ROOT, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(ROOT.length).split(sep).join("/"))
    .sort();
}

/** The files below some folders whose name ends in one of the endings, with their text. */
export function sourcesBelow(folders: readonly string[], endings: readonly string[]): SourceFile[] {
  return folders
    .flatMap(filesBelow)
    .filter((path) => endings.some((ending) => path.endsWith(ending)))
    .map((path) => ({ path, source: readText(path) }));
}

/** Every file that belongs to the project: what .gitignore names, and the history, left out. */
export function projectFiles(): string[] {
  const ignored = readText(".gitignore").split("\n").filter(Boolean);
  const isIgnored = (name: string, isFolder: boolean) =>
    name === ".git" ||
    ignored.some((rule) =>
      rule.startsWith("*") ? name.endsWith(rule.slice(1)) : isFolder && rule === `${name}/`,
    );
  const walk = (folder: string): string[] =>
    readdirSync(join(ROOT, folder), { withFileTypes: true }).flatMap((entry) => {
      const path = folder === "" ? entry.name : `${folder}/${entry.name}`;
      if (isIgnored(entry.name, entry.isDirectory())) return [];
      if (entry.isDirectory()) return walk(path);
      return entry.isFile() ? [path] : [];
    });
  return walk("");
}
