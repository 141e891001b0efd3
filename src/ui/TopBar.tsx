import type { AppModels } from "../models/app-models.ts";
import * as shellText from "./text/shell.ts";

export function TopBar({ models, title }: { models: AppModels; title: string }) {
  const show = models.journal.openShow.value;
  const name = show === null ? shellText.noShow : show.name || shellText.unnamedShow;
  return (
    <header class="top">
      <h1>{title}</h1>
      <nav class="top-links" aria-label={shellText.aside}>
        <a class="top-show" href="#/show">
          {name}
        </a>
        <a href="#/settings">{shellText.settings}</a>
      </nav>
    </header>
  );
}
