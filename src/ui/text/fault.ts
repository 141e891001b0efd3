import type { Advice } from "../../diagnosis/next-step.ts";
import type { Ending, Moment, StagePlace, TrialResult } from "../../journal/records.ts";

export const FAULT_TEXT = {
  title: "Fault",
  purpose:
    "When a microphone, in-ear or beltpack drops out, tap Mark dropout. The time is stored at once; the questions come after it.",
  openShow: "Name the show first",
  openFaults: "Open",
  closedFaults: "Closed",
  noFaults: "No dropout marked in this show so far.",
  moment: "What is going on now?",
  marks: "Links and place",
  next: "Next step",
  why: "Why this",
  suspects: "What it could be",
  given: "Answers so far",
  change: "Change",
  takeBack: "Take back",
  cantTell: "Can't tell",
  skip: "Skip",
  other: "Something else",
  notNow: "Not now",
  cured: "It's cured",
  for: "Speaks for it",
  against: "Speaks against it",
  noEvidence: "Nothing answered yet moves this one.",
  evidenceUnit: "Evidence in decibels: +10 dB makes it ten times likelier against the rest.",
  otherTitle: "Other steps",
  remedy: "Put it right",
  check: "Find out",
  reading: "Reading what the fault finder knows…",
  unread:
    "What the fault finder knows could not be read. Marking, the log and the calculators work. Try again.",
  readAgain: "Try again",
  otherNone: "Nothing else can be done at this moment of the show.",
  exhausted:
    "Every step has been done or skipped. Close the fault with what you know, or take an answer back.",
  fallback: "If audio has to be back at once: hand over a cabled microphone.",
  gone: "This fault is not in the log on this phone.",
  toFaults: "To the faults",
  closeTitle: "Close the fault",
  closeEnding: "How did it end?",
  closeCause: "What was it?",
  closeCauseUnknown: "Not known",
  closeRemedy: "What helped?",
  closeRemedyNone: "Nothing in particular",
  closeNote: "Note for the next crew (optional)",
  closeDo: "Close the fault",
  noteTooLong: "At most 4000 characters. Nothing is lost: shorten the note and close again.",
  audioBack:
    "Audio is back by a work-around. Close the fault as worked around, or keep tracing when there is a pause.",
  marksTitle: "Which links, and where?",
  marksNoLinks: "Add the show's links under Rig to choose them here.",
  stage: "Place on stage, as the performer sees it",
  done: "Done",
  back: "Back to the fault",
  trace: "Trace it",
  reopen: "Open it again",
  isBack: "Audio is back",
  isNotBack: "Still dropping out",
  howDidItGo: "How did it go?",
} as const;

export const MOMENT_TEXT: Readonly<Record<Moment, string>> = {
  live: "Live",
  between: "Between",
  "off-air": "Off air",
};

export const RESULT_TEXT: Readonly<Record<TrialResult, string>> = {
  cured: "Gone",
  better: "Better, but still there",
  "no-change": "No change",
  worse: "Worse",
};

export const ENDING_TEXT: Readonly<Record<Ending, string>> = {
  cured: "Cured",
  "worked-around": "Worked around",
  "stopped-by-itself": "Stopped by itself",
  unsolved: "Not solved",
};

export const PLACE_TEXT: Readonly<Record<StagePlace, string>> = {
  "up-right": "Up right",
  "up-centre": "Up centre",
  "up-left": "Up left",
  "centre-right": "Right",
  centre: "Centre",
  "centre-left": "Left",
  "down-right": "Down right",
  "down-centre": "Down centre",
  "down-left": "Down left",
  "in-the-house": "In the house",
  "off-stage": "Off stage",
};

export const STRENGTH_TEXT = {
  leading: "leading",
  possible: "possible",
  unlikely: "unlikely",
} as const;

export function markCount(count: number): string {
  return count === 1 ? "1 dropout" : `${count} dropouts`;
}

export function whyText(
  reason: Extract<Advice, { kind: "step" }>["reason"],
  causeName: (cause: string) => string,
): string {
  switch (reason.kind) {
    case "saves-the-show":
      return "Brings audio back first; the cause can wait.";
    case "likely-cure":
      return `Most likely to bring audio back soon: ${causeName(reason.cause)}.`;
    case "separates":
      return `Tells apart: ${reason.causes.map(causeName).join(" / ")}.`;
  }
}

export function waitText(until: Moment): string {
  return until === "between"
    ? "Nothing more can be done while the microphone is live. The next step waits for a pause."
    : "The remaining steps interrupt audio. They wait until the show is off air.";
}

export function secondsText(seconds: number): string {
  return seconds < 90 ? `about ${seconds} s` : `about ${Math.round(seconds / 60)} min`;
}
