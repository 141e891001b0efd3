import type { AppModels } from "../models/app-models.ts";
import { SHELL_TEXT } from "./text/shell.ts";

export function MishapLine({ models }: { models: AppModels }) {
  const { mishap, log } = models;
  const details = mishap.details.value;
  if (details === null) return null;
  return (
    <div class="line-note warning" role="alert">
      <p>{SHELL_TEXT.mishap}</p>
      <button type="button" onClick={() => void log.shareFile("fadewright-error", details)}>
        {SHELL_TEXT.mishapShare}
      </button>
      <button type="button" onClick={mishap.hide}>
        {SHELL_TEXT.mishapHide}
      </button>
    </div>
  );
}
