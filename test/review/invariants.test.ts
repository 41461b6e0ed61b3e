import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { CHECKS } from "../../services/review/checks.ts";
import type { Finding, Outcome } from "../../services/review/finding.ts";
import { signOff } from "../../services/review/sign-off.ts";
import { SignOffAnswer } from "../../services/review/sign-off-answer.ts";
import { signOffErrors } from "../../services/review/sign-off-rules.ts";
import { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import { arbitraryRequest } from "./arbitrary-requests.ts";

const Answer = SignOffAnswer.omit({ record: true });

function holds(property: (request: SignOffRequest) => void): void {
  fc.assert(fc.property(arbitraryRequest, property), { numRuns: 200 });
}

/** The verdict as the contract words it, written down a second time. */
function verdictOf(findings: readonly Finding[]): string {
  const counting = findings.filter(({ required }) => required).map(({ outcome }) => outcome);
  if (counting.includes("fail")) return "fail";
  if (counting.includes("indeterminate")) return "indeterminate";
  if (counting.includes("caution")) return "caution";
  return counting.includes("pass") ? "pass" : "indeterminate";
}

function everyNumber(value: unknown, visit: (number: number) => void): void {
  if (typeof value === "number") visit(value);
  else if (typeof value === "object" && value !== null) {
    for (const member of Object.values(value)) everyNumber(member, visit);
  }
}

describe("a sign-off of any legal request", () => {
  it("is of requests that the service takes", () => {
    holds((request) => {
      expect(SignOffRequest.safeParse(request).error).toBeUndefined();
      expect(signOffErrors(request)).toEqual([]);
    });
  });

  it("is an answer of the contract, with finite numbers only", () => {
    holds((request) => {
      const answer = signOff(request);
      expect(Answer.safeParse(answer).error).toBeUndefined();
      everyNumber(answer, (number) => expect(Number.isFinite(number)).toBe(true));
      expect(JSON.stringify(answer)).not.toMatch(/NaN|Infinity|undefined/);
    });
  });

  it("says the same each time, and leaves the request as it was", () => {
    holds((request) => {
      const before = JSON.stringify(request);
      const first = JSON.stringify(signOff(request));
      expect(JSON.stringify(signOff(JSON.parse(before) as SignOffRequest))).toBe(first);
      expect(JSON.stringify(request)).toBe(before);
    });
  });

  it("has the verdict of the findings that count, and counts that add up", () => {
    holds((request) => {
      const { verdict, findings, outcomeCounts } = signOff(request);
      expect(verdict).toBe(verdictOf(findings));
      for (const [outcome, count] of Object.entries(outcomeCounts)) {
        expect(findings.filter((each) => each.outcome === outcome)).toHaveLength(count);
      }
    });
  });

  it("shows every indeterminate finding as required or as not shown", () => {
    holds((request) => {
      const { findings, notShown } = signOff(request);
      const open = findings.filter(({ outcome, required }) => outcome === "indeterminate" && !required);
      expect(notShown.reduce((sum, each) => sum + each.findings, 0)).toBe(open.length);
      for (const { check, quantity, missing } of open) {
        expect(notShown.some((each) => each.check === check && each.quantity === quantity)).toBe(true);
        expect(missing.length).toBeGreaterThan(0);
        expect(new Set(missing).size).toBe(missing.length);
      }
    });
  });

  it("points into the request with every subject, and to an input or its absence with every other pointer", () => {
    holds((request) => {
      for (const { subject, missing, passesIf } of signOff(request).findings) {
        // A set m/z may be absent: then the ion's own is taken, and the member that would set it is named.
        if (!/\/set[A-Za-z]*Mz$/.test(subject.pointer))
          expect(isPresent(request, subject.pointer)).toBe(true);
        const inputs = [...missing, ...(passesIf === null ? [] : [passesIf.input])];
        for (const input of inputs) expect(isReachable(request, input), input).toBe(true);
      }
    });
  });

  it("judges value against bounds as they stand in the finding", () => {
    holds((request) => {
      for (const finding of signOff(request).findings) {
        const { value, pass, caution, outcome, margin } = finding;
        if (value === null) continue;
        const expected: Outcome = inside(value, pass) ? "pass" : inside(value, caution) ? "caution" : "fail";
        expect(outcome).toBe(expected);
        if (margin !== null) expect(margin >= 0).toBe(outcome === "pass");
      }
    });
  });

  it("keeps to the checks and quantities of the catalogue, in its order", () => {
    const order = CHECKS.map(({ id }) => id as string);
    const known = new Set(
      CHECKS.flatMap(({ id, quantities }) => quantities.map((each) => `${id} ${each.quantity} ${each.unit}`)),
    );
    holds((request) => {
      const { findings } = signOff(request);
      for (const { check, quantity, unit } of findings)
        expect(known).toContain(`${check} ${quantity} ${unit}`);
      const places = findings.map(({ check }) => order.indexOf(check));
      expect(places).toEqual([...places].sort((one, other) => one - other));
    });
  });
});

function inside(value: number, { min, max }: Finding["pass"]): boolean {
  return (min === null || value >= min) && (max === null || value <= max);
}

function at(document: unknown, path: readonly string[]): unknown {
  return path.reduce<unknown>(
    (value, step) =>
      typeof value === "object" && value !== null ? (value as Record<string, unknown>)[step] : undefined,
    document,
  );
}

function isPresent(document: unknown, pointer: string): boolean {
  return at(document, pointer.split("/").slice(1)) !== undefined;
}

/** The member itself may be missing, or an object that would hold it; not more. */
function isReachable(document: unknown, pointer: string): boolean {
  const path = pointer.split("/").slice(1);
  return at(document, path.slice(0, -1)) !== undefined || at(document, path.slice(0, -2)) !== undefined;
}
