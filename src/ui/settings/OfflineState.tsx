import type { AppModels } from "../../models/app-models.ts";
import * as settingsText from "../text/settings.ts";
import { LOOKED_TEXT } from "../text/settings.ts";

const READINESS = {
  ready: settingsText.ready,
  preparing: settingsText.preparing,
  failed: settingsText.failed,
  unsupported: settingsText.unsupported,
};

/** Whether the app works without network, and the one place where a new version is asked for. */
export function OfflineState({ models }: { models: AppModels }) {
  const { offline, journal } = models;
  const isLocked = journal.openShow.value !== null;
  const looked = offline.looked.value;
  return (
    <section class="stack">
      <h2>{settingsText.offline}</h2>
      <p role="status">{READINESS[offline.readiness.value]}</p>
      {offline.version.value !== null && (
        <p class="soft">
          {settingsText.version} {offline.version.value}
        </p>
      )}
      {isLocked && <p>{settingsText.locked}</p>}
      {!isLocked && offline.readiness.value === "ready" && (
        <button type="button" class="wide" onClick={() => void offline.look()}>
          {settingsText.check}
        </button>
      )}
      {looked !== null && <p role="status">{LOOKED_TEXT[looked]}</p>}
    </section>
  );
}
