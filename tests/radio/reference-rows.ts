import { readText } from "../architecture/tree.ts";

interface Source {
  readonly body: string;
  readonly document: string;
  readonly edition: string;
  readonly where: string;
  readonly readAt: string;
  readonly readOn: string;
  readonly standing: string;
}

export interface BodyLoss {
  readonly id: string;
  readonly case: string;
  readonly lowDb: number;
  /** null where the source says "more than" the low figure and no more. */
  readonly highDb: number | null;
  readonly fromMhz: number;
  readonly toMhz: number;
  readonly caution: string;
  readonly source: Source;
}

export interface SiteLoss {
  readonly id: string;
  readonly isInSight: boolean;
  readonly exponent: number;
  readonly offsetDb: number;
  readonly frequencyExponent: number;
  readonly spreadDb: number;
  readonly fromMhz: number;
  readonly toMhz: number;
  readonly fromM: number;
  readonly toM: number;
  readonly source: Source;
}

export interface ShadowSpread {
  readonly id: string;
  readonly isInSight: boolean;
  readonly spreadDb: number;
  /** Distance over which the shadowing stays much the same. */
  readonly sameOverM: number;
  readonly source: Source;
}

export interface FloorsLoss {
  readonly id: string;
  readonly frequencyMhz: number;
  readonly perDecadeDb: number;
  /** Loss of one floor, of two, of three; empty where nothing is known. */
  readonly floorsDb: readonly number[];
  readonly source: Source;
}

export interface SarLimit {
  readonly id: string;
  readonly rule: string;
  readonly group: string;
  readonly part: string;
  readonly limitWPerKg: number;
  /** null for the whole body. */
  readonly tissueG: number | null;
  readonly averagingMinutes: number;
  readonly source: Source;
}

const rowsOf = <Row>(name: string): readonly Row[] =>
  JSON.parse(readText(`shared/reference/${name}.json`)) as readonly Row[];

export const BODY_LOSSES = rowsOf<BodyLoss>("body-loss");
export const SITE_LOSSES = rowsOf<SiteLoss>("site-general-loss");
export const SHADOW_SPREADS = rowsOf<ShadowSpread>("shadow-spread");
export const FLOORS_LOSSES = rowsOf<FloorsLoss>("floors-loss");
export const SAR_LIMITS = rowsOf<SarLimit>("sar-limits");
