import type { SourceFile } from "./syntax.ts";

// Written as words, so that this file does not hold what it looks for.
const REGISTRIES = [
  ["npmjs", "\\w+"],
  ["yarnpkg", "\\w+"],
  ["pypi", "\\w+"],
  ["pythonhosted", "\\w+"],
  ["crates", "io"],
  ["rubygems", "org"],
  ["golang", "org"],
  ["unpkg", "com"],
  ["jsdelivr", "net"],
  ["pkg", "github", "com"],
];
const MIRROR_WORDS = ["registry", "npm", "artifactory", "nexus", "verdaccio", "mirror"];
const TOP_FOLDERS = ["home", "Users", "root", "work", "tmp", "mnt", "opt", "srv", "usr", "var"];

const REGISTRY = new RegExp(
  [
    ...REGISTRIES.map((labels) => `\\b${labels.join("\\.")}\\b`),
    `://[^/\\s"]*\\b(?:${MIRROR_WORDS.join("|")})\\b[^/\\s"]*`,
  ].join("|"),
);
// Behind a quote, a blank or a bracket: not the path of a web address, nor a relative path.
const MACHINE_PATH = new RegExp(
  `(?<![\\w.~*/:@)\\]-])/(?:${TOP_FOLDERS.join("|")})/(?!bin/env\\b)[\\w.-]+|\\b[A-Z]:\\\\\\w+`,
);

/** Names of package registries, and absolute paths of a machine: neither belongs in a project. */
export function traceOffences(files: readonly SourceFile[]): string[] {
  return files.flatMap(({ path, source }) =>
    source.split("\n").flatMap((line, index) => {
      const found = REGISTRY.exec(line) ?? MACHINE_PATH.exec(line);
      return found === null ? [] : [`${path}:${index + 1} names ${found[0]}`];
    }),
  );
}
