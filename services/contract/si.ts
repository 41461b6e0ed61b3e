/*
 * Units of the contract to SI and back, for quantities that stand alone; `fieldOf` and the drive conversions cover the
 * rest. Dividing by a power of ten, not multiplying by its inverse, keeps the nearest double.
 */

export const metresFromMm = (length_mm: number): number => length_mm / 1e3;
export const mmFromMetres = (length: number): number => length * 1e3;
export const hertzFromMHz = (frequency_MHz: number): number => frequency_MHz * 1e6;
export const MHzFromHertz = (frequency: number): number => frequency / 1e6;
export const kHzFromHertz = (frequency: number): number => frequency / 1e3;
export const microsecondsFromSeconds = (time: number): number => time * 1e6;
export const secondsFromMicroseconds = (time_us: number): number => time_us / 1e6;
export const millisecondsFromSeconds = (time: number): number => time * 1e3;
export const ppmFromRatio = (ratio: number): number => ratio * 1e6;
export const ratioFromPpm = (parts_ppm: number): number => parts_ppm / 1e6;
