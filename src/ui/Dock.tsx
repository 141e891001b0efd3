import type { ComponentChildren } from "preact";
import type { AppModels } from "../models/app-models.ts";
import * as shellText from "./text/shell.ts";
import { noticeText, PLACE_NAMES } from "./text/shell.ts";

const PLACES = ["fault", "calculators", "rig", "log"] as const;

/** Always at the thumb: the last acknowledgement, the mark button, the four places. */
export function Dock(props: { models: AppModels; children: ComponentChildren }) {
  const { journal, notices, fault, navigation } = props.models;
  const notice = notices.notice.value;
  const timeZone = journal.openShow.value?.timeZone ?? "UTC";
  // An address begins with its place: "#/fault/…".
  const here = navigation.place.value.split("/")[1];
  const hasOpenFault = fault.openFaults.value.length > 0;
  return (
    <div class="dock">
      {/* Present from the start and empty: a live region that appears with its text is not read out. */}
      <p class="notice number" role="status">
        {notice && noticeText(notice, timeZone)}
      </p>
      <div class="dock-actions">
        {props.children}
        <button type="button" class="main" onClick={() => void fault.markDropout()}>
          {hasOpenFault ? shellText.markAgain : shellText.mark}
        </button>
      </div>
      <nav class="places" aria-label={shellText.places}>
        {PLACES.map((place) => (
          <a key={place} href={`#/${place}`} aria-current={here === place ? "page" : undefined}>
            {PLACE_NAMES[place]}
          </a>
        ))}
      </nav>
    </div>
  );
}
