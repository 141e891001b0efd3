import { INTERMOD_RECIPES, type IntermodKind } from "./intermod-kind.ts";
import { FREQUENCY_LIMITS_MHZ, type Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

export interface IntermodProduct {
  readonly kind: IntermodKind;
  /** Where it lands; a difference below zero comes out as its mirror image above. [MHz] */
  readonly frequencyMhz: number;
  /** Places of its carriers in the list that was handed in, in the order of the letters. */
  readonly carriers: readonly number[];
}

export interface IntermodHit extends IntermodProduct {
  /** Place of the victim in its list. */
  readonly victim: number;
  /** Product minus victim. [MHz] */
  readonly offsetMhz: number;
}

export interface IntermodSearch {
  readonly carriersMhz: readonly number[];
  readonly victimsMhz: readonly number[];
  readonly withinMhz: number;
  readonly kinds: readonly IntermodKind[];
}

const WITHIN_LIMITS_MHZ: Limits = { min: 0, max: FREQUENCY_LIMITS_MHZ.max };

/**
 * All products that a set of carriers makes, one after the other, so that none has to be kept.
 *
 *     f = |Σ k·fk|
 *
 * Assumes: all carriers on the air together. Not for: finding what lands on a channel among many
 * carriers, which intermodHits does without visiting every product.
 *
 * @param carriersMhz   Carrier frequencies in any order, taken to the nearest hertz. [MHz], 0.003 to 3 000 000
 * @param kinds         Which kinds to make, such as THIRD_ORDER
 * @returns             Products, kind by kind, in no order of frequency
 * @throws RangeError   If a frequency lies outside its range or is NaN.
 * @accuracy            exact to the hertz
 * @source              common practice, no source; counts as in intermodCount
 * @differs             none
 * @checkedBy           none published, see test
 */
export function intermodProducts(
  carriersMhz: readonly number[],
  kinds: readonly IntermodKind[],
): Generator<IntermodProduct, void, undefined> {
  return eachProduct(rising("intermodProducts", carriersMhz), kinds);
}

/**
 * The products that land near given channels, found without visiting the others: with n carriers and
 * v victims in n²·(n + v) steps for each kind of three carriers, in memory for one hit at a time.
 *
 *     | |Σ k·fk| − f | ≤ w
 *
 * Assumes: as intermodProducts; the edge of the distance counts as near. Not for: how much a hit
 * disturbs, which depends on levels. A victim's own carrier may be among those that make the product.
 *
 * @param search.carriersMhz  Carrier frequencies in any order, taken to the nearest hertz. [MHz], 0.003 to 3 000 000
 * @param search.victimsMhz   Frequencies to protect in any order, carriers or not; likewise. [MHz]
 * @param search.withinMhz    How near counts. [MHz], 0 to 3 000 000
 * @param search.kinds        Which kinds to look for
 * @returns                   Hits, kind by kind; a product near two victims comes twice
 * @throws RangeError         If a value lies outside its range or is NaN.
 * @accuracy                  exact to the hertz
 * @source                    common practice, no source
 * @differs                   none
 * @checkedBy           none published, see test
 */
export function intermodHits(search: IntermodSearch): Generator<IntermodHit, void, undefined> {
  const carriers = rising("intermodHits", search.carriersMhz);
  const targets = targetsOf("intermodHits", search);
  return eachHit(carriers, targets, search.kinds);
}

/**
 * How many products land near each of given channels, without listing them.
 *
 *     number of products with | |Σ k·fk| − f | ≤ w
 *
 * Assumes: as intermodHits. Not for: how much they disturb together, which depends on levels.
 *
 * @param search        As for intermodHits. [MHz]
 * @returns             Count for each victim, in the order of search.victimsMhz. [none]
 * @throws RangeError   If a value lies outside its range or is NaN.
 * @accuracy            exact to the hertz
 * @source              common practice, no source
 * @differs             none
 * @checkedBy           none published, see test
 */
export function intermodHitCounts(search: IntermodSearch): number[] {
  const carriers = rising("intermodHitCounts", search.carriersMhz);
  const targets = targetsOf("intermodHitCounts", search);
  const counts = search.victimsMhz.map(() => 0);
  for (const kind of search.kinds)
    for (const { head, target, low, high } of windowsOf(kind, carriers, targets)) {
      const isInside = (place: number) => place >= low && place < high;
      const own = Number(isInside(head.first)) + Number(isInside(head.second));
      counts[target.victim] = (counts[target.victim] ?? 0) + high - low - own;
    }
  return counts;
}

/** Carriers in whole hertz, so that sums and differences of many are exact, lowest first. */
interface Carriers {
  readonly hz: readonly number[];
  /** Where each stood in the list that was handed in. */
  readonly places: readonly number[];
}

/** The carriers of a product but the last, as indexes of the rising list; second is −1 where there is none. */
interface Head {
  readonly first: number;
  readonly second: number;
  /** What they contribute to the frequency. [Hz] */
  readonly sumHz: number;
  /** The last carrier counts so often, as a difference. */
  readonly lastFactor: number;
  /** Below this index the last carrier would make a product over again. */
  readonly from: number;
}

/** Where the signed sum of a product must fall to be near a victim. [Hz] */
interface Target {
  readonly victim: number;
  readonly victimHz: number;
  readonly lowHz: number;
  readonly highHz: number;
}

/** Last carriers, from low up to but without high, that bring a head near a victim. */
interface Window {
  readonly head: Head;
  readonly target: Target;
  readonly low: number;
  readonly high: number;
}

const toHz = (frequencyMhz: number): number => Math.round(frequencyMhz * 1e6);

function rising(caller: string, carriersMhz: readonly number[]): Carriers {
  for (const carrierMhz of carriersMhz) requireRange(caller, FREQUENCY_LIMITS_MHZ, { carrierMhz });
  const sorted = carriersMhz
    .map((carrierMhz, place) => ({ hz: toHz(carrierMhz), place }))
    .sort((a, b) => a.hz - b.hz);
  return { hz: sorted.map(({ hz }) => hz), places: sorted.map(({ place }) => place) };
}

/** Highest first. Sums below zero land on their mirror image, so each victim has a target there too. */
function targetsOf(caller: string, search: IntermodSearch): readonly Target[] {
  const { victimsMhz, withinMhz } = search;
  requireRange(caller, WITHIN_LIMITS_MHZ, { withinMhz });
  const reachHz = toHz(withinMhz);
  return victimsMhz
    .flatMap((victimMhz, victim) => {
      requireRange(caller, FREQUENCY_LIMITS_MHZ, { victimMhz });
      const victimHz = toHz(victimMhz);
      const lowHz = Math.max(0, victimHz - reachHz);
      const highHz = victimHz + reachHz;
      const direct = { victim, victimHz, lowHz, highHz };
      return [direct, { ...direct, lowHz: -highHz, highHz: Math.min(-1, -lowHz) }];
    })
    .sort((a, b) => b.highHz - a.highHz);
}

function* headsOf(kind: IntermodKind, { hz }: Carriers): Generator<Head> {
  const [a = 0, b = 0, c] = INTERMOD_RECIPES[kind].factors;
  const lastFactor = -(c ?? b);
  for (let first = 0; first < hz.length; first += 1) {
    const firstHz = a * (hz[first] ?? 0);
    if (c === undefined) yield { first, second: -1, sumHz: firstHz, lastFactor, from: 0 };
    // Letters that count alike may swap their carriers without making another product.
    else
      for (let second = a === b ? first + 1 : 0; second < hz.length; second += 1) {
        if (second === first) continue;
        const sumHz = firstHz + b * (hz[second] ?? 0);
        yield { first, second, sumHz, lastFactor, from: b === c ? second + 1 : 0 };
      }
  }
}

function* windowsOf(
  kind: IntermodKind,
  carriers: Carriers,
  targets: readonly Target[],
): Generator<Window> {
  for (const head of headsOf(kind, carriers)) {
    const { sumHz, lastFactor } = head;
    const lastHz = (index: number) => lastFactor * (carriers.hz[index] ?? Number.POSITIVE_INFINITY);
    let low = head.from;
    for (const target of targets) {
      // The lower the target, the higher the last carrier: neither edge ever moves back.
      while (lastHz(low) < sumHz - target.highHz) low += 1;
      if (low === carriers.hz.length) break;
      let high = low;
      while (lastHz(high) <= sumHz - target.lowHz) high += 1;
      if (high > low) yield { head, target, low, high };
    }
  }
}

function* eachHit(
  carriers: Carriers,
  targets: readonly Target[],
  kinds: readonly IntermodKind[],
): Generator<IntermodHit, void, undefined> {
  for (const kind of kinds)
    for (const { head, target, low, high } of windowsOf(kind, carriers, targets))
      for (let last = low; last < high; last += 1) {
        if (last === head.first || last === head.second) continue;
        const { frequencyMhz, carriers: places } = productOf(kind, head, last, carriers);
        const offsetMhz = (toHz(frequencyMhz) - target.victimHz) / 1e6;
        yield { kind, frequencyMhz, carriers: places, victim: target.victim, offsetMhz };
      }
}

function* eachProduct(
  carriers: Carriers,
  kinds: readonly IntermodKind[],
): Generator<IntermodProduct, void, undefined> {
  for (const kind of kinds)
    for (const head of headsOf(kind, carriers))
      for (let last = head.from; last < carriers.hz.length; last += 1)
        if (last !== head.first && last !== head.second)
          yield productOf(kind, head, last, carriers);
}

function productOf(
  kind: IntermodKind,
  { first, second, sumHz, lastFactor }: Head,
  last: number,
  { hz, places }: Carriers,
): IntermodProduct {
  const members = second < 0 ? [first, last] : [first, second, last];
  return {
    kind,
    frequencyMhz: Math.abs(sumHz - lastFactor * (hz[last] ?? 0)) / 1e6,
    carriers: members.map((index) => places[index] ?? -1),
  };
}
