import { carsonBandwidthHz, carsonDeviationHz } from "../../../src/radio/carson-bandwidth.ts";
import { cascadeNoiseFigureDb } from "../../../src/radio/cascade-noise.ts";
import { combinedCarrierToNoiseDb } from "../../../src/radio/combined-carrier-to-noise.ts";
import { noiseFactor, noiseFigureDb } from "../../../src/radio/noise-factor.ts";
import { noiseFloorDbm } from "../../../src/radio/noise-floor.ts";
import { interferenceToNoiseDb, noiseRiseDb } from "../../../src/radio/noise-rise.ts";
import {
  noiseFigureFromTemperatureDb,
  noiseTemperatureK,
} from "../../../src/radio/noise-temperature.ts";
import { thermalNoiseDbm } from "../../../src/radio/thermal-noise.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  thermalNoiseDbm: (row) => thermalNoiseDbm(take(row, "temperatureK"), take(row, "bandwidthHz")),
  noiseFloorDbm: (row) => noiseFloorDbm(take(row, "bandwidthHz"), take(row, "noiseFigureDb")),
  noiseFactor: (row) => noiseFactor(take(row, "noiseFigureDb")),
  noiseFigureDb: (row) => noiseFigureDb(take(row, "noiseFactor")),
  noiseTemperatureK: (row) => noiseTemperatureK(take(row, "noiseFigureDb")),
  noiseFigureFromTemperatureDb: (row) => noiseFigureFromTemperatureDb(take(row, "temperatureK")),
  cascadeNoiseFigureDb: (row) => {
    const ordinals = ["first", "second", "third"].filter((one) => `${one}GainDb` in row.input);
    return cascadeNoiseFigureDb(
      ordinals.map((one) => ({
        gainDb: take(row, `${one}GainDb`),
        noiseFigureDb: take(row, `${one}FigureDb`),
      })),
    );
  },
  noiseRiseDb: (row) => noiseRiseDb(take(row, "interferenceToNoiseDb")),
  interferenceToNoiseDb: (row) => interferenceToNoiseDb(take(row, "riseDb")),
  combinedCarrierToNoiseDb: (row) =>
    combinedCarrierToNoiseDb(["firstDb", "secondDb", "thirdDb"].map((name) => take(row, name))),
  carsonBandwidthHz: (row) => carsonBandwidthHz(take(row, "deviationHz"), take(row, "audioHz")),
  carsonDeviationHz: (row) => carsonDeviationHz(take(row, "bandwidthHz"), take(row, "audioHz")),
};
