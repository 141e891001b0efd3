import { CAUTION_TEXT } from "../text/cautions.ts";
import { CAUTIONS_INTRO } from "../text/settings.ts";

/** All cautions in one place; each also stands where its risk is. */
export function Cautions() {
  return (
    <div class="stack">
      <p>{CAUTIONS_INTRO}</p>
      {Object.entries(CAUTION_TEXT).map(([id, { title, text }]) => (
        <details key={id} class="unfold">
          <summary>
            <strong>{title}</strong>
          </summary>
          <p class="caution">{text}</p>
        </details>
      ))}
    </div>
  );
}
