import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { NOISE_RISE_LIMITS_DB } from "./noise-rise.ts";
import { lessOneDb, onePlusDb } from "./one-plus-ratio.ts";
import { requireRange } from "./require-range.ts";

/** Data sheets state the blocking level for this loss of sensitivity. [dB] */
const STATED_LOSS_DB = 3;

/**
 * Sensitivity that a strong carrier off the channel costs a receiver, from the blocking level that
 * its data sheet states for 3 dB.
 *
 *     D = 10·log10(1 + (10^0.3 − 1)·10^((P − Pblock) / 10))
 *
 * Assumes: what the blocker adds grows with it dB for dB, as mixing noise and out-of-band noise do;
 * the same frequency offset as on the data sheet. Not for: compression, which sets in faster.
 *
 * @param blockerDbm        Strong carrier at the receiver's input. [dBm], −300 to 300
 * @param blockingLevelDbm  Blocker that costs 3 dB of sensitivity, as stated. [dBm], −300 to 300
 * @returns                 Loss of sensitivity. [dB], 0 or more
 * @throws RangeError       If an input lies outside its range or is NaN.
 * @accuracy                exact at the stated point; elsewhere as good as the assumption
 * @source                  CEPT, Monte Carlo simulation handbook, page 505674, desensitisation and blocking. Read at
 *                          ecowiki.atlassian.net, 2026-12-01. That 3 dB are usual: microwaves101.com, receiver blocking.
 * @differs                 none
 * @checkedBy           none published, see test
 */
export function desensitisationDb(blockerDbm: number, blockingLevelDbm: number): number {
  requireRange("desensitisationDb", LEVEL_LIMITS_DBM, { blockerDbm, blockingLevelDbm });
  return onePlusDb(blockerDbm - blockingLevelDbm + lessOneDb(STATED_LOSS_DB));
}

/**
 * Strongest carrier off the channel for a given loss of sensitivity: the inverse of desensitisationDb.
 *
 *     P = Pblock + 10·log10((10^(D / 10) − 1) / (10^0.3 − 1))
 *
 * Assumes: as desensitisationDb. Not for: a loss of 0, which no blocker causes.
 *
 * @param lossDb            Loss of sensitivity. [dB], 10⁻¹² to 400
 * @param blockingLevelDbm  Blocker that costs 3 dB of sensitivity, as stated. [dBm], −300 to 300
 * @returns                 Blocker at the receiver's input. [dBm]
 * @throws RangeError       If an input lies outside its range or is NaN.
 * @accuracy                as desensitisationDb
 * @source                  as desensitisationDb, solved for the blocker
 * @differs                 none
 * @checkedBy           none published, see test
 */
export function blockerForLossDbm(lossDb: number, blockingLevelDbm: number): number {
  requireRange("blockerForLossDbm", LEVEL_LIMITS_DBM, { blockingLevelDbm });
  requireRange("blockerForLossDbm", NOISE_RISE_LIMITS_DB, { lossDb });
  return blockingLevelDbm + lessOneDb(lossDb) - lessOneDb(STATED_LOSS_DB);
}
