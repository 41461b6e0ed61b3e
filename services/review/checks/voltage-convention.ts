import { rfFromCanonical } from "../../contract/drive.ts";
import { fieldOf } from "../../contract/rod-set.ts";
import { APEX_Q } from "../../physics/first-region.ts";
import { mzOf } from "../../physics/mathieu-parameters.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import type { MassFilterStage } from "../instrument.ts";
import { boundsOf, TwoSidedLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import { voltsAt } from "../resolve/operating-point.ts";
import type { Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";

export const voltageConvention = defineCheck({
  id: "voltage-convention",
  computes:
    "m/z that the stated RF voltage puts at the apex of the stability region, over the m/z it is stated for.",
  needs: ["stages/operatingPoint", "stages/rodSet"],
  quantities: [
    {
      quantity: "apex-over-target",
      unit: "1",
      meaning: "m/z at the apex over the stated m/z, at the heaviest point",
    },
  ],
  requiredByDefault: true,
  limit: TwoSidedLimit,
  defaults: { pass: { min: 0.95, max: 1.05 }, caution: { min: 0.9, max: 1.1 } },
  basis:
    "Readings of one voltage differ by factors of 1.41 and more, lengths and frequencies by more; 5 and 10 % are common practice, no source.",
  examine: (method, limits) =>
    method.filters.map((filter) =>
      apexOverTarget(method, filter, boundsOf(limits.pass), boundsOf(limits.caution)),
    ),
});

/**
 * What multiplies the m/z at the apex when one thing is mistaken for another. m/z is proportional to V / (f r0)^2.
 */
const MISTAKES: readonly { readonly factor: number; readonly cause: string }[] = [
  { factor: 2, cause: "the RF is peak-to-peak but stated as zero-to-peak" },
  { factor: 2, cause: "the RF is between the poles but stated between pole and ground" },
  { factor: 0.5, cause: "the RF is zero-to-peak but stated as peak-to-peak" },
  { factor: 0.5, cause: "the RF is between pole and ground but stated between the poles" },
  {
    factor: 4,
    cause: "the RF is peak-to-peak between the poles but stated as zero-to-peak between pole and ground",
  },
  {
    factor: 0.25,
    cause: "the RF is zero-to-peak between pole and ground but stated as peak-to-peak between the poles",
  },
  { factor: 0.25, cause: "the field diameter is stated as the field radius" },
  { factor: Math.SQRT2, cause: "the RF is zero-to-peak but stated as rms" },
  { factor: Math.SQRT1_2, cause: "the RF is rms but stated as zero-to-peak" },
  { factor: 2 * Math.SQRT2, cause: "the RF is peak-to-peak but stated as rms" },
  { factor: Math.SQRT1_2 / 2, cause: "the RF is rms but stated as peak-to-peak" },
  { factor: 0.76, cause: "the rod radius is stated as the field radius" },
  { factor: 1.32, cause: "the field radius was reduced as if it were a rod radius" },
  { factor: 1 / (4 * Math.PI * Math.PI), cause: "the angular frequency is stated as the frequency" },
  { factor: 4 * Math.PI * Math.PI, cause: "the frequency was divided by 2 pi" },
];

const RECOGNISED_WITHIN = 0.03;

function apexOverTarget(
  method: ResolvedMethod,
  filter: Placed<MassFilterStage>,
  pass: Bounds,
  caution: Bounds,
): Observation {
  const { operatingPoint, rodSet, name } = filter.stage;
  const pointer = `${filter.pointer}/operatingPoint`;
  const about = { quantity: "apex-over-target", unit: "1", subject: { pointer, stage: name } };
  if (operatingPoint?.by !== "drives" && operatingPoint?.by !== "drive-law") {
    return {
      ...about,
      kind: "not-applicable",
      statement: `No voltage of ${name} is stated, so none can be misread.`,
    };
  }
  if (rodSet === undefined) {
    return {
      ...about,
      kind: "indeterminate",
      missing: [`${filter.pointer}/rodSet`],
      statement: `The voltages of ${name} cannot be compared with m/z without its rod set.`,
    };
  }
  const target = heaviestTarget(method, filter, operatingPoint);
  const setting = target === null ? null : voltsAt(operatingPoint, target.mz);
  if (target === null || setting === null) {
    return { ...about, kind: "not-applicable", statement: `The method sets no m/z in ${name}.` };
  }
  const value = mzOf(APEX_Q, setting.volts.rfVolts, fieldOf(rodSet)) / target.mz;
  const stated = rfFromCanonical(setting.volts.rfVolts, setting.convention.rf);
  return {
    ...about,
    kind: "value",
    subject: { ...about.subject, pointer: target.pointer, ion: `m/z ${target.mz}` },
    value,
    evidence: "computed",
    pass,
    caution,
    passesIf: passesIfRead(target.voltsPointer, target.voltsPerUnit ?? stated.volts, value, pass),
    statement:
      `${digits(stated.volts, 6)} V ${stated.as}, ${stated.between}, puts m/z ${digits(value * target.mz, 5)} at the apex in ${name}; it is stated for m/z ${target.mz}.` +
      causesOf(value, pass),
  };
}

interface Target {
  readonly mz: number;
  readonly pointer: string;
  readonly voltsPointer: string;
  readonly voltsPerUnit: number | null;
}

/** The heaviest point is judged: the window's centre leaves the apex where the resolution is low, which is at light ions. */
function heaviestTarget(
  method: ResolvedMethod,
  filter: Placed<MassFilterStage>,
  operatingPoint: Extract<NonNullable<MassFilterStage["operatingPoint"]>, { by: "drives" | "drive-law" }>,
): Target | null {
  const pointer = `${filter.pointer}/operatingPoint`;
  if (operatingPoint.by === "drives") {
    const index = operatingPoint.points.reduce(
      (best, point, each) => (point.mz > operatingPoint.points[best]!.mz ? each : best),
      0,
    );
    return {
      mz: operatingPoint.points[index]!.mz,
      pointer: `${pointer}/points/${index}`,
      voltsPointer: `${pointer}/points/${index}/drive/rf/volts`,
      voltsPerUnit: null,
    };
  }
  const set = method.acquisitions.flatMap(({ filterings }) =>
    filterings.filter((filtering) => filtering.filter === filter).map(({ setMz }) => setMz),
  );
  if (set.length === 0) return null;
  return {
    mz: Math.max(...set),
    pointer: `${pointer}/rfPerMz`,
    voltsPointer: `${pointer}/rfPerMz/volts`,
    voltsPerUnit: operatingPoint.rfPerMz.volts,
  };
}

function causesOf(value: number, pass: Bounds): string {
  if ((pass.min === null || value >= pass.min) && (pass.max === null || value <= pass.max)) return "";
  const causes = MISTAKES.filter(({ factor }) => Math.abs(value / factor - 1) <= RECOGNISED_WITHIN).map(
    ({ cause }) => cause,
  );
  if (causes.length === 0)
    return ` The factor of ${digits(value, 4)} fits no mistaken convention that is known here.`;
  return ` A factor of ${digits(value, 4)} comes about when ${causes.join(", or when ")}.`;
}

function passesIfRead(input: string, volts: number, value: number, pass: Bounds): PassesIf | null {
  if (value <= 0) return null;
  return {
    input,
    min: pass.min === null ? null : (volts * pass.min) / value,
    max: pass.max === null ? null : (volts * pass.max) / value,
    unit: "V",
  };
}
