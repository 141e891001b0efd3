import { fresnelRadiusM } from "./fresnel-zone.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const EDGE_HEIGHT_LIMITS_M: Limits = { min: -10_000, max: 10_000 };
const KNIFE_EDGE_LIMITS: Limits = { min: -1e9, max: 1e9 };
/** Below this the approximation has come down to 0 dB and is no longer meant. */
const NO_LOSS_UP_TO = -0.78;

/**
 * How deep an edge cuts into a path, in the measure that its loss depends on.
 *
 *     ν = h·√(2 / λ·(1 / d1 + 1 / d2))  =  √2·h / R1
 *
 * Assumes: one straight, sharp, endless edge across the path; distances large against the height.
 * Not for: rounded or narrow things; a person has two edges and lets waves past on both sides.
 *
 * @param heightM       Height of the edge over the straight path, negative below it. [m], −10 000 to 10 000
 * @param fromM         Distance from one antenna to the edge. [m], 0.001 to 10⁹
 * @param toM           Distance from the edge to the other antenna. [m], 0.001 to 10⁹
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             ν, 0 when the edge just touches the path. [none]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              Rec. ITU-R P.526-14, section 4.1, equation for ν; section from memory. Read second-hand in
 *                      A. Ghasemi, Propagation Engineering in Wireless Communications, example 6.3, p. 228, at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             none
 * @checkedBy           rappaport-4-7-parameter, rappaport-4-7-parameter-below, rappaport-4-8-parameter
 */
export function knifeEdgeRatio(edge: {
  readonly heightM: number;
  readonly fromM: number;
  readonly toM: number;
  readonly frequencyMhz: number;
}): number {
  requireRange("knifeEdgeRatio", EDGE_HEIGHT_LIMITS_M, { heightM: edge.heightM });
  return (Math.SQRT2 * edge.heightM) / fresnelRadiusM({ ...edge, order: 1 });
}

/**
 * Loss that one sharp edge adds to that of free space.
 *
 *     J(ν) = 6.9 + 20·log10(√((ν − 0.1)² + 1) + ν − 0.1)  for ν above −0.78,  else 0
 *
 * Assumes: as knifeEdgeRatio. Not for: an edge near the path but below it, where the true level swings up to
 * 1.4 dB above free space and back, which this does not follow.
 *
 * @param knifeEdgeRatio  ν of knifeEdgeRatio. [none], −10⁹ to 10⁹
 * @returns             Loss over free space, 0 or more. [dB]
 * @throws RangeError   If ν lies outside that range or is NaN.
 * @accuracy            within 0.15 dB of the exact Fresnel integrals for ν above −0.78
 * @source              Rec. ITU-R P.526-14, section 4.1, equation (31); number from memory. Formula read second-hand
 *                      in A. Ghasemi, Propagation Engineering in Wireless Communications, example 6.4, p. 233, at
 *                      github.com/FOSSEE/Python-Textbook-Companions; with 0 up to −0.78 as in Rec. ITU-R P.2001-2,
 *                      section 3.12, read second-hand in open code, 2026-12-01.
 * @differs             none
 * @checkedBy           ghasemi-6-3-loss, ghasemi-6-4-loss, p526-at-0, p526-at-1, rappaport-4-7-loss,
 *                      rappaport-4-8-loss
 */
export function knifeEdgeLossDb(knifeEdgeRatio: number): number {
  requireRange("knifeEdgeLossDb", KNIFE_EDGE_LIMITS, { knifeEdgeRatio });
  if (knifeEdgeRatio <= NO_LOSS_UP_TO) return 0;
  const shifted = knifeEdgeRatio - 0.1;
  return 6.9 + 20 * Math.log10(Math.hypot(shifted, 1) + shifted);
}
