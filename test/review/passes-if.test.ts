import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Finding } from "../../services/review/finding.ts";
import { signOffErrors } from "../../services/review/sign-off-rules.ts";
import { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import { arbitraryRequest } from "./arbitrary-requests.ts";
import { signedOff } from "./laboratory.ts";
import { OUTCOMES_IN_CELL_AND_TIME } from "./outcomes-in-cell-and-time.ts";
import { OUTCOMES_IN_FILTERS } from "./outcomes-in-filters.ts";
import { withInput } from "./with-input.ts";

/** The ends of the interval and its middle; an open end is tried a little further out. */
function trials({ min, max }: NonNullable<Finding["passesIf"]>): number[] {
  if (min !== null && max !== null) return [min, max, (min + max) / 2];
  if (min !== null) return [min, min + Math.abs(min) * 0.01];
  return max === null ? [] : [max, max - Math.abs(max) * 0.01];
}

/** A finding about the same thing; what a stage is judged by may change with the input. */
function same(one: Finding, other: Finding): boolean {
  const ofStage = one.subject.pointer.split("/").length === 4 && one.subject.stage !== undefined;
  return (
    one.check === other.check &&
    one.quantity === other.quantity &&
    one.subject.pointer === other.subject.pointer &&
    one.subject.stage === other.subject.stage &&
    (ofStage || one.subject.acquisition === other.subject.acquisition)
  );
}

function expectToPassWhenFedBack(request: SignOffRequest, finding: Finding, place: number): void {
  const { passesIf } = finding;
  for (const value of trials(passesIf!)) {
    const changed = withInput(request, passesIf!.input, value);
    const about = `${finding.check} ${finding.quantity} with ${passesIf!.input} = ${value}: ${finding.statement}`;
    const accepted = SignOffRequest.safeParse(changed);
    expect(accepted.success, `${about} is refused`).toBe(true);
    // Another rule may forbid the value: an end of a scan beyond the other, for one.
    if (signOffErrors(changed).length > 0) continue;
    const candidates = signedOff(changed).findings.filter((each) => same(each, finding));
    const again = candidates[candidates.length === 1 ? 0 : place]!;
    expect(again.outcome, `${about}\n${again.statement}`).toBe("pass");
  }
}

function feedBack(request: SignOffRequest): number {
  let tried = 0;
  const { findings } = signedOff(request);
  for (const finding of findings) {
    if (finding.passesIf === null) continue;
    const place = findings.filter((each) => same(each, finding)).indexOf(finding);
    expectToPassWhenFedBack(request, finding, place);
    tried++;
  }
  return tried;
}

describe("what a finding says would make it pass", () => {
  it("does make it pass, in every row of the tables of outcomes", () => {
    for (const { check, quantity, requests } of [...OUTCOMES_IN_FILTERS, ...OUTCOMES_IN_CELL_AND_TIME]) {
      for (const outcome of ["caution", "fail"] as const) {
        const request = requests[outcome];
        if (request === undefined) continue;
        const missed = signedOff(request).findings.filter(
          (each) => each.check === check && each.quantity === quantity && each.outcome === outcome,
        );
        for (const finding of missed)
          expect(finding.passesIf, `${check} ${quantity} ${outcome}`).not.toBeNull();
        expect(feedBack(request)).toBeGreaterThan(0);
      }
    }
  });

  it("does make it pass, in random methods", () => {
    let tried = 0;
    fc.assert(
      fc.property(arbitraryRequest, (request) => {
        tried += feedBack(request);
      }),
      { numRuns: 150 },
    );
    expect(tried).toBeGreaterThan(400);
  });
});
