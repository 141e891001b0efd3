import type { FaultModel } from "../../models/fault-model.ts";
import { MOMENTS } from "../../models/vocabulary.ts";
import { Segments } from "../parts/Segments.tsx";
import * as faultText from "../text/fault.ts";
import { MOMENT_TEXT } from "../text/fault.ts";

/** What may be done now depends on it: a live microphone can't be switched off. */
export function MomentPicker({ fault }: { fault: FaultModel }) {
  return (
    <Segments
      label={faultText.moment}
      options={MOMENTS}
      text={MOMENT_TEXT}
      chosen={fault.moment.value}
      onPick={(moment) => void fault.setMoment(moment)}
    />
  );
}
