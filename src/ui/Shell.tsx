import type { ComponentType } from "preact";
import { useEffect, useRef } from "preact/hooks";
import type { AppModels } from "../models/app-models.ts";
import type { Route } from "../models/route.ts";
import { CalculatorList } from "./calculators/CalculatorList.tsx";
import { Distance } from "./calculators/Distance.tsx";
import { KeepDistance } from "./calculators/KeepDistance.tsx";
import { Dock } from "./Dock.tsx";
import { FaultClose } from "./fault/FaultClose.tsx";
import { FaultHome } from "./fault/FaultHome.tsx";
import { FaultMarks } from "./fault/FaultMarks.tsx";
import { FaultSteps } from "./fault/FaultSteps.tsx";
import { FaultTrace } from "./fault/FaultTrace.tsx";
import { LogPage } from "./log/LogPage.tsx";
import { RigPage } from "./rig/RigPage.tsx";
import { StateLines } from "./StateLines.tsx";
import { Cautions } from "./settings/Cautions.tsx";
import { Settings } from "./settings/Settings.tsx";
import { ShowPage } from "./show/ShowPage.tsx";
import { TopBar } from "./TopBar.tsx";
import * as calculatorsText from "./text/calculators.ts";
import * as distanceText from "./text/distance.ts";
import * as faultText from "./text/fault.ts";
import * as logText from "./text/log.ts";
import * as rigText from "./text/rig.ts";
import * as settingsText from "./text/settings.ts";
import * as shellText from "./text/shell.ts";
import * as showText from "./text/show.ts";

type Part = ComponentType<{ models: AppModels }>;
interface Screen {
  readonly title: string;
  readonly Content: Part;
  /** The screen's own main action; it stands beside "Mark dropout". */
  readonly Action?: Part;
}

const SCREENS: Readonly<Record<Route["place"], Screen>> = {
  fault: { title: faultText.title, Content: FaultHome },
  mark: { title: faultText.title, Content: FaultHome },
  trace: { title: faultText.title, Content: FaultTrace },
  steps: { title: faultText.otherTitle, Content: FaultSteps },
  marks: { title: faultText.marksTitle, Content: FaultMarks },
  close: { title: faultText.closeTitle, Content: FaultClose },
  calculators: { title: calculatorsText.title, Content: CalculatorList },
  distance: { title: distanceText.title, Content: Distance, Action: KeepDistance },
  rig: { title: rigText.title, Content: RigPage },
  log: { title: logText.title, Content: LogPage },
  show: { title: showText.title, Content: ShowPage },
  settings: { title: settingsText.title, Content: Settings },
  cautions: { title: settingsText.cautions, Content: Cautions },
};

/** These answer at once; the others wait for the log rather than show an empty one first. */
const WITHOUT_LOG: ReadonlySet<Route["place"]> = new Set([
  "calculators",
  "distance",
  "settings",
  "cautions",
]);

/** The frame of every screen: top line, the screen itself, and the dock at the thumb. */
export function Shell({ models }: { models: AppModels }) {
  const route = models.navigation.route.value;
  const { title, Content, Action } = SCREENS[route.place];
  const main = useRef<HTMLElement>(null);
  const seen = useRef(route.place);
  useEffect(() => {
    if (seen.current === route.place) return;
    seen.current = route.place;
    // A new screen takes the focus, so that a screen reader starts at its top.
    main.current?.focus({ preventScroll: true });
  }, [route.place]);
  return (
    <>
      <TopBar models={models} title={title} />
      <main ref={main} class="page" tabIndex={-1}>
        <StateLines models={models} />
        {models.journal.phase.value === "loading" && !WITHOUT_LOG.has(route.place) ? (
          <p class="soft">{shellText.reading}</p>
        ) : (
          <Content models={models} />
        )}
      </main>
      <Dock models={models}>{Action && <Action models={models} />}</Dock>
    </>
  );
}
