import type { Limits } from "./limits.ts";
import { type LossPoint, type LossRange, tableLossDb } from "./loss-table.ts";
import { requireWhole } from "./require-whole.ts";

const CONNECTOR_COUNT_LIMITS: Limits = { min: 0, max: 1000 };

/**
 * What the connectors of a line lose together.
 *
 *     L = n·a(f)
 *
 * Assumes: every connector like the table's, which holds for sound ones. Not for: loose, corroded or
 * badly soldered ones, which are a fault and have no figure.
 *
 * @param line.points          Table for one connector, as tableLossDb takes it. [MHz], [dB]
 * @param line.frequencyMhz    Carrier frequency. [MHz], 0.1 to 100 000
 * @param line.connectorCount  Connectors in the line, a pair that mates as one. [none], 0 to 1000, whole
 * @returns                    Lowest and highest loss to expect. [dB], 0 or more
 * @throws RangeError          If an input lies outside its range or is NaN, or the table is none.
 * @accuracy                   that of the table; one guide prints 0.5 dB in UHF where 0.1 dB is common practice
 * @source                     common practice, no source
 * @differs                    none
 * @checkedBy           none published, see test
 */
export function connectorLossDb(line: {
  readonly points: readonly LossPoint[];
  readonly frequencyMhz: number;
  readonly connectorCount: number;
}): LossRange {
  const { points, frequencyMhz, connectorCount } = line;
  requireWhole("connectorLossDb", CONNECTOR_COUNT_LIMITS, { connectorCount });
  const { lowDb, highDb } = tableLossDb(points, frequencyMhz);
  return { lowDb: lowDb * connectorCount, highDb: highDb * connectorCount };
}
