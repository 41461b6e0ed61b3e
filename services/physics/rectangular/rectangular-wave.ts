/*
 * A rectangular RF wave: the x rods at +V for the fraction d of a period and at −V for the rest, the y rods opposite
 * (Richards, Huey and Hiller, Int. J. Mass Spectrom. Ion Phys. 12 (1973) 317, from memory). Coupled for DC, its mean
 * (2d − 1) V acts as a DC of its own; coupled through a capacitor, the mean is gone and the levels are 2 (1 − d) V and
 * −2 d V. V is half the swing in both cases. For ions of negative charge the pairs exchange their names.
 */

export interface RectangularWave {
  /** Fraction of a period at the upper level, between 0 and 1, both excluded. */
  readonly dutyCycle: number;
  readonly coupling: "dc" | "ac";
}

/** The upper level over V. */
export function upperLevel({ dutyCycle, coupling }: RectangularWave): number {
  return coupling === "dc" ? 1 : 2 * (1 - dutyCycle);
}

/** The size of the lower level over V. */
export function lowerLevel({ dutyCycle, coupling }: RectangularWave): number {
  return coupling === "dc" ? 1 : 2 * dutyCycle;
}

/** The mean over V: what the wave itself adds to U/V. */
export function meanLevel({ dutyCycle, coupling }: RectangularWave): number {
  return coupling === "dc" ? 2 * dutyCycle - 1 : 0;
}

export function hasBothLevels({ dutyCycle }: RectangularWave): boolean {
  return dutyCycle > 0 && dutyCycle < 1;
}
