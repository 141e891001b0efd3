import type { AppModels } from "../../models/app-models.ts";
import { EXPONENT_PRESETS } from "../../models/vocabulary.ts";
import { Stepper } from "../parts/Stepper.tsx";
import {
  CALCULATORS_TEXT,
  changeMeaning,
  DISTANCE_TEXT,
  distanceCautionText,
  noAnswerText,
  PRESET_TEXT,
  wishText,
} from "../text/calculators.ts";
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
      label={DISTANCE_TEXT[id]}
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
              ? changeMeaning(outcome.changeDb)
              : outcome === null
                ? DISTANCE_TEXT.blank
                : noAnswerText(outcome.reason, outcome.nearZoneM, unit)}
          </span>
        </output>
        <button type="button" onClick={model.reset}>
          {CALCULATORS_TEXT.reset}
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
            {DISTANCE_TEXT.surroundings}
          </label>
          <select
            id="surroundings"
            class="wide"
            value={model.preset.value ?? ""}
            onChange={(event) => model.pickPreset(event.currentTarget.value)}
          >
            {model.preset.value === null && <option value="">{DISTANCE_TEXT.ownExponent}</option>}
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
