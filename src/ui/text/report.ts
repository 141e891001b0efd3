import type { ReportWording } from "../../journal/report.ts";
import { CANT_TELL } from "../../models/vocabulary.ts";
import type { Words } from "../../models/words.ts";
import { CALCULATORS_TEXT } from "./calculators.ts";
import { ENDING_TEXT, FAULT_TEXT, MOMENT_TEXT, PLACE_TEXT, RESULT_TEXT } from "./fault.ts";
import { dateOf, megahertz, timeOf } from "./format.ts";
import { KIND_TEXT } from "./rig.ts";
import { SHELL_TEXT } from "./shell.ts";

const named = (name: string, place: string): string =>
  `${name || SHELL_TEXT.unnamedShow}${place === "" ? "" : `, ${place}`}`;
const where = (links: readonly string[], place: string | null): string =>
  [links.join(", "), place ?? ""].filter((part) => part !== "").join("; ");

/** Every word of a shared report and of the lines of the log. */
export const reportWording = (words: Words): ReportWording => ({
  time: timeOf,
  date: dateOf,
  causeName: words.causeName,
  checkQuestion: words.question,
  outcomeLabel: (check, outcome) =>
    outcome === CANT_TELL ? FAULT_TEXT.cantTell : words.outcome(check, outcome),
  remedyTitle: words.remedyTitle,
  stepTitle: words.anyTitle,
  calculatorName: (calculator) =>
    calculator === "distance" ? CALCULATORS_TEXT.distance : calculator,
  linkKind: (kind) => KIND_TEXT[kind],
  moment: (moment) => MOMENT_TEXT[moment],
  place: (place) => PLACE_TEXT[place],
  trialResult: (result) => RESULT_TEXT[result],
  ending: (ending) => ENDING_TEXT[ending],
  unknownLink: "a link that is not listed",
  entry: {
    "show.opened": ({ name, place }) => `Show opened: ${named(name, place)}.`,
    "show.edited": ({ name, place }) => `Show renamed: ${named(name, place)}.`,
    "show.closed": () => "Show closed.",
    "moment.set": ({ moment }) => `Now: ${moment.toLowerCase()}.`,
    "link.set": ({ name, kind, frequencyMhz }) =>
      `${name}: ${kind.toLowerCase()}${frequencyMhz === null ? "" : `, ${megahertz(frequencyMhz)}`}.`,
    "link.removed": ({ name }) => `Link removed: ${name}.`,
    "fault.opened": ({ moment }) => `Fault opened (${moment.toLowerCase()}).`,
    "dropout.marked": () => "Dropout.",
    "dropout.detailed": ({ time, links, place }) =>
      `Dropout${time === null ? "" : ` at ${time}`}: ${where(links, place) || "no link or place given"}.`,
    "check.answered": ({ question, outcome }) => `${question} ${outcome}.`,
    "step.skipped": ({ step }) => `Skipped: ${step}`,
    "remedy.tried": ({ remedy, result }) => `Tried: ${remedy}. ${result}.`,
    "fault.closed": ({ causes, ending, remedy, note }) =>
      [
        `${ending}: ${causes.join(" and ") || FAULT_TEXT.closeCauseUnknown.toLowerCase()}.`,
        remedy === null ? "" : `Helped: ${remedy}.`,
        note,
      ]
        .filter((part) => part !== "")
        .join(" "),
    "sum.kept": ({ sentence }) => sentence,
    "note.added": ({ text }) => text,
    "record.withdrawn": () => "Entry taken back.",
  },
  title: ({ name, place, date }) => `${named(name, place)}, ${date}`,
  linksHeading: "Links",
  timelineHeading: "Timeline",
  faultHeading: ({ number, date, time, moment }) =>
    `Fault ${number}: ${date} ${time} (${moment.toLowerCase()})`,
  markLine: ({ time, links, place }) => {
    const detail = where(links, place);
    return detail === "" ? `Dropout at ${time}.` : `Dropout at ${time}: ${detail}.`;
  },
  faultStillOpen: "Still open.",
});
