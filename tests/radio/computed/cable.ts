import { cableLossDb } from "../../../src/radio/cable-loss.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  // The book states one figure and no frequency, so the table has one point and it is asked for.
  cableLossDb: (row) => {
    const lossDb = take(row, "lossPer100mDb");
    const points = [{ frequencyMhz: 100, lowDb: lossDb, highDb: lossDb }];
    return cableLossDb({ points, frequencyMhz: 100, lengthM: take(row, "lengthM") }).highDb;
  },
};
