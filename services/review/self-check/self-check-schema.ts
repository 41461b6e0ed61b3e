import { z } from "zod";
import { Engine, Seal } from "../record/record-schema.ts";

export const Host = z
  .strictObject({ runtime: z.string(), version: z.string(), architecture: z.string(), system: z.string() })
  .meta({ id: "Host", description: "What runs the service; no names." });
export type Host = z.output<typeof Host>;

const CapabilityChecked = z
  .strictObject({
    capability: z.string(),
    source: z.string().meta({ description: "Where the reference values come from." }),
    values: z.int().meta({ description: "How many values were recomputed." }),
    worstDeviation: z
      .number()
      .nullable()
      .meta({ description: "null where a value did not come out at all." }),
    worstAt: z.string(),
    kind: z.enum(["relative", "absolute", "relative-above-1"]).meta({
      description:
        "relative: over the reference. absolute: in the unit of the value. relative-above-1: over the reference where that is above 1, else absolute.",
    }),
    limit: z.number(),
    outcome: z.enum(["pass", "fail"]),
  })
  .meta({ id: "CapabilityChecked" });

export const SelfCheckAnswer = z
  .strictObject({
    outcome: z
      .enum(["pass", "fail"])
      .meta({ description: "pass when every capability is within its limit." }),
    capabilities: z.array(CapabilityChecked),
    engine: Engine,
    host: Host.nullable().meta({ description: "null where the service was not told what it runs on." }),
    digest: z
      .string()
      .meta({ description: "SHA-256 of the canonical JSON (RFC 8785) of the four members above." }),
    seal: Seal.nullable().meta({
      description: "With the time of the check; null where the service holds no key.",
    }),
  })
  .meta({
    id: "SelfCheckAnswer",
    description:
      "Shows that this installation computes as it should. It validates neither a method nor the laboratory's use of the service.",
  });
export type SelfCheckAnswer = z.output<typeof SelfCheckAnswer>;
