/** The parts used here of libraries that come without types. */
declare module "bessel" {
  /** Bessel functions of the first kind and modified, order n (whole). */
  export function besselj(x: number, n: number): number;
  export function besseli(x: number, n: number): number;
}

declare module "jstat" {
  interface Distribution<Shape extends number[]> {
    pdf(x: number, ...shape: Shape): number;
    cdf(x: number, ...shape: Shape): number;
    inv(probability: number, ...shape: Shape): number;
  }
  export const jStat: {
    readonly normal: Distribution<[mean: number, sd: number]>;
    readonly chisquare: Distribution<[degrees: number]>;
    readonly beta: Distribution<[alpha: number, beta: number]>;
    readonly gamma: Distribution<[shape: number, scale: number]>;
    readonly poisson: Pick<Distribution<[mean: number]>, "pdf" | "cdf">;
    readonly binomial: Pick<Distribution<[count: number, probability: number]>, "pdf" | "cdf">;
    erf(x: number): number;
    erfc(x: number): number;
  };
}
