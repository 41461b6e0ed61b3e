/*
 * Requests may state any number down to zero. Below these, which lie far under anything that a rod set could notice, a
 * quantity counts as not there: dividing by what is left of it would say nothing.
 */

/** In V. */
export const NO_VOLTS = 1e-6;
/** U/V of a drive. */
export const NO_DC_OVER_RF = 1e-6;
/** m/z of a low-mass cutoff. */
export const NO_CUTOFF_MZ = 1e-6;
/** Length of a round in ms. */
export const NO_TIME_MS = 1e-6;
