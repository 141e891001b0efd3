import type { AppModels } from "../../models/app-models.ts";
import { SETTINGS_TEXT } from "../text/settings.ts";

const READINESS = {
  ready: SETTINGS_TEXT.ready,
  preparing: SETTINGS_TEXT.preparing,
  failed: SETTINGS_TEXT.failed,
  unsupported: SETTINGS_TEXT.unsupported,
};

/** Whether the app works without network, and the one place where a new version is asked for. */
export function OfflineState({ models }: { models: AppModels }) {
  const { offline, journal } = models;
  const isLocked = journal.openShow.value !== null;
  const looked = offline.looked.value;
  return (
    <section class="stack">
      <h2>{SETTINGS_TEXT.offline}</h2>
      <p role="status">{READINESS[offline.readiness.value]}</p>
      {offline.version.value !== null && (
        <p class="soft">
          {SETTINGS_TEXT.version} {offline.version.value}
        </p>
      )}
      {isLocked && <p>{SETTINGS_TEXT.locked}</p>}
      {!isLocked && offline.readiness.value === "ready" && (
        <button type="button" class="wide" onClick={() => void offline.look()}>
          {SETTINGS_TEXT.check}
        </button>
      )}
      {looked !== null && <p role="status">{SETTINGS_TEXT[looked]}</p>}
    </section>
  );
}
