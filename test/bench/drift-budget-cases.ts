import { edgeSensitivities } from "../../services/physics/drift.ts";
import { allowedTolerances, driftBudgetOf } from "../../services/physics/drift-budget.ts";
import { APEX_RATIO } from "../../services/physics/first-region.ts";
import { passbandOf } from "../../services/physics/passband.ts";
import type { BenchCase } from "./bench-case.ts";
import { seededRandom } from "./random.ts";

const COUNT = 256;
const FIELD = { fieldRadius: 0.004, frequency: 1.2e6 };
const TOLERANCES = { fieldRadius: 2e-6, frequency: 1e-6, amplitude: 5e-5, ratio: 1e-5 };
const LIMITS = { centreShift: 0.1, widthChange: 0.1 };

const random = seededRandom(11);
/** Drives whose windows have R from about 10 to 2000. */
const DRIVES = Array.from({ length: COUNT }, () => {
  const rf = 100 + 1900 * random();
  const resolution = 10 * Math.exp(random() * Math.log(200));
  return { rf, dc: rf * (APEX_RATIO - 0.1264 / resolution) };
});

function sumOfBudgets(): number {
  let sum = 0;
  for (const { dc, rf } of DRIVES) {
    const found = passbandOf(dc, rf, FIELD);
    const sensitivity = edgeSensitivities(dc / rf);
    if (found.kind !== "window" || sensitivity === null) continue;
    const { mzCentre, mzWidth } = found.passband;
    const window = { mzCentre: mzCentre!, mzWidth: mzWidth!, sensitivity };
    const { worstCase, rootSumSquare } = driftBudgetOf(window, TOLERANCES);
    if (allowedTolerances(window, LIMITS).length === 0) continue;
    sum += worstCase.centre + worstCase.width + rootSumSquare.centre + rootSumSquare.width;
  }
  return sum;
}

/** Central differences of the passband over steps that are small against the distance from the apex. */
function sumOfDifferences(): number {
  let sum = 0;
  for (const { dc, rf } of DRIVES) {
    const step = 1e-3 * (1 - dc / rf / APEX_RATIO);
    const moved = {
      fieldRadius: (by: number) => passbandOf(dc, rf, { ...FIELD, fieldRadius: FIELD.fieldRadius * by }),
      frequency: (by: number) => passbandOf(dc, rf, { ...FIELD, frequency: FIELD.frequency * by }),
      amplitude: (by: number) => passbandOf(dc * by, rf * by, FIELD),
      ratio: (by: number) => passbandOf(dc * by, rf, FIELD),
    };
    const worst = [0, 0];
    const squares = [0, 0];
    for (const cause of ["fieldRadius", "frequency", "amplitude", "ratio"] as const) {
      const [above, below] = [moved[cause](1 + step), moved[cause](1 - step)];
      if (above.kind !== "window" || below.kind !== "window") continue;
      const scale = TOLERANCES[cause] / (2 * step);
      const shifts = [
        (above.passband.mzCentre! - below.passband.mzCentre!) * scale,
        (above.passband.mzWidth! - below.passband.mzWidth!) * scale,
      ];
      for (const [index, shift] of shifts.entries()) {
        worst[index]! += Math.abs(shift);
        squares[index]! += shift * shift;
      }
    }
    sum += worst[0]! + worst[1]! + Math.sqrt(squares[0]!) + Math.sqrt(squares[1]!);
  }
  return sum;
}

export const DRIFT_BUDGET_CASES: readonly BenchCase[] = [
  {
    name: "drift budget of a drive, forwards and backwards",
    target: { of: "time", most: 50 },
    unit: "us",
    a: { label: "exact derivatives of the edges", operations: COUNT, run: sumOfBudgets },
    b: {
      label: "central differences of the passband, forwards only",
      operations: COUNT,
      run: sumOfDifferences,
    },
    checksumTolerance: 1e-5,
    note: "b keeps some six digits of the width",
  },
];
