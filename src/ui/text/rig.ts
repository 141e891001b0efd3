import type { LinkKind } from "../../journal/records.ts";

export const RIG_TEXT = {
  title: "Rig",
  purpose:
    "List the links of the show: each microphone, in-ear and beltpack. Then a dropout can be marked for the right one.",
  name: "Name",
  namePlaceholder: "Lead vocal",
  frequency: "Carrier in MHz (optional)",
  kind: "Kind",
  add: "Add link",
  save: "Save change",
  change: "Change",
  remove: "Remove",
  links: "Links of the show",
  noFrequency: "carrier not given",
  "no-name": "Type a name, as it stands on the tape of the receiver.",
  "name-too-long": "At most 120 characters. Nothing is lost: shorten it and add again.",
} as const;

export const KIND_TEXT: Readonly<Record<LinkKind, string>> = {
  handheld: "Handheld",
  bodypack: "Bodypack",
  "in-ear": "In-ear",
  intercom: "Intercom",
};
