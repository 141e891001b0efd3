import type { Keep } from "../models/surroundings.ts";

const PREFIX = "fadewright.";

/**
 * Short texts in localStorage. Where the browser refuses it (switched off, full, private window)
 * they live as long as the window, and `write` says so.
 */
export function createKeptTexts(): Keep {
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
