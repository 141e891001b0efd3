import type { FaultModel } from "../../models/fault-model.ts";
import * as faultText from "../text/fault.ts";
import { RESULT_TEXT, STRENGTH_TEXT } from "../text/fault.ts";
import { decibels } from "../text/format.ts";

const SHOWN = 3;

/** The three leading suspects; each unfolds into the evidence for and against it, in decibels. */
export function Suspects({ model }: { model: FaultModel }) {
  const words = model.words.value;
  return (
    <section>
      <h2>{faultText.suspects}</h2>
      <div class="stack">
        {model.suspects.value.slice(0, SHOWN).map((suspect) => (
          <details key={suspect.cause} class="unfold">
            <summary>
              <span class="row">
                <strong>{words.causeName(suspect.cause)}</strong>
                <span class="soft">
                  {STRENGTH_TEXT[suspect.strength]}, {suspect.percent} %
                </span>
              </span>
              <span class="track" aria-hidden="true">
                <span class="fill" style={{ width: `${Math.round(suspect.probability * 100)}%` }} />
              </span>
            </summary>
            <div class="evidence">
              <p class="soft">{words.causePlain(suspect.cause)}</p>
              <Evidence model={model} cause={suspect.cause} />
            </div>
          </details>
        ))}
      </div>
    </section>
  );
}

function Evidence({ model, cause }: { model: FaultModel; cause: string }) {
  const words = model.words.value;
  const weights = model.weights(cause);
  if (weights.length === 0) return <p>{faultText.noEvidence}</p>;
  return (
    <>
      <ul>
        {weights.map(({ kind, id, outcome, weightDb }) => (
          <li key={`${kind}.${id}`}>
            <span>
              {kind === "check"
                ? words.outcome(id, outcome)
                : `${words.remedyTitle(id)}: ${resultText(outcome)}`}
            </span>
            <span class="number">{decibels(weightDb)}</span>
          </li>
        ))}
      </ul>
      <p class="soft">{faultText.evidenceUnit}</p>
    </>
  );
}

function resultText(outcome: string): string {
  return Object.entries(RESULT_TEXT).find(([result]) => result === outcome)?.[1] ?? outcome;
}
