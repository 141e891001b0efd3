import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

export type Surroundings = "city" | "residential" | "rural" | "quiet-rural";

/** Noise over kT0B, all in dB: it lies between lowest and highest 8 hours in 10. */
export interface ManMadeNoise {
  /** The published medians: one figure, or two where the forms of the Recommendation part. */
  readonly medianLowDb: number;
  readonly medianHighDb: number;
  /** Lower decile below the lower median, upper decile above the higher one. */
  readonly lowestDb: number;
  readonly highestDb: number;
  /** Whether the lower median continues a formula past the 250 MHz where its table stops. */
  readonly isPastTable: boolean;
}

interface Curve {
  readonly c: number;
  readonly d: number;
  readonly lowerDecileDb: number;
  readonly upperDecileDb: number;
}

const CURVES: Readonly<Record<Surroundings, Curve>> = {
  city: { c: 76.8, d: 27.7, lowerDecileDb: 6.7, upperDecileDb: 11 },
  residential: { c: 72.5, d: 27.7, lowerDecileDb: 5.3, upperDecileDb: 10.6 },
  rural: { c: 67.2, d: 27.7, lowerDecileDb: 4.6, upperDecileDb: 9.2 },
  "quiet-rural": { c: 53.6, d: 28.6, lowerDecileDb: 4.6, upperDecileDb: 9.2 },
};
const TABLE_LIMITS_MHZ: Limits = { min: 0.3, max: 250 };

/** Where there is a published figure at all. [MHz] */
export const MAN_MADE_NOISE_LIMITS_MHZ: Readonly<Record<Surroundings, Limits>> = {
  city: { min: 0.3, max: 900 },
  residential: TABLE_LIMITS_MHZ,
  rural: TABLE_LIMITS_MHZ,
  "quiet-rural": TABLE_LIMITS_MHZ,
};

/**
 * Noise that machines, lamps and vehicles send into an antenna, as a range.
 *
 *     Fam = c − d·log10 f, besides in a city above about 129 MHz: Fam = 44.3 − 12.3·log10 f
 *
 * Assumes: outdoors, a short vertical antenna without loss over ground; add it to a receiver's own
 * noise by systemNoiseFigureDb. Not for: a stage, where displays and dimmers a few metres away decide.
 *
 * @param surroundings  What stands around the antenna
 * @param frequencyMhz  Carrier frequency. [MHz], 0.3 to 250; in a city to 900
 * @returns             Medians and deciles over kT0B, and whether a formula had to be stretched. [dB]
 * @throws RangeError   If nothing is published for that frequency there, or it is NaN.
 * @accuracy            Old measurements (1970s, from memory, to be verified). Above 250 MHz the two forms for a city are 9 to 11 dB apart:
 *                      the truth may lie anywhere between, hence the range.
 * @source              Rec. ITU-R P.372, man-made noise, Table 1 (c and d) and Table 2 (deciles). Table 1 and the form
 *                      to 900 MHz (P.372-8) read second-hand at github.com/mit-ll/LLAMAComm,
 *                      simulator/pathloss/propmodels/manmade.m; Table 2 (P.372-10) second-hand in the code of ITU-R
 *                      Study Group 3, github.com/ITU-R-Study-Group-3/ITU-R-HF, P372/Src/P372/Noise.c; both 2026-12-01.
 * @differs             That code has no deciles for quiet rural areas and takes those of rural ones; so does this.
 *                      Where the forms part, both are given instead of the newer one alone.
 * @checkedBy           none published, see test
 */
export function manMadeNoise(surroundings: Surroundings, frequencyMhz: number): ManMadeNoise {
  requireRange("manMadeNoise", MAN_MADE_NOISE_LIMITS_MHZ[surroundings], { frequencyMhz });
  const { c, d, lowerDecileDb, upperDecileDb } = CURVES[surroundings];
  const medianLowDb = c - d * Math.log10(frequencyMhz);
  // Below the frequency where the two lines for a city cross, only the steeper one is published.
  const flatterDb = surroundings === "city" ? 44.3 - 12.3 * Math.log10(frequencyMhz) : medianLowDb;
  const medianHighDb = Math.max(medianLowDb, flatterDb);
  return {
    medianLowDb,
    medianHighDb,
    lowestDb: medianLowDb - lowerDecileDb,
    highestDb: medianHighDb + upperDecileDb,
    isPastTable: frequencyMhz > TABLE_LIMITS_MHZ.max,
  };
}
