import { z } from "zod";

export const Outcome = z.enum(["pass", "caution", "fail", "indeterminate", "not-applicable"]).meta({
  id: "Outcome",
  description: "indeterminate names what is missing and never counts as a pass.",
});
export type Outcome = z.output<typeof Outcome>;

export const Evidence = z.enum(["measured", "computed", "stated"]).meta({
  id: "Evidence",
  description:
    "How a finding knows: from observed peaks, from the physics of stated voltages and rods, or only from a claim. What follows from a claim proves nothing.",
});
export type Evidence = z.output<typeof Evidence>;

export const Bounds = z
  .strictObject({ min: z.number().nullable(), max: z.number().nullable() })
  .meta({ id: "Bounds", description: "A closed interval; null is unbounded on that side." });
export type Bounds = z.output<typeof Bounds>;

export const Subject = z
  .strictObject({
    pointer: z.string().meta({ description: "JSON Pointer into the request." }),
    acquisition: z.string().optional(),
    stage: z.string().optional(),
    ion: z.string().optional().meta({ description: "Label of the ion, or its m/z." }),
  })
  .meta({ id: "Subject", description: "What a finding is about." });
export type Subject = z.output<typeof Subject>;

export const PassesIf = z
  .strictObject({
    input: z.string().meta({ description: "JSON Pointer of the input that would have to change." }),
    min: z.number().nullable(),
    max: z.number().nullable(),
    unit: z.string().meta({ description: "UCUM unit of the bounds, or of the input." }),
  })
  .meta({
    id: "PassesIf",
    description: "The interval of one input in which the finding would pass, all else unchanged.",
  });
export type PassesIf = z.output<typeof PassesIf>;

export const Finding = z
  .strictObject({
    check: z.string(),
    quantity: z.string(),
    subject: Subject,
    outcome: Outcome,
    required: z.boolean().meta({ description: "Whether this finding counts in the verdict." }),
    evidence: Evidence.meta({ description: "stated where nothing could be judged." }),
    value: z.number().nullable(),
    unit: z.string().meta({ description: "UCUM unit of value and bounds; 1 for m/z and ratios." }),
    pass: Bounds,
    caution: Bounds,
    margin: z
      .number()
      .nullable()
      .meta({ description: "Signed distance of value to the nearer pass bound, negative outside." }),
    passesIf: PassesIf.nullable(),
    missing: z.array(z.string()).meta({ description: "JSON Pointers of the inputs that a judgement lacks." }),
    statement: z.string(),
    basis: z.string().meta({ description: "Where the limits come from." }),
  })
  .meta({ id: "Finding", description: "One judged quantity of one subject." });
export type Finding = z.output<typeof Finding>;

/** Order of severity: a set of findings is as bad as its worst. */
const SEVERITY: readonly Outcome[] = ["fail", "indeterminate", "caution", "pass"];

/** The worst outcome, or null where nothing was judged. */
export function worstOutcome(outcomes: Iterable<Outcome>): Exclude<Outcome, "not-applicable"> | null {
  const present = new Set(outcomes);
  return (SEVERITY.find((outcome) => present.has(outcome)) ?? null) as Exclude<
    Outcome,
    "not-applicable"
  > | null;
}
