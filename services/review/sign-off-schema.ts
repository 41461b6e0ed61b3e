import { z } from "zod";
import { Drive } from "../contract/drive.ts";
import { WidthHeight } from "../contract/width.ts";
import { Criteria } from "./criteria.ts";
import { Evidence, Finding } from "./finding.ts";
import { Instrument } from "./instrument.ts";
import { Method } from "./method.ts";

export const SignOffRequest = z
  .strictObject({ instrument: Instrument, method: Method, criteria: Criteria.optional() })
  .meta({ id: "SignOffRequest" });
export type SignOffRequest = z.output<typeof SignOffRequest>;

export const Verdict = z.enum(["pass", "caution", "fail", "indeterminate"]).meta({
  id: "Verdict",
  description: "The worst outcome of the findings that count: fail, indeterminate, caution, pass.",
});
export type Verdict = z.output<typeof Verdict>;

const Setting = z
  .strictObject({
    pointer: z.string().meta({ description: "JSON Pointer of the ion or of the end of a scan." }),
    acquisition: z.string(),
    stage: z.string(),
    ion: z.string(),
    mz: z.number(),
    setMz: z.number(),
    window: z
      .strictObject({ mzLow: z.number(), mzHigh: z.number(), at: WidthHeight, evidence: Evidence })
      .nullable()
      .meta({ description: "What the filter lets through, null where nothing passes or it is not known." }),
    drive: Drive.nullable().meta({
      description: "Calculated volts, in the convention of the request; not settings to apply.",
    }),
    cutoffMz: z
      .number()
      .nullable()
      .meta({ description: "Low-mass cutoff of the collision cell for this ion." }),
  })
  .meta({ id: "Setting", description: "One ion in one stage, as the method sets it." });
export type Setting = z.output<typeof Setting>;

const NotShown = z
  .strictObject({
    check: z.string(),
    quantity: z.string(),
    missing: z.array(z.string()),
    findings: z.int().meta({ description: "How many findings lack this." }),
    statement: z.string(),
  })
  .meta({ id: "NotShown", description: "What could not be judged and does not count in the verdict." });
export type NotShown = z.output<typeof NotShown>;

const WaivedCheck = z
  .strictObject({
    check: z.string(),
    worstOutcome: z.enum(["pass", "caution", "fail", "indeterminate"]).nullable(),
    reason: z.string(),
    reference: z.string(),
  })
  .meta({
    id: "WaivedCheck",
    description: "A check that the laboratory's criteria take out of the verdict.",
  });
export type WaivedCheck = z.output<typeof WaivedCheck>;

export const SignOffResult = z
  .strictObject({
    verdict: Verdict,
    verdictStatement: z.string(),
    outcomeCounts: z
      .strictObject({
        pass: z.int(),
        caution: z.int(),
        fail: z.int(),
        indeterminate: z.int(),
        "not-applicable": z.int(),
      })
      .meta({ id: "OutcomeCounts" }),
    findings: z.array(Finding),
    settings: z.array(Setting),
    notShown: z.array(NotShown),
    waivers: z.array(WaivedCheck),
  })
  .meta({ id: "SignOffResult", description: "What a sign-off found: the part that goes on record." });
export type SignOffResult = z.output<typeof SignOffResult>;
