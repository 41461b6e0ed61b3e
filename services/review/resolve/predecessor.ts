import type { ResolvedAcquisition, ResolvedMethod } from "./resolved-method.ts";
import { widthOf } from "./window.ts";

/** Half of the window a product is taken to pass where its filter's is not known: a unit-mass window. */
const HALF_UNIT_WINDOW = 0.5;

/**
 * The acquisition that comes before this one at some moment of the schedule and puts another precursor's ions of the
 * same product into the cell, or null.
 */
export function previousWithSameProduct(
  { acquisitions, schedule }: ResolvedMethod,
  each: ResolvedAcquisition,
): ResolvedAcquisition | null {
  for (const index of schedule.turns[each.index]!.predecessors) {
    const previous = acquisitions[index]!;
    if (sharesProduct(previous, each)) return previous;
  }
  return null;
}

function sharesProduct(previous: ResolvedAcquisition, each: ResolvedAcquisition): boolean {
  if (previous.acquisition.kind !== "transition" || each.acquisition.kind !== "transition") return false;
  const [precursor, product] = each.filterings;
  const [previousPrecursor, previousProduct] = previous.filterings;
  if (!precursor || !product || !previousPrecursor || !previousProduct) return false;
  const { window } = product;
  const half = window.kind === "window" ? widthOf(window) / 2 : HALF_UNIT_WINDOW;
  const sameProduct = Math.abs(previousProduct.mz - product.setMz) <= half;
  const samePrecursor = Math.abs(previousPrecursor.setMz - precursor.setMz) <= HALF_UNIT_WINDOW;
  return sameProduct && !samePrecursor;
}
