import Complex from "complex.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  type Polarization,
  polarizationEfficiencyRatio,
} from "../../src/radio/polarization-efficiency.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = {
  waveTiltDeg: { min: -360, max: 360 },
  waveAxisRatio: { min: -1, max: 1 },
  antennaTiltDeg: { min: -360, max: 360 },
  antennaAxisRatio: { min: -1, max: 1 },
};
type Inputs = Readonly<Record<keyof typeof RANGES, number>>;

const efficiency = (inputs: Inputs): number =>
  polarizationEfficiencyRatio(
    { tiltDeg: inputs.waveTiltDeg, axisRatio: inputs.waveAxisRatio },
    { tiltDeg: inputs.antennaTiltDeg, axisRatio: inputs.antennaAxisRatio },
  );

const linear = (tiltDeg: number): Polarization => ({ tiltDeg, axisRatio: 0 });
const RIGHT: Polarization = { tiltDeg: 0, axisRatio: 1 };
const LEFT: Polarization = { tiltDeg: 0, axisRatio: -1 };

/** The complex unit vector of a field that draws this ellipse, drawn from its definition. */
function unitVector({ tiltDeg, axisRatio }: Polarization): [Complex, Complex] {
  const tilt = (tiltDeg * Math.PI) / 180;
  const length = Math.hypot(1, axisRatio);
  const long = new Complex(1 / length);
  const short = new Complex({ re: 0, im: axisRatio / length });
  return [
    long.mul(Math.cos(tilt)).sub(short.mul(Math.sin(tilt))),
    long.mul(Math.sin(tilt)).add(short.mul(Math.cos(tilt))),
  ];
}

describe("polarizationEfficiencyRatio", () => {
  it("is the squared product of the complex unit vectors, by which IEEE Std 145 defines it", () => {
    fc.assert(
      fc.property(anyOf(RANGES), (inputs) => {
        const [x, y] = unitVector({
          tiltDeg: inputs.waveTiltDeg,
          axisRatio: inputs.waveAxisRatio,
        });
        const [u, v] = unitVector({
          tiltDeg: inputs.antennaTiltDeg,
          axisRatio: inputs.antennaAxisRatio,
        });
        const product = x.mul(u.conjugate()).add(y.mul(v.conjugate())).abs() ** 2;
        expect(efficiency(inputs)).toBeCloseTo(product, 12);
      }),
      SEEDED,
    );
  });

  it("is the squared cosine of half the distance on the sphere of Poincaré", () => {
    // J. D. Kraus, Antennas and Wave Propagation, section 2-17, second-hand: the point of a state lies
    // at longitude 2·tilt and latitude 2·atan(axis ratio).
    const pointOf = (tiltDeg: number, axisRatio: number) => {
      const longitude = (2 * tiltDeg * Math.PI) / 180;
      const latitude = 2 * Math.atan(axisRatio);
      return [
        Math.cos(latitude) * Math.cos(longitude),
        Math.cos(latitude) * Math.sin(longitude),
        Math.sin(latitude),
      ];
    };
    fc.assert(
      fc.property(anyOf(RANGES), (inputs) => {
        const wave = pointOf(inputs.waveTiltDeg, inputs.waveAxisRatio);
        const antenna = pointOf(inputs.antennaTiltDeg, inputs.antennaAxisRatio);
        const cosine = wave.reduce((sum, part, n) => sum + part * (antenna[n] ?? 0), 0);
        expect(efficiency(inputs)).toBeCloseTo((1 + cosine) / 2, 12);
      }),
      SEEDED,
    );
  });

  it("is nothing for crossed whips, and for the other sense of turning", () => {
    // Balanis, example 2.12: orthogonal linear gives 0. Circular against opposite circular too.
    expect(polarizationEfficiencyRatio(linear(0), linear(90))).toBeCloseTo(0, 15);
    expect(polarizationEfficiencyRatio(RIGHT, LEFT)).toBe(0);
  });

  it("is one half between circular and linear, however the whip is held", () => {
    for (const tiltDeg of [0, 17, 90, 200])
      expect(polarizationEfficiencyRatio(linear(tiltDeg), LEFT)).toBeCloseTo(0.5, 14);
  });

  it("keeps its digits next to a full miss", () => {
    // cos² of 89.9999 degrees: sin of 0.0001 degrees is 1.74533e-6, its square 3.04617e-12.
    expect(polarizationEfficiencyRatio(linear(0), linear(89.9999)) / 3.04617e-12).toBeCloseTo(1, 5);
  });

  it("is 1 for equal states and the same either way round", () => {
    fc.assert(
      fc.property(anyOf(RANGES), (inputs) => {
        const wave = { tiltDeg: inputs.waveTiltDeg, axisRatio: inputs.waveAxisRatio };
        const antenna = { tiltDeg: inputs.antennaTiltDeg, axisRatio: inputs.antennaAxisRatio };
        expect(polarizationEfficiencyRatio(wave, wave)).toBeCloseTo(1, 14);
        expect(polarizationEfficiencyRatio(wave, antenna)).toBe(
          polarizationEfficiencyRatio(antenna, wave),
        );
      }),
      SEEDED,
    );
  });

  it("shares the whole power between an antenna and its opposite", () => {
    fc.assert(
      fc.property(anyOf(RANGES), (inputs) => {
        const { antennaTiltDeg, antennaAxisRatio } = inputs;
        const opposite = {
          ...inputs,
          antennaTiltDeg: antennaTiltDeg > 0 ? antennaTiltDeg - 90 : antennaTiltDeg + 90,
          antennaAxisRatio: -antennaAxisRatio,
        };
        expect(efficiency(inputs) + efficiency(opposite)).toBeCloseTo(1, 12);
      }),
      SEEDED,
    );
  });

  it("lies between 0 and 1 over its whole range and refuses the rest", () => {
    expectWithin(efficiency, RANGES, { min: 0, max: 1 + 1e-15 });
    expectRefusals(efficiency, RANGES);
  });
});
