import type { AppModels } from "../../models/app-models.ts";
import { EXPONENT_PRESETS } from "../../models/vocabulary.ts";
import { Stepper } from "../parts/Stepper.tsx";
import * as calculatorsText from "../text/calculators.ts";
import * as distanceText from "../text/distance.ts";
import {
  changeMeaning,
  distanceCautionText,
  FIELD_LABEL,
  noAnswerText,
  PRESET_TEXT,
  wishText,
} from "../text/distance.ts";
import { decibels } from "../text/format.ts";
import { DistancePicture } from "./DistancePicture.tsx";

export function Distance({ models }: { models: AppModels }) {
  const model = models.distance;
  const unit = models.settings.lengthUnit.value;
  const fields = model.fields.value;
  const outcome = model.outcome.value;
  const isOk = outcome?.kind === "ok";
  const stepper = (id: keyof typeof fields) => (
    <Stepper
      key={id}
      label={FIELD_LABEL[id]}
      state={fields[id]}
      unit={unit}
      onType={(text) => model.type(id, text)}
      onStep={(direction) => model.step(id, direction)}
    />
  );
  return (
    <div class="stack">
      <div class="answer-row">
        <output>
          <span class="answer">{isOk ? decibels(outcome.changeDb) : "\u2013"}</span>
          <span>
            {isOk
              ? changeMeaning(outcome.powerRatio)
              : outcome === null
                ? distanceText.blank
                : noAnswerText(outcome.reason, outcome.nearZoneM, unit)}
          </span>
        </output>
        <button type="button" onClick={model.reset}>
          {calculatorsText.reset}
        </button>
      </div>
      <div class="pair">
        {stepper("fromM")}
        {stepper("toM")}
        {stepper("frequencyMhz")}
        {stepper("exponent")}
        {stepper("wishedGainDb")}
        <div>
          <label class="field-label" for="surroundings">
            {distanceText.surroundings}
          </label>
          <select
            id="surroundings"
            class="wide"
            value={model.preset.value ?? ""}
            onChange={(event) => model.pickPreset(event.currentTarget.value)}
          >
            {model.preset.value === null && <option value="">{distanceText.ownExponent}</option>}
            {EXPONENT_PRESETS.map(({ id }) => (
              <option key={id} value={id}>
                {PRESET_TEXT[id]}
              </option>
            ))}
          </select>
        </div>
      </div>
      {isOk && outcome.distanceForWishM !== null && (
        <p>{wishText(model.inputs.value?.wishedGainDb ?? 0, outcome.distanceForWishM, unit)}</p>
      )}
      {isOk &&
        outcome.cautions.map((code) => (
          <p key={code} class="caution">
            {distanceCautionText(code, outcome.nearZoneM, unit)}
          </p>
        ))}
      {isOk && model.curve.value !== null && (
        <DistancePicture curve={model.curve.value} unit={unit} />
      )}
    </div>
  );
}
