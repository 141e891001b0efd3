import type { ComponentChildren } from "preact";
import type { AppModels } from "../../models/app-models.ts";
import { ENDINGS } from "../../models/vocabulary.ts";
import { Chip } from "../parts/Chip.tsx";
import { DraftField } from "../parts/DraftField.tsx";
import * as faultText from "../text/fault.ts";
import { ENDING_TEXT } from "../text/fault.ts";
import { noteTooLong } from "../text/log.ts";
import { FaultGone } from "./FaultGone.tsx";

/** The verdict: how it ended, what it was, what helped. Filled in from the evidence, changed by tap. */
export function FaultClose({ models }: { models: AppModels }) {
  if (models.fault.traced.value === null) return <FaultGone />;
  const model = models.close;
  const words = models.expertise.words.value;
  return (
    <div class="stack">
      <Choices title={faultText.closeEnding}>
        {ENDINGS.map((ending) => (
          <Chip
            key={ending}
            text={ENDING_TEXT[ending]}
            isChosen={ending === model.ending.value}
            onPick={() => model.pickEnding(ending)}
          />
        ))}
      </Choices>
      <Choices title={faultText.closeCause}>
        {model.offered.value.map((cause) => (
          <Chip
            key={cause}
            text={words.causeName(cause)}
            isChosen={cause === model.cause.value}
            onPick={() => model.pickCause(cause)}
          />
        ))}
        <Chip
          text={faultText.closeCauseUnknown}
          isChosen={model.cause.value === null}
          onPick={() => model.pickCause(null)}
        />
      </Choices>
      {model.helped.value.length > 0 && (
        <Choices title={faultText.closeRemedy}>
          {model.helped.value.map((remedy) => (
            <Chip
              key={remedy}
              text={words.remedyTitle(remedy)}
              isChosen={remedy === model.remedy.value}
              onPick={() => model.pickRemedy(remedy)}
            />
          ))}
          <Chip
            text={faultText.closeRemedyNone}
            isChosen={model.remedy.value === null}
            onPick={() => model.pickRemedy(null)}
          />
        </Choices>
      )}
      <DraftField
        id="closing-note"
        label={faultText.closeNote}
        draft={model.note}
        lines="some"
        problem={model.isNoteTooLong.value ? noteTooLong : null}
      />
      <button type="button" class="wide tall" onClick={() => void model.close()}>
        {faultText.closeDo}
      </button>
    </div>
  );
}

function Choices({ title, children }: { title: string; children: ComponentChildren }) {
  return (
    <fieldset>
      <legend>
        <h2>{title}</h2>
      </legend>
      <div class="chips">{children}</div>
    </fieldset>
  );
}
