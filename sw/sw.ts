import { cacheForStart, heldCache, noteTaken, release, settle } from "./hold.ts";
import { isShowOpen } from "./show-lock.ts";
import {
  cacheNameOf,
  completionOf,
  type Entry,
  INDEX,
  ourCaches,
  storeVersion,
  versionOf,
} from "./versions.ts";

declare const self: ServiceWorkerGlobalScope & { readonly __WB_MANIFEST: readonly Entry[] };

const ENTRIES = self.__WB_MANIFEST;
const OWN = cacheNameOf(ENTRIES);

self.addEventListener("install", (event) => event.waitUntil(install()));

self.addEventListener("activate", (event) => {
  // Without the claim, the window of the very first visit would stay without worker until its
  // next load, and that load may find no network.
  event.waitUntil(settle(OWN).finally(() => self.clients.claim()));
});

self.addEventListener("fetch", (event) => {
  const { request } = event;
  if (request.method !== "GET" || !request.url.startsWith(self.registration.scope)) return;
  const answer = request.mode === "navigate" ? answerStart() : answerFile(request);
  event.respondWith(
    answer.then(
      (response) => response ?? fetch(request),
      // Storage that can't be read must not stand before a network that may be there.
      () => fetch(request),
    ),
  );
});

self.addEventListener("message", (event) => {
  const reply = async (answer: Promise<unknown>): Promise<void> =>
    event.ports[0]?.postMessage(await answer);
  switch (Object(event.data).type) {
    case "completeness":
      return event.waitUntil(reply(completeness()));
    case "show-open":
      return event.waitUntil(reply(isShowOpen()));
    case "release":
      return event.waitUntil(reply(release(OWN)));
    case "take-over":
      // The only place that ends the waiting. The note comes first: the activation may follow in
      // another run of this script.
      return event.waitUntil(noteTaken(OWN).then(() => self.skipWaiting()));
  }
});

async function install(): Promise<void> {
  // An installed version can be kept from activating only by not installing it. The first version
  // replaces nothing. Asked before the first request, so that a show costs no traffic.
  if (self.registration.active !== null && (await isShowOpen()) === true) {
    throw new Error("a show is open");
  }
  await storeVersion(OWN, ENTRIES);
}

async function answerStart(): Promise<Response | undefined> {
  return find(INDEX, [await cacheForStart(OWN), OWN]);
}

/** A second window may run another version than the one that is started now. */
async function answerFile(request: Request): Promise<Response | undefined> {
  const started = (await heldCache(OWN)) ?? OWN;
  return (await find(request, [started, OWN])) ?? find(request, await ourCaches());
}

async function find(
  request: Request | string,
  cacheNames: readonly string[],
): Promise<Response | undefined> {
  for (const cacheName of cacheNames) {
    // One stored response for each address: headers that would choose among several mean nothing.
    const hit = await caches.match(request, { cacheName, ignoreVary: true });
    if (hit !== undefined) return hit;
  }
  return undefined;
}

async function completeness() {
  const started = (await heldCache(OWN)) ?? OWN;
  return {
    complete: (await completionOf(started)) !== null,
    version: versionOf(started),
    held: started !== OWN,
  };
}
