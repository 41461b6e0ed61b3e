import { type Dc, dcFromCanonical, type Rf, rfFromCanonical } from "../../contract/drive.ts";
import { DcVolts, RfVolts } from "../../contract/quantity.ts";
import type { Lever } from "../lever.ts";

/** A stated RF voltage as the lever of V, zero-to-peak and pole-to-ground. */
export function rfLever(rf: Rf, pointer: string): Lever {
  return {
    input: `${pointer}/volts`,
    unit: "V",
    range: RfVolts,
    inputFor: (volts) => rfFromCanonical(volts, rf).volts,
  };
}

/**
 * A stated DC as the lever of U, pole-to-ground, with the sign that it has: only its magnitude counts, so its range ends
 * at zero. Of two pairs against ground the x pair moves.
 */
export function dcLever(dc: Dc, pointer: string): Lever {
  const stated = "pairX_V" in dc ? dc.pairX_V - dc.pairY_V : dc.volts;
  const origin = "pairX_V" in dc ? dc.pairY_V : 0;
  const sign = stated < 0 ? -1 : 1;
  const between = "pairX_V" in dc ? "pole-and-pole" : dc.between;
  return {
    input: `${pointer}/${"pairX_V" in dc ? "pairX_V" : "volts"}`,
    unit: "V",
    range: sign > 0 ? { ...limits(), minValue: origin } : { ...limits(), maxValue: origin },
    falling: sign < 0,
    inputFor: (volts) => origin + sign * (dcFromCanonical(volts, { between }) as { volts: number }).volts,
  };
}

function limits() {
  return { minValue: DcVolts.minValue, maxValue: DcVolts.maxValue };
}
