import { effect } from "@preact/signals";
import type { NavigationModel } from "../models/navigation-model.ts";
import { parseHash } from "../models/route.ts";
import type { Keep } from "../models/surroundings.ts";

const PLACE_KEY = "place";
const SCROLL_KEY = "scroll";
const REST_MS = 250;

/**
 * Goes to the place where the user was, unless the address names one by itself (a link, a shortcut,
 * a reload). The function that it returns is for the moment when the database, which may know
 * better, has been read: it does the same again, unless the user has moved on.
 */
export function restorePlace(keep: Keep, navigation: NavigationModel): () => void {
  if (navigation.hash.value.length > 2) return () => {};
  const restore = (): void => {
    const kept = keep.read(PLACE_KEY);
    if (kept !== null) navigation.replace(parseHash(kept));
  };
  restore();
  const restored = navigation.hash.value;
  return () => {
    if (navigation.hash.value === restored) restore();
  };
}

/**
 * Keeps place and scroll where a killed app finds them, and gives each place its scroll back.
 * `isReady` turns true once the screen has its content and can be scrolled.
 */
export function followPlace(
  navigation: NavigationModel,
  keep: Keep,
  isReady: { readonly value: boolean },
): void {
  history.scrollRestoration = "manual";
  const scrolls = new Map<string, number>();
  const stored = keep.read(SCROLL_KEY)?.split(" ") ?? [];
  if (stored[0] !== undefined) scrolls.set(stored[0], Number(stored[1]) || 0);
  let here = navigation.place.value;
  let timer: ReturnType<typeof setTimeout> | undefined;
  const note = (): void => {
    clearTimeout(timer);
    scrolls.set(here, Math.round(scrollY));
    keep.write(SCROLL_KEY, `${here} ${Math.round(scrollY)}`);
  };
  addEventListener(
    "scroll",
    () => {
      clearTimeout(timer);
      timer = setTimeout(note, REST_MS);
    },
    { passive: true },
  );
  addEventListener("visibilitychange", () => {
    if (document.visibilityState === "hidden") note();
  });
  effect(() => {
    const hash = navigation.hash.value;
    // Opening "mark" marks: it must never be what a restart returns to.
    if (parseHash(hash).place !== "mark") keep.write(PLACE_KEY, hash);
  });
  // By place, not by address: a calculator keeps its scroll while its fields change.
  effect(() => {
    const next = navigation.place.value;
    if (!isReady.value) return;
    clearTimeout(timer);
    const hasMoved = here !== next;
    here = next;
    const scroll = scrolls.get(next) ?? 0;
    // At the start the page stands at its top: to scroll there would lay it out for nothing.
    if (hasMoved || scroll > 0) requestAnimationFrame(() => scrollTo(0, scroll));
  });
}
