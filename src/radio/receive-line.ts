import { attenuatorNoiseFigureDb } from "./attenuator-noise.ts";
import { cascadeNoiseFigureDb, type NoiseStage, STAGE_COUNT_LIMITS } from "./cascade-noise.ts";
import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";
import { systemNoiseFigureDb } from "./system-noise.ts";
import { REFERENCE_TEMPERATURE_K, thermalNoiseDbm } from "./thermal-noise.ts";

/**
 * One thing that the signal passes on its way from antenna to receiver. Cable, connector, splitter
 * and passive filter are losses; the receiver itself, if it is to count, is an amplifier of 0 dB.
 */
export type LineElement =
  | { readonly kind: "loss"; readonly lossDb: number; readonly temperatureK: number }
  | { readonly kind: "amplifier"; readonly gainDb: number; readonly noiseFigureDb: number };

/** How things stand at the output of one element. */
export interface LinePoint {
  /** From the antenna to here, a loss below 0. [dB] */
  readonly gainDb: number;
  /** Of all up to here, referred to the antenna. [dB] */
  readonly noiseFigureDb: number;
  readonly levelDbm: number;
  readonly floorDbm: number;
}

/**
 * Level and noise floor after each element of a receive line: shows where carrier-to-noise is lost.
 *
 *     Li = L0 + Gi; Ni = k·T0·B·(fa + Fi − 1)·gi, with Gi and Fi those of elements 1 to i in cascade
 *
 * Assumes: everything matched and linear, the same bandwidth throughout. Not for: amplifiers driven
 * into compression (gainCompressionDb), nor products made on the way (intermodLevelDbm).
 *
 * @param line.elements        In the order of the signal: lossDb and temperatureK as attenuatorNoiseFigureDb takes
 *                             them, gainDb −300 to 300 and noiseFigureDb 0 to 400; 1 to 40 of them. [dB], [K]
 * @param line.levelDbm        Carrier at the antenna's output. [dBm], −300 to 300
 * @param line.bandwidthHz     Noise bandwidth of the receiver. [Hz], 1 to 10¹²
 * @param line.antennaNoiseDb  What the antenna picks up over kT0B; 0 for surroundings at 290 K. [dB], −100 to 300
 * @returns                    One point for each element; the last stands for the whole line
 * @throws RangeError          If an input lies outside its range or is NaN, or there is no element.
 * @accuracy                   exact for the assumptions
 * @source                     H. T. Friis, as cascadeNoiseFigureDb; D. K. Mishra, Radio-Frequency and Microwave
 *                             Communication Circuits, examples 2.10 and 2.11, read second-hand at
 *                             github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs                    none
 * @checkedBy           none published, see test
 */
export function alongLine(line: {
  readonly elements: readonly LineElement[];
  readonly levelDbm: number;
  readonly bandwidthHz: number;
  readonly antennaNoiseDb: number;
}): readonly LinePoint[] {
  const { elements, levelDbm, bandwidthHz, antennaNoiseDb } = line;
  requireRange("alongLine", LEVEL_LIMITS_DBM, { levelDbm });
  requireRange("alongLine", STAGE_COUNT_LIMITS, { elementCount: elements.length });
  const referenceDbm = thermalNoiseDbm(REFERENCE_TEMPERATURE_K, bandwidthHz);
  const stages: NoiseStage[] = [];
  let gainDb = 0;
  return elements.map((element) => {
    const stage = stageOf(element);
    stages.push(stage);
    gainDb += stage.gainDb;
    const noiseFigureDb = cascadeNoiseFigureDb(stages);
    const noiseDb = systemNoiseFigureDb(antennaNoiseDb, noiseFigureDb);
    return {
      gainDb,
      noiseFigureDb,
      levelDbm: levelDbm + gainDb,
      floorDbm: referenceDbm + noiseDb + gainDb,
    };
  });
}

function stageOf(element: LineElement): NoiseStage {
  if (element.kind === "amplifier") return element;
  const { lossDb, temperatureK } = element;
  return { gainDb: -lossDb, noiseFigureDb: attenuatorNoiseFigureDb(lossDb, temperatureK) };
}
