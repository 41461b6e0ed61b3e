import { readReference } from "./read-reference.ts";

interface CharacteristicValues {
  readonly a: Readonly<Record<string, readonly number[]>>;
  readonly b: Readonly<Record<string, readonly number[]>>;
  readonly table_20_1_from_memory: readonly { f: string; q: number; from_memory: number }[];
}
export const CHARACTERISTIC_VALUES = readReference<CharacteristicValues>("characteristic-values");

type StabilityRow = [
  a: number,
  q: number,
  halfTraceX: number,
  halfTraceY: number,
  stableX: 0 | 1,
  stableY: 0 | 1,
  betaX: number | null,
  betaY: number | null,
  marginX: number,
  marginY: number,
  kind: string,
];
export const STABILITY_POINTS = readReference<{ points: StabilityRow[] }>("stability-points").points;

interface Corner {
  readonly x_curve: string;
  readonly y_curve: string;
  readonly q: number;
  readonly a: number;
}
interface Region {
  readonly label: string;
  readonly n_x: number;
  readonly n_y: number;
  readonly corners_all_real_a: readonly Corner[];
  readonly interior_check: readonly {
    a: number;
    q: number;
    half_trace_x: number;
    half_trace_y: number;
    beta_x: number;
    beta_y: number;
  }[];
}
interface Regions {
  readonly headline: {
    readonly region_I: {
      readonly apex_q: string;
      readonly apex_a: string;
      readonly apex_U_over_V: string;
      readonly q_limit_rf_only_a0: string;
      readonly slope_b1_at_apex: string;
      readonly slope_minus_a0_at_apex: string;
      readonly resolution_constant_c: string;
    };
    readonly region_II: { readonly q_limits_a0: readonly [string, string] };
  };
  readonly regions: readonly Region[];
}
export const STABILITY_REGIONS = readReference<Regions>("stability-regions");

type PassbandRow = [
  r0: number,
  f: number,
  U: number,
  V: number,
  ratio: number,
  qLow: number,
  qHigh: number,
  mzLow: number,
  mzHigh: number,
  centre: number,
  width: number,
  resolution: number,
  mzAtApex: number,
];
interface Passbands {
  readonly settings: readonly PassbandRow[];
  readonly no_passband_r0_f_U_V: readonly [number, number, number, number][];
  readonly asymptotic_table: readonly [
    ratio: number,
    resolution: number,
    textbook: number,
    textbookError: number,
    exactConstants: number,
    exactConstantsError: number,
  ][];
}
export const PASSBANDS = readReference<Passbands>("passbands");

interface RfOnly {
  readonly quadrupole: readonly [
    r0: number,
    f: number,
    V: number,
    cutoff: number,
    secondHigh: number,
    secondLow: number,
    mz: number,
    q: number,
    depth: number,
    beta: number,
    secularExact: number,
    secularAdiabatic: number,
  ][];
  readonly multipole: readonly [
    polePairs: number,
    charge: number,
    mass: number,
    r0: number,
    f: number,
    V: number,
    radiusFraction: number,
    effectivePotential: number,
    adiabaticity: number,
  ][];
  readonly beta_table: readonly [q: number, beta: number, adiabatic: number, relativeError: number][];
}
export const RF_ONLY = readReference<RfOnly>("rf-only");
