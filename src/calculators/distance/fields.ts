import type { NumberField } from "../field.ts";

const DISTANCE = { quantity: "length", min: 0.1, max: 2000, step: 1.25, stepIs: "ratio" } as const;

/** The inputs of the distance calculator, in the order of its screen. */
export const DISTANCE_FIELDS = {
  fromM: { id: "fromM", ...DISTANCE, initial: 30 },
  toM: { id: "toM", ...DISTANCE, initial: 15 },
  frequencyMhz: {
    id: "frequencyMhz",
    quantity: "frequency",
    min: 25,
    max: 7200,
    initial: 550,
    step: 10,
    stepIs: "sum",
  },
  exponent: {
    id: "exponent",
    quantity: "exponent",
    min: 1,
    max: 6,
    initial: 2,
    step: 0.1,
    stepIs: "sum",
  },
  wishedGainDb: {
    id: "wishedGainDb",
    quantity: "level-change",
    min: -60,
    max: 60,
    initial: 6,
    step: 1,
    stepIs: "sum",
  },
} as const satisfies Readonly<Record<string, NumberField>>;

export type DistanceFieldId = keyof typeof DISTANCE_FIELDS;
export const DISTANCE_FIELD_IDS = Object.keys(DISTANCE_FIELDS) as readonly DistanceFieldId[];

/**
 * Published exponents to start from; any other may be typed. The first follows from the definition
 * (Rec. ITU-R P.525-5, free-space basic transmission loss). The others are the coefficient α of
 * Rec. ITU-R P.1238-11, Table 2, and hold where it says: office 0.3 to 83.5 GHz, in sight 2 to 27 m,
 * out of sight 4 to 30 m; industrial 0.625 to 70.28 GHz, 2 to 101 m and 5 to 108 m. Second-hand:
 * read in an open implementation of the recommendation (model_p1238.m, octave-rxt), 2026-12-01.
 */
export const EXPONENT_PRESETS = [
  { id: "free-space", value: 2 },
  { id: "office-los", value: 1.46 },
  { id: "office-nlos", value: 2.46 },
  { id: "industrial-los", value: 2.31 },
  { id: "industrial-nlos", value: 3.79 },
] as const;
