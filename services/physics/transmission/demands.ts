/*
 * Which rows the aperture |row · u| <= 1 really needs, over all times and not at samples only.
 *
 * Between two samples a plane's position obeys x'' = −k x. Where k <= 0 on the whole span, |x| is convex and its largest
 * value stands at an end. In any case |x| <= (larger end) / cos(√k_max · span/2) (Sturm's comparison with constant
 * k_max; Ince, Ordinary Differential Equations (1927), section 10.3). Where k >= 0 and √k_max · span < π/2, an x that
 * changes sign has no extreme in the span (the two lie further apart), and one that does not is bounded by the solution of
 * constant k_min that starts like it at either end. A span whose bound lies within the hull that is already known, blown up
 * by 1 + ε, is settled; any other is halved. In the end the rows of all times lie within (1 + ε) times the hull of the rows
 * that are kept, and the polygon that they demand is at least 1/(1 + ε) of the one that is computed.
 */
import { type FlightRows, GRID, gridRowAt } from "./flight-rows.ts";
import { keepWhatCounts, newRowList, type RowList } from "./row-list.ts";
import { newRefinement, refineGrid, spanFocus } from "./span-refinement.ts";
import { addToHull, newSymmetricHull, type SymmetricHull } from "./symmetric-hull.ts";

export interface Demands {
  readonly rows: FlightRows;
  readonly rfCycles: number;
  /** Hull of the rows that every start phase must obey: from the end of the first cycle to the earliest exit. */
  readonly shared: SymmetricHull;
  /** The rows outside of it in the cycle of entry, and after the earliest exit. */
  readonly lead: RowList;
  readonly tail: RowList;
  /** True where the rest of the flight was left away because a row left nothing of the beam. */
  readonly cutShort: boolean;
  /** Shortest time between rows that were looked at, in RF cycles. */
  readonly finestSpan: number;
  readonly steps: number;
  readonly withinBudget: boolean;
}

/** Of each span of the grid: whether |x| can have an extreme inside. */
function focusingSpans(rows: FlightRows): boolean[] {
  return Array.from(
    { length: GRID },
    (_, i) => spanFocus(rows.motion, i / GRID, (i + 1) / GRID).strongest > 0,
  );
}

const row = new Float64Array(4);
const point = new Float64Array(2);

/**
 * Collects the rows of a flight of `rfCycles` > 0 cycles. `slack` is the ε above (plain number > 0); a row longer than
 * `enough` ends the shared part, because it leaves nothing of the beam. At most about `maxSteps` rows and tests.
 */
export function demandsOf(
  rows: FlightRows,
  rfCycles: number,
  slack: number,
  enough: number,
  maxSteps: number,
): Demands {
  const shared = newSymmetricHull();
  const sharedEnd = Math.max(GRID, Math.floor(rfCycles * GRID));
  const knownEnd = rows.cycles * GRID;
  const focusing = focusingSpans(rows);
  const samples = Math.min(sharedEnd, knownEnd);
  const work = newRefinement(rows, shared, slack, maxSteps);
  let end = GRID;
  let cutShort = sharedEnd > knownEnd;
  if (rfCycles >= 1) {
    for (let index = GRID; index <= samples && work.steps <= maxSteps; index++) {
      const node = index % GRID;
      end = index;
      const bare = !focusing[node] && !focusing[(node + GRID - 1) % GRID];
      if (bare && index > GRID && index < samples) continue;
      gridRowAt(rows, index, row);
      point[0] = row[0]!;
      point[1] = row[2]!;
      addToHull(shared, point, 0);
      work.steps += 1;
      if (point[0] * point[0] + point[1] * point[1] > enough * enough) {
        cutShort = true;
        break;
      }
    }
  }
  if (end > GRID) refineGrid(work, null, GRID, end);
  const lead = newRowList();
  refineGrid(work, lead, 0, GRID);
  const tail = newRowList();
  if (!cutShort) refineGrid(work, tail, sharedEnd, Math.min(knownEnd, Math.ceil((rfCycles + 1) * GRID)));
  if (rfCycles >= 1) {
    // A shorter flight may be over before the cycle of entry is: then no row needs any other.
    keepWhatCounts(lead, shared, true);
    keepWhatCounts(tail, shared, false);
  }
  return {
    rows,
    rfCycles,
    shared,
    lead,
    tail,
    cutShort,
    finestSpan: work.finestSpan,
    steps: work.steps,
    withinBudget: work.steps <= maxSteps,
  };
}
