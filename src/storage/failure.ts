import type { StoreFailure } from "../journal/store.ts";

const REASON_BY_ERROR: Readonly<Record<string, StoreFailure>> = {
  VersionError: "newer",
  QuotaExceededError: "quota",
  // What browsers throw once the connection is gone, or the database behind it.
  InvalidStateError: "lost",
  UnknownError: "lost",
  AbortError: "lost",
};

/** An opening that was given up; `reason` is its name. */
export const givenUp = (reason: "blocked" | "no-answer"): DOMException =>
  new DOMException(`opening the database: ${reason}`, reason);

export function reasonOf(error: unknown): StoreFailure {
  const name = error instanceof Error ? error.name : "";
  if (name === "blocked" || name === "no-answer") return name;
  return REASON_BY_ERROR[name] ?? "unavailable";
}
