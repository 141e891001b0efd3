import { signal } from "@preact/signals";
import type { Keep } from "../models/surroundings.ts";
import type { KeptStore } from "../storage/kept-store.ts";

const PREFIX = "fadewright.";

/**
 * Short texts in localStorage, which can be read before anything else. Where the browser refuses it
 * (switched off, full, private window) they live as long as the window, and `write` says so.
 */
export function createLocalTexts(): Keep {
  const inMemory = new Map<string, string>();
  return {
    read: (key) => {
      const held = inMemory.get(key);
      if (held !== undefined) return held;
      try {
        return localStorage.getItem(PREFIX + key);
      } catch (refused) {
        if (refused instanceof DOMException) return null;
        throw refused;
      }
    },
    write: (key, text) => {
      inMemory.delete(key);
      try {
        if (text === null) localStorage.removeItem(PREFIX + key);
        else localStorage.setItem(PREFIX + key, text);
        return true;
      } catch (refused) {
        if (!(refused instanceof DOMException)) throw refused;
        if (text !== null) inMemory.set(key, text);
        return false;
      }
    },
  };
}

/**
 * The same with the database behind it. localStorage answers at once but may be some seconds old
 * after a kill; what the database gives a moment later is as new as the last tap. `read` is
 * reactive, so that a screen follows.
 */
export function createKeptTexts(local: Keep, store: KeptStore): Keep & { load(): Promise<void> } {
  const written = new Map<string, string | null>();
  const stored = signal<ReadonlyMap<string, string>>(new Map());
  return {
    read: (key) => {
      const newest = stored.value.get(key) ?? null;
      const own = written.get(key);
      return own !== undefined ? own : (newest ?? local.read(key));
    },
    write: (key, text) => {
      written.set(key, text);
      store.write(key, text);
      return local.write(key, text);
    },
    load: async () => {
      const texts = await store.readAll();
      if (texts !== null) stored.value = texts;
    },
  };
}
