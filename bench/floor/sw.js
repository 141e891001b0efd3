// The build puts the list of built files in place of the word FILES, and this file beside them.
const CACHE = "floor";

self.addEventListener("install", (event) => {
  event.waitUntil(caches.open(CACHE).then((cache) => cache.addAll(FILES)));
});

self.addEventListener("fetch", (event) => {
  const asked = event.request.mode === "navigate" ? "./index.html" : event.request;
  event.respondWith(caches.match(asked).then((kept) => kept ?? fetch(event.request)));
});
