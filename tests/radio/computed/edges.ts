import { clearanceRatio } from "../../../src/radio/fresnel-clearance.ts";
import { fresnelRadiusM } from "../../../src/radio/fresnel-zone.ts";
import { knifeEdgeLossDb, knifeEdgeRatio } from "../../../src/radio/knife-edge.ts";
import { type Computed, type Row, take } from "../rows.ts";

const point = (row: Row) => ({
  fromM: take(row, "fromM"),
  toM: take(row, "toM"),
  frequencyMhz: take(row, "frequencyMhz"),
});

export const COMPUTED: Computed = {
  fresnelRadiusM: (row) => fresnelRadiusM({ ...point(row), order: take(row, "order") }),
  clearanceRatio: (row) => clearanceRatio({ ...point(row), clearanceM: take(row, "clearanceM") }),
  knifeEdgeRatio: (row) => knifeEdgeRatio({ ...point(row), heightM: take(row, "heightM") }),
  knifeEdgeLossDb: (row) => knifeEdgeLossDb(take(row, "knifeEdgeRatio")),
};
