import type { FaultView, ShowView } from "../../journal/views.ts";
import type { AppModels } from "../../models/app-models.ts";
import type { Words } from "../../models/words.ts";
import { MarkStrip } from "../parts/MarkStrip.tsx";
import { ENDING_TEXT, FAULT_TEXT, markCount } from "../text/fault.ts";
import { timeOf } from "../text/format.ts";
import { MomentPicker } from "./MomentPicker.tsx";

export function FaultHome({ models }: { models: AppModels }) {
  const show = models.fault.show.value;
  if (show === null)
    return (
      <div class="stack">
        <p>{FAULT_TEXT.purpose}</p>
        <a class="button wide" href="#/show">
          {FAULT_TEXT.openShow}
        </a>
      </div>
    );
  const words = models.expertise.words.value;
  const open = models.fault.openFaults.value;
  const closed = show.faults.filter(({ verdict }) => verdict !== null);
  return (
    <div class="stack">
      <MomentPicker fault={models.fault} />
      {show.faults.length === 0 && <p>{FAULT_TEXT.purpose}</p>}
      {show.faults.length === 0 && <p class="soft">{FAULT_TEXT.noFaults}</p>}
      {open.length > 0 && (
        <FaultList title={FAULT_TEXT.openFaults} faults={open} show={show} words={words} />
      )}
      {closed.length > 0 && (
        <FaultList
          title={FAULT_TEXT.closedFaults}
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
                ? `${FAULT_TEXT.trace} (${markCount(fault.marks.length)})`
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
  const what = causes === "" ? FAULT_TEXT.closeCauseUnknown : causes;
  return `${timeOf(verdict.at, timeZone)} ${ENDING_TEXT[verdict.ending]}: ${what}`;
}
