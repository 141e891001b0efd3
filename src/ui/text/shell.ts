import type { StoreFailure } from "../../journal/store.ts";
import type { Notice } from "../../models/notice-model.ts";
import { timeOf } from "./format.ts";

export const SHELL_TEXT = {
  app: "Fadewright",
  places: "Places",
  fault: "Fault",
  calculators: "Calculators",
  rig: "Rig",
  log: "Log",
  settings: "Settings",
  back: "Back",
  mark: "Mark dropout",
  markAgain: "Mark again",
  noShow: "No show open",
  unnamedShow: "Unnamed show",
  reading: "Reading the log…",
  retry: "Try to store again",
  copyUnsaved: "Share what is not stored",
  toSettings: "See settings",
  aside: "Show and settings",
  update: "A new version is ready.",
  updateNow: "Restart with the new version",
  takenElsewhere:
    "Another window has taken a new version. This one goes on as it is; restart it when you have a pause.",
  mishap:
    "Something in the app went wrong. The log is safe. Go on; where a screen stays empty, choose another place.",
  mishapShare: "Share what happened",
  mishapHide: "Hide this line",
  replaced:
    "A newer version in another window has taken over the log. Nothing is lost. Close this window and open the app again.",
} as const;

const FAILURES: Readonly<Record<StoreFailure, string>> = {
  blocked:
    "Another window of Fadewright holds the log. Close the other windows, then try again. What you enter is kept in this window meanwhile.",
  newer:
    "The log was written by a newer version of Fadewright. It is left untouched. What you enter is kept in this window; share it before you close.",
  quota:
    "The phone's storage is full. What is stored is safe. Free some space, then try again; what you enter is kept in this window.",
  "no-answer":
    "The phone's storage does not answer. What you enter is kept in this window. Try again, or restart the phone when you have a pause.",
  lost: "The browser dropped the log and opening it again did not work. What you enter is kept in this window. Try again.",
  unavailable:
    "This browser keeps nothing here (a private window, or storage switched off). What you enter is kept in this window only; share it before you close.",
};
export const failureText = (reason: StoreFailure): string => FAILURES[reason];

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
