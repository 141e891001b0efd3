import type { LengthUnit } from "../../calculators/field.ts";
import type { Theme } from "../../models/settings-model.ts";

export const title = "Settings";
export const theme = "Theme";
export const units = "Lengths in";
export const offline = "Without network";
export const ready = "Ready without network: everything is stored on this phone.";
export const preparing = "Getting ready for use without network…";
export const failed = "Not ready without network. Try again with a connection.";
export const unsupported =
  "Can't be made ready for use without network: it takes HTTPS and a browser with service workers.";
export const version = "Version";
export const check = "Look for a new version";
export const locked = "A show is open: the version stays as it is until you close the show.";
export const storage = "Storage";
export const persistent = "The browser will not clear the log by itself.";
export const notPersistent =
  "The browser may clear the log when space is short: share it after the show.";
export const askPersist = "Ask the browser to keep it";
export const unknownUse = "This browser does not tell how much is used.";
export const used = "used on this phone";
export const setAside = "Set-aside records";
export const exportSetAside = "Hand over the set-aside records";
export const about = "About";
export const aboutText =
  "Fadewright helps to find out why a wireless link drops out. It measures nothing itself, sends nothing anywhere, and gives no licence.";
export const cautions = "Cautions";

export const THEME_TEXT: Readonly<Record<Theme, string>> = {
  blackout: "Blackout",
  daylight: "Daylight",
  "deep-red": "Deep red",
};

export const UNIT_TEXT: Readonly<Record<LengthUnit, string>> = { m: "Metres", ft: "Feet" };

export const CAUTIONS_INTRO =
  "Advice in this app never outranks local codes, the house's rules, or the licensed or competent person in charge.";

/** What came of a look for a new version. */
export const LOOKED_TEXT = {
  found: "A new version is on its way.",
  none: "No newer version there.",
  locked: "A show is open: the version stays as it is until you close the show.",
  unreachable: "Can't reach the place the app came from. Nothing has changed.",
} as const;
