import { FAULT_TEXT } from "../text/fault.ts";

export function FaultGone() {
  return (
    <div class="stack">
      <p>{FAULT_TEXT.gone}</p>
      <a class="button wide" href="#/fault">
        {FAULT_TEXT.toFaults}
      </a>
    </div>
  );
}
