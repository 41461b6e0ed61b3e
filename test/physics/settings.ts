import fc from "fast-check";

/** A number whose logarithm is uniform between two positive bounds. */
export function logUniform(least: number, greatest: number): fc.Arbitrary<number> {
  const span = Math.log(greatest / least);
  return fc
    .double({ min: 0, max: 1, noNaN: true })
    .map((share) => Math.min(greatest, least * Math.exp(share * span)));
}

/** The ranges that a request may state: m/z 0.5 to 1e6, r0 0.05 to 50 mm, f 1 kHz to 100 MHz. */
export const anyMz = logUniform(0.5, 1e6);
export const anyField = fc.record({
  fieldRadius: logUniform(5e-5, 5e-2),
  frequency: logUniform(1e3, 1e8),
});
export const anyVolts = logUniform(1e-3, 1e5);
/** centre/width between the edges, from nearly open to nearly closed. */
export const anyResolution = logUniform(0.5001, 1e5);
