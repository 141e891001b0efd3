import type { StagePlace } from "../../journal/records.ts";
import type { ReportWording } from "../../journal/report.ts";
import { CANT_TELL } from "../../models/vocabulary.ts";
import type { Words } from "../../models/words.ts";
import * as faultText from "./fault.ts";
import { ENDING_TEXT, MOMENT_TEXT, PLACE_TEXT, RESULT_TEXT } from "./fault.ts";
import { dateOf, megahertz, timeOf } from "./format.ts";
import { KIND_TEXT } from "./rig.ts";
import * as shellText from "./shell.ts";

const named = (name: string, place: string): string =>
  `${name || shellText.unnamedShow}${place === "" ? "" : `, ${place}`}`;
const lower = (label: string): string => label.toLowerCase();
const dropout = (
  time: string | null,
  links: readonly string[],
  place: StagePlace | null,
): string => {
  const where = [links.join(", "), place === null ? "" : PLACE_TEXT[place]].filter(Boolean);
  return `Dropout${time === null ? "" : ` at ${time}`}${where.length > 0 ? `: ${where.join("; ")}` : ""}.`;
};

/** Every word of a shared report and of the lines of the log. */
export const reportWording = (words: Words): ReportWording => ({
  time: timeOf,
  date: dateOf,
  unknownLink: "a link that is not listed",
  entry: {
    "show.opened": ({ name, place }) => `Show opened: ${named(name, place)}.`,
    "show.edited": ({ name, place }) => `Show renamed: ${named(name, place)}.`,
    "show.closed": () => "Show closed.",
    "moment.set": ({ moment }) => `Now: ${lower(MOMENT_TEXT[moment])}.`,
    "link.set": ({ name, kind, frequencyMhz }) =>
      `${name}: ${lower(KIND_TEXT[kind])}${frequencyMhz === null ? "" : `, ${megahertz(frequencyMhz)}`}.`,
    "link.removed": ({ link }, { linkName }) => `Link removed: ${linkName(link)}.`,
    "fault.opened": ({ moment }) => `Fault opened (${lower(MOMENT_TEXT[moment])}).`,
    "dropout.marked": () => "Dropout.",
    "dropout.detailed": ({ mark, links, place }, { markTime, linkName }) =>
      dropout(markTime(mark), links.map(linkName), place),
    "check.answered": ({ check, outcome }) =>
      `${words.question(check)} ${outcome === CANT_TELL ? faultText.cantTell : words.outcome(check, outcome)}.`,
    "step.skipped": ({ step }) => `Skipped: ${words.anyTitle(step)}`,
    "remedy.tried": ({ remedy, result }) =>
      `Tried: ${words.remedyTitle(remedy)}. ${RESULT_TEXT[result]}.`,
    "fault.closed": ({ causes, ending, remedy, note }) =>
      [
        `${ENDING_TEXT[ending]}: ${causes.map(words.causeName).join(" and ") || lower(faultText.closeCauseUnknown)}.`,
        remedy === null ? "" : `Helped: ${words.remedyTitle(remedy)}.`,
        note,
      ]
        .filter(Boolean)
        .join(" "),
    "sum.kept": ({ sentence }) => sentence,
    "note.added": ({ text }) => text,
    "record.withdrawn": () => "Entry taken back.",
  },
  title: ({ name, place, date }) => `${named(name, place)}, ${date}`,
  linksHeading: "Links",
  timelineHeading: "Timeline",
  faultHeading: ({ number, date, time, moment }) =>
    `Fault ${number}: ${date} ${time} (${lower(MOMENT_TEXT[moment])})`,
  markLine: ({ time, links, place }) => dropout(time, links, place),
  faultStillOpen: "Still open.",
});
