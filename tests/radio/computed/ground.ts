import { breakPointM } from "../../../src/radio/break-point.ts";
import { farGroundLossDb } from "../../../src/radio/far-ground-loss.ts";
import { breakPointLossDb } from "../../../src/radio/street-loss.ts";
import { type Computed, type Row, take } from "../rows.ts";

const heights = (row: Row) => ({
  fromHeightM: take(row, "fromHeightM"),
  toHeightM: take(row, "toHeightM"),
});

export const COMPUTED: Computed = {
  farGroundLossDb: (row) => farGroundLossDb({ ...heights(row), distanceM: take(row, "distanceM") }),
  breakPointM: (row) => breakPointM({ ...heights(row), frequencyMhz: take(row, "frequencyMhz") }),
  breakPointLossDb: (row) =>
    breakPointLossDb({ ...heights(row), frequencyMhz: take(row, "frequencyMhz") }),
};
