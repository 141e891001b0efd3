import type { FaultView } from "../../journal/views.ts";
import type { FaultModel } from "../../models/fault-model.ts";
import { CHECK_TEXT } from "../text/checks.ts";
import { FAULT_TEXT, RESULT_TEXT } from "../text/fault.ts";
import { REMEDY_TEXT } from "../text/remedies.ts";

/** What has been answered and tried, each to be taken back: everything is worked out anew then. */
export function GivenAnswers({ model, fault }: { model: FaultModel; fault: FaultView }) {
  const given = [
    ...fault.answers.map(({ record, at, check, outcome }) => ({
      record,
      at,
      title: CHECK_TEXT[check]?.question ?? check,
      what: CHECK_TEXT[check]?.outcomes[outcome] ?? FAULT_TEXT.cantTell,
    })),
    ...fault.trials.map(({ record, at, remedy, result }) => ({
      record,
      at,
      title: REMEDY_TEXT[remedy]?.title ?? remedy,
      what: RESULT_TEXT[result],
    })),
  ].sort((a, b) => a.at - b.at);
  if (given.length === 0) return null;
  return (
    <section>
      <h2>{FAULT_TEXT.given}</h2>
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
              aria-label={`${FAULT_TEXT.takeBack}: ${title}`}
              onClick={() => void model.withdraw(record)}
            >
              {FAULT_TEXT.takeBack}
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
