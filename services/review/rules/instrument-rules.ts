import { sinusoid, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import type { Instrument, Stage } from "../instrument.ts";
import { duplicates } from "./duplicates.ts";

/** The rules between the members of an instrument. */
export function instrumentErrors(instrument: Instrument): ErrorItem[] {
  return [
    ...duplicates(instrument.stages, "name", (index) => `/instrument/stages/${index}/name`),
    ...instrument.stages.flatMap((stage, index) => stageErrors(stage, `/instrument/stages/${index}`)),
  ];
}

function stageErrors(stage: Stage, pointer: string): ErrorItem[] {
  switch (stage.role) {
    case "ion-trap":
      return [
        {
          pointer: `${pointer}/role`,
          code: "ion-trap-not-computed",
          detail:
            "role is ion-trap; the formulas of a linear rod set do not hold in an ion trap, so it is not computed. Expected mass-filter, collision-cell or ion-guide.",
        },
      ];
    case "mass-filter": {
      const errors =
        stage.rodSet === undefined ? [] : sinusoidalQuadrupole(stage.rodSet, `${pointer}/rodSet`);
      if (stage.mode !== "rf-only" && stage.operatingPoint === undefined) {
        errors.push({
          pointer: `${pointer}/operatingPoint`,
          code: "missing-member",
          detail: "operatingPoint is missing; a mass filter needs it unless its mode is rf-only.",
        });
      }
      if (stage.rated !== undefined && stage.rated.mzLow >= stage.rated.mzHigh) {
        errors.push({
          pointer: `${pointer}/rated/mzHigh`,
          code: "not-above",
          detail: `mzHigh is ${stage.rated.mzHigh}; it must be above mzLow, ${stage.rated.mzLow}.`,
        });
      }
      return errors;
    }
    default:
      return sinusoid(stage.rodSet?.waveform, `${pointer}/rodSet/waveform`);
  }
}
