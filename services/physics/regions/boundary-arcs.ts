import { characteristicA, characteristicB } from "../characteristic-values.ts";
import type { CharacteristicCurve } from "./scan-line-crossing.ts";
import type { Corner, StabilityRegion } from "./stability-regions.ts";

/** One side of a region, along a characteristic curve of the plane that is lost beyond it. */
export interface BoundaryArc {
  readonly lostTo: "x" | "y";
  readonly curve: CharacteristicCurve;
  /** From corner to corner, so that the four arcs of a region follow each other around it. */
  readonly points: readonly { readonly q: number; readonly a: number }[];
  /** Largest distance in a between the curve and the straight lines through the points, seen half-way between them. */
  readonly chordError: number;
}

/** Most points on one arc. */
export const MOST_POINTS = 4097;

/** a at which `curve` bounds the plane: c(q) for x, −c(q) for y; q within 0 to 12 and order within 0 to 3. */
function boundaryA(lostTo: "x" | "y", { kind, order }: CharacteristicCurve, q: number): number {
  const value = kind === "a" ? characteristicA(order, q) : characteristicB(order, q);
  return lostTo === "x" ? value! : 0 - value!;
}

function arc(
  lostTo: "x" | "y",
  curve: CharacteristicCurve,
  from: Corner,
  to: Corner,
  pointCount: number,
): BoundaryArc {
  const points: { q: number; a: number }[] = [{ q: from.q, a: from.a }];
  let chordError = 0;
  for (let i = 1; i < pointCount; i++) {
    const last = i === pointCount - 1;
    const q = last ? to.q : from.q + ((to.q - from.q) * i) / (pointCount - 1);
    const a = last ? to.a : boundaryA(lostTo, curve, q);
    const before = points[i - 1]!;
    const onCurve = boundaryA(lostTo, curve, (q + before.q) / 2);
    chordError = Math.max(chordError, Math.abs(onCurve - (a + before.a) / 2));
    points.push({ q, a });
  }
  return { lostTo, curve, points, chordError };
}

/** The four sides of a region with `pointsPerArc` points each (2 to MOST_POINTS), equally spaced in q. */
export function boundaryArcs(region: StabilityRegion, pointsPerArc: number): readonly BoundaryArc[] {
  return sides(region).map(([lostTo, curve, from, to]) => arc(lostTo, curve, from, to, pointsPerArc));
}

/**
 * The four sides of a region with so many points each that straight lines through them lie within `accuracy` (in a)
 * of the curve, or with MOST_POINTS where that is not enough: chordError tells.
 */
export function boundaryArcsWithin(region: StabilityRegion, accuracy: number): readonly BoundaryArc[] {
  return sides(region).map(([lostTo, curve, from, to]) => {
    let found = arc(lostTo, curve, from, to, 3);
    while (!(found.chordError <= accuracy) && found.points.length < MOST_POINTS) {
      found = arc(lostTo, curve, from, to, 2 * found.points.length - 1);
    }
    return found;
  });
}

type Side = readonly [lostTo: "x" | "y", curve: CharacteristicCurve, from: Corner, to: Corner];

function sides({ bands, inner, highTip, outer, lowTip }: StabilityRegion): readonly Side[] {
  return [
    ["y", { kind: "a", order: bands.y }, inner, highTip],
    ["x", { kind: "b", order: bands.x + 1 }, highTip, outer],
    ["y", { kind: "b", order: bands.y + 1 }, outer, lowTip],
    ["x", { kind: "a", order: bands.x }, lowTip, inner],
  ];
}
