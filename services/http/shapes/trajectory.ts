import { z } from "zod";
import { Drive } from "../../contract/drive.ts";
import { Ion } from "../../contract/ion.ts";
import { quantity } from "../../contract/quantity.ts";
import { Residence } from "../../contract/residence.ts";
import { RodSet } from "../../contract/rod-set.ts";

const Position_mm = (axis: string) => quantity(`Position in ${axis}, in mm from the axis.`, -50, 50);
const Velocity = (axis: string) => quantity(`Velocity in ${axis}, in m/s.`, -1e6, 1e6);
const Phase = quantity(
  "RF phase in degrees. At 0 the RF on the x pair has the sign opposite to the ion's at its largest.",
  -360,
  360,
);

export const TrajectoryRequest = z
  .strictObject({
    rodSet: RodSet,
    drive: Drive,
    ion: Ion,
    start: z
      .strictObject({
        x_mm: Position_mm("x"),
        y_mm: Position_mm("y"),
        vx_mPerS: Velocity("x"),
        vy_mPerS: Velocity("y"),
        phase_deg: Phase,
      })
      .meta({ id: "TrajectoryStart", description: "How the ion enters the field." }),
    residence: Residence,
    samplesPerCycle: z
      .int()
      .min(1)
      .max(1000)
      .meta({ description: "Samples in each RF cycle; at most 20,000 in all." }),
    fieldAt: z
      .strictObject({ x_mm: Position_mm("x"), y_mm: Position_mm("y"), phase_deg: Phase })
      .optional()
      .meta({ description: "A point at which to state potential, field and force." }),
  })
  .meta({ id: "TrajectoryRequest" });

const Envelope = z
  .strictObject({
    largest_mm: z.number().meta({ description: "Largest distance from the axis during the flight." }),
    at_us: z.number(),
    largestEver_mm: z.number().nullable().meta({
      description:
        "Largest distance that an ion with this start could ever reach in a field without end; null where the motion is unstable.",
    }),
  })
  .meta({ id: "TrajectoryEnvelope" });

const Rods = z
  .strictObject({
    dcToGround_V: z.number(),
    positiveShare: z
      .number()
      .meta({ description: "Share of an RF cycle in which these rods are positive against ground." }),
    peakToGround_V: z.number().meta({ description: "Largest magnitude against ground." }),
  })
  .meta({ id: "RodPotential" });

export const TrajectoryAnswer = z
  .strictObject({
    mz: z.number(),
    a: z.number(),
    q: z.number(),
    flight: z
      .strictObject({
        rfCycles: z.number().meta({ description: "RF cycles in the field if the ion is not lost." }),
        samples: z
          .strictObject({
            time_us: z.array(z.number()),
            x_mm: z.array(z.number()),
            y_mm: z.array(z.number()),
          })
          .meta({
            description:
              "Equally spaced samples from the entrance, and a last one at the exit or where the ion is lost.",
          }),
        envelope: z.strictObject({ x: Envelope, y: Envelope }),
        lost: z
          .strictObject({
            to: z.enum(["x", "y"]),
            at_us: z.number(),
            atCycle: z.number(),
            x_mm: z.number(),
            y_mm: z.number(),
          })
          .nullable()
          .meta({ description: "Where |x| or |y| first reaches r0, found between the samples." }),
        end: z.strictObject({
          time_us: z.number(),
          x_mm: z.number(),
          y_mm: z.number(),
          vx_mPerS: z.number(),
          vy_mPerS: z.number(),
        }),
      })
      .nullable()
      .meta({ description: "null outside the computed domain." }),
    reason: z.enum(["outside-computed-domain"]).nullable(),
    rods: z.strictObject({ x: Rods, y: Rods, rodOffset_V: z.number().nullable() }).meta({
      description:
        "What stands on the rods. The rod offset counts where the drive states both pairs; else ground is the axis.",
    }),
    fieldAt: z
      .strictObject({
        potential_V: z.number().meta({ description: "Against the axis." }),
        fieldX_VPerM: z.number(),
        fieldY_VPerM: z.number(),
        forceX_N: z.number(),
        forceY_N: z.number(),
      })
      .nullable()
      .meta({ description: "null where no point was asked for." }),
  })
  .meta({ id: "TrajectoryAnswer" });
