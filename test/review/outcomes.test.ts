import { describe, expect, it } from "vitest";
import { CHECKS } from "../../services/review/checks.ts";
import { Outcome } from "../../services/review/finding.ts";
import { findings } from "./laboratory.ts";
import { OUTCOMES_IN_CELL_AND_TIME } from "./outcomes-in-cell-and-time.ts";
import { OUTCOMES_IN_FILTERS } from "./outcomes-in-filters.ts";

const OUTCOMES = [...OUTCOMES_IN_FILTERS, ...OUTCOMES_IN_CELL_AND_TIME];

const ROWS = OUTCOMES.flatMap(({ check, quantity, requests }) =>
  Object.entries(requests).map(([outcome, request]) => ({ check, quantity, outcome, request })),
);

describe("outcomes of the checks", () => {
  it.each(ROWS)("$check $quantity can be $outcome", ({ check, quantity, outcome, request }) => {
    expect(findings(request, check, quantity).map((found) => found.outcome)).toContain(outcome);
  });

  it("are all shown, for every quantity of the catalogue, or said to be impossible", () => {
    const catalogued = CHECKS.flatMap(({ id, quantities }) =>
      quantities.map(({ quantity }) => `${id} ${quantity}`),
    );
    expect(OUTCOMES.map(({ check, quantity }) => `${check} ${quantity}`).sort()).toEqual(catalogued.sort());
    for (const { check, quantity, requests, never = {} } of OUTCOMES) {
      const named = [...Object.keys(requests), ...Object.keys(never)].sort();
      expect(named, `${check} ${quantity}`).toEqual([...Outcome.options].sort());
    }
  });

  it("name at least one missing input where they are indeterminate, and only there", () => {
    for (const { check, quantity, outcome, request } of ROWS) {
      for (const found of findings(request, check, quantity)) {
        const pointers = found.missing.every((pointer) =>
          /^\/(instrument|method)(\/[A-Za-z0-9_]+)+$/.test(pointer),
        );
        expect(pointers, found.missing.join(" ")).toBe(true);
        expect(found.missing.length > 0, `${check} ${quantity} ${outcome}`).toBe(
          found.outcome === "indeterminate",
        );
      }
    }
  });

  it("carry a value only where one was judged, and its unit is the catalogue's", () => {
    const units = new Map(
      CHECKS.flatMap(({ id, quantities }) =>
        quantities.map(({ quantity, unit }) => [`${id} ${quantity}`, unit]),
      ),
    );
    for (const { check, quantity, request } of ROWS) {
      for (const found of findings(request, check, quantity)) {
        expect(found.unit).toBe(units.get(`${check} ${quantity}`));
        if (found.outcome === "indeterminate" || found.outcome === "not-applicable") {
          expect([found.value, found.margin, found.passesIf]).toEqual([null, null, null]);
        }
        if (found.outcome === "pass") expect(found.passesIf).toBeNull();
      }
    }
  });
});
