import { z } from "zod";
import { quantity } from "../../contract/quantity.ts";
import { REGIONS_LIMIT } from "../../physics/regions/stability-regions.ts";
import { Region } from "./region.ts";

/** The box that is shown when the query states none: every region that is listed. */
export const WHOLE_BOX = { aMin: -REGIONS_LIMIT, aMax: REGIONS_LIMIT, qMin: 0, qMax: REGIONS_LIMIT };

/** Points on each of the four sides of a region: enough for a smooth line on paper. */
export const POINTS_PER_ARC = 17;

const LARGEST = 100;

function edgeOfBox(description: string, absent: number, minimum = -LARGEST) {
  return quantity(`${description}; ${absent} when absent.`, minimum, LARGEST).optional();
}

export const StabilityRegionsQuery = z
  .strictObject({
    aMin: edgeOfBox("Lower edge of the box in a", WHOLE_BOX.aMin),
    aMax: edgeOfBox("Upper edge of the box in a, above aMin", WHOLE_BOX.aMax),
    qMin: edgeOfBox("Left edge of the box in q", WHOLE_BOX.qMin, 0),
    qMax: edgeOfBox("Right edge of the box in q, above qMin", WHOLE_BOX.qMax, 0),
    pointsPerArc: z
      .int()
      .min(2)
      .max(65)
      .optional()
      .meta({
        description: `Points on each side of a region, both corners included; ${POINTS_PER_ARC} when absent.`,
      }),
  })
  .meta({ id: "StabilityRegionsQuery" });
export type StabilityRegionsQuery = z.output<typeof StabilityRegionsQuery>;

const Corner = z
  .strictObject({
    a: z.number(),
    q: z.number(),
    dcToRfRatio: z.number().meta({ description: "U/V of the scan line through the corner." }),
  })
  .meta({ id: "RegionCorner" });

const Arc = z
  .strictObject({
    curve: z.string().meta({ description: "The curve in the notation of DLMF 28.2, such as a = b_1(q)." }),
    lostTo: z.enum(["x", "y"]).meta({ description: "The rods that take an ion beyond this side." }),
    characteristicExponent: z.int().meta({ description: "β of that plane on the curve." }),
    points: z.array(z.strictObject({ q: z.number(), a: z.number() })),
    chordError: z.number().meta({
      description: "How far, in a, the curve departs from straight lines through the points.",
    }),
  })
  .meta({ id: "RegionArc", description: "One side of a region, from corner to corner." });

const BoundedRegion = z
  .strictObject({
    region: Region,
    corners: z.strictObject({ inner: Corner, highTip: Corner, outer: Corner, lowTip: Corner }).meta({
      description:
        "inner: nearest the origin, where a window is widest. highTip and lowTip: largest and smallest U/V, where it closes. outer: the fourth.",
    }),
    arcs: z.array(Arc).meta({ description: "The four sides, following each other around the region." }),
  })
  .meta({
    id: "BoundedRegion",
    description: "A whole region, whatever the box cuts off it.",
  });

export const StabilityRegionsAnswer = z
  .strictObject({
    box: z.strictObject({ aMin: z.number(), aMax: z.number(), qMin: z.number(), qMax: z.number() }),
    regions: z.array(BoundedRegion).meta({ description: "Those of which some part lies inside the box." }),
    reason: z
      .enum(["outside-computed-domain"])
      .nullable()
      .meta({
        description: `outside-computed-domain: the box reaches beyond |a| or q = ${REGIONS_LIMIT}, where further regions are not listed. POST /v1/stability judges single points there.`,
      }),
  })
  .meta({ id: "StabilityRegionsAnswer" });
export type StabilityRegionsAnswer = z.output<typeof StabilityRegionsAnswer>;
