import type { LengthUnit } from "../../calculators/field.ts";
import type { FieldState } from "../../models/distance-model.ts";
import * as calculatorsText from "../text/calculators.ts";
import { problemText, unitOf } from "../text/fields.ts";

/**
 * A number, by keyboard or by thumb. The text stays as typed, right or wrong; what is wrong with it
 * stands below.
 */
export function Stepper(props: {
  label: string;
  state: FieldState;
  unit: LengthUnit;
  onType: (text: string) => void;
  onStep: (direction: 1 | -1) => void;
}) {
  const { label, state, unit } = props;
  const { id } = state.field;
  const suffix = unitOf(state.field, unit);
  const named = suffix === "" ? label : `${label} (${suffix})`;
  return (
    <div>
      <label class="field-label" for={id}>
        {named}
      </label>
      <div class="stepper">
        <button
          type="button"
          aria-label={`${calculatorsText.less}: ${label}`}
          onClick={() => props.onStep(-1)}
        >
          −
        </button>
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autocomplete="off"
          enterkeyhint="done"
          maxLength={80}
          value={state.text}
          aria-invalid={state.problem !== null}
          aria-describedby={state.problem === null ? undefined : `${id}-problem`}
          onInput={(event) => props.onType(event.currentTarget.value)}
        />
        <button
          type="button"
          aria-label={`${calculatorsText.more}: ${label}`}
          onClick={() => props.onStep(1)}
        >
          +
        </button>
      </div>
      {state.problem !== null && (
        <p class="problem" id={`${id}-problem`}>
          {problemText(state.problem, state, unit)}
        </p>
      )}
    </div>
  );
}
