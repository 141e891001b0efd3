import type { ManifestOptions } from "vite-plugin-pwa";

/** The web app manifest. Every address is relative, so that it holds under any sub-path. */
export const manifest: Partial<ManifestOptions> = {
  // Resolved against the origin, not the sub-path: one installed Fadewright for each origin.
  id: "fadewright",
  name: "Fadewright",
  short_name: "Fadewright",
  description:
    "Find out why a wireless microphone, in-ear monitor or intercom drops out, and keep the record.",
  start_url: "./",
  scope: "./",
  display: "standalone",
  background_color: "#120d09",
  theme_color: "#120d09",
  categories: ["utilities", "productivity"],
  launch_handler: { client_mode: "navigate-existing" },
  icons: [
    { src: "icons/icon-192.png", sizes: "192x192", type: "image/png" },
    { src: "icons/icon-512.png", sizes: "512x512", type: "image/png" },
    {
      src: "icons/icon-maskable-512.png",
      sizes: "512x512",
      type: "image/png",
      purpose: "maskable",
    },
    { src: "icons/icon.svg", sizes: "any", type: "image/svg+xml" },
  ],
  shortcuts: [
    { name: "Mark a dropout", short_name: "Mark", url: "./#/mark" },
    { name: "Distance and level", short_name: "Distance", url: "./#/calculators/distance" },
    { name: "Log of the show", short_name: "Log", url: "./#/log" },
  ],
};
