/**
 * Speed of light in vacuum. [m/s], exact since 1983.
 * @source BIPM, SI Brochure, 9th ed. (2019), section 2.2, defining constant c; value from memory, to be verified.
 */
export const SPEED_OF_LIGHT_M_PER_S = 299_792_458;
