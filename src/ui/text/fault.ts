import type { Advice } from "../../diagnosis/next-step.ts";
import type { Ending, Moment, StagePlace, TrialResult } from "../../journal/records.ts";

export const title = "Fault";
export const purpose =
  "When a microphone, in-ear or beltpack drops out, tap Mark dropout. The time is stored at once; questions come after.";
export const openShow = "Name the show first";
export const openFaults = "Open";
export const closedFaults = "Closed";
export const noFaults = "No dropout marked in this show so far.";
export const moment = "What is going on now?";
export const marks = "Links and place";
export const next = "Next step";
export const suspects = "What it could be";
export const given = "Answers so far";
export const takeBack = "Take back";
export const cantTell = "Can't tell";
export const skip = "Skip";
export const other = "Something else";
export const notNow = "Not now";
export const cured = "It's cured";
export const noEvidence = "Nothing answered yet moves this one.";
export const evidenceUnit =
  "Evidence in decibels: +10 dB makes it ten times likelier against the rest.";
export const otherTitle = "Other steps";
export const reading = "Reading…";
export const unread = "What the fault finder knows could not be read. Everything else works.";
export const readAgain = "Try again";
export const otherNone = "Nothing else can be done at this moment of the show.";
export const exhausted =
  "Every step is done or skipped. Close the fault with what you know, or take an answer back.";
export const fallback = "If audio has to be back at once: hand over a cabled microphone.";
export const gone = "This fault is not in the log on this phone.";
export const toFaults = "To the faults";
export const closeTitle = "Close the fault";
export const closeEnding = "How did it end?";
export const closeCause = "What was it?";
export const closeCauseUnknown = "Not known";
export const closeRemedy = "What helped?";
export const closeRemedyNone = "Nothing in particular";
export const closeNote = "Note for the next crew (optional)";
export const closeDo = "Close the fault";
export const audioBack = "Audio is back. Close the fault, or keep tracing when there is a pause.";
export const marksTitle = "Which links, and where?";
export const marksNoLinks = "Add the show's links under Rig to choose them here.";
export const stage = "Place on stage, as the performer sees it";
export const done = "Done";
export const back = "Back to the fault";
export const trace = "Trace it";
export const reopen = "Open it again";
export const isBack = "Audio is back";
export const isNotBack = "Still dropping out";
export const howDidItGo = "How did it go?";

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

export const STEP_KIND_TEXT = {
  remedy: "Put it right",
  check: "Find out",
} as const;
