import { circularIsolationDb } from "../../../src/radio/circular-isolation.ts";
import {
  type Polarization,
  polarizationEfficiencyRatio,
} from "../../../src/radio/polarization-efficiency.ts";
import { polarizationLossDb } from "../../../src/radio/polarization-loss.ts";
import { worstPolarizationLossDb } from "../../../src/radio/worst-polarization.ts";
import { type Computed, type Row, take } from "../rows.ts";

const wave = (row: Row): Polarization => ({
  tiltDeg: take(row, "waveTiltDeg"),
  axisRatio: take(row, "waveAxisRatio"),
});

/** Some sources give long over short axis in decibels. */
const antenna = (row: Row): Polarization => ({
  tiltDeg: take(row, "antennaTiltDeg"),
  axisRatio: row.input["antennaAxisRatio"] ?? 10 ** (-take(row, "antennaAxialRatioDb") / 20),
});

const limits = (row: Row) => ({
  isolationDb: take(row, "isolationDb"),
  crossRatioDb: take(row, "crossRatioDb"),
});

export const COMPUTED: Computed = {
  polarizationEfficiencyRatio: (row) => polarizationEfficiencyRatio(wave(row), antenna(row)),
  polarizationLossDb: (row) =>
    polarizationLossDb({ wave: wave(row), antenna: antenna(row), ...limits(row) }),
  worstPolarizationLossDb: (row) =>
    worstPolarizationLossDb({
      waveAxisRatio: take(row, "waveAxisRatio"),
      antennas: [antenna(row)],
      ...limits(row),
    }),
  circularIsolationDb: (row) => circularIsolationDb(take(row, "axialRatioDb")),
};
