import { importsOf } from "./imports.ts";
import type { SourceFile } from "./syntax.ts";

/** One line for each ring of files that import each other, type-only imports included. */
export function cycleOffences(files: readonly SourceFile[]): string[] {
  const paths = new Set(files.map(({ path }) => path));
  const targets = new Map(
    files.map((file) => {
      const local = importsOf(file).flatMap(({ path }) =>
        path !== null && paths.has(path) ? [path] : [],
      );
      return [file.path, new Set(local)] as const;
    }),
  );
  const done = new Set<string>();
  const offences: string[] = [];
  const visit = (path: string, trail: readonly string[]): void => {
    const start = trail.indexOf(path);
    if (start >= 0) {
      offences.push(`${[...trail.slice(start), path].join(" -> ")} is a cycle`);
      return;
    }
    if (done.has(path)) return;
    for (const target of targets.get(path) ?? []) visit(target, [...trail, path]);
    done.add(path);
  };
  for (const { path } of files) visit(path, []);
  return offences;
}
