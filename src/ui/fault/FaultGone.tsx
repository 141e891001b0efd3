import * as faultText from "../text/fault.ts";

export function FaultGone() {
  return (
    <div class="stack">
      <p>{faultText.gone}</p>
      <a class="button wide" href="#/fault">
        {faultText.toFaults}
      </a>
    </div>
  );
}
