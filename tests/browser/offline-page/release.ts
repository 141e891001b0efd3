declare const __RELEASE__: string;

/** Set by the build: the same page in several versions. */
export const RELEASE = __RELEASE__;
