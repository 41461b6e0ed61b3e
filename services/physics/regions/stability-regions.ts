/*
 * The stability regions of the ideal mass filter with |a| <= 12 and q <= 12. Region (n_x, n_y) is where
 * a_{n_x} < a < b_{n_x+1} and a_{n_y} < −a < b_{n_y+1}, a four-sided figure. Corners: two-dimensional Newton on the
 * characteristic curves (DLMF 28.6) at 50 digits; the tests find the same corners from the curves of this project, and
 * show by a dense scan that the list is complete.
 */
import { APEX_A, APEX_Q, APEX_RATIO, RF_ONLY_LIMIT_Q } from "../first-region.ts";
import { pointStability } from "../stability.ts";

export type RegionName = "first" | "second" | "third";

/** The bands n_x and n_y that name a region. */
export interface Bands {
  readonly x: number;
  readonly y: number;
}

/** Where a curve of the x plane meets one of the y plane; `ratio` is U/V there, a/(2q). */
export interface Corner {
  readonly q: number;
  readonly a: number;
  readonly ratio: number;
}

/** The corners by the curves (of x, of y) that meet there; scan lines enter and leave the region at the two tips. */
export interface StabilityRegion {
  readonly bands: Bands;
  /** Trade's name: first (0,0), second (1,1), third (1,0); null for all others, mirrors among them. */
  readonly name: RegionName | null;
  /** a_{n_x} and a_{n_y}: the corner nearest the origin; here a window of the region is widest. */
  readonly inner: Corner;
  /** b_{n_x+1} and a_{n_y}: the largest U/V of the region. */
  readonly highTip: Corner;
  /** b_{n_x+1} and b_{n_y+1}. */
  readonly outer: Corner;
  /** a_{n_x} and b_{n_y+1}: the smallest U/V of the region. */
  readonly lowTip: Corner;
}

export function regionNameOf({ x, y }: Bands): RegionName | null {
  if (x === 0 && y === 0) return "first";
  if (x === 1 && y === 1) return "second";
  return x === 1 && y === 0 ? "third" : null;
}

function region(
  bands: Bands,
  inner: Corner,
  highTip: Corner,
  outer: Corner,
  lowTip: Corner,
): StabilityRegion {
  return { bands, name: regionNameOf(bands), inner, highTip, outer, lowTip };
}

function mirrored(corner: Corner): Corner {
  return { q: corner.q, a: 0 - corner.a, ratio: 0 - corner.ratio };
}

/** Exchanging the planes turns a into −a, so that the largest U/V becomes the smallest. */
function mirror(original: StabilityRegion): StabilityRegion {
  const { bands, inner, highTip, outer, lowTip } = original;
  return region(
    { x: bands.y, y: bands.x },
    mirrored(inner),
    mirrored(lowTip),
    mirrored(outer),
    mirrored(highTip),
  );
}

const FIRST_APEX: Corner = { q: APEX_Q, a: APEX_A, ratio: APEX_RATIO };
const FIRST = region(
  { x: 0, y: 0 },
  { q: 0, a: 0, ratio: 0 },
  FIRST_APEX,
  { q: RF_ONLY_LIMIT_Q, a: 0, ratio: 0 },
  mirrored(FIRST_APEX),
);

const SECOND_TIP: Corner = {
  q: 7.5472748663818034,
  a: 0.02954999454495303,
  ratio: 0.0019576598883776592,
};
const SECOND = region(
  { x: 1, y: 1 },
  { q: 7.513610299420813, a: 0, ratio: 0 },
  SECOND_TIP,
  { q: 7.579690373736909, a: 0, ratio: 0 },
  mirrored(SECOND_TIP),
);

const THIRD = region(
  { x: 1, y: 0 },
  { q: 2.772254743581038, a: 2.519718955965702, ratio: 0.4544529974743366 },
  { q: 3.234075085700503, a: 3.164296367779791, ratio: 0.489211951474281 },
  { q: 3.2545597649380573, a: 3.15409590895006, ratio: 0.48456567658238875 },
  { q: 2.815304330086136, a: 2.521000065549916, ratio: 0.4477313586685644 },
);

const TWO_ZERO = region(
  { x: 2, y: 0 },
  { q: 6.380699712436513, a: 7.976075962022807, ratio: 0.6250157758150547 },
  { q: 6.993807363524513, a: 8.963710859810265, ratio: 0.6408319813439229 },
  { q: 6.995196894440389, a: 8.963413717945468, ratio: 0.6406834470284438 },
  { q: 6.383489531664531, a: 7.976744030598884, ratio: 0.6247949488309807 },
);

/** Largest |a| and q in which REGIONS is complete; every region of the list lies wholly inside. */
export const REGIONS_LIMIT = 12;

/** Every region with |a|, q <= REGIONS_LIMIT, by rising q of the inner corner; mirrors follow their originals. */
export const REGIONS: readonly StabilityRegion[] = [
  FIRST,
  THIRD,
  mirror(THIRD),
  TWO_ZERO,
  mirror(TWO_ZERO),
  SECOND,
];

/** Whether an ion at (a, q) is stable in this region; null outside the domain of pointStability. */
export function isInRegion({ bands }: StabilityRegion, a: number, q: number): boolean | null {
  const point = pointStability(a, q);
  if (point === null) return null;
  return point.region !== null && point.region.x === bands.x && point.region.y === bands.y;
}
