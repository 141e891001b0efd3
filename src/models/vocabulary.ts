/** The closed lists that screens offer, in the order in which they stand on the screen. */

export { EXPONENT_PRESETS } from "../calculators/distance/fields.ts";
export { METRES_PER } from "../calculators/units.ts";
export { CANT_TELL } from "../diagnosis/knowledge.ts";
export { ENDINGS, LINK_KINDS, MOMENTS, PLACES, TRIAL_RESULTS } from "../journal/records.ts";
