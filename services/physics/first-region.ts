/*
 * The first stability region of the ideal mass filter: the boundaries are a = −a_0(q), where β_y = 0, and a = b_1(q),
 * where β_x = 1 (Dawson 1976, chapter II). All numbers were solved at 40 digits from the Fourier continued fractions
 * of DLMF 28.6 and are checked by the tests against an independent solution.
 */

/** q of the apex, where both boundaries meet. */
export const APEX_Q = 0.7059960697133709;

/** What the double APEX_Q leaves of the apex. */
export const APEX_Q_REST = -2.523055921326151e-17;

/** a of the apex. */
export const APEX_A = 0.23699399311247357;

/** U/V of the apex, a/(2q): above it no ion is stable in both planes. */
export const APEX_RATIO = 0.16784370570836984;

/** What the double APEX_RATIO leaves of the apex; it keeps margins right where the window is nearly closed. */
export const APEX_RATIO_REST = 3.811289208760695e-18;

/** q above which no ion is stable in the first region without DC: b_1(q) = 0. */
export const RF_ONLY_LIMIT_Q = 0.9080463337345775;

/** Limit of R · (APEX_RATIO − U/V) at high resolution, R = centre/width between the edges. */
export const RESOLUTION_CONSTANT = 0.12640180366994705;

/** Exact distance of U/V from the apex over the apex; negative above it. `ratio` is |U/V|. */
export function apexMarginOf(ratio: number): number {
  return (APEX_RATIO - ratio + APEX_RATIO_REST) / APEX_RATIO;
}
