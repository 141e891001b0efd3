import type { FaultView } from "../../journal/views.ts";
import type { FaultModel } from "../../models/fault-model.ts";
import { CANT_TELL } from "../../models/vocabulary.ts";
import * as faultText from "../text/fault.ts";
import { ENDING_TEXT, waitText, whyText } from "../text/fault.ts";
import { timeOf } from "../text/format.ts";
import { CheckStep } from "./CheckStep.tsx";
import { RemedyStep } from "./RemedyStep.tsx";

/** The one next step, with its answers and the ways round it. */
export function StepCard(props: { model: FaultModel; fault: FaultView; timeZone: string }) {
  const { model, fault } = props;
  if (fault.verdict !== null) return <Verdict {...props} verdict={fault.verdict} />;
  const advice = model.advice.value;
  const step = model.step.value;
  return (
    <section class="card stack" aria-label={faultText.next}>
      {step === null && advice !== null && (
        <>
          <p>{advice.kind === "wait" ? waitText(advice.until) : faultText.exhausted}</p>
          {model.moment.value === "live" && <p>{faultText.fallback}</p>}
        </>
      )}
      {fault.trials.some(({ result }) => result === "cured") && <p>{faultText.audioBack}</p>}
      {step?.kind === "check" && <CheckStep model={model} id={step.id} />}
      {step?.kind === "remedy" && <RemedyStep model={model} id={step.id} />}
      {advice?.kind === "step" && step === model.steps.value[0] && (
        <p class="soft">{whyText(advice.reason, model.words.value.causeName)}</p>
      )}
      <div class="ways">
        {step?.kind === "check" && (
          <button type="button" onClick={() => void model.answer(step.id, CANT_TELL)}>
            {faultText.cantTell}
          </button>
        )}
        {step !== null && (
          <>
            <button type="button" onClick={() => void model.skip(step)}>
              {faultText.skip}
            </button>
            <a class="button" href={`#/fault/${fault.id}/steps`}>
              {faultText.other}
            </a>
          </>
        )}
        <a class="button" href="#/fault">
          {faultText.notNow}
        </a>
        <a class="button" href={`#/fault/${fault.id}/close`}>
          {faultText.cured}
        </a>
      </div>
    </section>
  );
}

function Verdict(props: {
  model: FaultModel;
  timeZone: string;
  verdict: NonNullable<FaultView["verdict"]>;
}) {
  const { verdict, timeZone, model } = props;
  const causes = verdict.causes.map(model.words.value.causeName).join(" + ");
  return (
    <section class="card stack" aria-label={faultText.closeTitle}>
      <h2 class="number">
        {timeOf(verdict.at, timeZone)} {ENDING_TEXT[verdict.ending]}
      </h2>
      <p>{causes === "" ? faultText.closeCauseUnknown : causes}</p>
      {verdict.note !== "" && <p>{verdict.note}</p>}
      <button type="button" onClick={() => void model.withdraw(verdict.record)}>
        {faultText.reopen}
      </button>
    </section>
  );
}
