/**
 * Ratio of electric to magnetic field strength of a wave in vacuum. [Ω]
 * @source CODATA recommended values 2018, characteristic impedance of vacuum, 376.730 313 668 Ω; from
 * memory, to be verified. Textbooks round it to 120π or 377 Ω, 0.07 % more at most.
 */
export const FREE_SPACE_IMPEDANCE_OHM = 376.730_313_668;
