import { readRow } from "../journal/reading.ts";
import type { JournalRecord } from "../journal/records.ts";
import type { SetAside } from "../journal/store.ts";
import type { Keep } from "./surroundings.ts";

const KEY = "unsaved";

/** Where entries wait that the database would not take, so that a killed app does not lose them. */
export interface EmergencySlot {
  read(): { readonly records: readonly JournalRecord[]; readonly damaged: readonly SetAside[] };
  write(records: readonly JournalRecord[]): void;
}

export function createEmergencySlot(keep: Keep): EmergencySlot {
  return {
    read: () => {
      const kept = keep.read(KEY);
      const records: JournalRecord[] = [];
      const damaged: SetAside[] = [];
      for (const raw of kept === null ? [] : rowsOf(kept)) {
        const read = readRow(raw);
        if (read.kind === "record") records.push(read.record);
        else damaged.push({ key: KEY, raw, reason: read.kind });
      }
      return { records, damaged };
    },
    write: (records) => {
      keep.write(KEY, records.length > 0 ? JSON.stringify(records) : null);
    },
  };
}

/** A text that is no list of records any more counts as one damaged row. */
function rowsOf(text: string): readonly unknown[] {
  try {
    const rows: unknown = JSON.parse(text);
    return Array.isArray(rows) ? rows : [rows];
  } catch (cause) {
    if (cause instanceof SyntaxError) return [text];
    throw cause;
  }
}
