import { flightTimeOf, type Residence } from "../../contract/residence.ts";
import type { RodSet } from "../../contract/rod-set.ts";
import { secondsFromMicroseconds } from "../../contract/si.ts";

/** Flight time in s through one stage, or the JSON Pointers of what it does not follow without. */
export interface Flight {
  readonly time: number | null;
  readonly missing: readonly string[];
}

/** The flight of an ion through a stage at `pointer`. A time that is stated needs no rods. */
export function flightThrough(
  stage: { readonly residence?: Residence | undefined; readonly rodSet?: RodSet | undefined },
  pointer: string,
  mz: number,
): Flight {
  const { residence, rodSet } = stage;
  if (residence === undefined) return { time: null, missing: [`${pointer}/residence`] };
  if ("flightTime_us" in residence) {
    return { time: secondsFromMicroseconds(residence.flightTime_us), missing: [] };
  }
  if (rodSet === undefined) return { time: null, missing: [`${pointer}/rodSet`] };
  const time = flightTimeOf(residence, rodSet, mz);
  return { time, missing: time === null ? [`${pointer}/rodSet/rodLength_mm`] : [] };
}
