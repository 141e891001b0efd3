import { ANTENNA_LENGTH_LIMITS_M } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

/**
 * The nearest distance at which the formulas for free space and for distance ratios may be used.
 *
 *     d = max(2·D² / λ, λ)
 *
 * Assumes: one antenna of length D; of two, the longer decides. Not for: exact work near this
 * distance. The near zone fades out over several times this length, it has no edge.
 *
 * @param frequencyMhz    Carrier frequency. [MHz], 0.003 to 3 000 000
 * @param antennaLengthM  Largest dimension of the antenna. [m], 0.001 to 1000
 * @returns               Distance from the antenna. [m]
 * @throws RangeError     If an input lies outside its range or is NaN.
 * @accuracy              A convention. At 2·D²/λ the wave front is still curved by 22.5° across the
 *                        antenna; at λ the field of a short dipole is 0.1 dB below its far value,
 *                        √((1 − 1/k²)² + 1/k²) with k = 2π (field of the short dipole, from memory, to be verified).
 * @source                T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                        section 4.2: d_f = 2·D²/λ with d_f ≫ D and d_f ≫ λ; example 4.1, p. 109. Example read
 *                        second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; the two
 *                        conditions from memory, to be verified. Agrees with Federal Standard 1037C, "far-field
 *                        region", note 1, read at its.bldrdoc.gov/fs-1037/dir-015/_2167.htm, 2026-12-01.
 * @differs               "≫" has no figure in the book. It is read here as "not less than", the least
 *                        that it can mean, so this is a lower bound and a caller should warn for some way
 *                        beyond it. d ≥ D needs no term: for D ≥ λ, 2·D²/λ is 2·D or more, else λ is above D.
 * @checkedBy             rappaport-4-1, rappaport-4-12
 */
export function farZoneStartM(antenna: {
  readonly frequencyMhz: number;
  readonly antennaLengthM: number;
}): number {
  const { frequencyMhz, antennaLengthM } = antenna;
  requireRange("farZoneStartM", ANTENNA_LENGTH_LIMITS_M, { antennaLengthM });
  const wavelength = wavelengthM(frequencyMhz);
  return Math.max((2 * antennaLengthM ** 2) / wavelength, wavelength);
}
