import type { ShowView } from "../../journal/views.ts";
import type { AppModels } from "../../models/app-models.ts";
import { DraftField } from "../parts/DraftField.tsx";
import { dateOf, timeOf } from "../text/format.ts";
import * as shellText from "../text/shell.ts";
import * as showText from "../text/show.ts";

/** Opens, names and closes the show. */
export function ShowPage({ models }: { models: AppModels }) {
  const model = models.show;
  const open = model.open.value;
  const earlier = model.shows.value.filter(({ id }) => id !== open?.id);
  const tooLong = model.isTooLong.value ? showText.tooLong : null;
  return (
    <div class="stack">
      {open === null ? (
        <p>{showText.purpose}</p>
      ) : (
        <section class="card stack" aria-label={showText.title}>
          <ShowLines show={open} />
          <button type="button" class="wide" onClick={() => void model.close()}>
            {showText.close}
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
          label={showText.name}
          draft={model.name}
          placeholder={open?.name ?? ""}
          problem={tooLong}
        />
        <DraftField
          id="show-place"
          label={showText.place}
          draft={model.place}
          placeholder={open?.place ?? ""}
        />
        <button type="submit" class="wide tall">
          {open === null ? showText.open : showText.save}
        </button>
      </form>
      {earlier.length > 0 && (
        <section>
          <h2>{showText.earlier}</h2>
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
                    {showText.reopen}
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
      <strong>{show.name || shellText.unnamedShow}</strong>
      {show.place !== "" && <span> · {show.place}</span>}
      <br />
      <span class="soft number">
        {day}, {timeOf(show.openedAt, show.timeZone)}
        {show.closedAt !== null && ` – ${timeOf(show.closedAt, show.timeZone)}`}
      </span>
    </>
  );
}
