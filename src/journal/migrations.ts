import { RECORD_VERSION } from "./records.ts";

/** A record as it was stored, before anything is known about it but that it is an object. */
export type RawRecord = Readonly<Record<string, unknown>>;

export interface Migration {
  /** The version it leads to, from the one below. */
  readonly to: number;
  readonly why: string;
  readonly up: (old: RawRecord) => RawRecord;
}

/** Append only, numbered 2, 3, 4 … without a gap. Never edit or remove one that has shipped. */
export const MIGRATIONS: readonly Migration[] = [];

/**
 * Lifts a stored record to the present version, on a copy: the stored one stays what it was.
 *
 * @param from  Version of `raw`: whole, 1 to `version`.
 * @throws RangeError  If the list does not lead there step by step.
 */
export function migrate(
  raw: RawRecord,
  from: number,
  migrations = MIGRATIONS,
  version = RECORD_VERSION,
): RawRecord {
  if (from === version) return raw;
  let lifted: RawRecord = JSON.parse(JSON.stringify(raw));
  for (let to = from + 1; to <= version; to++) {
    const migration = migrations[to - 2];
    if (migration?.to !== to)
      throw new RangeError(`migrate: migrations must hold version ${to}, got ${migration?.to}`);
    lifted = { ...migration.up(lifted), v: to };
  }
  return lifted;
}
