import { CALCULATORS_TEXT } from "../text/calculators.ts";

export function CalculatorList() {
  return (
    <div class="stack">
      <p>{CALCULATORS_TEXT.purpose}</p>
      <ul>
        <li>
          <a class="button wide choice" href="#/calculators/distance">
            <span>
              <strong>{CALCULATORS_TEXT.distance}</strong>
              <br />
              {CALCULATORS_TEXT.distanceHint}
            </span>
          </a>
        </li>
      </ul>
    </div>
  );
}
