export const title = "Calculators";
export const purpose =
  "Sums that decide what to do. Each works alone, without a rig and without a show.";
export const distance = "Distance and level";
export const distanceHint = "What moving an antenna or a performer gains or costs.";
export const keep = "Keep in log";
export const reset = "Reset";
export const less = "Less";
export const more = "More";
