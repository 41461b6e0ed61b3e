import type { AnyEndpoint } from "./endpoint.ts";
import { about } from "./endpoints/about.ts";
import { driftBudget } from "./endpoints/drift-budget.ts";
import { mathieuParameters } from "./endpoints/mathieu-parameters.ts";
import { mzCalibration } from "./endpoints/mz-calibration.ts";
import { passband } from "./endpoints/passband.ts";
import { peakProfile } from "./endpoints/peak-profile.ts";
import { problems } from "./endpoints/problems.ts";
import { rfOnly } from "./endpoints/rf-only.ts";
import { scanTable } from "./endpoints/scan-table.ts";
import { sealKeys } from "./endpoints/seal-keys.ts";
import { selfCheck } from "./endpoints/self-check.ts";
import { setPoints } from "./endpoints/set-points.ts";
import { signOff } from "./endpoints/sign-off.ts";
import { signOffChecks } from "./endpoints/sign-off-checks.ts";
import { signOffComparison } from "./endpoints/sign-off-comparison.ts";
import { signOffVerification } from "./endpoints/sign-off-verification.ts";
import { stability } from "./endpoints/stability.ts";
import { stabilityRegions } from "./endpoints/stability-regions.ts";
import { trajectory } from "./endpoints/trajectory.ts";
import { transit } from "./endpoints/transit.ts";

/** Every question the service answers, in the order of the document. */
export const ENDPOINTS: readonly AnyEndpoint[] = [
  stability,
  stabilityRegions,
  mathieuParameters,
  rfOnly,
  transit,
  trajectory,
  passband,
  setPoints,
  peakProfile,
  scanTable,
  driftBudget,
  mzCalibration,
  signOff,
  signOffVerification,
  signOffComparison,
  signOffChecks,
  selfCheck,
  sealKeys,
  about,
  problems,
];
