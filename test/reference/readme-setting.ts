/**
 * The setting that README asks about: r0 4 mm, 1.2 MHz, U 279.0608 V and V 1663.4998 V against ground. The edges with 40
 * digits, outside this project's code and in another language: b_1 and a_0 from the continued fractions of their Fourier
 * coefficients (NIST DLMF 28.4), crossed with the scan line by a secant search, m/z by e and u of CODATA 2022. The same
 * program gives the row R 1000 of passbands.json to all its digits.
 */
export const README_SETTING = {
  mzLow: 999.6499988059595,
  mzHigh: 1000.3500446842951,
} as const;
