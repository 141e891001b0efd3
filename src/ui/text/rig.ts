import type { LinkKind } from "../../journal/records.ts";
import { tooLong } from "./show.ts";

export const title = "Rig";
export const purpose =
  "List the links of the show: each microphone, in-ear and beltpack. Then a dropout can be marked for the right one.";
export const name = "Name";
export const namePlaceholder = "Lead vocal";
export const frequency = "Carrier in MHz (optional)";
export const kind = "Kind";
export const add = "Add link";
export const save = "Save change";
export const change = "Change";
export const remove = "Remove";
export const links = "Links of the show";
export const noFrequency = "carrier not given";

export const KIND_TEXT: Readonly<Record<LinkKind, string>> = {
  handheld: "Handheld",
  bodypack: "Bodypack",
  "in-ear": "In-ear",
  intercom: "Intercom",
};

export const NAME_PROBLEM_TEXT = {
  "no-name": "Type a name, as it stands on the tape of the receiver.",
  "name-too-long": tooLong,
} as const;
