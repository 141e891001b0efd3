/** How far a row of shared/ can be trusted. */
const STANDINGS = ["read", "second-hand", "common-practice", "from-memory"];
const FIELDS = [
  "id",
  "quantity",
  "input",
  "expected",
  "tolerance",
  "toleranceReason",
  "basis",
  "source",
];
const SOURCE_FIELDS = ["body", "document", "edition", "where", "readAt", "readOn", "standing"];
/**
 * A number's name ends in its unit, or in the word for a number that has none: a share of 1, a
 * count, a ratio.
 */
const NAMED_WITH_UNIT =
  /^(exponent|order|count|level|ratio|share)$|(M|Mm|Km|Mhz|Khz|Hz|Db|Dbm|Dbuv|Dbi|Dbd|Dbc|Mw|W|K|Deg|S|Ms|Seconds|MPerS|VPerM|PerM2|Ohm|Percent|Probability|Count|Ratio|Order|Exponent|Factor|Level)$/;

export interface RowFile {
  readonly path: string;
  readonly rows: readonly unknown[];
}

/** Whatever a published example lacks before a test may lean on it. */
export function rowOffences(files: readonly RowFile[]): string[] {
  const seen = new Map<unknown, string>();
  return files.flatMap(({ path, rows }) =>
    rows.flatMap((row, index) => {
      const id = fieldOf(row, "id");
      const place = `${path}: ${typeof id === "string" && id !== "" ? id : `row ${index}`}`;
      const first = typeof id === "string" ? seen.get(id) : undefined;
      seen.set(id, path);
      return [
        ...(first === undefined ? [] : [`${place} has the id of a row in ${first}`]),
        ...offencesOf(row).map((offence) => `${place} ${offence}`),
      ];
    }),
  );
}

function offencesOf(row: unknown): string[] {
  const source = fieldOf(row, "source");
  const tolerance = fieldOf(row, "tolerance");
  const standing = fieldOf(source, "standing");
  return [
    ...FIELDS.filter((name) => isEmpty(fieldOf(row, name))).map((name) => `lacks ${name}`),
    ...SOURCE_FIELDS.filter((name) => isEmpty(fieldOf(source, name))).map(
      (name) => `lacks source.${name}`,
    ),
    ...numbersOf(fieldOf(row, "input"))
      .filter((name) => !NAMED_WITH_UNIT.test(name))
      .map((name) => `names no unit in input.${name}`),
    ...(/^\d{4}-\d\d-\d\d$/.test(String(fieldOf(source, "readOn")))
      ? []
      : ["has no date in source.readOn"]),
    ...(STANDINGS.includes(String(standing)) ? [] : [`has the standing "${standing}"`]),
    ...(typeof tolerance === "number" && tolerance > 0 ? [] : ["has no tolerance above 0"]),
  ];
}

const numbersOf = (input: unknown): string[] =>
  Object.entries(input ?? {}).flatMap(([name, value]) => (typeof value === "number" ? [name] : []));

const fieldOf = (value: unknown, name: string): unknown =>
  typeof value === "object" && value !== null ? Reflect.get(value, name) : undefined;

const isEmpty = (value: unknown): boolean => value === undefined || value === null || value === "";
