/** Composite Gauss-Legendre, five nodes (DLMF 3.5.22 and its table). */
const NODES = [0, 0.538469310105683, 0.906179845938664];
const WEIGHTS = [0.568888888888889, 0.478628670499366, 0.236926885056189];

/** Beyond this a double cannot tell the mass from 1. */
const ALL = 8.3;

/**
 * Mass of the standard normal distribution within ±halfWidth, erf(halfWidth/√2), DLMF 7.2.1; a plain number 0..1 for
 * halfWidth >= 0, right to 1e-14.
 */
export function stripMass(halfWidth: number): number {
  if (halfWidth >= ALL) return 1;
  const panels = Math.max(1, Math.ceil(4 * halfWidth));
  const half = halfWidth / (2 * panels);
  let sum = 0;
  for (let panel = 0; panel < panels; panel++) {
    const middle = (2 * panel + 1) * half;
    for (let i = 0; i < 3; i++) {
      const offset = half * NODES[i]!;
      const above = middle + offset;
      const below = middle - offset;
      const both = Math.exp(-0.5 * above * above) + (i === 0 ? 0 : Math.exp(-0.5 * below * below));
      sum += WEIGHTS[i]! * both;
    }
  }
  return Math.min(1, half * sum * Math.sqrt(2 / Math.PI));
}
