export interface RemedyText {
  /** What to do, as an order. */
  readonly title: string;
  /** How, in one or two sentences. */
  readonly how: string;
}

export const REMEDY_TEXT: Readonly<Record<string, RemedyText>> = {
  "hand-over-spare": {
    title: "Hand over the spare",
    how: "Give the performer the spare that is ready, on its own frequency, and open its channel. Look for the fault afterwards.",
  },
  "go-to-cable": {
    title: "Go to a cable",
    how: "Hand out a microphone on a cable, or a wired monitor or headset, and mute the radio channel.",
  },
  "switch-on-unmute": {
    title: "Switch it on and unmute it",
    how: "Right pack on the right person, power on, mute off at the pack, the receiver and the desk. Bring the level up slowly.",
  },
  "desk-path": {
    title: "Clear the way through the desk",
    how: "Mute, gate, routing, input patch and the cable from the receiver. Keep the fader down while you open it.",
  },
  "microphone-or-cable": {
    title: "Change the microphone or its cable",
    how: "Channel muted, swap capsule, headset or cable and push the plug home. Nothing else at the same time.",
  },
  "fresh-cell": {
    title: "Put in a fresh battery",
    how: "New or freshly charged, of the right type. See that the contacts are clean and hold it tight.",
  },
  "restore-supply": {
    title: "Restore the power",
    how: "Push home and secure the plugs of receiver, splitter and rack, and take them off circuits shared with effects.",
  },
  "antenna-power": {
    title: "Bring back the antenna power",
    how: "Switch the supply on at splitter or receiver. If it trips, take one line off at a time.",
  },
  "new-line": {
    title: "Replace the antenna line",
    how: "Run a known good cable past the old one, then find out whether cable or connector was bad.",
  },
  "spare-pack": {
    title: "Swap the transmitter",
    how: "Spare on the same frequency, old one off first. Mark the old one so that it isn't used again.",
  },
  "spare-receiver": {
    title: "Swap the receiver",
    how: "Set another one up from the list, with the same antennas. Mark the old one.",
  },
  "receiver-set-up": {
    title: "Set the receiver up again",
    how: "Frequency, squelch, mode and band as on the list, transmitter to match. Mute while you do it.",
  },
  "same-key-and-clock": {
    title: "Pair again, on one clock",
    how: "Pair transmitter and receiver afresh, one clock master for the sound network, and own time slots for each system.",
  },
  retune: {
    title: "Move to a free frequency",
    how: "Take one that the plan holds in reserve, look that it is quiet, then set receiver and transmitter.",
  },
  "switch-off-double": {
    title: "Find the double, switch it off",
    how: "Look where spares live. Read its display before you switch it off, so that it isn't one in use.",
  },
  "unused-packs-off": {
    title: "Switch unused packs off",
    how: "Spares off and away from the ones in use. Check twice that nobody is about to go on with it.",
  },
  "step-power-down": {
    title: "Step the power down",
    how: "One step on all packs of the group, not on this one alone. Keep what still reaches the far end.",
  },
  "step-power-up": {
    title: "Step the power up",
    how: "Only if it had been set low and nothing else helps. One step, then see that no other link suffers.",
  },
  "less-gain": {
    title: "Take gain out of the antenna line",
    how: "Turn the antenna amplifier down or put a pad behind it, until gain only makes up for the cable.",
  },
  "band-pass-filter": {
    title: "Put a filter in the antenna line",
    how: "One that passes only the band in use, ahead of the first amplifier.",
  },
  "radios-away": {
    title: "Keep radios and phones away",
    how: "Hand radios, phones and computers at least three metres (ten feet) from antennas and rack.",
  },
  "quieten-source": {
    title: "Move or quieten the noise source",
    how: "Get distance between it and the antennas, reroute its cables, or have its people repair or switch it off.",
  },
  "closer-antennas": {
    title: "Bring the antennas closer",
    how: "Shorten the way through the air first; cable loss is easier to make up for.",
  },
  "raise-antennas": {
    title: "Raise the antennas above heads",
    how: "Just above head height with clear sight of the stage, not straight overhead.",
  },
  "free-antennas": {
    title: "Give the antennas space",
    how: "A metre or more from metal and from each other, off the floor and out of the rack.",
  },
  "cross-antennas": {
    title: "Cross the antennas' angles",
    how: "Lean one left and one right, so that they stand at a right angle to each other.",
  },
  "circular-antenna": {
    title: "Use a circularly polarized antenna",
    how: "For in-ears on the sending side, for tilting handhelds on the receiving side. Both ends of a pair turn the same way.",
  },
  "other-antenna-position": {
    title: "Find another antenna position",
    how: "Put one of the two where it looks into the bad area. Half a metre can be enough against echoes.",
  },
  "antenna-distribution": {
    title: "Share two good antennas",
    how: "A splitter feeds all receivers from one well placed pair, in place of a whip on each.",
  },
  "other-path": {
    title: "Keep the performer off that spot",
    how: "Agree on another path with performer and stage management. Mark the spot.",
  },
  "pack-clear-of-body": {
    title: "Free the pack and its antenna",
    how: "Antenna straight, off the skin and away from metal, on the side that faces the receiving antennas.",
  },
  "other-shared-channel": {
    title: "Leave the crowded channel",
    how: "Pick another channel or band, or have the network's people move their access point.",
  },
};
