import * as z from "zod/mini";

/**
 * What the app can remember. A record is never edited: a correction is a later record, undo is a
 * `record.withdrawn`, and every screen is a fold over the records.
 */

/** Version of the record bodies below. A change of meaning raises it and adds a migration. */
export const RECORD_VERSION = 1;

type Is<T> = (value: unknown) => value is T;
const isText =
  (most: number, least = 0): Is<string> =>
  (value): value is string =>
    typeof value === "string" && value.length >= least && value.length <= most;
const isWhole =
  (least: number): Is<number> =>
  (value): value is number =>
    Number.isSafeInteger(value) && Number(value) >= least;
const isOneOf =
  <T extends string>(known: readonly T[]): Is<T> =>
  (value): value is T =>
    known.some((one) => one === value);
const isListOf =
  <T>(is: Is<T>, most: number): Is<T[]> =>
  (value): value is T[] =>
    Array.isArray(value) && value.length <= most && value.every(is);
const isNullOr =
  <T>(is: Is<T>): Is<T | null> =>
  (value): value is T | null =>
    value === null || is(value);
const isCarrierMhz: Is<number> = (value): value is number =>
  typeof value === "number" && value >= 25 && value <= 7200;

const isId = isText(64, 1);
const isName = isText(120);
const isLongText = isText(4000);

/** From which moment of the show something may be done, in rising freedom. */
export const MOMENTS = ["live", "between", "off-air"] as const;
/** Nine parts of the stage as the performer names them, and the places off it. */
export const PLACES = [
  "up-right",
  "up-centre",
  "up-left",
  "centre-right",
  "centre",
  "centre-left",
  "down-right",
  "down-centre",
  "down-left",
  "in-the-house",
  "off-stage",
] as const;
export const LINK_KINDS = ["handheld", "bodypack", "in-ear", "intercom"] as const;
export const TRIAL_RESULTS = ["cured", "better", "no-change", "worse"] as const;
export const ENDINGS = ["cured", "worked-around", "stopped-by-itself", "unsolved"] as const;

const BODIES = {
  "show.opened": { name: isName, place: isName, timeZone: isText(64) },
  "show.edited": { name: isName, place: isName },
  "show.closed": {},
  "moment.set": { moment: isOneOf(MOMENTS) },
  "link.set": {
    link: isId,
    name: isName,
    kind: isOneOf(LINK_KINDS),
    frequencyMhz: isNullOr(isCarrierMhz),
  },
  "link.removed": { link: isId },
  "fault.opened": { moment: isOneOf(MOMENTS) },
  "dropout.marked": { fault: isId },
  "dropout.detailed": {
    mark: isId,
    links: isListOf(isId, 200),
    place: isNullOr(isOneOf(PLACES)),
  },
  "check.answered": { fault: isId, check: isId, outcome: isId },
  "step.skipped": { fault: isId, step: isId },
  "remedy.tried": { fault: isId, remedy: isId, result: isOneOf(TRIAL_RESULTS) },
  "fault.closed": {
    fault: isId,
    causes: isListOf(isId, 4),
    ending: isOneOf(ENDINGS),
    remedy: isNullOr(isId),
    note: isLongText,
  },
  "sum.kept": { calculator: isId, query: isText(1000), sentence: isLongText },
  "note.added": { text: isLongText },
  "record.withdrawn": { record: isId },
};

/** The part that every record has, whatever its type. */
const ENVELOPE = {
  /** UUID version 7: sorts by the time it was made. */
  id: isId,
  v: isWhole(1),
  /** Id of the `show.opened` record of the show it belongs to (its own id on `show.opened`). */
  show: isId,
  /** Wall clock of the device that made it. [ms since 1970-01-01 UTC] */
  at: isWhole(0),
  device: isId,
  /** Hybrid logical clock, see clock.ts: merged journals have one order whatever the wall clocks say. */
  clock: isId,
  type: isId,
  body: (_value: unknown): _value is unknown => true,
};

type Shape = Readonly<Record<string, Is<unknown>>>;
type Parsed<S extends Shape> = { [K in keyof S]: S[K] extends Is<infer T> ? T : never };

export type RecordType = keyof typeof BODIES;
export const RECORD_TYPES = Object.keys(BODIES) as RecordType[];

const made = new Map<Shape, z.ZodMiniType>();
/**
 * Made when the first record is read, not when the app starts. `z.custom` in place of the library's
 * own leaf types, which would add 1.3 kB to the app.
 */
function schemaOf<S extends Shape>(shape: S): z.ZodMiniType<Parsed<S>> {
  let schema = made.get(shape);
  if (!schema) {
    const fields = Object.entries(shape).map(([name, is]) => [name, z.custom(is)]);
    schema = z.object(Object.fromEntries(fields));
    made.set(shape, schema);
  }
  return schema as z.ZodMiniType<Parsed<S>>;
}
export const bodySchema = (type: RecordType): z.ZodMiniType => schemaOf<Shape>(BODIES[type]);
export const envelopeSchema = (): z.ZodMiniType<Parsed<typeof ENVELOPE>> => schemaOf(ENVELOPE);

type Body<T extends RecordType> = Parsed<(typeof BODIES)[T]>;
type Envelope = Omit<Parsed<typeof ENVELOPE>, "type" | "body">;
/** A record of one type, or (without an argument) the union of all. */
export type JournalRecord<T extends RecordType = RecordType> = {
  [K in T]: Envelope & { type: K; body: Body<K> };
}[T];
/** What a screen asks to be recorded; the app adds id, time, device and clock. */
export type Entry<T extends RecordType = RecordType> = {
  [K in T]: { type: K; body: Body<K> };
}[T];

export type Moment = (typeof MOMENTS)[number];
export type StagePlace = (typeof PLACES)[number];
export type LinkKind = (typeof LINK_KINDS)[number];
export type TrialResult = (typeof TRIAL_RESULTS)[number];
export type Ending = (typeof ENDINGS)[number];
