const NUMBER = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?$/;

/** A decimal number as analysers write it, or null: not "", "0x10", "NaN", "1e999" or a comma. */
export function readNumber(word: string): number | null {
  const value = NUMBER.test(word) ? Number(word) : Number.NaN;
  return Number.isFinite(value) ? value : null;
}
