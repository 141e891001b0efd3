import { erpExemptDistanceM, erpExemptW } from "../../../src/radio/erp-exemption.ts";
import { powerDensityWPerM2 } from "../../../src/radio/power-density.ts";
import { levelOfWattsDbm } from "../../../src/radio/power-level.ts";
import { eirpDbm } from "../../../src/radio/radiated-power.ts";
import { sarExemptDistanceM, sarExemptMw } from "../../../src/radio/sar-exemption.ts";
import { exposureRule } from "../exposure-rules.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  powerDensityWPerM2: (row) =>
    powerDensityWPerM2({
      eirpDbm: eirpDbm({
        powerDbm: levelOfWattsDbm(take(row, "powerW")),
        lossDb: 0,
        gainDbi: take(row, "gainDbi"),
      }),
      distanceM: take(row, "distanceM"),
      reflectionFactor: take(row, "reflectionFactor"),
    }),
  sarExemptMw: (row) => sarExemptMw(take(row, "distanceM"), take(row, "frequencyMhz")),
  sarExemptDistanceM: (row) => sarExemptDistanceM(take(row, "powerMw"), take(row, "frequencyMhz")),
  erpExemptW: (row) =>
    erpExemptW(
      { distanceM: take(row, "distanceM"), frequencyMhz: take(row, "frequencyMhz") },
      exposureRule("fcc-erp-exemption").steps,
    ),
  erpExemptDistanceM: (row) =>
    erpExemptDistanceM(
      { erpW: take(row, "erpW"), frequencyMhz: take(row, "frequencyMhz") },
      exposureRule("fcc-erp-exemption").steps,
    ),
};
