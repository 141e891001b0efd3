import * as z from "zod/mini";

/**
 * What the app can remember. A record is never edited: a correction is a later record, undo is a
 * `record.withdrawn`, and every screen is a fold over the records.
 */

/** Version of the record bodies below. A change of meaning raises it and adds a migration. */
export const RECORD_VERSION = 1;

// One kind of check for all: each of the library's own would be shipped beside it.
const within = (least: number, value: number, most: number): boolean =>
  value >= least && value <= most;
const text = (most: number, least = 0) =>
  z.string().check(z.refine(({ length }) => within(least, length, most)));
const list = <T extends z.ZodMiniType>(of: T, most: number) =>
  z.array(of).check(z.refine(({ length }) => within(0, length, most)));
const whole = (least: number) =>
  z.number().check(z.refine((value) => Number.isSafeInteger(value) && value >= least));
const id = text(64, 1);
const NAME = text(120);
const LONG_TEXT = text(4000);

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
/** The answer that every check takes. */
export const CANT_TELL = "cant-tell";

const BODIES = {
  "show.opened": z.object({ name: NAME, place: NAME, timeZone: text(64) }),
  "show.edited": z.object({ name: NAME, place: NAME }),
  "show.closed": z.object({}),
  "moment.set": z.object({ moment: z.enum(MOMENTS) }),
  "link.set": z.object({
    link: id,
    name: NAME,
    kind: z.enum(LINK_KINDS),
    frequencyMhz: z.nullable(z.number().check(z.refine((mhz) => within(25, mhz, 7200)))),
  }),
  "link.removed": z.object({ link: id }),
  "fault.opened": z.object({ moment: z.enum(MOMENTS) }),
  "dropout.marked": z.object({ fault: id }),
  "dropout.detailed": z.object({
    mark: id,
    links: list(id, 200),
    place: z.nullable(z.enum(PLACES)),
  }),
  "check.answered": z.object({ fault: id, check: id, outcome: id }),
  "step.skipped": z.object({ fault: id, step: id }),
  "remedy.tried": z.object({ fault: id, remedy: id, result: z.enum(TRIAL_RESULTS) }),
  "fault.closed": z.object({
    fault: id,
    causes: list(id, 4),
    ending: z.enum(ENDINGS),
    remedy: z.nullable(id),
    note: LONG_TEXT,
  }),
  "sum.kept": z.object({ calculator: id, query: text(1000), sentence: LONG_TEXT }),
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
  v: whole(1),
  /** Id of the `show.opened` record of the show it belongs to (its own id on `show.opened`). */
  show: id,
  /** Wall clock of the device that made it. [ms since 1970-01-01 UTC] */
  at: whole(0),
  device: id,
  /** Hybrid logical clock, see clock.ts: merged journals have one order whatever the wall clocks say. */
  clock: id,
  type: id,
  body: z.unknown(),
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
