import type { AppModels } from "../../models/app-models.ts";
import type { ExpertiseModel } from "../../models/expertise-model.ts";
import { MarkStrip } from "../parts/MarkStrip.tsx";
import * as faultText from "../text/fault.ts";
import { FaultGone } from "./FaultGone.tsx";
import { GivenAnswers } from "./GivenAnswers.tsx";
import { MomentPicker } from "./MomentPicker.tsx";
import { StepCard } from "./StepCard.tsx";
import { Suspects } from "./Suspects.tsx";

/** One fault: the next step, what it could be, and what has been answered. */
export function FaultTrace({ models }: { models: AppModels }) {
  const { fault: model, expertise } = models;
  const traced = model.traced.value;
  if (traced === null) return <FaultGone />;
  const { fault, show } = traced;
  return (
    <div class="stack">
      <div class="row nowrap">
        <div class="grow">
          <MarkStrip marks={fault.marks} timeZone={show.timeZone} />
        </div>
        <a class="button" href={`#/fault/${fault.id}/marks`}>
          {faultText.marks}
        </a>
      </div>
      <MomentPicker fault={model} />
      {expertise.phase.value === "ready" ? (
        <>
          <StepCard model={model} fault={fault} timeZone={show.timeZone} />
          <Suspects model={model} />
        </>
      ) : (
        <Unread expertise={expertise} />
      )}
      <GivenAnswers model={model} fault={fault} />
    </div>
  );
}

function Unread({ expertise }: { expertise: ExpertiseModel }) {
  if (expertise.phase.value === "loading") return <p class="soft">{faultText.reading}</p>;
  return (
    <section class="card stack" role="alert">
      <p>{faultText.unread}</p>
      <button type="button" onClick={() => void expertise.load()}>
        {faultText.readAgain}
      </button>
    </section>
  );
}
