import * as z from "zod/mini";

/**
 * What the app can remember. A record is never edited: a correction is a later record, undo is a
 * `record.withdrawn`, and every screen is a fold over the records.
 */

/** Version of the record bodies below. A change of meaning raises it and adds a migration. */
export const RECORD_VERSION = 1;

type Is<T> = (value: unknown) => value is T;
/** A field that the given question decides: the library's own leaf types would add 1.3 kB to the app. */
const field = <T>(is: Is<T>) => z.custom<T>(is);

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
const id = field(isId);
const NAME = field(isText(120));
const LONG_TEXT = field(isText(4000));

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
  "show.opened": z.object({ name: NAME, place: NAME, timeZone: field(isText(64)) }),
  "show.edited": z.object({ name: NAME, place: NAME }),
  "show.closed": z.object({}),
  "moment.set": z.object({ moment: field(isOneOf(MOMENTS)) }),
  "link.set": z.object({
    link: id,
    name: NAME,
    kind: field(isOneOf(LINK_KINDS)),
    frequencyMhz: field(isNullOr(isCarrierMhz)),
  }),
  "link.removed": z.object({ link: id }),
  "fault.opened": z.object({ moment: field(isOneOf(MOMENTS)) }),
  "dropout.marked": z.object({ fault: id }),
  "dropout.detailed": z.object({
    mark: id,
    links: field(isListOf(isId, 200)),
    place: field(isNullOr(isOneOf(PLACES))),
  }),
  "check.answered": z.object({ fault: id, check: id, outcome: id }),
  "step.skipped": z.object({ fault: id, step: id }),
  "remedy.tried": z.object({ fault: id, remedy: id, result: field(isOneOf(TRIAL_RESULTS)) }),
  "fault.closed": z.object({
    fault: id,
    causes: field(isListOf(isId, 4)),
    ending: field(isOneOf(ENDINGS)),
    remedy: field(isNullOr(isId)),
    note: LONG_TEXT,
  }),
  "sum.kept": z.object({ calculator: id, query: field(isText(1000)), sentence: LONG_TEXT }),
  "note.added": z.object({ text: LONG_TEXT }),
  "record.withdrawn": z.object({ record: id }),
} as const;

export type RecordType = keyof typeof BODIES;
export const RECORD_TYPES = Object.keys(BODIES) as RecordType[];
export const bodySchema = (type: RecordType): z.ZodMiniType => BODIES[type];

/** The part that every record has, whatever its type. */
export const ENVELOPE = z.object({
  /** UUID version 7: sorts by the time it was made. */
  id,
  v: field(isWhole(1)),
  /** Id of the `show.opened` record of the show it belongs to (its own id on `show.opened`). */
  show: id,
  /** Wall clock of the device that made it. [ms since 1970-01-01 UTC] */
  at: field(isWhole(0)),
  device: id,
  /** Hybrid logical clock, see clock.ts: merged journals have one order whatever the wall clocks say. */
  clock: id,
  type: id,
  body: field((_value): _value is unknown => true),
});

type Body<T extends RecordType> = z.infer<(typeof BODIES)[T]>;
type Envelope = Omit<z.infer<typeof ENVELOPE>, "type" | "body">;
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
