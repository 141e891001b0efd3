import type { ComponentChildren } from "preact";
import type { AppModels } from "../../models/app-models.ts";
import { ENDINGS } from "../../models/vocabulary.ts";
import { DraftField } from "../parts/DraftField.tsx";
import { ENDING_TEXT, FAULT_TEXT } from "../text/fault.ts";
import { FaultGone } from "./FaultGone.tsx";

/** The verdict: how it ended, what it was, what helped. Filled in from the evidence, changed by tap. */
export function FaultClose({ models }: { models: AppModels }) {
  if (models.fault.traced.value === null) return <FaultGone />;
  const model = models.close;
  const words = models.expertise.words.value;
  return (
    <div class="stack">
      <Choices title={FAULT_TEXT.closeEnding}>
        {ENDINGS.map((ending) => (
          <Choice
            key={ending}
            text={ENDING_TEXT[ending]}
            isChosen={ending === model.ending.value}
            onPick={() => model.pickEnding(ending)}
          />
        ))}
      </Choices>
      <Choices title={FAULT_TEXT.closeCause}>
        {model.offered.value.map((cause) => (
          <Choice
            key={cause}
            text={words.causeName(cause)}
            isChosen={cause === model.cause.value}
            onPick={() => model.pickCause(cause)}
          />
        ))}
        <Choice
          text={FAULT_TEXT.closeCauseUnknown}
          isChosen={model.cause.value === null}
          onPick={() => model.pickCause(null)}
        />
      </Choices>
      {model.helped.value.length > 0 && (
        <Choices title={FAULT_TEXT.closeRemedy}>
          {model.helped.value.map((remedy) => (
            <Choice
              key={remedy}
              text={words.remedyTitle(remedy)}
              isChosen={remedy === model.remedy.value}
              onPick={() => model.pickRemedy(remedy)}
            />
          ))}
          <Choice
            text={FAULT_TEXT.closeRemedyNone}
            isChosen={model.remedy.value === null}
            onPick={() => model.pickRemedy(null)}
          />
        </Choices>
      )}
      <DraftField
        id="closing-note"
        label={FAULT_TEXT.closeNote}
        draft={model.note}
        lines="some"
        problem={model.isNoteTooLong.value ? FAULT_TEXT.noteTooLong : null}
      />
      <button type="button" class="wide tall" onClick={() => void model.close()}>
        {FAULT_TEXT.closeDo}
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

function Choice(props: { text: string; isChosen: boolean; onPick: () => void }) {
  return (
    <button type="button" aria-pressed={props.isChosen} onClick={props.onPick}>
      {props.text}
    </button>
  );
}
