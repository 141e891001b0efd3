import { useEffect } from "preact/hooks";
import type { AppModels } from "../../models/app-models.ts";
import { LENGTH_UNITS, THEMES } from "../../models/settings-model.ts";
import { Segments } from "../parts/Segments.tsx";
import { megabytes } from "../text/format.ts";
import { SETTINGS_TEXT, THEME_TEXT, UNIT_TEXT } from "../text/settings.ts";
import { setAsideText } from "../text/shell.ts";
import { OfflineState } from "./OfflineState.tsx";

export function Settings({ models }: { models: AppModels }) {
  const { settings, journal, log } = models;
  const setAside = journal.setAside.value;
  useEffect(() => void settings.lookAtStorage(), [settings]);
  return (
    <div class="stack">
      <section class="stack">
        <h2>{SETTINGS_TEXT.theme}</h2>
        <Segments
          label={SETTINGS_TEXT.theme}
          options={THEMES}
          text={THEME_TEXT}
          chosen={settings.theme.value}
          onPick={settings.setTheme}
        />
      </section>
      <section class="stack">
        <h2>{SETTINGS_TEXT.units}</h2>
        <Segments
          label={SETTINGS_TEXT.units}
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
          <h2>{SETTINGS_TEXT.setAside}</h2>
          <p>{setAsideText(setAside.length)}</p>
          <button
            type="button"
            class="wide"
            onClick={() =>
              void log.shareFile("fadewright-set-aside", JSON.stringify(setAside, null, 1))
            }
          >
            {SETTINGS_TEXT.exportSetAside}
          </button>
        </section>
      )}
      <section class="stack">
        <h2>{SETTINGS_TEXT.about}</h2>
        <p>{SETTINGS_TEXT.aboutText}</p>
        <a class="button wide" href="#/cautions">
          {SETTINGS_TEXT.cautions}
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
      <h2>{SETTINGS_TEXT.storage}</h2>
      <p>
        {use.usedBytes === null
          ? SETTINGS_TEXT.unknownUse
          : `${megabytes(use.usedBytes)} ${SETTINGS_TEXT.used}.`}
      </p>
      <p>{use.isPersistent ? SETTINGS_TEXT.persistent : SETTINGS_TEXT.notPersistent}</p>
      {!use.isPersistent && (
        <button type="button" class="wide" onClick={() => void settings.askToPersist()}>
          {SETTINGS_TEXT.askPersist}
        </button>
      )}
    </section>
  );
}
