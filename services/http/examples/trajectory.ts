import type { z } from "zod";
import type { Example } from "../endpoint.ts";
import type { TrajectoryAnswer, TrajectoryRequest } from "../shapes/trajectory.ts";

type Examples = Readonly<
  Record<string, Example<z.input<typeof TrajectoryRequest>, z.output<typeof TrajectoryAnswer>>>
>;

export const TRAJECTORY_EXAMPLES: Examples = {
  "inside-the-window": {
    summary: "Two and a half RF cycles of an ion in the middle of its window",
    source: "Computed by an independent program (test/reference, generate-endpoint-examples).",
    request: {
      rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
      drive: {
        rf: { volts: 831.55739482, as: "zero-to-peak", between: "pole-and-ground" },
        dc: { volts: 139.42457479, between: "pole-and-ground" },
      },
      ion: { mz: 500 },
      start: { x_mm: 0.2, y_mm: -0.1, vx_mPerS: 100, vy_mPerS: 40, phase_deg: 30 },
      residence: { rfCycles: 2.5 },
      samplesPerCycle: 2,
      fieldAt: { x_mm: 1, y_mm: 2, phase_deg: 180 },
    },
    answer: {
      mz: 500,
      a: 0.23663468138174998,
      q: 0.7056694254590696,
      flight: {
        rfCycles: 2.5,
        samples: {
          time_us: [
            0.0, 0.4166666666666667, 0.8333333333333334, 1.25, 1.6666666666666667, 2.0833333333333335,
          ],
          x_mm: [
            0.2, 0.17395456963698347, -0.3000690175107487, -0.6777477399976743, 0.39902093096790986,
            1.1790177750012507,
          ],
          y_mm: [
            -0.1, -0.09589456092728955, -0.22128616054588382, -0.1627396822184663, -0.34215978296527255,
            -0.22928141208451774,
          ],
        },
        envelope: {
          x: { largest_mm: 1.290405762111544, at_us: 1.9962770862090842, largestEver_mm: 8.747858986552192 },
          y: { largest_mm: 0.351474659906063, at_us: 1.6090686834704853, largestEver_mm: 2.927534698631387 },
        },
        lost: null,
        end: {
          time_us: 2.0833333333333335,
          x_mm: 1.1790177750012507,
          y_mm: -0.22928141208451774,
          vx_mPerS: -2476.8327445151263,
          vy_mPerS: -476.0672293749133,
        },
      },
      reason: null,
      rods: {
        x: {
          dcToGround_V: 139.42457479,
          positiveShare: 0.5536232778324269,
          peakToGround_V: 970.9819696100001,
        },
        y: {
          dcToGround_V: -139.42457479,
          positiveShare: 0.44637672216757307,
          peakToGround_V: 970.9819696100001,
        },
        rodOffset_V: null,
      },
      fieldAt: {
        potential_V: -182.05911930187503,
        fieldX_VPerM: -121372.74620125002,
        fieldY_VPerM: 242745.49240250004,
        forceX_N: -1.9446057796805503e-14,
        forceY_N: 3.8892115593611006e-14,
      },
    },
  },
};
