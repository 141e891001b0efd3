import { isShowOpen } from "./show-lock.ts";
import { completionOf, markerKey, ourCaches, retire } from "./versions.ts";

declare const self: ServiceWorkerGlobalScope;

/** Note in the own cache: the version to serve instead of the own one. */
const HELD = markerKey("held");
/** Note in the own cache: the user has asked for this version. */
const TAKEN = markerKey("taken");

/** Read once for each start of the worker, which the browser ends and starts as it likes. */
let held: string | null | undefined;

/** Name of the cache that is served instead of the own one; null: none is. */
export async function heldCache(own: string): Promise<string | null> {
  if (held === undefined) held = await readHeld(own);
  return held;
}

/** Notes that the activation to come was asked for, before it is set off. */
export const noteTaken = async (own: string): Promise<void> =>
  (await caches.open(own)).put(TAKEN, new Response());

/**
 * A waiting version is activated as soon as the last window has gone, without asking anybody: a
 * phone that ends the app in the middle of a show does just that, and an activation can't be
 * refused. So the version that was running is kept and goes on being served while a show is open.
 */
export async function settle(own: string): Promise<void> {
  const cache = await caches.open(own);
  const isTaken = await cache.delete(TAKEN);
  const before = isTaken ? null : await versionBefore(own);
  held = before !== null && (await isShowOpen()) === true ? before : null;
  await (held === null ? cache.delete(HELD) : cache.put(HELD, new Response(held)));
  await clearOlder(own, held);
}

/** The cache to start the app from. The version changes here only, so never under a loaded page. */
export async function cacheForStart(own: string): Promise<string> {
  const before = await heldCache(own);
  if (before === null) return own;
  // A lock that can't be read now is not one that has been lifted.
  if ((await isShowOpen()) !== false) return before;
  await release(own);
  return own;
}

/** Ends the hold: the next start of the app is served from the own version. */
export async function release(own: string): Promise<void> {
  held = null;
  await (await caches.open(own)).delete(HELD);
  await clearOlder(own, null);
}

async function readHeld(cacheName: string): Promise<string | null> {
  const note = await caches.match(HELD, { cacheName });
  return note === undefined ? null : note.text();
}

/** What was served until now: the newest older version, or the one that it held in its place. */
async function versionBefore(own: string): Promise<string | null> {
  const [newest] = (await olderThan(own))
    .filter(({ at }) => at > 0)
    .sort((a, b) => b.at - a.at)
    .map(({ name }) => name);
  if (newest === undefined) return null;
  const heldThere = await readHeld(newest);
  return heldThere !== null && (await completionOf(heldThere)) !== null ? heldThere : newest;
}

/** Everything stored before the own version; time 0 for what is not whole. Nothing if that is the own. */
async function olderThan(own: string): Promise<{ name: string; at: number }[]> {
  const ownAt = (await completionOf(own))?.at ?? 0;
  const others = (await ourCaches()).filter((name) => name !== own);
  const dated = await Promise.all(
    others.map(async (name) => ({ name, at: (await completionOf(name))?.at ?? 0 })),
  );
  return dated.filter(({ at }) => at < ownAt);
}

/**
 * Removes older versions and unfinished ones. Nothing is removed while yet another version is being
 * installed, whose cache looks unfinished, or while a second window is open: it may still run the
 * older version and ask for its files. The next activation removes what was left.
 */
async function clearOlder(own: string, kept: string | null): Promise<void> {
  const windows = await self.clients.matchAll({ type: "window", includeUncontrolled: true });
  const canRemove = self.registration.installing === null && windows.length <= 1;
  for (const { name } of await olderThan(own)) {
    if (name !== kept) await (canRemove ? caches.delete(name) : retire(name));
  }
}
