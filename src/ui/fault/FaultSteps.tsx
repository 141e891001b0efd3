import type { AppModels } from "../../models/app-models.ts";
import * as faultText from "../text/fault.ts";
import { STEP_KIND_TEXT } from "../text/fault.ts";
import { FaultGone } from "./FaultGone.tsx";

const KINDS = ["remedy", "check"] as const;

/** "Something else": every step that this moment of the show allows, best first of each kind. */
export function FaultSteps({ models }: { models: AppModels }) {
  const model = models.fault;
  const traced = model.traced.value;
  if (traced === null) return <FaultGone />;
  const steps = model.steps.value;
  return (
    <div class="stack">
      {steps.length === 0 && <p>{faultText.otherNone}</p>}
      {KINDS.map((kind) => {
        const ofKind = steps.filter((step) => step.kind === kind);
        return (
          ofKind.length > 0 && (
            <section key={kind} class="stack">
              <h2>{STEP_KIND_TEXT[kind]}</h2>
              <div class="answers">
                {ofKind.map((step) => (
                  <button key={step.id} type="button" onClick={() => model.pick(step)}>
                    {model.words.value.stepTitle(step)}
                  </button>
                ))}
              </div>
            </section>
          )
        );
      })}
      <a class="button wide" href={`#/fault/${traced.fault.id}`}>
        {faultText.back}
      </a>
    </div>
  );
}
