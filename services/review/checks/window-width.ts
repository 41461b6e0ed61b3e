import { widthInMz } from "../../contract/width.ts";
import { defineCheck, type Limits } from "../check.ts";
import { boundsOf, type Limit, UpperLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { eachIon } from "./each-ion.ts";

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
      (filtering) => difference(filtering, limits),
      ["ion", "scan-end"],
    ),
});

function difference(filtering: Filtering, limits: Limits<Limit>): Observation | null {
  const { window, filter, acquisition, claim, ion } = filtering;
  // A width that is only claimed agrees with itself, which shows nothing.
  if (claim === null || filter.stage.operatingPoint?.by === "stated") return null;
  const about = {
    quantity: "width-against-claim",
    unit: "1",
    subject: { pointer: filtering.pointer, acquisition: acquisition.id, stage: filter.stage.name, ion },
  };
  const pass = boundsOf(limits.pass);
  const caution = boundsOf(limits.caution);
  if (window.kind === "unknown") {
    return { ...about, kind: "indeterminate", missing: window.missing, statement: window.reason };
  }
  if (window.kind === "empty") {
    return {
      ...about,
      kind: "impossible",
      evidence: window.evidence,
      pass,
      caution,
      passesIf: null,
      statement: `${filter.stage.name}: ${window.reason}`,
    };
  }
  if (window.height !== claim.width.at) {
    return {
      ...about,
      kind: "indeterminate",
      missing: [`${claim.pointer}/at`],
      statement: `The method claims a width at ${claim.width.at}, the instrument's is known at ${window.height}; the two differ and are not compared.`,
    };
  }
  const claimed = widthInMz(claim.width, filtering.setMz);
  const observed = widthOf(window);
  return {
    ...about,
    kind: "value",
    value: Math.abs(observed - claimed),
    evidence: window.evidence,
    pass,
    caution,
    passesIf:
      pass.max === null
        ? null
        : {
            input: claim.pointer,
            min: Math.max(observed - pass.max, 0),
            max: observed + pass.max,
            unit: "1",
          },
    statement:
      `At m/z ${filtering.setMz} ${filter.stage.name} is ${digits(observed, 4)} wide at ${window.height}; the method claims ${digits(claimed, 4)}.` +
      (window.note === null ? "" : ` ${window.note}`),
  };
}
