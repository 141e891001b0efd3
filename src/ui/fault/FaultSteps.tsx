import type { AppModels } from "../../models/app-models.ts";
import { CHECK_TEXT } from "../text/checks.ts";
import { FAULT_TEXT } from "../text/fault.ts";
import { REMEDY_TEXT } from "../text/remedies.ts";
import { FaultGone } from "./FaultGone.tsx";

/** "Something else": every step that this moment of the show allows, best first. */
export function FaultSteps({ models }: { models: AppModels }) {
  const model = models.fault;
  const traced = model.traced.value;
  if (traced === null) return <FaultGone />;
  const steps = model.steps.value;
  return (
    <div class="stack">
      {steps.length === 0 && <p>{FAULT_TEXT.otherNone}</p>}
      <div class="answers">
        {steps.map((step) => (
          <button key={`${step.kind}.${step.id}`} type="button" onClick={() => model.pick(step)}>
            {step.kind === "check"
              ? (CHECK_TEXT[step.id]?.question ?? step.id)
              : (REMEDY_TEXT[step.id]?.title ?? step.id)}
          </button>
        ))}
      </div>
      <a class="button wide" href={`#/fault/${traced.fault.id}`}>
        {FAULT_TEXT.back}
      </a>
    </div>
  );
}
