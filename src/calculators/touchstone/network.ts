/** A complex number. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

export interface OnePortPoint {
  readonly frequencyMhz: number;
  readonly s11: Complex;
}

/** s21 is what leaves port 2 of what enters port 1. */
export interface TwoPortPoint extends OnePortPoint {
  readonly s21: Complex;
  readonly s12: Complex;
  readonly s22: Complex;
}

/** What a file says of a part; the points rise in frequency, and there is at least one. */
export type Network =
  | {
      readonly portCount: 1;
      readonly referenceOhm: number;
      readonly points: readonly OnePortPoint[];
    }
  | {
      readonly portCount: 2;
      readonly referenceOhm: number;
      readonly points: readonly TwoPortPoint[];
      /** Lines of noise parameters, which are checked for form and left out. */
      readonly noiseLineCount: number;
    };
