import { RELEASE } from "./release.ts";

export const text = `late part of ${RELEASE}`;
