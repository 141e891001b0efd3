export interface CauseText {
  readonly name: string;
  /** What is wrong, in one line for somebody who knows no radio. */
  readonly plain: string;
}

export const CAUSE_TEXT: Readonly<Record<string, CauseText>> = {
  distance: {
    name: "Too far away",
    plain: "The performer is farther from the antennas than the signal carries.",
  },
  "body-block": {
    name: "A body in the way",
    plain: "The wearer, a hand or the crowd shades the transmitter.",
  },
  obstruction: {
    name: "Something in the way",
    plain: "Scenery, a wall or a screen hides the performer from the antennas.",
  },
  reflections: {
    name: "Echoes in the room",
    plain: "The signal and its echoes cancel out at certain small spots.",
  },
  "diversity-too-close": {
    name: "Antennas too close together",
    plain: "Both antennas fade at the same instant, so neither helps the other out.",
  },
  "tilt-mismatch": {
    name: "Held across the antennas",
    plain: "Tilted like this, the transmitter barely reaches either antenna.",
  },
  "inear-single-antenna": {
    name: "In-ear pack at a bad angle",
    plain: "The pack's only antenna lies across the one that sends to it.",
  },
  "co-channel": {
    name: "A stranger on the frequency",
    plain: "Somebody else transmits on this frequency or right beside it.",
  },
  "strong-neighbour": {
    name: "Strong transmitter close by",
    plain: "A strong signal on another frequency drowns the receiver.",
  },
  "noise-floor": {
    name: "Electrical noise",
    plain: "Screens, lights or power supplies make noise over the whole band.",
  },
  "own-mixing": {
    name: "Our own transmitters mixing",
    plain: "Several of our transmitters together make a false signal on this channel.",
  },
  "own-duplicate": {
    name: "Two of ours on one frequency",
    plain: "A second transmitter of ours is on, with the same frequency.",
  },
  "busy-shared-band": {
    name: "Crowded shared band",
    plain: "Phones and networks use the same band and leave too little room.",
  },
  "too-much-power": {
    name: "Too much power",
    plain: "Our transmitters are stronger than needed, or too near an antenna.",
  },
  "overdriven-line": {
    name: "Antenna line amplified too much",
    plain: "The amplifier adds more than the cable loses, and noise with it.",
  },
  "low-power": {
    name: "Transmitter too weak",
    plain: "The transmitter is set low, or its battery is nearly empty.",
  },
  "power-loss": {
    name: "Power cutting out",
    plain: "Transmitter, rack or antenna loses its supply for a moment.",
  },
  "bad-antenna-spot": {
    name: "Antennas badly placed",
    plain: "The antennas stand against metal, too low, or in a bunch.",
  },
  "feeder-fault": {
    name: "Bad antenna cable or plug",
    plain: "One antenna's signal is lost on its way to the receiver.",
  },
  "transmitter-fault": {
    name: "Faulty transmitter",
    plain: "This pack or handheld, or its antenna, is damaged.",
  },
  "receiver-fault": {
    name: "Faulty receiver",
    plain: "This one receiver, or one of its inputs, is damaged.",
  },
  "receiver-setting": {
    name: "Receiver set up wrong",
    plain: "Frequency, squelch or mode of the receiver is not what it should be.",
  },
  "sync-timing": {
    name: "Pairing or clock out of step",
    plain: "Digital gear has lost its pairing, or two systems disturb each other's timing.",
  },
  "off-or-muted": {
    name: "Off, muted, or mixed up",
    plain: "It is switched off or muted, or somebody wears the wrong pack.",
  },
  "audio-chain": {
    name: "Not the radio",
    plain: "The radio works; microphone, cable or sound desk does not.",
  },
  "none-of-these": {
    name: "Something else",
    plain: "Nothing on this list explains it.",
  },
};

export const FAMILY_TEXT: Readonly<Record<string, string>> = {
  range: "Range",
  multipath: "Echoes",
  polarization: "Antenna angle",
  interference: "Interference",
  power: "Power",
  placement: "Antenna place",
  hardware: "Faulty gear",
  setting: "Settings",
  "not-radio": "Not radio",
  unlisted: "Not on the list",
};
