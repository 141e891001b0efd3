import { useEffect } from "preact/hooks";
import type { AppModels } from "../../models/app-models.ts";
import { LENGTH_UNITS, THEMES } from "../../models/settings-model.ts";
import { Segments } from "../parts/Segments.tsx";
import { megabytes } from "../text/format.ts";
import * as settingsText from "../text/settings.ts";
import { THEME_TEXT, UNIT_TEXT } from "../text/settings.ts";
import { setAsideText } from "../text/shell.ts";
import { OfflineState } from "./OfflineState.tsx";

export function Settings({ models }: { models: AppModels }) {
  const { settings, journal, log } = models;
  const setAside = journal.setAside.value;
  useEffect(() => void settings.lookAtStorage(), [settings]);
  return (
    <div class="stack">
      <section class="stack">
        <h2>{settingsText.theme}</h2>
        <Segments
          label={settingsText.theme}
          options={THEMES}
          text={THEME_TEXT}
          chosen={settings.theme.value}
          onPick={settings.setTheme}
        />
      </section>
      <section class="stack">
        <h2>{settingsText.units}</h2>
        <Segments
          label={settingsText.units}
          options={LENGTH_UNITS}
          text={UNIT_TEXT}
          chosen={settings.lengthUnit.value}
          onPick={settings.setLengthUnit}
        />
      </section>
      <OfflineState models={models} />
      <Storage models={models} />
      {setAside.length > 0 && (
        <section class="stack">
          <h2>{settingsText.setAside}</h2>
          <p>{setAsideText(setAside.length)}</p>
          <button
            type="button"
            class="wide"
            onClick={() =>
              void log.shareFile("fadewright-set-aside", JSON.stringify(setAside, null, 1))
            }
          >
            {settingsText.exportSetAside}
          </button>
        </section>
      )}
      <section class="stack">
        <h2>{settingsText.about}</h2>
        <p>{settingsText.aboutText}</p>
        <a class="button wide" href="#/cautions">
          {settingsText.cautions}
        </a>
      </section>
    </div>
  );
}

function Storage({ models }: { models: AppModels }) {
  const { settings } = models;
  const use = settings.storage.value;
  if (use === null) return null;
  return (
    <section class="stack">
      <h2>{settingsText.storage}</h2>
      <p>
        {use.usedBytes === null
          ? settingsText.unknownUse
          : `${megabytes(use.usedBytes)} ${settingsText.used}.`}
      </p>
      <p>{use.isPersistent ? settingsText.persistent : settingsText.notPersistent}</p>
      {!use.isPersistent && (
        <button type="button" class="wide" onClick={() => void settings.askToPersist()}>
          {settingsText.askPersist}
        </button>
      )}
    </section>
  );
}
