import { type Rf, rfToCanonical } from "../../contract/drive.ts";

type Reading = Pick<Rf, "as" | "between">;

/**
 * A rod of a round-rod set that approximates the hyperbolic field best has this many field radii: taking the one for the
 * other multiplies m/z by its square, 0.76 or 1.32. Common practice, no source.
 */
const ROD_RADIUS_OVER_FIELD_RADIUS = 1.148;
const ROD_RADIUS_FACTOR = ROD_RADIUS_OVER_FIELD_RADIUS * ROD_RADIUS_OVER_FIELD_RADIUS;
const ANGULAR_FACTOR = 4 * Math.PI * Math.PI;

/** How near to a factor a ratio must lie for its cause to be named. */
const RECOGNISED_WITHIN = 0.03;

/** What multiplies the m/z at the apex when lengths or frequencies are mistaken: m/z is proportional to V / (f r0)^2. */
const GEOMETRY: readonly { readonly factor: number; readonly cause: string }[] = [
  { factor: 1 / 4, cause: "the field diameter is stated as the field radius" },
  { factor: 4, cause: "the field radius was halved as if it were a diameter" },
  { factor: 1 / ROD_RADIUS_FACTOR, cause: "the rod radius is stated as the field radius" },
  { factor: ROD_RADIUS_FACTOR, cause: "the field radius was reduced as if it were a rod radius" },
  { factor: 1 / ANGULAR_FACTOR, cause: "the angular frequency is stated as the frequency" },
  { factor: ANGULAR_FACTOR, cause: "the frequency was divided by 2 pi" },
];

const READINGS: readonly Reading[] = (["zero-to-peak", "peak-to-peak", "rms"] as const).flatMap((as) =>
  (["pole-and-ground", "pole-and-pole"] as const).map((between) => ({ as, between })),
);

/** Every single mistake that would put this factor between m/z as computed and as stated. */
export function causesOf(factor: number, stated: Reading): string[] {
  const byReading = READINGS.filter(({ as, between }) => as !== stated.as || between !== stated.between).map(
    (actual) => ({
      factor: rfToCanonical({ ...stated, volts: 1 }) / rfToCanonical({ ...actual, volts: 1 }),
      cause: `the RF is ${readingText(actual)} but stated as ${readingText(stated)}`,
    }),
  );
  return [...byReading, ...GEOMETRY]
    .filter((mistake) => Math.abs(factor / mistake.factor - 1) <= RECOGNISED_WITHIN)
    .map(({ cause }) => cause);
}

function readingText({ as, between }: Reading): string {
  return `${as} ${between === "pole-and-ground" ? "between pole and ground" : "between the poles"}`;
}
