import type { LengthUnit } from "../field.ts";
import { LONGEST_TYPED_TEXT } from "../typed.ts";
import { DISTANCE_FIELD_IDS, DISTANCE_FIELDS, type DistanceFieldId } from "./fields.ts";

/**
 * The inputs as the part of an address behind "?", so that a link reopens the calculator as it was.
 * Spaces around a text are dropped, and what is longer than a field reads is cut.
 *
 * @param texts       What stands in the fields, by field id; other keys are left out
 * @param lengthUnit  If given, a length without a unit gets it, so that the link means the same on a
 *                    phone that is set to the other unit
 */
export function encodeInputs(
  texts: Readonly<Record<string, string>>,
  lengthUnit?: LengthUnit,
): string {
  return DISTANCE_FIELD_IDS.flatMap((id) => {
    const text = texts[id];
    if (text === undefined) return [];
    const kept = text.trim();
    const isBareLength = DISTANCE_FIELDS[id].quantity === "length" && /\d[.,]?$/.test(kept);
    const unit = isBareLength && lengthUnit ? lengthUnit : "";
    return `${id}=${encodeURIComponent(capped(kept, LONGEST_TYPED_TEXT - unit.length) + unit)}`;
  }).join("&");
}

/**
 * The texts of a link, with or without its "?". Keys that name no field and values that are not
 * valid percent-encoding are ignored: a damaged link opens with what is left of it.
 */
export function decodeInputs(query: string): Partial<Record<DistanceFieldId, string>> {
  const texts: Partial<Record<DistanceFieldId, string>> = {};
  for (const pair of query.replace(/^\?/, "").split("&")) {
    const [key, value] = pair.split("=");
    const id = DISTANCE_FIELD_IDS.find((known) => known === key);
    const text = id === undefined || value === undefined ? null : decoded(value);
    if (id !== undefined && text !== null) texts[id] ??= capped(text);
  }
  return texts;
}

/** Null if the percent-encoding is damaged. */
function decoded(value: string): string | null {
  try {
    return decodeURIComponent(value.replaceAll("+", " "));
  } catch (error) {
    if (error instanceof URIError) return null;
    throw error;
  }
}

/** Counts whole characters, and replaces halves of a pair, which no address can carry. */
function capped(text: string, most = LONGEST_TYPED_TEXT): string {
  return Array.from(text)
    .slice(0, most)
    .join("")
    .replace(/\p{Surrogate}/gu, "\ufffd");
}
