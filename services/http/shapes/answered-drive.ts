import {
  type CanonicalVolts,
  type Drive,
  driveFromCanonical,
  type VoltageConvention,
  type WaveShape,
} from "../../contract/drive.ts";
import { DcVolts, RfVolts } from "../../contract/quantity.ts";

/**
 * A computed drive in the convention of the request, or null when its volts are beyond what a request may state: such
 * a drive could not be sent back, and no supply gives it.
 */
export function answeredDrive(
  volts: CanonicalVolts,
  convention: VoltageConvention,
  shape: WaveShape = "sinusoid",
): Drive | null {
  const drive = driveFromCanonical(volts, convention, shape);
  const { dc } = drive;
  const sayable =
    RfVolts.safeParse(drive.rf.volts).success &&
    (dc === undefined || !("volts" in dc) || DcVolts.safeParse(dc.volts).success);
  return sayable ? drive : null;
}
