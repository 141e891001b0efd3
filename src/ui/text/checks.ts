export interface CheckText {
  /** Under twelve words. */
  readonly question: string;
  /** How to find out, in one or two sentences. */
  readonly how: string;
  /** Button label of each outcome. */
  readonly outcomes: Readonly<Record<string, string>>;
}

export const CHECK_TEXT: Readonly<Record<string, CheckText>> = {
  "what-was-heard": {
    question: "What did you hear when it dropped?",
    how: "Take the first thing you noticed. If you were not listening, ask whoever was.",
    outcomes: {
      silence: "Silence",
      noise: "Hiss, buzz or hash",
      clicks: "Crackle, pops or clicks",
      foreign: "Other voices, whistles, garble",
    },
  },
  "which-links": {
    question: "How many links dropped out?",
    how: "Look along the receivers and think of the last few minutes.",
    outcomes: { one: "Only one", some: "Several", all: "All of them" },
  },
  "when-it-happens": {
    question: "When does it happen?",
    how: "Think of all the dropouts so far, not only the last.",
    outcomes: {
      moving: "At some spots or movements",
      always: "All the time, or ever more",
      event: "When something came on",
      random: "No pattern",
    },
  },
  "meters-did": {
    question: "What did the signal meters do as it dropped?",
    how: "The radio signal meters of the receiver, often marked A and B. Not the sound meter.",
    outcomes: {
      "both-fell": "All fell",
      "one-low": "One was low all along",
      "stayed-up": "They stayed up",
    },
  },
  "link-kind": {
    question: "What kind of link is it?",
    how: "If several drop out, take the one that suffers most.",
    outcomes: {
      handheld: "Handheld microphone",
      bodypack: "Pack with microphone",
      "in-ear": "In-ear monitor",
      intercom: "Intercom",
    },
  },
  "band-in-use": {
    question: "Is it in a band shared with networks and phones?",
    how: "Such gear says 2.4 GHz, 1.9 GHz or 900 MHz on its label or in its menu.",
    outcomes: { shared: "Yes, one of those", other: "No, another band" },
  },
  "branches-lit": {
    question: "Which antenna meters show signal right now?",
    how: "Look at A and B on the receiver while the transmitter is on.",
    outcomes: { both: "Both", one: "Only one", none: "None" },
  },
  "follows-what": {
    question: "What does it follow?",
    how: "Watch the performer and the signal meter together for a while.",
    outcomes: {
      place: "A place on stage",
      turn: "Which way they face",
      angle: "How it is tilted or held",
      neither: "None of these",
    },
  },
  "audio-meter": {
    question: "What did the receiver's sound meter do?",
    how: "The meter for sound on the same receiver, during a dropout.",
    outcomes: {
      "as-usual": "Kept moving as usual",
      "fell-alone": "Fell, signal meter stayed up",
      "fell-too": "Fell with the signal meter",
    },
  },
  "on-headphones": {
    question: "Is it there on headphones at the receiver?",
    how: "Plug in with the level down, then bring it up. Listen before the desk comes into play.",
    outcomes: { heard: "Yes, I hear it there", clean: "No, clean there" },
  },
  "battery-reading": {
    question: "What does the transmitter's battery reading say?",
    how: "Many receivers show it. An old or wrong type of cell can read full and be nearly empty.",
    outcomes: { fine: "Fine", low: "Low", jumps: "Jumps, or no reading" },
  },
  "display-dark": {
    question: "Did a display go dark or restart?",
    how: "Pack, receiver, splitter, antenna supply: ask whoever saw it.",
    outcomes: { no: "No", transmitter: "Yes, on the transmitter", rack: "Yes, in the rack" },
  },
  "neighbours-suffer": {
    question: "Do other links at the same place suffer too?",
    how: "Compare with another performer of the same band who stands near by.",
    outcomes: { yes: "Yes", no: "No, only this one" },
  },
  "what-changed": {
    question: "What has changed since it last worked?",
    how: "Ask round: cells, costume, cables, settings, scenery, audience, visitors with transmitters.",
    outcomes: {
      nothing: "Nothing that we know of",
      wearer: "Performer, costume or pack",
      gear: "Cables, antennas or settings",
      surroundings: "Scenery, crowd or neighbours",
    },
  },
  "switched-just-then": {
    question: "Were lights, video or effects switched just then?",
    how: "Ask on the intercom what was on cue at that moment.",
    outcomes: { yes: "Yes", no: "No" },
  },
  "regular-beat": {
    question: "Does it come at an even beat?",
    how: "Count between two of them. A clock or machine keeps its period to the second.",
    outcomes: { regular: "Yes, like a clock", irregular: "No, unevenly" },
  },
  "radios-near-antennas": {
    question: "Any radios, phones or computers close to the antennas?",
    how: "Look for anything that transmits or computes within three metres (ten feet) of antennas and rack.",
    outcomes: { yes: "Yes", no: "No" },
  },
  "antenna-look": {
    question: "How do the antennas look?",
    how: "Look from the floor; do not climb. They want clear sight, and space from metal and each other.",
    outcomes: {
      clear: "Clear, high and apart",
      hidden: "Low, hidden or against metal",
      bunched: "Bunched together",
      damaged: "Loose, fallen or damaged",
    },
  },
  "antenna-distance": {
    question: "How far from the nearest antenna does it drop?",
    how: "Guess from the performer's place to the antenna that is nearest.",
    outcomes: {
      near: "Under 10 m (30 ft)",
      middle: "10 to 30 m (30 to 100 ft)",
      far: "Over 30 m (100 ft)",
    },
  },
  "antenna-power-light": {
    question: "Is the antenna power light on?",
    how: "On the splitter, the supply or the antenna itself.",
    outcomes: { lit: "Yes, on", dark: "No, dark", none: "No powered antennas here" },
  },
  "settings-as-planned": {
    question: "Are frequency, squelch and mode as planned?",
    how: "Read receiver and transmitter against the list. For digital gear look at pairing and clock too.",
    outcomes: { "as-planned": "Yes, as planned", changed: "No, something differs" },
  },
  "second-transmitter": {
    question: "Is a second transmitter of ours on this frequency?",
    how: "Look in cases, chargers, pockets and dressing rooms for one that is on.",
    outcomes: { found: "Yes, found one", "not-found": "No, none found" },
  },
  "transmitter-off": {
    question: "Transmitter off: what does the signal meter show?",
    how: "Mute the channel, switch the transmitter off and watch the meter for half a minute.",
    outcomes: {
      quiet: "Nothing",
      carrier: "A steady signal",
      noise: "A restless low level",
    },
  },
  "close-by": {
    question: "Within 3 m (10 ft) of the antennas, is it clean?",
    how: "Bring the transmitter near, with nothing between, and let it work for half a minute.",
    outcomes: { clean: "Yes, clean", same: "No, still drops", worse: "Worse" },
  },
  "level-close-by": {
    question: "How high is the meter 3 m (10 ft) away?",
    how: "Hold the transmitter free in the air, three metres from an antenna.",
    outcomes: { high: "Nearly full", middling: "Middling", low: "Low" },
  },
  twist: {
    question: "Does a quarter twist make the signal fall?",
    how: "Stay on the spot and turn the transmitter from upright to level while somebody watches the meter.",
    outcomes: { falls: "Yes, it falls", same: "No, hardly" },
  },
  "turn-round": {
    question: "Does turning the wearer make the signal fall?",
    how: "Let the wearer turn once round on the spot while somebody watches the meter.",
    outcomes: { falls: "Yes, it falls", same: "No, hardly" },
  },
  "slow-walk": {
    question: "How does the signal behave on a slow walk?",
    how: "One walks the stage slowly and talks, one watches meters and listens.",
    outcomes: {
      smooth: "Fades with distance",
      dips: "Dips, back in half a step",
      region: "Weak in one region",
      steady: "Steady",
    },
  },
  "less-power": {
    question: "One step less power: better or worse?",
    how: "Step this transmitter down, and those near it. Try where it dropped before.",
    outcomes: { better: "Better", same: "No difference", worse: "Worse" },
  },
  "try-spare": {
    question: "With a spare pack on this frequency, does it clear?",
    how: "Change only the transmitter; keep frequency, place and person. The old one off.",
    outcomes: { clears: "Yes, it clears", same: "No, the same" },
  },
  "other-frequency": {
    question: "Same pack, another frequency: does it clear?",
    how: "Take a free frequency from the plan, on transmitter and receiver. Change nothing else.",
    outcomes: { clears: "Yes, it clears", same: "No, the same" },
  },
  "others-off": {
    question: "All other transmitters off: is it clean?",
    how: "Mute them at the desk, then switch all the others off, spares too.",
    outcomes: { clean: "Yes, clean", same: "No, the same" },
  },
  "packs-apart": {
    question: "Packs two metres apart: does it clear?",
    how: "Spread the people, and the packs on the table, by six feet or more.",
    outcomes: { clears: "Yes, it clears", same: "No, the same" },
  },
  "pad-in-line": {
    question: "With a 10 dB pad in the line: better or worse?",
    how: "Put it before the first amplifier or receiver. A pad may cut the supply of a powered antenna.",
    outcomes: { better: "Better", same: "No difference", worse: "Worse" },
  },
  "antenna-off": {
    question: "Antenna lines off: what does the noise reading do?",
    how: "Mute everything, transmitter off, then take the lines off at the receiver or splitter.",
    outcomes: {
      "was-quiet": "It was quiet before",
      falls: "It falls to nothing",
      stays: "It stays",
    },
  },
  "swap-lines": {
    question: "Antenna lines swapped: where is the weak side?",
    how: "Mute everything and exchange A and B at the receiver.",
    outcomes: {
      moves: "It moved over",
      stays: "It stayed where it was",
      "no-weak-side": "Neither side is weak",
    },
  },
  "other-receiver": {
    question: "On another receiver, does it still drop?",
    how: "Tune a second receiver on the same antennas to this frequency and listen to both.",
    outcomes: { drops: "Yes, it drops there too", clean: "No, clean there" },
  },
  wiggle: {
    question: "What does wiggling the cables stir up?",
    how: "Mute the outputs. Move antenna plugs and cables first, then microphone, plug and pack antenna.",
    outcomes: {
      "antenna-line": "Signal jumps: antenna line",
      microphone: "Crackle: microphone or pack",
      nothing: "Nothing",
    },
  },
  "wall-off": {
    question: "Video wall and lights off: does the noise drop?",
    how: "Watch the meter, transmitter off, while their people switch one thing after another.",
    outcomes: { drops: "Yes, it drops", same: "No, the same" },
  },
};
