import { characteristicA, characteristicB } from "../../physics/characteristic-values.ts";
import type { Capability } from "./capability.ts";
import { COMPUTED_AT_50_DIGITS } from "./sources.ts";

type Row = readonly [curve: "a" | "b", order: number, q: number, value: number];

const COMPUTED: readonly Row[] = [
  ["a", 0, 0.5, -0.1217655449410827],
  ["a", 1, 0.5, 1.4667668425160558],
  ["a", 2, 0.5, 4.10090059556048],
  ["b", 1, 0.5, 0.4706543549338391],
  ["b", 2, 0.5, 3.979189215751357],
  ["a", 0, 2, -1.5139568850565202],
  ["a", 1, 2, 2.3791998804886862],
  ["a", 2, 2, 5.1726651333582945],
  ["b", 1, 2, -1.3906765012253228],
  ["b", 2, 2, 3.6722327064971907],
  ["a", 0, 5, -5.800046020851508],
  ["a", 1, 5, 1.858187541547751],
  ["a", 2, 5, 7.449109739529177],
  ["b", 1, 5, -5.790080598637771],
  ["b", 2, 5, 2.0994604454866654],
  ["a", 0, 10, -13.936979956658925],
  ["a", 1, 10, -2.399142400036264],
  ["a", 2, 10, 7.717369849779622],
  ["b", 1, 10, -13.93655247925009],
  ["b", 2, 10, -2.3821582359569557],
  ["a", 0, 25, -40.25677954656679],
  ["a", 1, 25, -21.314899690665726],
  ["a", 2, 25, -3.522164727158296],
  ["b", 1, 25, -40.25677898468416],
  ["b", 2, 25, -21.31486062224985],
];

const TABLE_20_1: readonly Row[] = [
  ["a", 0, 5, -5.80004602],
  ["a", 0, 10, -13.93697996],
  ["a", 0, 15, -22.51303776],
  ["a", 0, 20, -31.31339007],
  ["a", 0, 25, -40.25677955],
  ["a", 2, 5, 7.44910974],
  ["a", 2, 10, 7.71736985],
  ["a", 2, 15, 5.0779832],
  ["a", 2, 20, 1.15428288],
  ["a", 2, 25, -3.52216473],
  ["a", 1, 5, 1.85818754],
  ["a", 1, 10, -2.3991424],
  ["a", 1, 15, -8.10110513],
  ["a", 1, 20, -14.49130142],
  ["a", 1, 25, -21.31489969],
  ["a", 5, 5, 25.54997175],
  ["a", 5, 10, 27.70376873],
  ["a", 5, 15, 31.95782125],
  ["a", 5, 20, 36.64498973],
  ["a", 5, 25, 40.05019099],
  ["b", 1, 5, -5.7900806],
  ["b", 1, 10, -13.93655248],
  ["b", 1, 15, -22.5130035],
  ["b", 1, 20, -31.31338617],
  ["b", 1, 25, -40.25677898],
  ["b", 2, 5, 2.09946045],
  ["b", 2, 10, -2.38215824],
  ["b", 2, 15, -8.0993468],
  ["b", 2, 20, -14.49106325],
  ["b", 2, 25, -21.31486062],
  ["b", 5, 5, 25.51081605],
  ["b", 5, 10, 26.76642636],
  ["b", 5, 15, 27.9678806],
  ["b", 5, 20, 28.46822133],
  ["b", 5, 25, 28.0627659],
];

/** Where two boundaries of a stability region meet: the curve of x gives a, the mirrored curve of y the same. */
const CORNERS: readonly (readonly [region: string, x: Curve, y: Curve, q: number, a: number])[] = [
  ["first, apex", ["b", 1], ["a", 0], 0.7059960697133709, 0.23699399311247357],
  ["first, RF-only limit", ["b", 1], ["b", 1], 0.9080463337345775, 0],
  ["second, low end at a = 0", ["a", 1], ["a", 1], 7.513610299420813, 0],
  ["second, high end at a = 0", ["b", 2], ["b", 2], 7.579690373736909, 0],
  ["second, upper corner", ["b", 2], ["a", 1], 7.5472748663818034, 0.02954999454495303],
  ["third, lower corner", ["a", 1], ["b", 1], 2.815304330086136, 2.521000065549916],
  ["third, upper corner", ["b", 2], ["a", 0], 3.234075085700503, 3.164296367779791],
];
type Curve = readonly ["a" | "b", number];

const onCurve = ([curve, order]: Curve, q: number): number | null =>
  curve === "a" ? characteristicA(order, q) : characteristicB(order, q);

const checked = (rows: readonly Row[]) =>
  rows.map(([curve, order, q, reference]) => ({
    at: `${curve}_${order}(${q})`,
    reference,
    computed: onCurve([curve, order], q),
  }));

export const CHARACTERISTIC_VALUE_CHECKS: readonly Capability[] = [
  {
    capability: "characteristic values of the Mathieu equation",
    source: COMPUTED_AT_50_DIGITS,
    kind: "relative-above-1",
    limit: 1e-13,
    values: () => checked(COMPUTED),
  },
  {
    capability: "characteristic values, as tabulated to 8 decimals",
    source:
      "Abramowitz and Stegun, Handbook of Mathematical Functions, table 20.1, from memory, so good to one unit of the last decimal; the function of NIST DLMF chapter 28",
    kind: "absolute",
    limit: 1e-8,
    values: () => checked(TABLE_20_1),
  },
  {
    capability: "corners of the first three stability regions",
    source: `${COMPUTED_AT_50_DIGITS}; Dawson 1976, Dawson and Bingqi 1984 and Du, Olney and Douglas 1997 print their first digits`,
    kind: "absolute",
    limit: 1e-10,
    values: () =>
      CORNERS.flatMap(([region, x, y, q, a]) => {
        const mirrored = onCurve(y, q);
        return [
          { at: `${region}, x`, reference: a, computed: onCurve(x, q) },
          { at: `${region}, y`, reference: a, computed: mirrored === null ? null : -mirrored },
        ];
      }),
  },
];
