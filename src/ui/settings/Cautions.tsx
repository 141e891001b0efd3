import { CAUTION_TEXT } from "../text/cautions.ts";
import { CAUTIONS_INTRO } from "../text/settings.ts";

export function Cautions() {
  return (
    <div class="stack">
      <p>{CAUTIONS_INTRO}</p>
      {Object.entries(CAUTION_TEXT).map(([id, { title, text }]) => (
        <section key={id} class="caution">
          <h2 class="inline">{title}</h2>
          <p>{text}</p>
        </section>
      ))}
    </div>
  );
}
