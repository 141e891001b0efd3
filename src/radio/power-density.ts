import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { DISTANCE_LIMITS_M, type Limits } from "./limits.ts";
import { powerW } from "./power-level.ts";
import { requireRange } from "./require-range.ts";

/** 1 in free space, 1.6 over ground as usually taken, 2 over a perfect reflector. */
const REFLECTION_FACTOR_LIMITS: Limits = { min: 1, max: 2 };
const DENSITY_LIMITS_W_PER_M2: Limits = { min: 1e-30, max: 1e30 };

/**
 * The power density in front of a transmitting antenna that exposure rules set limits for.
 *
 *     S = F²·EIRP / (4π·r²)
 *
 * Assumes: far field, best direction, power averaged over the rule's averaging time. Not for: distances
 * below about λ / 2π, 9 cm at 550 MHz; anything worn on the body, where rules ask for the absorption
 * in tissue (SAR) and not for the density; implants, which no such rule covers.
 *
 * @param eirpDbm       Equivalent isotropically radiated power of all transmitters on the antenna together,
 *                      averaged over time. [dBm], −300 to 300
 * @param distanceM     Distance from the nearest part of the antenna. [m], 0.001 to 10⁹
 * @param reflectionFactor  F, field with reflections over field without: 1 in free space, 1.6 over ground,
 *                      2 at most. [none], 1 to 2
 * @returns             Power density. [W/m²]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions; too high close to large antennas
 * @source              FCC OET Bulletin 65, edition 97-01 (1997), section 2, equations (4), (6) and (7); from
 *                      memory, to be verified. Results of a published calculator after it read second-hand at
 *                      github.com/zimolzak/fcc-rf-formulas, test_fcc.py, 2026-12-01.
 * @differs             none
 * @checkedBy           oet65-420mhz-10m, oet65-123mhz-17m, oet65-146mhz-2m, oet65-3-9mhz-2m, oet65-145mhz-10cm,
 *                      density-100mw-20cm, density-250mw-20cm, density-50mw-20cm
 */
export function powerDensityWPerM2(exposure: {
  readonly eirpDbm: number;
  readonly distanceM: number;
  readonly reflectionFactor: number;
}): number {
  const { eirpDbm, distanceM, reflectionFactor } = exposure;
  requireRange("powerDensityWPerM2", LEVEL_LIMITS_DBM, { eirpDbm });
  requireRange("powerDensityWPerM2", DISTANCE_LIMITS_M, { distanceM });
  requireRange("powerDensityWPerM2", REFLECTION_FACTOR_LIMITS, { reflectionFactor });
  return (reflectionFactor ** 2 * powerW(eirpDbm)) / (4 * Math.PI * distanceM ** 2);
}

/**
 * The distance at which the power density has fallen to a limit: the inverse of powerDensityWPerM2.
 *
 *     r = F·√(EIRP / (4π·S))
 *
 * Assumes: as powerDensityWPerM2. Not for: results below about λ / 2π, which only say that the limit
 * is met where the formula begins to hold; a distance that a manual or an approval gives, which goes first.
 *
 * @param eirpDbm       Equivalent isotropically radiated power of all transmitters on the antenna together,
 *                      averaged over time. [dBm], −300 to 300
 * @param densityWPerM2  Limit. [W/m²], 10⁻³⁰ to 10³⁰
 * @param reflectionFactor  F, as in powerDensityWPerM2. [none], 1 to 2
 * @returns             Distance from the nearest part of the antenna. [m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            as powerDensityWPerM2
 * @source              as powerDensityWPerM2, solved for the distance
 * @differs             none
 * @checkedBy           none published, see test
 */
export function distanceForDensityM(exposure: {
  readonly eirpDbm: number;
  readonly densityWPerM2: number;
  readonly reflectionFactor: number;
}): number {
  const { eirpDbm, densityWPerM2, reflectionFactor } = exposure;
  requireRange("distanceForDensityM", LEVEL_LIMITS_DBM, { eirpDbm });
  requireRange("distanceForDensityM", DENSITY_LIMITS_W_PER_M2, { densityWPerM2 });
  requireRange("distanceForDensityM", REFLECTION_FACTOR_LIMITS, { reflectionFactor });
  return reflectionFactor * Math.sqrt(powerW(eirpDbm) / (4 * Math.PI * densityWPerM2));
}
