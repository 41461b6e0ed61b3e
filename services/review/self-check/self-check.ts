import { digestOf } from "../record/digest.ts";
import type { Engine } from "../record/record-schema.ts";
import { seal } from "../record/seal.ts";
import type { SealingKey } from "../record/seal-keys.ts";
import { type Capability, deviationOf } from "./capability.ts";
import { CHARACTERISTIC_VALUE_CHECKS } from "./characteristic-value-checks.ts";
import { MASS_FILTER_CHECKS } from "./mass-filter-checks.ts";
import { RECORD_CHECKS } from "./record-checks.ts";
import { RF_ONLY_CHECKS } from "./rf-only-checks.ts";
import type { Host, SelfCheckAnswer } from "./self-check-schema.ts";
import { STABILITY_CHECKS } from "./stability-checks.ts";

const CAPABILITIES: readonly Capability[] = [
  ...CHARACTERISTIC_VALUE_CHECKS,
  ...STABILITY_CHECKS,
  ...MASS_FILTER_CHECKS,
  ...RF_ONLY_CHECKS,
  ...RECORD_CHECKS,
];

/** Recomputes the reference values on this machine. */
export function selfCheck(engine: Engine, capabilities = CAPABILITIES): SelfCheckAnswer {
  const rows = capabilities.map(checked);
  const outcome = rows.every((row) => row.outcome === "pass") ? "pass" : "fail";
  return withDigest({ outcome, capabilities: rows, engine: { ...engine }, host: null });
}

function checked({
  capability,
  source,
  kind,
  limit,
  values,
}: Capability): SelfCheckAnswer["capabilities"][number] {
  const deviations = values().map((value) => ({ at: value.at, deviation: deviationOf(kind, value) }));
  const worst = deviations.reduce((one, other) => (other.deviation > one.deviation ? other : one));
  return {
    capability,
    source,
    values: deviations.length,
    worstDeviation: Number.isFinite(worst.deviation) ? worst.deviation : null,
    worstAt: worst.at,
    kind,
    limit,
    outcome: worst.deviation <= limit ? "pass" : "fail",
  };
}

function withDigest(sheet: Omit<SelfCheckAnswer, "digest" | "seal">): SelfCheckAnswer {
  return { ...sheet, digest: digestOf(sheet), seal: null };
}

/** The sheet with what it was made on, dated and sealed where there is a key. */
export async function sealedSelfCheck(
  { digest: _digest, seal: _seal, ...sheet }: SelfCheckAnswer,
  host: Host | null,
  key: SealingKey | null,
  now: () => Date,
): Promise<SelfCheckAnswer> {
  const whole = withDigest({ ...sheet, host });
  if (key === null) return whole;
  return { ...whole, seal: { jws: await seal(whole.digest, now(), "rodset-self-check-seal", key) } };
}
