import type { StoreFailure } from "../../journal/store.ts";
import type { Notice } from "../../models/notice-model.ts";
import { timeOf } from "./format.ts";

export const places = "Places";
export const settings = "Settings";
export const mark = "Mark dropout";
export const markAgain = "Mark again";
export const noShow = "No show open";
export const unnamedShow = "Unnamed show";
export const reading = "Reading the log…";
export const retry = "Try to store again";
export const copyUnsaved = "Share what is not stored";
export const toSettings = "See settings";
export const aside = "Show and settings";
export const update = "A new version is ready.";
export const updateNow = "Restart with the new version";
export const takenElsewhere =
  "Another window has taken a new version. Restart this one when you have a pause.";
export const mishap =
  "Something in the app went wrong. The log is safe. Go on, or choose another place.";
export const mishapShare = "Share what happened";
export const mishapHide = "Hide this line";
export const replaced =
  "A newer version in another window has taken over the log. Nothing is lost. Close this window.";

const FAILURES: Readonly<Record<StoreFailure, string>> = {
  blocked: "Another window holds the log. Close the other windows, then try again.",
  newer: "The log is from a newer version of Fadewright and is left untouched.",
  quota: "The phone's storage is full. What is stored is safe. Free some space, then try again.",
  "no-answer": "The phone's storage does not answer. Try again, or restart the phone in a pause.",
  lost: "The browser dropped the log. Try again.",
  unavailable: "This browser keeps nothing here: a private window, or storage is switched off.",
};
export const failureText = (reason: StoreFailure): string =>
  `${FAILURES[reason]} What you enter is kept in this window: share it before you close.`;

export function notStoredText(count: number): string {
  return count === 1 ? "1 entry is not stored yet." : `${count} entries are not stored yet.`;
}

export function setAsideText(count: number): string {
  return count === 1
    ? "1 damaged record was set aside; everything else is shown."
    : `${count} damaged records were set aside; everything else is shown.`;
}

export function newerText(count: number): string {
  return count === 1
    ? "1 record was made by a newer version; it is kept untouched."
    : `${count} records were made by a newer version; they are kept untouched.`;
}

export function noticeText(notice: Notice, timeZone: string): string {
  switch (notice.code) {
    case "marked":
      return `Stored: dropout ${notice.count} at ${timeOf(notice.at, timeZone)}`;
    case "stored":
      return "Stored in the log.";
    case "not-stored":
      return "Not stored yet: see the line at the top.";
    case "shared":
      return "Handed over.";
    case "copied":
      return "Copied: paste it where you want it.";
    case "saved":
      return "Saved as a file.";
  }
}

export const PLACE_NAMES = {
  fault: "Fault",
  calculators: "Calculators",
  rig: "Rig",
  log: "Log",
} as const;
