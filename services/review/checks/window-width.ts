import { widthInMz } from "../../contract/width.ts";
import { defineCheck, type Limits } from "../check.ts";
import { passesIfWithin } from "../lever.ts";
import { boundsOf, type Limit, UpperLimit } from "../limit.ts";
import type { Observation, Reading } from "../observation.ts";
import { type Claim, claimedWidthLever } from "../resolve/operating-point.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { eachIon } from "./each-ion.ts";
import { passesIfDcChanges } from "./window-that-passes.ts";

export const windowWidth = defineCheck({
  id: "window-width",
  computes:
    "Difference in m/z between the width that is observed or computed and the width that the method claims.",
  needs: [
    "acquisition/precursorWidth",
    "acquisition/productWidth",
    "acquisition/width",
    "stages/operatingPoint",
  ],
  quantities: [
    { quantity: "width-against-claim", unit: "1", meaning: "difference of the widths in m/z, without sign" },
  ],
  requiredByDefault: true,
  limit: UpperLimit,
  defaults: { pass: { max: 0.1 }, caution: { max: 0.2 } },
  basis: "Widths within 0.1 of the claim, 0.2 at most: common practice, no source.",
  examine: (method, limits) =>
    eachIon(
      method,
      "width-against-claim",
      "claims no width that the instrument's own could be held against",
      (filtering): Observation | null => {
        const { claim, filter, pointer, acquisition, ion } = filtering;
        // A width that is only claimed agrees with itself, which shows nothing.
        if (claim === null || filter.stage.operatingPoint?.by === "stated") return null;
        return {
          quantity: "width-against-claim",
          unit: "1",
          subject: { pointer, acquisition: acquisition.id, stage: filter.stage.name, ion },
          ...againstClaim(filtering, claim, limits),
        };
      },
      ["ion", "scan-end"],
    ),
});

function againstClaim(filtering: Filtering, claim: Claim, limits: Limits<Limit>): Reading {
  const { window, filter, setMz } = filtering;
  const { name } = filter.stage;
  const pass = boundsOf(limits.pass);
  const caution = boundsOf(limits.caution);
  const claimed = widthInMz(claim.width, setMz);
  if (window.kind === "unknown") {
    return { kind: "indeterminate", missing: window.missing, statement: window.reason };
  }
  if (window.kind === "no-window") {
    return {
      kind: "impossible",
      evidence: window.evidence,
      pass,
      caution,
      passesIf: () =>
        passesIfDcChanges(
          filtering,
          (open) =>
            open.kind === "window" &&
            claim.width.at === "edges" &&
            (pass.max === null || Math.abs(widthOf(open) - claimed) <= pass.max),
        ),
      statement: `${name}: ${window.reason}`,
    };
  }
  if (window.height !== claim.width.at) {
    return {
      kind: "indeterminate",
      missing: [`${claim.pointer}/at`],
      statement: `The method claims a width at ${claim.width.at}, the instrument's is known at ${window.height}; the two differ and are not compared.`,
    };
  }
  const observed = widthOf(window);
  return {
    kind: "value",
    value: Math.abs(observed - claimed),
    evidence: window.evidence,
    pass,
    caution,
    passesIf: () =>
      pass.max === null
        ? null
        : passesIfWithin(claimedWidthLever(claim.width, `${claim.pointer}/value`, setMz), {
            // Smaller than any claim that a request can make.
            min: Math.max(observed - pass.max, 1e-9),
            max: observed + pass.max,
          }),
    statement:
      `At m/z ${setMz} ${name} is ${digits(observed, 4)} wide at ${window.height}; the method claims ${digits(claimed, 4)}.` +
      (window.note === null ? "" : ` ${window.note}`),
  };
}
