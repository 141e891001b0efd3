import type { AppModels } from "../models/app-models.ts";
import { MishapLine } from "./MishapLine.tsx";
import * as shellText from "./text/shell.ts";
import { failureText, newerText, notStoredText, setAsideText } from "./text/shell.ts";

/** What the user has to know about the log or the version; nothing while all is well. */
export function StateLines({ models }: { models: AppModels }) {
  const { journal, offline } = models;
  const failure = journal.failure.value;
  const unsaved = journal.unsaved.value;
  const setAside = journal.setAside.value.length;
  const newer = journal.newerCount.value;
  return (
    <>
      <MishapLine models={models} />
      {journal.isReplaced.value && <Line text={shellText.replaced} isWarning />}
      {failure !== null && (
        <div class="line-note warning" role="alert">
          <p>
            {unsaved.length > 0 && <strong>{notStoredText(unsaved.length)} </strong>}
            {failureText(failure)}
          </p>
          <button type="button" onClick={() => void journal.retry()}>
            {shellText.retry}
          </button>
          {unsaved.length > 0 && (
            <button
              type="button"
              onClick={() => void models.log.shareFile("unsaved", JSON.stringify(unsaved, null, 1))}
            >
              {shellText.copyUnsaved}
            </button>
          )}
        </div>
      )}
      {setAside > 0 && <Line text={setAsideText(setAside)} hasLink />}
      {newer > 0 && <Line text={newerText(newer)} />}
      {offline.isTakenElsewhere.value && <Line text={shellText.takenElsewhere} />}
      {offline.canOffer.value && (
        <div class="line-note">
          <p>{shellText.update}</p>
          <button type="button" onClick={offline.takeUpdate}>
            {shellText.updateNow}
          </button>
        </div>
      )}
    </>
  );
}

function Line(props: { text: string; isWarning?: boolean; hasLink?: boolean }) {
  return (
    <p class={props.isWarning ? "line-note warning" : "line-note"}>
      <span>
        {props.text} {props.hasLink && <a href="#/settings">{shellText.toSettings}</a>}
      </span>
    </p>
  );
}
