import { pointStability } from "../../physics/stability.ts";
import type { Capability, CheckedValue } from "./capability.ts";
import { COMPUTED_AT_50_DIGITS } from "./sources.ts";

/** Over the whole domain to 12, near the edges of the first region and inside others; β is null where it is unstable. */
const POINTS: readonly (readonly [
  a: number,
  q: number,
  halfTraceX: number,
  halfTraceY: number,
  exponentX: number | null,
  exponentY: number | null,
])[] = [
  [-0.275673, 0.014446, 2.6975974795539726, -0.07903190242984615, null, 0.5251828979822857],
  [0.101312, 0.196715, 0.45101093076062704, 1.4412212361127232, 0.3510635403561381, null],
  [-0.175191, 0.327602, 1.7010114063427653, 0.017413440807966425, null, 0.49445684947460816],
  [0.22617, 0.466263, -0.3837229140298243, 1.7230094049821316, 0.6253582225669817, null],
  [-0.052711, 0.674969, 0.11948511287982147, -0.3250981166842567, 0.46187562265323995, 0.6053973303477441],
  [-0.268754, 0.874328, 0.44240698225086117, -1.6120032254607433, 0.3541246821730039, null],
  [-8.80468, 9.19571, -2410.340361743204, -3.079501158781574, null, null],
  [2.87966, 6.98075, 23.84551969700304, -213.6579510543586, null, null],
  [-3.09336, 5.31156, -154.17006102711804, 7.66593103521734, null, null],
  [-6.52573, 11.26549, -1211.010202121948, 11.596866999261858, null, null],
  [-11.41526, 2.31298, 18360.46773969534, -0.4874014981667188, null, 3.3379448210845446],
  [6.87721, 2.99932, 0.23886677093117475, 1280.0951437742845, 2.423224078195159, null],
  [3.1464125, 3.247195, 0.97474504622531, -0.8490559282760994, 1.9283103132073394, 0.8228285274371455],
  [-2.5478658, 2.802952, 0.5117337928095275, -0.9120813327626073, 0.3290034112852783, 1.1344745570327588],
  [3.1530933, 3.246094, 0.9884286031045079, -0.43708965264366567, 1.951529478293582, 0.6439907580170111],
  [-2.6295813, 2.86523, 0.340964930088553, -0.6522719883730813, 0.389246257092077, 1.2738160005948935],
  [-2.8925889, 3.066642, -0.5273768950039679, 0.18960691713408193, 0.6768244050943242, 1.5607213623739196],
  [-3.0509838, 3.174582, -0.38135936762973427, 0.6795000488121169, 0.6245439470174521, 1.7378032635394371],
  [-0.00193681029590585, 0.90642, -0.985902118840382, -1.0000000046385835, 0.9464877032904955, null],
  [
    -0.094903450409622, 0.82789, -0.26655034529838534, -0.9999985971507184, 0.585883860780157,
    0.9994668238885405,
  ],
  [
    -0.123776008332521, 0.80331, -0.025821223154301038, -0.9999994829631088, 0.5082200642108461,
    0.9996763125139418,
  ],
  [0.0230928307265237, 0.88863, -1.0000000287847914, -0.829573107846373, null, 0.8114161711218543],
  [0.0075671725299378, 0.90169, -1.00000002006093, -0.9447159491118212, null, 0.8936625003786065],
  [
    -0.106428263720112, 0.81809, -0.17146091359789714, -0.9999998180987627, 0.554848725140698,
    0.9998080080770868,
  ],
];

export const STABILITY_CHECKS: readonly Capability[] = [
  {
    capability: "half-traces of the motion in both planes",
    source: COMPUTED_AT_50_DIGITS,
    kind: "relative-above-1",
    limit: 1e-12,
    values: () =>
      POINTS.flatMap(([a, q, halfTraceX, halfTraceY]): CheckedValue[] => {
        const found = pointStability(a, q);
        return [
          { at: `x at a ${a}, q ${q}`, reference: halfTraceX, computed: found?.x.halfTrace ?? null },
          { at: `y at a ${a}, q ${q}`, reference: halfTraceY, computed: found?.y.halfTrace ?? null },
        ];
      }),
  },
  {
    capability: "characteristic exponents where the motion is stable",
    source: COMPUTED_AT_50_DIGITS,
    kind: "absolute",
    limit: 1e-10,
    values: () =>
      POINTS.flatMap(([a, q, , , exponentX, exponentY]): CheckedValue[] => {
        const found = pointStability(a, q);
        return [
          ...exponentAt(`x at a ${a}, q ${q}`, exponentX, found?.x.characteristicExponent),
          ...exponentAt(`y at a ${a}, q ${q}`, exponentY, found?.y.characteristicExponent),
        ];
      }),
  },
  {
    capability: "stable and unstable told apart",
    source: COMPUTED_AT_50_DIGITS,
    kind: "absolute",
    limit: 0,
    values: () =>
      POINTS.map(([a, q, , , exponentX, exponentY]) => ({
        at: `a ${a}, q ${q}`,
        reference: Number(exponentX !== null && exponentY !== null),
        computed: Number(pointStability(a, q)?.stable ?? Number.NaN),
      })),
  },
];

function exponentAt(
  at: string,
  reference: number | null,
  computed: number | null | undefined,
): CheckedValue[] {
  return reference === null ? [] : [{ at, reference, computed: computed ?? null }];
}
