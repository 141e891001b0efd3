import { seededChance } from "./chance.ts";

export interface Walked {
  /** Times the level fell below, for each wavelength walked. */
  readonly fadesPerWavelength: number;
  /** Part of a wavelength walked in a fade, on average. */
  readonly fadeLengthWavelengths: number;
}

const WAVES = 40;
const STEPS_PER_WAVELENGTH = 60;
const WAVELENGTHS = 60;

/**
 * A walk simulated from first principles: plane waves from all sides with random phases, summed at
 * each antenna, each antenna with waves of its own; the strongest antenna counts. A direct wave comes
 * from the side, so that its phase stays. Mean power 1.
 */
export function walked(setting: {
  readonly thresholdPower: number;
  readonly branchCount: number;
  readonly k: number;
  readonly runs: number;
}): Walked {
  const chance = seededChance(20_261_201);
  const { thresholdPower, branchCount, k, runs } = setting;
  let falls = 0;
  let below = 0;
  for (let run = 0; run < runs; run += 1) {
    const branches = Array.from({ length: branchCount }, () => branch(chance, k));
    let wasBelow = true;
    for (let step = 0; step < WAVELENGTHS * STEPS_PER_WAVELENGTH; step += 1) {
      const isBelow = branches.map((next) => next() < thresholdPower).every(Boolean);
      if (isBelow) below += 1;
      if (isBelow && !wasBelow) falls += 1;
      wasBelow = isBelow;
    }
  }
  return {
    fadesPerWavelength: falls / (runs * WAVELENGTHS),
    fadeLengthWavelengths: below / STEPS_PER_WAVELENGTH / falls,
  };
}

/** The power at one antenna, step by step. */
function branch(chance: () => number, k: number): () => number {
  const waves = Array.from({ length: WAVES }, (_, n) => {
    const phase = 2 * Math.PI * chance();
    const angle = (2 * Math.PI * (n + chance())) / WAVES;
    const turn = (2 * Math.PI * Math.cos(angle)) / STEPS_PER_WAVELENGTH;
    return { re: Math.cos(phase), im: Math.sin(phase), c: Math.cos(turn), s: Math.sin(turn) };
  });
  const scale = Math.sqrt(1 / (WAVES * (1 + k)));
  const direct = Math.sqrt(k / (1 + k));
  return () => {
    let re = direct;
    let im = 0;
    for (const wave of waves) {
      re += wave.re * scale;
      im += wave.im * scale;
      const turned = wave.re * wave.c - wave.im * wave.s;
      wave.im = wave.re * wave.s + wave.im * wave.c;
      wave.re = turned;
    }
    return re ** 2 + im ** 2;
  };
}
