/** Both ends belong to the range. */
export interface Limits {
  readonly min: number;
  readonly max: number;
}

/*
 * What the radio functions accept. Wide enough for every published example, narrow enough that no
 * result can overflow: not a promise that a formula holds out there, which each docstring gives.
 */

export const DISTANCE_LIMITS_M: Limits = { min: 0.001, max: 1e9 };
/** The bands that the Radio Regulations number: 3 kHz to 3 000 GHz (No. 2.1, from memory, to be verified). */
export const FREQUENCY_LIMITS_MHZ: Limits = { min: 0.003, max: 3e6 };
export const ANTENNA_LENGTH_LIMITS_M: Limits = { min: 0.001, max: 1000 };
/**
 * Published ones run from 1.46 (office in sight, Rec. ITU-R P.1238-11, second-hand) to 6 (obstructed
 * in buildings: Rappaport, Table 4.2, from memory, to be verified).
 */
export const EXPONENT_LIMITS: Limits = { min: 0.5, max: 10 };
export const LEVEL_CHANGE_LIMITS_DB: Limits = { min: -300, max: 300 };
