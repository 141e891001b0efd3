import type { FaultModel } from "../../models/fault-model.ts";
import { CHECK_TEXT } from "../text/checks.ts";
import { CautionList } from "./CautionList.tsx";

export function CheckStep({ model, id }: { model: FaultModel; id: string }) {
  const check = model.knowledge().checks.find((candidate) => candidate.id === id);
  const text = CHECK_TEXT[id];
  if (!check || !text) return null;
  return (
    <>
      <h2 class="question">{text.question}</h2>
      <p>{text.how}</p>
      <CautionList ids={check.cautions} />
      <div class="answers">
        {check.outcomes.map((outcome) => (
          <button key={outcome} type="button" onClick={() => void model.answer(id, outcome)}>
            {text.outcomes[outcome] ?? outcome}
          </button>
        ))}
      </div>
    </>
  );
}
