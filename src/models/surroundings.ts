/**
 * What the models may ask of the phone. src/app makes it from the browser; tests make it from
 * plain values. Everything that depends on clock, chance or device comes through here.
 */
export interface Surroundings {
  /** Wall clock. [ms since 1970-01-01 UTC] */
  nowMs(): number;
  /** A new UUID version 7. */
  newId(): string;
  /** IANA name of the zone that the phone is in now. */
  timeZone(): string;
  /** Names this browser on this phone in the journal. */
  readonly device: string;
  readonly keep: Keep;
  /** For what the database would not take: a keep that does not need the database. */
  readonly emergencyKeep: Keep;
  /** A light acknowledgement in the hand, where the phone has it. */
  nudge(): void;
  /** Asks the browser not to clear the journal by itself. Null: it can't say. */
  askToPersist(): Promise<boolean | null>;
  storageUse(): Promise<StorageUse>;
  shareText(title: string, text: string): Promise<Shared>;
  shareFile(name: string, text: string): Promise<Shared>;
  /** Keeps the screen on while wanted. */
  keepAwake(wanted: boolean): void;
}

/** Short texts that survive a killed app. Not for the journal. */
export interface Keep {
  /** Reactive: what the database knows better arrives a moment after the start. */
  read(key: string): string | null;
  /** Null removes it. False: the phone did not keep it. */
  write(key: string, text: string | null): boolean;
}

export interface StorageUse {
  readonly isPersistent: boolean | null;
  readonly usedBytes: number | null;
}

/** How a text left the app. "shown": neither share sheet nor clipboard, the text has to be shown. */
export type Shared = "shared" | "copied" | "saved" | "cancelled" | "shown";
