import { fnv1a } from "./fnv.ts";

declare const self: ServiceWorkerGlobalScope;

/** One file of a build. A null revision: the address itself changes with the content. */
export interface Entry {
  readonly url: string;
  readonly revision: string | null;
}

interface Completion {
  /** Later than that of every version stored before, even if the phone's clock was set back. [ms] */
  readonly at: number;
  readonly keys: readonly string[];
}

const PREFIX = "fadewright-";
const { scope } = self.registration;
/**
 * Caches belong to the whole origin, so a copy of the app in another folder sees ours. No path
 * holds a space: the ending names the folder without doubt.
 */
const SUFFIX = ` ${new URL(scope).pathname}`;
const COMPLETE = markerKey("complete");

/** The page is stored under the address of the folder, which is what a start asks for. */
export const INDEX = scope;

/** Name of the cache that holds exactly these files. */
export const cacheNameOf = (entries: readonly Entry[]): string =>
  PREFIX + fnv1a(JSON.stringify(entries)) + SUFFIX;

export const versionOf = (cacheName: string): string =>
  cacheName.slice(PREFIX.length, -SUFFIX.length);

/** Names of all caches of this app in this folder, unfinished ones included. */
export const ourCaches = async (): Promise<string[]> =>
  (await caches.keys()).filter((name) => name.startsWith(PREFIX) && name.endsWith(SUFFIX));

/** Key of a note that a version keeps beside its files. No file of a build is named like it. */
export function markerKey(name: string): string {
  return new URL(`~${name}`, scope).href;
}

/** Null unless every file of the version is there at this moment. */
export async function completionOf(cacheName: string): Promise<Completion | null> {
  // Opening a cache would create it, so existence is found out by a look at its marker.
  const marker = await caches.match(COMPLETE, { cacheName });
  if (marker === undefined) return null;
  const completion: Completion = await marker.json();
  const requests = await (await caches.open(cacheName)).keys();
  const stored = new Set(requests.map(({ url }) => url));
  return completion.keys.every((key) => stored.has(key)) ? completion : null;
}

/** Stores all files or fails; a failed installation is tried again at the browser's next check. */
export async function storeVersion(cacheName: string, entries: readonly Entry[]): Promise<void> {
  const wasThere = await caches.has(cacheName);
  try {
    if ((await completionOf(cacheName)) === null) await fill(cacheName, entries);
    await markComplete(cacheName, entries);
  } catch (error) {
    // An unfinished version takes room that the journal may need. One that was there before may
    // belong to the active worker: its script changed, its files did not.
    if (!wasThere) await caches.delete(cacheName);
    throw error;
  }
}

/** From here on the version counts as something older, to be cleared away when it can be. */
export const retire = async (cacheName: string): Promise<boolean> =>
  (await caches.open(cacheName)).delete(COMPLETE);

const keyOf = ({ url }: Entry): string => (url === "index.html" ? INDEX : new URL(url, scope).href);

async function fill(cacheName: string, entries: readonly Entry[]): Promise<void> {
  const cache = await caches.open(cacheName);
  await Promise.all(
    entries.map(async (entry) => cache.put(keyOf(entry), await download(entry.url))),
  );
}

async function download(url: string): Promise<Response> {
  // "reload": the browser's own cache may still hold the file of another version.
  // "same-origin": a network that wants a sign-in first answers with its own page.
  const response = await fetch(new Request(url, { cache: "reload", mode: "same-origin" }));
  const isPage = response.headers.get("content-type")?.startsWith("text/html") === true;
  // Some hosts answer a missing file with their start page and a good status.
  if (!response.ok || (isPage && !url.endsWith(".html"))) {
    throw new Error(`${url}: status ${response.status}`);
  }
  // A navigation that is answered with a redirected response fails, so it is made a plain one.
  return response.redirected ? new Response(response.body, response) : response;
}

async function markComplete(cacheName: string, entries: readonly Entry[]): Promise<void> {
  const stored = await Promise.all((await ourCaches()).map(completionOf));
  const at = Math.max(Date.now(), ...stored.map((other) => (other?.at ?? 0) + 1));
  const completion: Completion = { at, keys: entries.map(keyOf) };
  await (await caches.open(cacheName)).put(COMPLETE, new Response(JSON.stringify(completion)));
  // An activating version clears away what looks unfinished, and may have met this one.
  if ((await completionOf(cacheName)) === null) throw new Error(`${cacheName}: files are gone`);
}
