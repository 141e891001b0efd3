import { filesBelow, readText } from "../architecture/tree.ts";

/** A published figure that a radio function is held against; inputs and quantity carry their units. */
export interface Row {
  readonly id: string;
  readonly quantity: string;
  readonly input: Readonly<Record<string, number>>;
  readonly expected: number;
  readonly tolerance: number;
  readonly toleranceReason: string;
  readonly basis: string;
  readonly source: Readonly<Record<string, string>>;
}

export const ROWS: readonly Row[] = filesBelow("shared/vectors")
  .filter((path) => path.endsWith(".json"))
  .flatMap((path) => JSON.parse(readText(path)) as Row[]);

/** How the program computes each quantity from the inputs of a row. */
export type Computed = Readonly<Record<string, (row: Row) => number>>;

/** The named input of a row; a row without it is an error, not a pass. */
export function take(row: Row, name: string): number {
  const value = row.input[name];
  if (value === undefined) throw new Error(`${row.id} lacks ${name}`);
  return value;
}
