import type { ComponentType } from "preact";
import { useEffect, useRef } from "preact/hooks";
import type { AppModels } from "../models/app-models.ts";
import { type Route, tabOf } from "../models/route.ts";
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
import { CALCULATORS_TEXT, DISTANCE_TEXT } from "./text/calculators.ts";
import { FAULT_TEXT } from "./text/fault.ts";
import { LOG_TEXT, SHOW_TEXT } from "./text/log.ts";
import { RIG_TEXT } from "./text/rig.ts";
import { SETTINGS_TEXT } from "./text/settings.ts";

type Part = ComponentType<{ models: AppModels }>;
interface Screen {
  readonly title: string;
  readonly Content: Part;
  /** The screen's own main action; it stands beside "Mark dropout". */
  readonly Action?: Part;
}

const SCREENS: Readonly<Record<Route["place"], Screen>> = {
  fault: { title: FAULT_TEXT.title, Content: FaultHome },
  mark: { title: FAULT_TEXT.title, Content: FaultHome },
  trace: { title: FAULT_TEXT.title, Content: FaultTrace },
  steps: { title: FAULT_TEXT.otherTitle, Content: FaultSteps },
  marks: { title: FAULT_TEXT.marksTitle, Content: FaultMarks },
  close: { title: FAULT_TEXT.closeTitle, Content: FaultClose },
  calculators: { title: CALCULATORS_TEXT.title, Content: CalculatorList },
  distance: { title: DISTANCE_TEXT.title, Content: Distance, Action: KeepDistance },
  rig: { title: RIG_TEXT.title, Content: RigPage },
  log: { title: LOG_TEXT.title, Content: LogPage },
  show: { title: SHOW_TEXT.title, Content: ShowPage },
  settings: { title: SETTINGS_TEXT.title, Content: Settings },
  cautions: { title: SETTINGS_TEXT.cautions, Content: Cautions },
};

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
        <Content models={models} />
      </main>
      <Dock models={models} tab={tabOf(route)}>
        {Action && <Action models={models} />}
      </Dock>
    </>
  );
}
