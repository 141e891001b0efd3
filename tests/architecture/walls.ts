import { type Import, importsOf } from "./imports.ts";
import { tableOf } from "./markdown.ts";
import type { SourceFile } from "./syntax.ts";

/** What the files of one folder may refer to. */
export interface Wall {
  /** Folders under src, single files of them, and "shared/". */
  readonly values: ReadonlySet<string>;
  /** Where a type-only import may go besides. */
  readonly types: ReadonlySet<string>;
  /** "zod/mini" allows that entry alone, "preact" its other entries too. */
  readonly packages: readonly string[];
}

/** Folders that stand beside src, not in it. */
const OUTER_FOLDERS = ["sw"];

/**
 * Reads the import table of DEVELOPERS.md.
 *
 * @throws RangeError naming an entry that is no folder of the table.
 */
export function readWalls(markdown: string): ReadonlyMap<string, Wall> {
  const rows = tableOf(markdown, ["folder", "may import", "packages"]).flatMap(
    ([folders = "", imports = "", packages = ""]) =>
      listOf(folders).map((folder) => ({ folder, imports, packages })),
  );
  const folders = rows.map(({ folder }) => folder).filter((one) => !OUTER_FOLDERS.includes(one));
  const isKnown = (place: string) =>
    place === "shared/" || folders.includes(place.split("/")[0] ?? "");
  return new Map(
    rows.map(({ folder, imports, packages }, index) => {
      const values = new Set<string>();
      const types = new Set<string>();
      for (const entry of listOf(imports)) {
        const isType = entry.startsWith("types of ");
        const place = entry.replace("types of ", "");
        const places = /^(everything|the rest)$/.test(place)
          ? folders
          : place === "all of the above"
            ? rows.slice(0, index).map((row) => row.folder)
            : [place];
        for (const one of places) {
          if (!isKnown(one)) throw new RangeError(`import table: ${folder}: "${one}" is no folder`);
          (isType ? types : values).add(one);
        }
      }
      return [folder, { values, types, packages: listOf(packages) }];
    }),
  );
}

const listOf = (cell: string): string[] =>
  cell
    .split(",")
    .map((entry) => entry.trim())
    .filter((entry) => !["", "nothing", "none"].includes(entry));

/** The folder of the table that a path belongs to; null for a file that stands in none. */
export function folderOf(path: string): string | null {
  const [top = "", folder = "", ...rest] = path.split("/");
  if (top === "shared") return "shared/";
  if (OUTER_FOLDERS.includes(top)) return top;
  return top === "src" && rest.length > 0 ? folder : null;
}

/** Every import that the table does not allow, and every file that stands in no folder of it. */
export function wallOffences(
  files: readonly SourceFile[],
  walls: ReadonlyMap<string, Wall>,
): string[] {
  return files.flatMap((file) => {
    const folder = folderOf(file.path);
    const wall = folder === null ? undefined : walls.get(folder);
    if (folder === null || wall === undefined) {
      return [`${file.path} stands in a folder that the import table lacks`];
    }
    return importsOf(file).flatMap((one) => offencesOf(one, folder, wall));
  });
}

function offencesOf({ place, path, specifier, kind }: Import, folder: string, wall: Wall) {
  if (path === null) {
    const isAllowed = wall.packages.some(
      (name) => specifier === name || specifier.startsWith(`${name}/`),
    );
    return isAllowed ? [] : [`${place} imports package ${specifier}, which ${folder} may not`];
  }
  const target = folderOf(path);
  if (target === null) return [`${place} imports ${path}, which is outside the program`];
  const inner = path.replace(/^src\//, "");
  const isIn = (places: ReadonlySet<string>) => places.has(target) || places.has(inner);
  if (target === folder || isIn(wall.values)) return [];
  if (!isIn(wall.types)) return [`${place} imports ${path}, which ${folder} may not`];
  return kind === "type"
    ? []
    : [`${place} imports ${path} by value, ${folder} may import its types only`];
}
