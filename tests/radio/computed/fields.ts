import { eirpForFieldDbm, fieldDbuvPerM } from "../../../src/radio/field-strength.ts";
import { fluxDbwPerM2 } from "../../../src/radio/flux-density.ts";
import { fieldForLevelDbuvPerM, receivedDbm } from "../../../src/radio/received-level.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  fieldDbuvPerM: (row) => fieldDbuvPerM(take(row, "eirpDbm"), take(row, "distanceM")),
  eirpForFieldDbm: (row) => eirpForFieldDbm(take(row, "fieldDbuvPerM"), take(row, "distanceM")),
  fluxDbwPerM2: (row) => fluxDbwPerM2(take(row, "fieldDbuvPerM")),
  receivedDbm: (row) =>
    receivedDbm({
      fieldDbuvPerM: take(row, "fieldDbuvPerM"),
      frequencyMhz: take(row, "frequencyMhz"),
      gainDbi: take(row, "gainDbi"),
    }),
  fieldForLevelDbuvPerM: (row) =>
    fieldForLevelDbuvPerM({
      receivedDbm: take(row, "receivedDbm"),
      frequencyMhz: take(row, "frequencyMhz"),
      gainDbi: take(row, "gainDbi"),
    }),
};
