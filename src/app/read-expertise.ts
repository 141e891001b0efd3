import { expertiseAddress } from "virtual:expertise-address";
import type { Expertise } from "../facts/expertise.ts";

/**
 * Reads the fault finder's data file, which the worker serves from the same version as the script.
 * Null if it can't be had: no network on the very first visit, or a damaged store.
 */
export async function readExpertise(): Promise<Expertise | null> {
  try {
    const response = await fetch(expertiseAddress);
    return response.ok ? ((await response.json()) as Expertise) : null;
  } catch (cause) {
    // Not reached, or not JSON.
    if (cause instanceof TypeError || cause instanceof SyntaxError) return null;
    throw cause;
  }
}
