import { distanceForChangeM, levelChangeDb } from "../../radio/distance-ratio.ts";
import { farZoneStartM } from "../../radio/far-zone.ts";
import { requireRange } from "../../radio/require-range.ts";
import { wavelengthM } from "../../radio/wavelength.ts";
import { DISTANCE_FIELD_IDS, DISTANCE_FIELDS, type DistanceFieldId } from "./fields.ts";

export type DistanceInputs = Readonly<Record<DistanceFieldId, number>>;

export type DistanceCaution =
  /** A distance in the answer, the wished one included, lies within two wavelengths of an antenna. */
  | "near-zone"
  /** The wish would be met only where the formulas no longer hold: no distance is given. */
  | "wish-inside-near-zone"
  /** The wish would be met outside the range of distances that the calculator takes: none is given. */
  | "wish-beyond-range";

export type DistanceOutcome =
  | {
      readonly kind: "ok";
      /** Positive: louder at the new distance. [dB] */
      readonly changeDb: number;
      /** The same as a factor of received power. [none] */
      readonly powerRatio: number;
      /** Where the wished gain would be met; null if a caution says that no number can be given. [m] */
      readonly distanceForWishM: number | null;
      /** Below this distance there is no answer. [m] */
      readonly nearZoneM: number;
      readonly cautions: readonly DistanceCaution[];
    }
  | {
      readonly kind: "no-answer";
      /** The old or the new distance lies inside the near zone of an antenna. */
      readonly reason: "inside-near-zone";
      readonly nearZoneM: number;
    };

/** Up to this many near zones the answer carries a caution. */
const DOUBTFUL_NEAR_ZONES = 2;

/** Where the near zone ends for half-wave antennas at both ends: one wavelength. [m] */
export function nearZoneEndM(frequencyMhz: number): number {
  return farZoneStartM({ frequencyMhz, antennaLengthM: wavelengthM(frequencyMhz) / 2 });
}

/**
 * What a change of distance does to the received level, and where a wished change would be met.
 *
 * The calculator does not ask for antennas, so it takes half-wave ones, the usual case at both ends.
 * - Either distance below one wavelength: no answer. Not even a half-wave antenna is far away there,
 *   so both formulas are outside what they hold for.
 * - Any distance below two wavelengths: answer and caution. Legal for half-wave antennas, doubtful
 *   for a directional one, which is longer: with one wavelength of length its far zone starts at two.
 * - The wish falls below one wavelength or outside the range of the distance fields: the rest of the
 *   answer stands, the wished distance is withheld and a caution says why.
 *
 * @throws RangeError if an input lies outside its field's range or is NaN; never for one inside
 */
export function distanceOutcome(inputs: DistanceInputs): DistanceOutcome {
  for (const id of DISTANCE_FIELD_IDS)
    requireRange("distanceOutcome", DISTANCE_FIELDS[id], { [id]: inputs[id] });
  const { fromM, toM, frequencyMhz, exponent, wishedGainDb } = inputs;
  const nearZoneM = nearZoneEndM(frequencyMhz);
  if (fromM < nearZoneM || toM < nearZoneM)
    return { kind: "no-answer", reason: "inside-near-zone", nearZoneM };

  const wishM = distanceForChangeM({ fromM, changeDb: wishedGainDb, exponent });
  const { min, max } = DISTANCE_FIELDS.toM;
  const withheld: DistanceCaution | null =
    wishM < nearZoneM
      ? "wish-inside-near-zone"
      : wishM < min || wishM > max
        ? "wish-beyond-range"
        : null;
  const nearest = Math.min(fromM, toM, withheld === null ? wishM : Number.POSITIVE_INFINITY);
  const cautions: DistanceCaution[] = [];
  if (nearest < DOUBTFUL_NEAR_ZONES * nearZoneM) cautions.push("near-zone");
  if (withheld !== null) cautions.push(withheld);

  const changeDb = levelChangeDb({ fromM, toM, exponent });
  return {
    kind: "ok",
    changeDb,
    powerRatio: 10 ** (changeDb / 10),
    distanceForWishM: withheld === null ? wishM : null,
    nearZoneM,
    cautions,
  };
}
