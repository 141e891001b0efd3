import type { AppModels } from "../models/app-models.ts";
import { SHELL_TEXT } from "./text/shell.ts";

export function TopBar({ models, title }: { models: AppModels; title: string }) {
  const show = models.journal.openShow.value;
  const name = show === null ? SHELL_TEXT.noShow : show.name || SHELL_TEXT.unnamedShow;
  return (
    <header class="top">
      <h1>{title}</h1>
      <nav class="top-links" aria-label={SHELL_TEXT.aside}>
        <a class="top-show" href="#/show">
          {name}
        </a>
        <a href="#/settings">{SHELL_TEXT.settings}</a>
      </nav>
    </header>
  );
}
