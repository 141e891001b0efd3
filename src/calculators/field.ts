/** What a calculator says of one of its inputs. Values inside are always in the field's own unit. */
export interface NumberField {
  readonly id: string;
  /** "length" is shown in metres or feet as the user has chosen; the others as they are. */
  readonly quantity: "length" | "frequency" | "level-change" | "exponent";
  /** [m] for length, [MHz] for frequency, [dB] for level-change, none for exponent */
  readonly min: number;
  readonly max: number;
  readonly initial: number;
  /** What one press of the stepper does: adds `step`, or multiplies by it where `stepIs` says so. */
  readonly step: number;
  readonly stepIs: "sum" | "ratio";
}

export type LengthUnit = "m" | "ft";

/** What came of a typed text. Only "ok" carries a number, in the field's own unit. */
export type Typed =
  | { readonly kind: "ok"; readonly value: number }
  | {
      readonly kind:
        | "empty"
        | "not-a-number"
        | "ambiguous-separator"
        | "wrong-unit"
        | "below-range"
        | "above-range";
    };
