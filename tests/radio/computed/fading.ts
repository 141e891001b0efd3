import { dopplerHz, speedForDopplerMPerS } from "../../../src/radio/doppler.ts";
import { fadeDurationS, fadeRateHz, type RayleighWalk } from "../../../src/radio/fade-rate.ts";
import { riceOutageProbability } from "../../../src/radio/rice-outage.ts";
import { nullIntervalS, standingWavePeriodM } from "../../../src/radio/standing-wave.ts";
import { twoPathPowerMw } from "../../../src/radio/two-path-power.ts";
import { type Computed, type Row, take } from "../rows.ts";

/** Books give the needed amplitude over the root mean square, and a speed instead of its Doppler shift. */
const walk = (row: Row): RayleighWalk => ({
  marginDb: row.input["marginDb"] ?? -20 * Math.log10(take(row, "thresholdRatio")),
  shiftHz: row.input["shiftHz"] ?? dopplerHz(take(row, "speedMPerS"), take(row, "frequencyMhz")),
  branchCount: take(row, "branchCount"),
});

export const COMPUTED: Computed = {
  fadeRateHz: (row) => fadeRateHz(walk(row)),
  fadeDurationS: (row) => fadeDurationS(walk(row)),
  dopplerHz: (row) => dopplerHz(take(row, "speedMPerS"), take(row, "frequencyMhz")),
  speedForDopplerMPerS: (row) =>
    speedForDopplerMPerS(take(row, "shiftHz"), take(row, "frequencyMhz")),
  standingWavePeriodM: (row) => standingWavePeriodM(take(row, "frequencyMhz")),
  nullIntervalS: (row) => nullIntervalS(take(row, "speedMPerS"), take(row, "frequencyMhz")),
  twoPathPowerMw: (row) =>
    twoPathPowerMw({
      firstDbm: take(row, "firstDbm"),
      secondDbm: take(row, "secondDbm"),
      phaseDeg: take(row, "phaseDeg"),
    }),
  riceOutageProbability: (row) =>
    riceOutageProbability({
      marginDb: take(row, "marginDb"),
      kFactorDb: take(row, "kFactorDb"),
    }),
};
