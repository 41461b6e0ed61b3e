import { z } from "zod";
import { quantity } from "../contract/quantity.ts";
import { Label } from "../contract/text.ts";
import { WidthHeight } from "../contract/width.ts";
import { Criteria } from "./criteria.ts";
import { Bounds, Outcome } from "./finding.ts";
import { Instrument } from "./instrument.ts";
import { Method } from "./method.ts";
import { Engine } from "./record/record-schema.ts";
import { SignOffResult, Verdict } from "./sign-off-schema.ts";

const ComparisonCase = z
  .strictObject({
    label: Label.meta({ description: "What this case is called in the answer; each case another." }),
    instrument: Instrument,
    method: Method,
    criteria: Criteria.optional(),
  })
  .meta({ id: "ComparisonCase", description: "A sign-off request with a name." });

export const ComparisonRequest = z
  .strictObject({
    cases: z
      .array(ComparisonCase)
      .min(2)
      .max(10)
      .meta({ description: "2 to 10 cases; every other one is compared with the first." }),
    withinOfWidth: quantity(
      "How far an edge of a window may move for the setting to carry over, as a fraction of the window's width; 0.1 when absent.",
      0,
      1,
    ).optional(),
  })
  .meta({ id: "ComparisonRequest" });
export type ComparisonRequest = z.output<typeof ComparisonRequest>;

const Side = z
  .strictObject({
    pointer: z.string().meta({ description: "JSON Pointer into the request of this case." }),
    stage: z.string().nullable(),
    outcome: Outcome,
    required: z.boolean(),
    value: z.number().nullable(),
    pass: Bounds,
    statement: z.string(),
  })
  .meta({ id: "ComparedFindingSide", description: "The finding in one of both cases." });

export const ComparedFinding = z
  .strictObject({
    check: z.string(),
    quantity: z.string(),
    unit: z.string(),
    acquisition: z.string().nullable(),
    ion: z.string().nullable(),
    changed: z
      .array(z.enum(["added", "removed", "outcome", "value", "limits", "required"]))
      .meta({ description: "added and removed stand alone: the finding is there in one case only." }),
    direction: z.enum(["better", "worse", "same", "not-comparable"]).meta({
      description: "By the outcomes, in the order pass, caution, indeterminate, fail.",
    }),
    base: Side.nullable(),
    other: Side.nullable(),
  })
  .meta({ id: "ComparedFinding", description: "A finding that is not the same in both cases." });
export type ComparedFinding = z.output<typeof ComparedFinding>;

const SideOfSetting = z
  .strictObject({
    stage: z.string(),
    setMz: z.number(),
    window: z.strictObject({ mzLow: z.number(), mzHigh: z.number(), at: WidthHeight }).nullable(),
    cutoffMz: z.number().nullable(),
  })
  .meta({ id: "ComparedSettingSide", description: "What the setting comes to in one of both cases." });

export const ComparedSetting = z
  .strictObject({
    acquisition: z.string(),
    ion: z.string(),
    carriesOver: z.boolean().nullable().meta({ description: "null where it cannot be told." }),
    reason: z.enum([
      "window-moved",
      "cutoff-moved",
      "not-known",
      "other-height",
      "only-in-base",
      "only-in-other",
    ]),
    shiftOfWidth: z.number().nullable().meta({
      description:
        "By how much the edge that moved more did so, as a fraction of the width in the first case; of a cutoff, as a fraction of its distance from the ion.",
    }),
    base: SideOfSetting.nullable(),
    other: SideOfSetting.nullable(),
  })
  .meta({
    id: "ComparedSetting",
    description: "A setting that does not carry over, or of which it cannot be told.",
  });
export type ComparedSetting = z.output<typeof ComparedSetting>;

const CaseFound = z
  .strictObject({ label: z.string(), verdict: Verdict, outcomeCounts: SignOffResult.shape.outcomeCounts })
  .meta({ id: "ComparisonBase" });

export const ComparisonAnswer = z
  .strictObject({
    base: CaseFound,
    others: z.array(
      z
        .strictObject({
          ...CaseFound.shape,
          statement: z.string().meta({ description: "What the change does, for a person." }),
          inputChanged: z
            .array(z.enum(["instrument", "method", "criteria"]))
            .meta({ description: "Which parts of the input are not those of the first case." }),
          findings: z.array(ComparedFinding),
          findingsUnchanged: z.int().min(0),
          settings: z.array(ComparedSetting),
          settingsCarriedOver: z.int().min(0),
        })
        .meta({ id: "ComparisonOther" }),
    ),
    withinOfWidth: z.number(),
    tolerance: z.number().meta({ description: "Values that differ by less, relatively, are the same." }),
    engine: Engine,
  })
  .meta({ id: "ComparisonAnswer" });
export type ComparisonAnswer = z.output<typeof ComparisonAnswer>;
