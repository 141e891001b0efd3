import { gainDbd, gainDbi } from "../../../src/radio/dipole-gain.ts";
import { eirpFromErpDbm, erpFromEirpDbm } from "../../../src/radio/dipole-power.ts";
import { fieldRatioDb } from "../../../src/radio/field-ratio.ts";
import { levelDbm, levelOfWattsDbm, powerMw, powerW } from "../../../src/radio/power-level.ts";
import { powerRatio, powerRatioDb } from "../../../src/radio/power-ratio.ts";
import { eirpDbm, powerForEirpDbm } from "../../../src/radio/radiated-power.ts";
import { voltageDbuv } from "../../../src/radio/voltage-level.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  powerRatioDb: (row) => powerRatioDb(take(row, "ratio")),
  powerRatio: (row) => powerRatio(take(row, "changeDb")),
  fieldRatioDb: (row) => fieldRatioDb(take(row, "ratio")),
  levelDbm: (row) => levelDbm(take(row, "powerMw")),
  powerMw: (row) => powerMw(take(row, "powerDbm")),
  levelOfWattsDbm: (row) => levelOfWattsDbm(take(row, "powerW")),
  powerW: (row) => powerW(take(row, "powerDbm")),
  voltageDbuv: (row) => voltageDbuv(take(row, "powerDbm"), take(row, "impedanceOhm")),
  gainDbi: (row) => gainDbi(take(row, "gainDbd")),
  gainDbd: (row) => gainDbd(take(row, "gainDbi")),
  eirpDbm: (row) =>
    eirpDbm({
      powerDbm: take(row, "powerDbm"),
      lossDb: take(row, "lossDb"),
      gainDbi: take(row, "gainDbi"),
    }),
  powerForEirpDbm: (row) =>
    powerForEirpDbm({
      eirpDbm: take(row, "eirpDbm"),
      lossDb: take(row, "lossDb"),
      gainDbi: take(row, "gainDbi"),
    }),
  eirpFromErpDbm: (row) => eirpFromErpDbm(take(row, "erpDbm")),
  erpFromEirpDbm: (row) => erpFromEirpDbm(take(row, "eirpDbm")),
};
