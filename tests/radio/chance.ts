/** Uniform numbers from 0 to 1, the same in each run: a 32-bit xorshift (Marsaglia 2003). */
export function seededChance(seed: number): () => number {
  let state = seed | 1;
  return () => {
    state ^= state << 13;
    state ^= state >>> 17;
    state ^= state << 5;
    return (state >>> 0) / 2 ** 32;
  };
}

/** A complex Gaussian of mean power 1, by Box and Muller (1958). */
export function complexGaussian(chance: () => number): { re: number; im: number } {
  const amplitude = Math.sqrt(-Math.log(1 - chance()));
  const angle = 2 * Math.PI * chance();
  return { re: amplitude * Math.cos(angle), im: amplitude * Math.sin(angle) };
}

/** The integral of a smooth function by Simpson's rule. */
export function integral(f: (x: number) => number, from: number, to: number, steps = 2000): number {
  const width = (to - from) / steps;
  let sum = f(from) + f(to);
  for (let n = 1; n < steps; n += 1) sum += f(from + n * width) * (n % 2 === 1 ? 4 : 2);
  return (sum * width) / 3;
}
