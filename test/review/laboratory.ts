import type { Acquisition } from "../../services/review/acquisition.ts";
import type { Criteria } from "../../services/review/criteria.ts";
import type { Finding } from "../../services/review/finding.ts";
import type { Instrument, MassFilterStage, OperatingPoint, Stage } from "../../services/review/instrument.ts";
import type { Method } from "../../services/review/method.ts";
import { signOff } from "../../services/review/sign-off.ts";
import { signOffErrors } from "../../services/review/sign-off-rules.ts";
import { SignOffRequest } from "../../services/review/sign-off-schema.ts";

/* An invented laboratory: small builders of instruments and methods, each part legal and replaceable. */

export type Transition = Extract<Acquisition, { kind: "transition" }>;
export type SelectedIon = Extract<Acquisition, { kind: "selected-ion" }>;
export type Scan = Extract<Acquisition, { kind: "scan" }>;
export type CollisionCell = Extract<Stage, { role: "collision-cell" }>;

export const edges = (value: number) => ({ value, as: "mz", at: "edges" }) as const;
export const halfHeight = (value: number) => ({ value, as: "mz", at: "half-height" }) as const;
export const tenthHeight = (value: number) => ({ value, as: "mz", at: "tenth-height" }) as const;

/** The canonical reading: zero-to-peak, pole to ground. */
export const rf = (volts: number) => ({ volts, as: "zero-to-peak", between: "pole-and-ground" }) as const;
export const dc = (volts: number) => ({ volts, between: "pole-and-ground" }) as const;

/** r0 4.17 mm at 1.0 MHz: the setting of the handbooks' worked examples. */
export const RODS = { fieldRadius_mm: 4.17, frequency_MHz: 1, rodLength_mm: 200 };

export const TUNE_REPORT: OperatingPoint = {
  by: "measured-peaks",
  peaks: [
    { setMz: 59, observedMz: 59, width: halfHeight(0.7) },
    { setMz: 500, observedMz: 500, width: halfHeight(0.7) },
    { setMz: 1000, observedMz: 1000, width: halfHeight(0.7) },
  ],
};

export const stated = (width: OperatingPointStated["width"]): OperatingPoint => ({ by: "stated", width });
type OperatingPointStated = Extract<OperatingPoint, { by: "stated" }>;

export function massFilter(name: string, over: Partial<MassFilterStage> = {}): MassFilterStage {
  return { name, role: "mass-filter", operatingPoint: TUNE_REPORT, ...over };
}

export function collisionCell(over: Partial<CollisionCell> = {}): CollisionCell {
  return { name: "q2", role: "collision-cell", rf: { mode: "cutoff", mz: 60 }, ...over };
}

export function instrument(...stages: Stage[]): Instrument {
  return { id: "north-bench", revision: "1", stages };
}

export interface TripleParts {
  readonly q1?: Partial<MassFilterStage>;
  readonly q2?: Partial<CollisionCell>;
  readonly q3?: Partial<MassFilterStage>;
}

export function tripleQuadrupole({ q1 = {}, q2 = {}, q3 = {} }: TripleParts = {}): Instrument {
  return instrument(massFilter("Q1", q1), collisionCell(q2), massFilter("Q3", q3));
}

export function transition(
  id: string,
  precursor: number,
  product: number,
  over: Partial<Transition> = {},
): Transition {
  return {
    id,
    kind: "transition",
    precursor: { mz: precursor },
    product: { mz: product },
    dwell_ms: 10,
    pause_ms: 5,
    ...over,
  };
}

export function selectedIon(id: string, mz: number, over: Partial<SelectedIon> = {}): SelectedIon {
  return { id, kind: "selected-ion", stage: "Q1", ion: { mz }, dwell_ms: 10, pause_ms: 5, ...over };
}

export function scan(mzFrom: number, mzTo: number, over: Partial<Scan> = {}): Scan {
  return { id: "scan", kind: "scan", stage: "Q1", mzFrom, mzTo, rate_mzPerS: 100, pause_ms: 5, ...over };
}

export function method(acquisition: Acquisition[], over: Partial<Method> = {}): Method {
  return {
    id: "well-water",
    revision: "3",
    polarity: "positive",
    timing: { mode: "dwell" },
    acquisition,
    ...over,
  };
}

export interface Case {
  readonly instrument?: Instrument;
  readonly method?: Method;
  readonly checks?: Criteria["checks"];
}

export function request(parts: Case = {}): SignOffRequest {
  const { checks } = parts;
  return {
    instrument: parts.instrument ?? tripleQuadrupole(),
    method: parts.method ?? method([transition("A", 500, 200)]),
    ...(checks === undefined ? {} : { criteria: { id: "house-limits", revision: "2", checks } }),
  };
}

/** One filter and one ion, the smallest method there is. */
export function oneFilter(over: Partial<MassFilterStage>, ...acquisition: Acquisition[]): SignOffRequest {
  return request({
    instrument: instrument(massFilter("Q1", over)),
    method: method(acquisition.length === 0 ? [selectedIon("A", 500)] : acquisition),
  });
}

/** Signs off a request that the service would accept; anything else is a mistake of the test. */
export function signedOff(request: SignOffRequest) {
  const accepted = SignOffRequest.parse(request);
  const errors = signOffErrors(accepted);
  if (errors.length > 0) throw new Error(`not a legal request: ${JSON.stringify(errors)}`);
  return signOff(accepted);
}

export function findings(request: SignOffRequest, check: string, quantity?: string): Finding[] {
  return signedOff(request).findings.filter(
    (finding) => finding.check === check && (quantity === undefined || finding.quantity === quantity),
  );
}

/** The one finding of a quantity. */
export function finding(request: SignOffRequest, check: string, quantity?: string): Finding {
  const found = findings(request, check, quantity);
  if (found.length !== 1) throw new Error(`${found.length} findings of ${check} ${quantity ?? ""}`);
  return found[0]!;
}

/** check, quantity, subject and outcome in a line. */
export function line({ check, quantity, subject, outcome }: Finding): string {
  const about = [subject.acquisition, subject.stage].filter((part) => part !== undefined).join(" ");
  return `${check} ${quantity}${about === "" ? "" : ` ${about}`}: ${outcome}`;
}

/** All that does not pass, in order. */
export function notPassing(request: SignOffRequest): string[] {
  return signedOff(request)
    .findings.filter(({ outcome }) => outcome !== "pass")
    .map(line)
    .sort();
}
