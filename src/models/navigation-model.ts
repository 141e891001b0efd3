import { computed, type ReadonlySignal, signal } from "@preact/signals";
import { hashOf, parseHash, type Route } from "./route.ts";

/** The address bar, as far as the app uses it. */
export interface AddressBar {
  hash(): string;
  push(hash: string): void;
  replace(hash: string): void;
  /** Reaches the address when typing rests: browsers refuse a change at every key press. */
  replaceSoon(hash: string): void;
  onChange(hear: () => void): void;
}

export interface NavigationModel {
  readonly route: ReadonlySignal<Route>;
  readonly hash: ReadonlySignal<string>;
  /** Which screen, whatever stands in its fields. */
  readonly place: ReadonlySignal<string>;
  go(route: Route): void;
  /** Changes the address in place: nothing that the back button would stop at. */
  replace(route: Route): void;
  /** The same for an address that changes while somebody types. */
  retype(route: Route): void;
}

export function createNavigationModel(address: AddressBar): NavigationModel {
  const hash = signal(address.hash());
  address.onChange(() => {
    hash.value = address.hash();
  });
  const route = computed(() => parseHash(hash.value));
  return {
    place: computed(() => hashOf(route.value).split("?")[0] ?? ""),
    hash,
    route,
    go: (next) => {
      hash.value = hashOf(next);
      address.push(hash.value);
    },
    replace: (next) => {
      hash.value = hashOf(next);
      address.replace(hash.value);
    },
    retype: (next) => {
      hash.value = hashOf(next);
      address.replaceSoon(hash.value);
    },
  };
}
