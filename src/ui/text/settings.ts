import type { LengthUnit } from "../../calculators/field.ts";
import type { Theme } from "../../models/settings-model.ts";

export const SETTINGS_TEXT = {
  title: "Settings",
  theme: "Theme",
  units: "Lengths in",
  offline: "Without network",
  ready: "Ready without network: everything is stored on this phone.",
  preparing: "Getting ready for use without network…",
  failed:
    "Not ready without network: the download did not finish. Open the app once more with a connection.",
  unsupported:
    "This address can't be made ready for use without network. It takes HTTPS and a browser that allows service workers.",
  version: "Version",
  check: "Look for a new version",
  updateNow: "Restart with the new version",
  locked: "A show is open: the version stays as it is until you close the show.",
  found: "A new version is on its way.",
  none: "No newer version there.",
  unreachable: "Can't reach the place the app came from. Nothing has changed.",
  storage: "Storage",
  persistent: "The browser has agreed not to clear the log by itself.",
  notPersistent: "The browser may clear the log when space is short. Share the log after the show.",
  askPersist: "Ask the browser to keep it",
  unknownUse: "This browser does not tell how much is used.",
  used: "used on this phone",
  setAside: "Set-aside records",
  exportSetAside: "Hand over the set-aside records",
  about: "About",
  aboutText:
    "Fadewright helps to find out why a wireless link drops out. It measures nothing itself, sends nothing anywhere, and gives no licence.",
  cautions: "Cautions",
} as const;

export const THEME_TEXT: Readonly<Record<Theme, string>> = {
  blackout: "Blackout",
  daylight: "Daylight",
  "deep-red": "Deep red",
};

export const UNIT_TEXT: Readonly<Record<LengthUnit, string>> = { m: "Metres", ft: "Feet" };

export const CAUTIONS_INTRO =
  "Advice in this app never outranks local codes, the house's rules, or the licensed or competent person in charge.";
