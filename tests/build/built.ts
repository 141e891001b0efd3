import { readdirSync, readFileSync } from "node:fs";
import { join, relative, sep } from "node:path";
import { gzipSync } from "node:zlib";

/** One file of the built app: its path from the folder that is served, and its bytes. */
export interface BuiltFile {
  readonly path: string;
  readonly bytes: Buffer;
}

/** The built app. @throws Error if there is none, with the command that makes it. */
export function readBuilt(folder: string): BuiltFile[] {
  const entries = readdirSync(folder, { recursive: true, withFileTypes: true });
  return entries
    .filter((entry) => entry.isFile())
    .map((entry) => {
      const path = join(entry.parentPath, entry.name);
      return { path: relative(folder, path).split(sep).join("/"), bytes: readFileSync(path) };
    });
}

export function textOf(files: readonly BuiltFile[], path: string): string {
  const file = files.find((one) => one.path === path);
  if (file === undefined) throw new RangeError(`textOf: path: the built app has no ${path}`);
  return file.bytes.toString("utf8");
}

/** [kB of 1000 bytes], gzip -9 */
export const gzipKb = ({ bytes }: BuiltFile): number => gzipSync(bytes, { level: 9 }).length / 1000;

/**
 * Why some files are over their budget, with the size of each; null if they keep to it. A budget
 * that weighs no file is broken, and says so.
 */
export function overBudget(
  files: readonly BuiltFile[],
  limitKb: number,
  weigh: (file: BuiltFile) => number,
): string | null {
  if (files.length === 0) return "no file to weigh";
  const weights = files.map((file) => ({ path: file.path, kb: weigh(file) }));
  const totalKb = weights.reduce((sum, { kb }) => sum + kb, 0);
  if (totalKb <= limitKb) return null;
  const list = weights
    .sort((a, b) => b.kb - a.kb)
    .map(({ path, kb }) => `${path} ${kb.toFixed(2)}`)
    .join(", ");
  return `${totalKb.toFixed(2)} kB, at most ${limitKb}: ${list}`;
}
