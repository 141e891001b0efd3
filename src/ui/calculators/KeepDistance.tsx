import type { AppModels } from "../../models/app-models.ts";
import * as calculatorsText from "../text/calculators.ts";
import { distanceSentence } from "../text/distance.ts";

/** Drops the result into the log, as the sentence that one would say. */
export function KeepDistance({ models }: { models: AppModels }) {
  const { distance, settings } = models;
  const outcome = distance.outcome.value;
  const inputs = distance.inputs.value;
  const keep = (): void => {
    if (outcome?.kind === "ok" && inputs !== null)
      void distance.keep(distanceSentence(inputs, outcome.changeDb, settings.lengthUnit.value));
  };
  return (
    <button type="button" class="tall" aria-disabled={outcome?.kind !== "ok"} onClick={keep}>
      {calculatorsText.keep}
    </button>
  );
}
