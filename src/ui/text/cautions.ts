export interface CautionText {
  readonly title: string;
  readonly text: string;
}

/** Beside the step they belong to, and all together on a page of their own. */
export const CAUTION_TEXT: Readonly<Record<string, CautionText>> = {
  hearing: {
    title: "Mind people's ears",
    text: "A dropout can end in a full-level burst of noise. In-ear packs off the ears or their level down first, and the channel muted at the desk.",
  },
  height: {
    title: "Work at height",
    text: "Ladders, lifts and trusses are for people who are trained and allowed to use them here. Follow the house rules and local codes, and never climb alone or over an audience.",
  },
  mains: {
    title: "Mains power",
    text: "Leave distribution, open covers and damaged cables to a licensed or competent person. Agree with everyone on the circuit before switching it.",
  },
  batteries: {
    title: "Batteries",
    text: "Use the type that the maker names, all cells alike. Set hot, swollen or leaking cells aside, touch no leak, and follow local rules for disposal.",
  },
  licence: {
    title: "Check what is allowed",
    text: "Bands, frequencies and power limits differ by country and place. Ask whoever holds the licence or coordinates frequencies here before you retune or raise the power.",
  },
  "other-departments": {
    title: "Ask first",
    text: "Lighting, video, network and rigging have their own reasons. Let their people switch their own gear, and never touch emergency lighting or safety systems.",
  },
};
