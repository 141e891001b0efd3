import type { ShowView } from "../../journal/views.ts";
import type { AppModels } from "../../models/app-models.ts";
import { DraftField } from "../parts/DraftField.tsx";
import { dateOf, timeOf } from "../text/format.ts";
import { SHOW_TEXT } from "../text/log.ts";
import { SHELL_TEXT } from "../text/shell.ts";

/** Opens, names and closes the show. */
export function ShowPage({ models }: { models: AppModels }) {
  const model = models.show;
  const open = model.open.value;
  const earlier = model.shows.value.filter(({ id }) => id !== open?.id);
  const tooLong = model.isTooLong.value ? SHOW_TEXT.tooLong : null;
  return (
    <div class="stack">
      {open === null ? (
        <p>{SHOW_TEXT.purpose}</p>
      ) : (
        <section class="card stack" aria-label={SHOW_TEXT.title}>
          <ShowLines show={open} />
          <button type="button" class="wide" onClick={() => void model.close()}>
            {SHOW_TEXT.close}
          </button>
        </section>
      )}
      <form
        class="stack"
        onSubmit={(event) => {
          event.preventDefault();
          void model.save();
        }}
      >
        <DraftField
          id="show-name"
          label={SHOW_TEXT.name}
          draft={model.name}
          placeholder={open?.name ?? ""}
          problem={tooLong}
        />
        <DraftField
          id="show-place"
          label={SHOW_TEXT.place}
          draft={model.place}
          placeholder={open?.place ?? ""}
        />
        <button type="submit" class="wide tall">
          {open === null ? SHOW_TEXT.open : SHOW_TEXT.save}
        </button>
      </form>
      {earlier.length > 0 && (
        <section>
          <h2>{SHOW_TEXT.earlier}</h2>
          <ul class="entries">
            {earlier.map((show) => (
              <li key={show.id} class="row">
                <a class="button" href={`#/log/${show.id}`}>
                  <span>
                    <ShowLines show={show} />
                  </span>
                </a>
                {open === null && show.closedAt !== null && (
                  <button type="button" onClick={() => void model.reopen(show)}>
                    {SHOW_TEXT.reopen}
                  </button>
                )}
              </li>
            ))}
          </ul>
        </section>
      )}
    </div>
  );
}

function ShowLines({ show }: { show: ShowView }) {
  const day = dateOf(show.openedAt, show.timeZone);
  return (
    <>
      <strong>{show.name || SHELL_TEXT.unnamedShow}</strong>
      {show.place !== "" && <span> · {show.place}</span>}
      <br />
      <span class="soft number">
        {day}, {timeOf(show.openedAt, show.timeZone)}
        {show.closedAt !== null && ` – ${timeOf(show.closedAt, show.timeZone)}`}
      </span>
    </>
  );
}
