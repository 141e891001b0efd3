try {
  const t = localStorage.getItem("fadewright.theme");
  if (t === "daylight" || t === "deep-red") document.documentElement.dataset.theme = t;
} catch (e) {
  document.documentElement.dataset.storage = e.name;
}
