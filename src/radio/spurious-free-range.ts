import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * How far two equal carriers may stand above the floor before their third-order products show.
 *
 *     SFDR = 2/3·(IP3 − N)
 *
 * Assumes: intercept point and floor at the input, products of the kind 2A−B. Not for: receivers that
 * are limited by blocking or mixing noise before products appear.
 *
 * @param interceptDbm  Third-order intercept point at the input. [dBm], −300 to 300
 * @param floorDbm      Noise floor at the input. [dBm], −300 to 300
 * @returns             Spurious-free dynamic range; below 0 if even carriers below the floor would make them. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              D. K. Mishra, Radio-Frequency and Microwave Communication Circuits, example 2.15, p. 52;
 *                      J. S. Beasley and G. M. Miller, Modern Electronic Communication, examples 7.7 and 7.8. Read
 *                      second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             none
 * @checkedBy           mishra-2-15-range, beasley-7-7-range, beasley-7-8-range
 */
export function spuriousFreeRangeDb(interceptDbm: number, floorDbm: number): number {
  requireRange("spuriousFreeRangeDb", LEVEL_LIMITS_DBM, { interceptDbm, floorDbm });
  return (2 / 3) * (interceptDbm - floorDbm);
}
