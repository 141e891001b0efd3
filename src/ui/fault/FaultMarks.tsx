import type { LinkView, MarkView } from "../../journal/views.ts";
import type { AppModels } from "../../models/app-models.ts";
import type { FaultModel } from "../../models/fault-model.ts";
import { PLACES } from "../../models/vocabulary.ts";
import { Chip } from "../parts/Chip.tsx";
import * as faultText from "../text/fault.ts";
import { PLACE_TEXT } from "../text/fault.ts";
import { timeOf } from "../text/format.ts";
import { FaultGone } from "./FaultGone.tsx";

/** Which links and where on stage, for each mark, latest first; all of it optional, all by tap. */
export function FaultMarks({ models }: { models: AppModels }) {
  const traced = models.fault.traced.value;
  if (traced === null) return <FaultGone />;
  const { fault, show } = traced;
  return (
    <div class="stack">
      {show.links.length === 0 && <p class="soft">{faultText.marksNoLinks}</p>}
      {[...fault.marks].reverse().map((mark) => (
        <Mark
          key={mark.id}
          model={models.fault}
          mark={mark}
          links={show.links}
          time={timeOf(mark.at, show.timeZone)}
        />
      ))}
      <a class="button wide tall" href={`#/fault/${fault.id}`}>
        {faultText.done}
      </a>
    </div>
  );
}

function Mark(props: {
  model: FaultModel;
  mark: MarkView;
  links: readonly LinkView[];
  time: string;
}) {
  const { model, mark, links, time } = props;
  const toggle = (link: string): void => {
    const next = mark.links.includes(link)
      ? mark.links.filter((id) => id !== link)
      : [...mark.links, link];
    void model.detailMark(mark.id, next, mark.place);
  };
  return (
    <section class="card stack" aria-label={time}>
      <h2 class="number">{time}</h2>
      <div class="chips">
        {links.map((link) => (
          <Chip
            key={link.id}
            text={link.name}
            isChosen={mark.links.includes(link.id)}
            onPick={() => toggle(link.id)}
          />
        ))}
      </div>
      <p class="soft">{faultText.stage}</p>
      <div class="stage">
        {PLACES.map((place) => (
          <Chip
            key={place}
            text={PLACE_TEXT[place]}
            isChosen={mark.place === place}
            onPick={() =>
              void model.detailMark(mark.id, mark.links, mark.place === place ? null : place)
            }
          />
        ))}
      </div>
    </section>
  );
}
