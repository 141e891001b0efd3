// Runs before the first paint. Names of the themes and of the stored key: src/models/settings-model.ts.
try {
  const theme = localStorage.getItem("fadewright.theme");
  if (theme === "daylight" || theme === "deep-red") document.documentElement.dataset.theme = theme;
} catch (refused) {
  // Storage switched off: the default theme stays, and the app itself says what it can't keep.
  document.documentElement.dataset.storage = refused instanceof Error ? refused.name : "refused";
}
