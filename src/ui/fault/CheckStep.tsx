import type { FaultModel } from "../../models/fault-model.ts";
import { CautionList } from "./CautionList.tsx";

export function CheckStep({ model, id }: { model: FaultModel; id: string }) {
  const check = model.knowledge.value?.checks.find((candidate) => candidate.id === id);
  const words = model.words.value;
  if (!check) return null;
  return (
    <>
      <h2 class="question">{words.question(id)}</h2>
      <p>{words.checkHow(id)}</p>
      <CautionList ids={check.cautions} words={words} />
      <div class="answers">
        {check.outcomes.map((outcome) => (
          <button key={outcome} type="button" onClick={() => void model.answer(id, outcome)}>
            {words.outcome(id, outcome)}
          </button>
        ))}
      </div>
    </>
  );
}
