import type { ReportWording } from "../../journal/report.ts";
import type { ShowView, TimelineEntry } from "../../journal/views.ts";
import type { AppModels } from "../../models/app-models.ts";
import type { LogModel } from "../../models/log-model.ts";
import { DraftField } from "../parts/DraftField.tsx";
import { dateOf, timeOf } from "../text/format.ts";
import * as logText from "../text/log.ts";
import { reportWording } from "../text/report.ts";
import * as shellText from "../text/shell.ts";

/** The show's timeline, latest entry first, and the way out of the phone for it. */
export function LogPage({ models }: { models: AppModels }) {
  const model = models.log;
  const show = model.show.value;
  if (show === null)
    return (
      <div class="stack">
        <p>{logText.purpose}</p>
        <a class="button wide" href="#/show">
          {logText.openShow}
        </a>
      </div>
    );
  const name = show.name || shellText.unnamedShow;
  const wording = reportWording(models.expertise.words.value);
  return (
    <div class="stack">
      <div class="row nowrap">
        <p>
          <strong>{name}</strong>
          {show.place !== "" && <span> · {show.place}</span>}
          <br />
          <span class="soft number">{dateOf(show.openedAt, show.timeZone)}</span>
        </p>
        <button type="button" onClick={() => void model.share(name, wording)}>
          {logText.share}
        </button>
      </div>
      {model.shownText.value !== null && <CopyByHand model={model} text={model.shownText.value} />}
      <form
        class="stack"
        onSubmit={(event) => {
          event.preventDefault();
          void model.addNote();
        }}
      >
        <div class="row nowrap">
          <div class="grow">
            <DraftField
              id="note"
              label={logText.note}
              placeholder={logText.notePlaceholder}
              draft={model.note}
              lines="some"
              problem={model.isNoteTooLong.value ? logText.noteTooLong : null}
            />
          </div>
          <button type="submit" class="tall">
            {logText.addNote}
          </button>
        </div>
      </form>
      <ol class="entries" reversed>
        {[...show.timeline].reverse().map((entry) => (
          <Entry key={entry.record.id} entry={entry} show={show} model={model} wording={wording} />
        ))}
      </ol>
    </div>
  );
}

function Entry(props: {
  entry: TimelineEntry;
  show: ShowView;
  model: LogModel;
  wording: ReportWording;
}) {
  const { show, model } = props;
  const { record, isWithdrawn, withdrawals } = props.entry;
  const line = model.lineOf(props.entry, show, props.wording);
  return (
    <li class="row nowrap">
      <span>
        <span class="soft number">{timeOf(record.at, show.timeZone)}</span>
        <br />
        <span class={isWithdrawn ? "withdrawn" : undefined}>{line}</span>
        {isWithdrawn && <span class="soft"> ({logText.withdrawn})</span>}
        {record.type === "sum.kept" && !isWithdrawn && (
          <>
            {" "}
            <a href={`#/calculators/${record.body.calculator}?${record.body.query}`}>
              {logText.reopenSum}
            </a>
          </>
        )}
      </span>
      {record.type !== "show.opened" && (!isWithdrawn || withdrawals.length > 0) && (
        <button
          type="button"
          aria-label={`${isWithdrawn ? logText.restore : logText.withdraw}: ${line}`}
          onClick={() => void (isWithdrawn ? model.restore(record.id) : model.withdraw(record.id))}
        >
          {isWithdrawn ? logText.restore : logText.withdraw}
        </button>
      )}
    </li>
  );
}

function CopyByHand({ model, text }: { model: LogModel; text: string }) {
  return (
    <section class="card stack">
      <label for="copy-by-hand">{logText.copyByHand}</label>
      <textarea id="copy-by-hand" readOnly value={text} rows={8} />
      <button type="button" onClick={model.hideText}>
        {logText.close}
      </button>
    </section>
  );
}
