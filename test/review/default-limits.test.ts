import { describe, expect, it } from "vitest";
import { CHECKS } from "../../services/review/checks.ts";
import { DEFAULT_LIMITS } from "./default-limits.ts";
import { finding } from "./laboratory.ts";

const STEP = 1e-9;

describe("default limits", () => {
  it.each(DEFAULT_LIMITS)("$check $quantity turns at $limit", (row) => {
    const { check, quantity, limit, better, outcomes, withValue, exact, step = STEP } = row;
    const away = (limit === 0 ? 1 : limit) * step * (better === "above" ? 1 : -1);
    const [atLimit, beyond] = outcomes;
    const judgedAt = (value: number) => {
      const found = finding(withValue(value), check, quantity);
      // The step must be real: the request gives the value that was asked for, far closer than the step.
      expect(Math.abs(found.value! - value)).toBeLessThan(Math.abs(away) / 4);
      return found.outcome;
    };
    expect(judgedAt(limit + away)).toBe(atLimit);
    expect(judgedAt(limit - away)).toBe(beyond);
    if (exact) {
      expect(finding(withValue(limit), check, quantity).value).toBe(limit);
      expect(judgedAt(limit)).toBe(atLimit);
    }
  });

  it("cover every quantity that has limits", () => {
    const covered = new Set(DEFAULT_LIMITS.map(({ check, quantity }) => `${check} ${quantity}`));
    const limited = CHECKS.filter(({ defaults }) => defaults !== null).flatMap(({ id, quantities }) =>
      quantities.map(({ quantity }) => `${id} ${quantity}`),
    );
    expect([...covered].sort()).toEqual(limited.sort());
  });

  it("stand in the findings beside the value", () => {
    for (const { check, quantity, withValue, limit } of DEFAULT_LIMITS) {
      const { pass, caution } = finding(withValue(limit), check, quantity);
      const bounds = [pass.min, pass.max, caution.min, caution.max];
      const nearest = Math.min(...bounds.flatMap((bound) => (bound === null ? [] : Math.abs(bound - limit))));
      expect(nearest, `${check} ${quantity} at ${limit}`).toBeLessThan(1e-12 * Math.max(1, Math.abs(limit)));
    }
  });
});
