import { isClock } from "./clock.ts";
import { migrate, type RawRecord } from "./migrations.ts";
import {
  bodySchema,
  envelopeSchema,
  type JournalRecord,
  RECORD_TYPES,
  RECORD_VERSION,
  type RecordType,
} from "./records.ts";

/** What a stored or received row turned out to be. */
export type Row =
  | { readonly kind: "record"; readonly record: JournalRecord }
  /** Written by a newer version of the app. */
  | { readonly kind: "newer" }
  | { readonly kind: "damaged"; readonly reason: string };

/**
 * Reads anything as a record: lifts a copy to the present version, then checks the envelope, then
 * the body by its type. Never throws and never changes `raw`; unknown fields are left out.
 */
export function readRow(raw: unknown): Row {
  try {
    return read(raw);
  } catch (cause) {
    // Nested too deeply to be copied, or an object whose properties throw.
    return damaged(cause instanceof Error ? `cannot be read: ${cause.message}` : "cannot be read");
  }
}

function read(raw: unknown): Row {
  if (typeof raw !== "object" || raw === null || Array.isArray(raw)) return damaged("not a record");
  const { v } = raw as { readonly v?: unknown };
  const hasVersion = Number.isInteger(v) && (v as number) > 0;
  if (hasVersion && (v as number) > RECORD_VERSION) return { kind: "newer" };
  const lifted = hasVersion ? migrate(raw as RawRecord, v as number) : raw;
  const envelope = envelopeSchema().safeParse(lifted);
  if (!envelope.success) return wrongField([], envelope.error.issues);
  const { type, clock } = envelope.data;
  if (!isClock(clock)) return wrongField(["clock"]);
  if (!isRecordType(type)) return wrongField(["type"]);
  const body = bodySchema(type).safeParse(envelope.data.body);
  if (!body.success) return wrongField(["body"], body.error.issues);
  return { kind: "record", record: { ...envelope.data, body: body.data } as JournalRecord };
}

const isRecordType = (type: string): type is RecordType =>
  (RECORD_TYPES as readonly string[]).includes(type);

const damaged = (reason: string): Row => ({ kind: "damaged", reason });

function wrongField(
  path: readonly PropertyKey[],
  issues: readonly { readonly path: readonly PropertyKey[] }[] = [],
): Row {
  return damaged(`${[...path, ...(issues[0]?.path ?? [])].join(".")} is missing or not valid`);
}
