import causes from "../../shared/knowledge/causes.json" with { type: "json" };
import checks from "../../shared/knowledge/checks.json" with { type: "json" };
import remedies from "../../shared/knowledge/remedies.json" with { type: "json" };
import scale from "../../shared/knowledge/scale.json" with { type: "json" };
import wording from "../../shared/wording/fault-finder.en.json" with { type: "json" };
import type { Elicited } from "../diagnosis/elicit.ts";
import type { Wording } from "./wording.ts";

/** What the fault finder knows, in the practitioners' words, and what it says. */
export interface Expertise {
  readonly elicited: Elicited;
  readonly wording: Wording;
}

/**
 * The files of shared/knowledge and shared/wording as one. The build makes one data file of it that
 * the app reads after its first paint; only the build and the tests import this object.
 */
export const EXPERTISE: Expertise = {
  elicited: {
    scale,
    causes: causes.causes,
    checks: checks.checks,
    remedies: remedies.remedies,
    fallbackSeconds: remedies.fallbackSeconds,
  },
  wording,
};
