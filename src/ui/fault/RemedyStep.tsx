import type { FaultModel } from "../../models/fault-model.ts";
import { TRIAL_RESULTS } from "../../models/vocabulary.ts";
import * as faultText from "../text/fault.ts";
import { RESULT_TEXT, secondsText } from "../text/fault.ts";
import { CautionList } from "./CautionList.tsx";

export function RemedyStep({ model, id }: { model: FaultModel; id: string }) {
  const remedy = model.knowledge.value?.remedies.find((candidate) => candidate.id === id);
  const words = model.words.value;
  if (!remedy) return null;
  return (
    <>
      <h2 class="question">{words.remedyTitle(id)}</h2>
      <p>
        {words.remedyHow(id)} <span class="soft">({secondsText(remedy.seconds)})</span>
      </p>
      <CautionList ids={remedy.cautions} words={words} />
      <p>{faultText.howDidItGo}</p>
      <div class="answers two">
        {remedy.isWorkaround ? (
          <>
            <button type="button" onClick={() => void model.tried(id, "cured")}>
              {faultText.isBack}
            </button>
            <button type="button" onClick={() => void model.tried(id, "no-change")}>
              {faultText.isNotBack}
            </button>
          </>
        ) : (
          TRIAL_RESULTS.map((result) => (
            <button key={result} type="button" onClick={() => void model.tried(id, result)}>
              {RESULT_TEXT[result]}
            </button>
          ))
        )}
      </div>
    </>
  );
}
