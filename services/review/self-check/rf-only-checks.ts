import { qOf } from "../../physics/mathieu-parameters.ts";
import { adiabaticity, lowMassCutoff, secularFrequency, wellDepth } from "../../physics/rf-only.ts";
import { attainableResolution, flightTime, H_CONSTANTS, rfCycles } from "../../physics/transit.ts";
import type { Capability } from "./capability.ts";
import { COMPUTED_AT_50_DIGITS } from "./sources.ts";

const QUADRUPOLES: readonly (readonly [
  fieldRadius: number,
  frequency: number,
  rfVolts: number,
  cutoff: number,
  mz: number,
  depth: number,
  secularFrequency: number,
])[] = [
  [0.003, 1000000.0, 974.14, 1165.2856764818714, 3738.99, 68.92035395344115, 101694.10010431519],
  [0.008, 1500000.0, 77.228, 5.773854516762347, 7.3844, 13.707978956098238, 430628.99364577845],
  [0.008, 1000000.0, 26.362, 4.43457416655229, 4.75981, 5.575562381924714, 382578.53906388313],
  [0.01, 2000000.0, 128.48, 3.458032555457936, 6.34354, 15.899407513700352, 369539.48778656585],
  [0.008, 500000.0, 620.6, 417.58542261776057, 506.258, 116.20724887568969, 155009.37121873352],
  [0.006, 1500000.0, 62.88, 8.357589866980113, 113.27, 1.0532384508393888, 35563.29383121856],
];

const MULTIPOLES: readonly (readonly [
  polePairs: number,
  charge: number,
  mass: number,
  fieldRadius: number,
  frequency: number,
  rfVolts: number,
  radiusFraction: number,
  energy: number,
  adiabaticity: number,
])[] = [
  [4, 1, 12000.0, 0.006, 500000.0, 97.635, 1.0, 0.8628769264193323, 0.05302669696846411],
  [6, 3, 100.0, 0.004, 1000000.0, 32.375, 1.0, 129.683925895274, 8.90151357496518],
  [11, 2, 2500.0, 0.005, 2500000.0, 32.613, 0.8, 0.009283422909541716, 0.01205021606743366],
  [8, 2, 2500.0, 0.008, 500000.0, 84.757, 1.0, 28.091355397300863, 1.1600191593679934],
  [8, 1, 12000.0, 0.006, 1500000.0, 618.6, 0.9, 3.5218450150357237, 0.09258023716573759],
  [4, 2, 100.0, 0.005, 800000.0, 166.5, 0.9, 360.06846830607833, 9.888309936989893],
];

export const RF_ONLY_CHECKS: readonly Capability[] = [
  {
    capability: "low-mass cutoff, well depth and secular frequency of RF-only rods",
    source: COMPUTED_AT_50_DIGITS,
    kind: "relative",
    limit: 1e-10,
    values: () =>
      QUADRUPOLES.flatMap(([fieldRadius, frequency, rfVolts, cutoff, mz, depth, secular]) => {
        const field = { fieldRadius, frequency };
        const at = `${rfVolts} V, ${frequency} Hz, ${fieldRadius} m`;
        const q = qOf(mz, rfVolts, field);
        return [
          { at: `cutoff at ${at}`, reference: cutoff, computed: lowMassCutoff(rfVolts, field) },
          {
            at: `depth for m/z ${mz} at ${at}`,
            reference: depth,
            computed: wellDepth(rfVolts, mz, field, 2),
          },
          {
            at: `secular frequency of m/z ${mz} at ${at}`,
            reference: secular,
            computed: secularFrequency(q, frequency),
          },
        ];
      }),
  },
  {
    capability: "effective potential and adiabaticity of multipoles",
    source: `formulas of Gerlich, Adv. Chem. Phys. 82 (1992) 1, from memory; values ${COMPUTED_AT_50_DIGITS}`,
    kind: "relative",
    limit: 1e-12,
    values: () =>
      MULTIPOLES.flatMap(
        ([polePairs, charge, mass, fieldRadius, frequency, rfVolts, fraction, energy, eta]) => {
          const field = { fieldRadius, frequency };
          const mz = mass / charge;
          const at = `${polePairs} pole pairs, mass ${mass} u, charge ${charge}`;
          return [
            // The table gives the energy of the ion, the service gives it for one elementary charge.
            {
              at: `depth, ${at}`,
              reference: energy / charge,
              computed: wellDepth(rfVolts, mz, field, polePairs, fraction),
            },
            {
              at: `adiabaticity, ${at}`,
              reference: eta,
              computed: adiabaticity(rfVolts, mz, field, polePairs, fraction),
            },
          ];
        },
      ),
  },
  {
    capability: "flight time, RF cycles and attainable resolution",
    source:
      "worked example, m/z 500, 1 MHz, 0.20 m, 2 eV, for the rules of Paul, Reinhard and von Zahn 1958 and of Austin, Holme and Leck in Dawson 1976, both from memory; recomputed to the digits shown",
    kind: "relative",
    limit: 2.5e-4,
    values: () => {
      const time = flightTime(500, 2, 0.2);
      const cycles = rfCycles(time, 1e6);
      return [
        { at: "flight time in us", reference: 227.6, computed: time * 1e6 },
        { at: "RF cycles", reference: 227.6, computed: cycles },
        ...H_CONSTANTS.map(({ h }, index) => ({
          at: `resolution with h ${h}`,
          reference: [4230, 2591][index]!,
          computed: attainableResolution(cycles, h),
        })),
      ];
    },
  },
];
