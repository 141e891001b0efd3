import {
  carriersForProductDbm,
  interceptFromProductDbm,
  intermodLevelDbm,
} from "../../../src/radio/intermod-level.ts";
import { spuriousFreeRangeDb } from "../../../src/radio/spurious-free-range.ts";
import { type Computed, type Row, take } from "../rows.ts";

const pair = (row: Row) =>
  ({ kind: "2A-B", levelsDbm: [take(row, "levelDbm"), take(row, "levelDbm")] }) as const;

export const COMPUTED: Computed = {
  intermodLevelDbm: (row) =>
    intermodLevelDbm({ ...pair(row), interceptDbm: take(row, "interceptDbm") }),
  interceptFromProductDbm: (row) =>
    interceptFromProductDbm({ ...pair(row), productDbm: take(row, "productDbm") }),
  carriersForProductDbm: (row) =>
    carriersForProductDbm({
      kind: "2A-B",
      productDbm: take(row, "productDbm"),
      interceptDbm: take(row, "interceptDbm"),
    }),
  spuriousFreeRangeDb: (row) =>
    spuriousFreeRangeDb(take(row, "interceptDbm"), take(row, "floorDbm")),
};
