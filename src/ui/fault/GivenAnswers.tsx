import type { FaultView } from "../../journal/views.ts";
import type { FaultModel } from "../../models/fault-model.ts";
import { CANT_TELL } from "../../models/vocabulary.ts";
import * as faultText from "../text/fault.ts";
import { RESULT_TEXT } from "../text/fault.ts";

/** What has been answered and tried, each to be taken back: everything is worked out anew then. */
export function GivenAnswers({ model, fault }: { model: FaultModel; fault: FaultView }) {
  const words = model.words.value;
  const given = [
    ...fault.answers.map(({ record, at, check, outcome }) => ({
      record,
      at,
      title: words.question(check),
      what: outcome === CANT_TELL ? faultText.cantTell : words.outcome(check, outcome),
    })),
    ...fault.trials.map(({ record, at, remedy, result }) => ({
      record,
      at,
      title: words.remedyTitle(remedy),
      what: RESULT_TEXT[result],
    })),
  ].sort((a, b) => a.at - b.at);
  if (given.length === 0) return null;
  return (
    <section>
      <h2>{faultText.given}</h2>
      <ul class="entries">
        {given.map(({ record, title, what }) => (
          <li key={record} class="row nowrap">
            <span>
              <span class="soft">{title}</span>
              <br />
              {what}
            </span>
            <button
              type="button"
              aria-label={`${faultText.takeBack}: ${title}`}
              onClick={() => void model.withdraw(record)}
            >
              {faultText.takeBack}
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
