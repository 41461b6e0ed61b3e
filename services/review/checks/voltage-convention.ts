import { rfFromCanonical, rfToCanonical } from "../../contract/drive.ts";
import { fieldOf } from "../../contract/rod-set.ts";
import { APEX_Q } from "../../physics/first-region.ts";
import { mzOf, rfVoltsOf } from "../../physics/mathieu-parameters.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import type { MassFilterStage } from "../instrument.ts";
import { type Lever, leverThrough, passesIfWithin } from "../lever.ts";
import { boundsOf, TwoSidedLimit } from "../limit.ts";
import { lacking, notApplicable, type Observation } from "../observation.ts";
import type { Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { rfLever } from "../resolve/volts-lever.ts";
import { digits } from "../statement.ts";
import { causesOf } from "./mistaken-convention.ts";
import { settingsAt } from "./worst-of-stage.ts";

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
    return { ...about, ...notApplicable(`No voltage of ${name} is stated, so none can be misread.`) };
  }
  if (rodSet === undefined) {
    return { ...about, ...lacking(`What m/z the voltages of ${name} select`, [`${filter.pointer}/rodSet`]) };
  }
  const target =
    operatingPoint.by === "drives"
      ? heaviestPoint(operatingPoint, pointer)
      : heaviestSetting(method, filter, operatingPoint, pointer);
  if (target === null) return { ...about, ...notApplicable(`The method sets no m/z in ${name}.`) };
  const { rfVolts, mz, rf, lever } = target;
  const field = fieldOf(rodSet);
  const value = mzOf(APEX_Q, rfVolts, field) / mz;
  const agrees = (pass.min === null || value >= pass.min) && (pass.max === null || value <= pass.max);
  return {
    ...about,
    kind: "value",
    subject: { ...about.subject, pointer: target.pointer, ion: `m/z ${mz}` },
    value,
    evidence: "computed",
    pass,
    caution,
    passesIf: () =>
      passesIfWithin(
        leverThrough(lever, (ratio) => rfVoltsOf(ratio * mz, APEX_Q, field)),
        pass,
      ),
    statement:
      `${digits(rfFromCanonical(rfVolts, rf).volts, 6)} V ${rf.as}, ${rf.between}, puts m/z ${digits(value * mz, 5)} at the apex in ${name}; it is stated for m/z ${mz}.` +
      (agrees ? "" : causesText(value, causesOf(value, rf))),
  };
}

function causesText(value: number, causes: readonly string[]): string {
  return causes.length === 0
    ? ` The factor of ${digits(value, 4)} fits no mistaken convention that is known here.`
    : ` A factor of ${digits(value, 4)} comes about when ${causes.join(", or when ")}.`;
}

interface Target {
  readonly mz: number;
  readonly rfVolts: number;
  readonly pointer: string;
  readonly rf: Parameters<typeof rfLever>[0];
  readonly lever: Lever;
}

type OperatingPointBy<By extends string> = Extract<MassFilterStage["operatingPoint"], { by: By }>;

/*
 * The heaviest is judged: the window's centre leaves the apex where the resolution is low, which is at light ions.
 */

function heaviestPoint({ points }: OperatingPointBy<"drives">, pointer: string): Target {
  const index = points.reduce((best, point, each) => (point.mz > points[best]!.mz ? each : best), 0);
  const { mz, drive } = points[index]!;
  const { rf } = drive;
  const own = `${pointer}/points/${index}`;
  return { mz, rfVolts: rfToCanonical(rf), pointer: own, rf, lever: rfLever(rf, `${own}/drive/rf`) };
}

function heaviestSetting(
  method: ResolvedMethod,
  filter: Placed<MassFilterStage>,
  { rfPerMz }: OperatingPointBy<"drive-law">,
  pointer: string,
): Target | null {
  const set = settingsAt(method, filter).map(({ setMz }) => setMz);
  if (set.length === 0) return null;
  const mz = Math.max(...set);
  const own = `${pointer}/rfPerMz`;
  const lever = rfLever(rfPerMz, own);
  return {
    mz,
    rfVolts: rfToCanonical(rfPerMz) * mz,
    pointer: own,
    rf: rfPerMz,
    lever: { ...lever, inputFor: (volts) => lever.inputFor(volts / mz) },
  };
}
