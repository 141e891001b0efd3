import type { AppModels } from "../../models/app-models.ts";
import { CARRIER } from "../../models/rig-model.ts";
import { LINK_KINDS } from "../../models/vocabulary.ts";
import { DraftField } from "../parts/DraftField.tsx";
import { Segments } from "../parts/Segments.tsx";
import { problemText } from "../text/fields.ts";
import { megahertz } from "../text/format.ts";
import * as rigText from "../text/rig.ts";
import { KIND_TEXT, NAME_PROBLEM_TEXT } from "../text/rig.ts";

/** The links of the show: who is on the air, and where. */
export function RigPage({ models }: { models: AppModels }) {
  const model = models.rig;
  const problem = model.problem.value;
  const isNameProblem = problem === "no-name" || problem === "name-too-long";
  return (
    <div class="stack">
      {model.links.value.length === 0 && <p>{rigText.purpose}</p>}
      <form
        class="stack"
        onSubmit={(event) => {
          event.preventDefault();
          void model.save();
        }}
      >
        <DraftField
          id="link-name"
          label={rigText.name}
          placeholder={rigText.namePlaceholder}
          draft={model.name}
          problem={isNameProblem ? NAME_PROBLEM_TEXT[problem] : null}
        />
        <DraftField
          id="link-frequency"
          label={rigText.frequency}
          inputMode="decimal"
          draft={model.frequency}
          problem={problem === null || isNameProblem ? null : problemText(problem, CARRIER, "m")}
        />
        <Segments
          label={rigText.kind}
          options={LINK_KINDS}
          text={KIND_TEXT}
          isWrapped
          chosen={model.kind.value}
          onPick={model.pickKind}
        />
        <button type="submit" class="wide">
          {model.edited.value === null ? rigText.add : rigText.save}
        </button>
      </form>
      {model.links.value.length > 0 && (
        <section>
          <h2>{rigText.links}</h2>
          <ul class="entries">
            {model.links.value.map((link) => (
              <li key={link.id} class="row">
                <span>
                  <strong>{link.name}</strong>
                  <br />
                  <span class="soft number">
                    {KIND_TEXT[link.kind]},{" "}
                    {link.frequencyMhz === null
                      ? rigText.noFrequency
                      : megahertz(link.frequencyMhz)}
                  </span>
                </span>
                <span class="chips">
                  <button
                    type="button"
                    aria-label={`${rigText.change}: ${link.name}`}
                    onClick={() => model.edit(link)}
                  >
                    {rigText.change}
                  </button>
                  <button
                    type="button"
                    aria-label={`${rigText.remove}: ${link.name}`}
                    onClick={() => void model.remove(link)}
                  >
                    {rigText.remove}
                  </button>
                </span>
              </li>
            ))}
          </ul>
        </section>
      )}
    </div>
  );
}
