import causes from "../../shared/knowledge/causes.json";
import checks from "../../shared/knowledge/checks.json";
import remedies from "../../shared/knowledge/remedies.json";
import scale from "../../shared/knowledge/scale.json";
import type { Elicited } from "../diagnosis/elicit.ts";

/**
 * What practitioners said, in words, read-only. `fromElicited` makes numbers of it.
 * The keys `because` and `source` of the files are for readers; a build leaves them out.
 */
export const ELICITED: Elicited = {
  scale,
  causes: causes.causes,
  checks: checks.checks,
  remedies: remedies.remedies,
  fallbackSeconds: remedies.fallbackSeconds,
};
