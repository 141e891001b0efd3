import { posix } from "node:path";
import { type BuiltFile, textOf } from "./built.ts";
import { parsePage } from "./page.ts";

interface Icon {
  readonly src: string;
  readonly sizes: string;
  readonly type: string;
  readonly purpose?: string;
}

interface Manifest {
  readonly id?: string;
  readonly name?: string;
  readonly start_url?: string;
  readonly scope?: string;
  readonly icons?: readonly Icon[];
  readonly shortcuts?: readonly { readonly name: string; readonly url: string }[];
}

/** "192x192" of a PNG, from its header. @throws RangeError if it is none. */
function pngSize(bytes: Buffer): string {
  const isPng = bytes.subarray(1, 4).toString("latin1") === "PNG" && bytes.length > 24;
  if (!isPng) throw new RangeError("pngSize: bytes: not a PNG");
  return `${bytes.readUInt32BE(16)}x${bytes.readUInt32BE(20)}`;
}

/** Whatever keeps the app from being installed, or ties it to one address. */
export function manifestOffences(manifest: Manifest, files: readonly BuiltFile[]): string[] {
  const { icons = [], shortcuts = [] } = manifest;
  const addresses = [
    manifest.id,
    manifest.start_url,
    manifest.scope,
    ...icons.map(({ src }) => src),
    ...shortcuts.map(({ url }) => url),
  ];
  const isAny = ({ purpose = "any" }: Icon) => purpose.split(" ").includes("any");
  const has = (sizes: string) => icons.some((icon) => icon.sizes === sizes && isAny(icon));
  return [
    ...(["id", "name", "start_url", "scope"] as const)
      .filter((field) => !manifest[field])
      .map((field) => `the manifest lacks ${field}`),
    ...(shortcuts.length > 0 ? [] : ["the manifest lacks shortcuts"]),
    ...["192x192", "512x512"].filter((sizes) => !has(sizes)).map((sizes) => `no icon of ${sizes}`),
    ...(icons.some(({ purpose }) => purpose === "maskable") ? [] : ["no maskable icon"]),
    ...addresses
      .filter((address) => address !== undefined && /^(\/|[a-z][a-z0-9+.-]*:)/i.test(address))
      .map((address) => `${address} is not relative`),
    ...icons.flatMap((icon) => iconOffences(icon, files)),
  ];
}

function iconOffences({ src, sizes, type }: Icon, files: readonly BuiltFile[]): string[] {
  const file = files.find(({ path }) => path === posix.normalize(src));
  if (file === undefined) return [`${src} is not there`];
  if (type !== "image/png") return sizes === "any" ? [] : [`${src} claims ${sizes}`];
  const size = pngSize(file.bytes);
  return size === sizes ? [] : [`${src} is ${size}, not ${sizes}`];
}

/** Whatever is wrong with what the page links to: the manifest and the icon of the home screen. */
export function linkOffences(html: string, files: readonly BuiltFile[]): string[] {
  const page = parsePage(html);
  const linked = (rel: string) => {
    const address = page.querySelector(`link[rel="${rel}"]`)?.getAttribute("href") ?? "";
    return files.find(({ path }) => path === posix.normalize(address));
  };
  const icon = linked("apple-touch-icon");
  return [
    ...(linked("manifest") === undefined ? ["index.html links to no manifest"] : []),
    ...(icon === undefined ? ["index.html links to no apple-touch-icon"] : []),
    ...(icon && pngSize(icon.bytes) !== "180x180" ? [`${icon.path} is not 180x180`] : []),
  ];
}

export const readManifest = (files: readonly BuiltFile[]): Manifest =>
  JSON.parse(textOf(files, "manifest.webmanifest")) as Manifest;
