import type { AppModels } from "../../models/app-models.ts";
import { CAUTIONS_INTRO } from "../text/settings.ts";

/** All cautions in one place; each also stands where its risk is. */
export function Cautions({ models }: { models: AppModels }) {
  return (
    <div class="stack">
      <p>{CAUTIONS_INTRO}</p>
      {models.expertise.words.value.cautions.map(({ title, text }) => (
        <details key={title} class="unfold">
          <summary>
            <strong>{title}</strong>
          </summary>
          <p class="caution">{text}</p>
        </details>
      ))}
    </div>
  );
}
