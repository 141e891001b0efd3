import * as calculatorsText from "../text/calculators.ts";

export function CalculatorList() {
  return (
    <div class="stack">
      <p>{calculatorsText.purpose}</p>
      <ul>
        <li>
          <a class="button wide choice" href="#/calculators/distance">
            <span>
              <strong>{calculatorsText.distance}</strong>
              <br />
              {calculatorsText.distanceHint}
            </span>
          </a>
        </li>
      </ul>
    </div>
  );
}
