import type { AppModels } from "../models/app-models.ts";
import * as shellText from "./text/shell.ts";

export function MishapLine({ models }: { models: AppModels }) {
  const { mishap, log } = models;
  const details = mishap.details.value;
  if (details === null) return null;
  return (
    <div class="line-note warning" role="alert">
      <p>{shellText.mishap}</p>
      <button type="button" onClick={() => void log.shareFile("fadewright-error", details)}>
        {shellText.mishapShare}
      </button>
      <button type="button" onClick={mishap.hide}>
        {shellText.mishapHide}
      </button>
    </div>
  );
}
