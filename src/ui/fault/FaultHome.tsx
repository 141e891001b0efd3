import type { FaultView, ShowView } from "../../journal/views.ts";
import type { AppModels } from "../../models/app-models.ts";
import type { Words } from "../../models/words.ts";
import { MarkStrip } from "../parts/MarkStrip.tsx";
import * as faultText from "../text/fault.ts";
import { ENDING_TEXT, markCount } from "../text/fault.ts";
import { timeOf } from "../text/format.ts";
import { MomentPicker } from "./MomentPicker.tsx";

export function FaultHome({ models }: { models: AppModels }) {
  const show = models.fault.show.value;
  if (show === null)
    return (
      <div class="stack">
        <p>{faultText.purpose}</p>
        <a class="button wide" href="#/show">
          {faultText.openShow}
        </a>
      </div>
    );
  const words = models.expertise.words.value;
  const open = models.fault.openFaults.value;
  const closed = show.faults.filter(({ verdict }) => verdict !== null);
  return (
    <div class="stack">
      <MomentPicker fault={models.fault} />
      {show.faults.length === 0 && <p>{faultText.purpose}</p>}
      {show.faults.length === 0 && <p class="soft">{faultText.noFaults}</p>}
      {open.length > 0 && (
        <FaultList title={faultText.openFaults} faults={open} show={show} words={words} />
      )}
      {closed.length > 0 && (
        <FaultList
          title={faultText.closedFaults}
          faults={[...closed].reverse()}
          show={show}
          words={words}
        />
      )}
    </div>
  );
}

function FaultList(props: {
  title: string;
  faults: readonly FaultView[];
  show: ShowView;
  words: Words;
}) {
  return (
    <section>
      <h2>{props.title}</h2>
      <ul class="stack">
        {props.faults.map((fault) => (
          <li key={fault.id} class="card">
            <MarkStrip marks={fault.marks} timeZone={props.show.timeZone} />
            <a class="button wide" href={`#/fault/${fault.id}`}>
              {fault.verdict === null
                ? `${faultText.trace} (${markCount(fault.marks.length)})`
                : verdictLine(fault, props.show.timeZone, props.words)}
            </a>
          </li>
        ))}
      </ul>
    </section>
  );
}

function verdictLine({ verdict }: FaultView, timeZone: string, words: Words): string {
  if (verdict === null) return "";
  const causes = verdict.causes.map(words.causeName).join(" + ");
  const what = causes === "" ? faultText.closeCauseUnknown : causes;
  return `${timeOf(verdict.at, timeZone)} ${ENDING_TEXT[verdict.ending]}: ${what}`;
}
