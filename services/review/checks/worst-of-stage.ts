import type { PassesIf } from "../finding.ts";
import type { Stage } from "../instrument.ts";
import { bothPassIf } from "../lever.ts";
import {
  type About,
  marginOf,
  notApplicable,
  type Observation,
  outcomeOf,
  type Reading,
  textOf,
} from "../observation.ts";
import type { Filtering, Placed, ResolvedMethod } from "../resolve/resolved-method.ts";

/** One set point in a stage, for whose ion the stage is judged. */
export interface InStage {
  readonly acquisition: { readonly id: string };
  readonly ion: string;
}

/** All that the method sets at one filter. */
export function settingsAt({ settings }: ResolvedMethod, filter: Placed<Stage>): readonly Filtering[] {
  return settings.get(filter.pointer) ?? [];
}

/**
 * One observation of a stage, the worst of its settings: one that fails, whatever the others lack; else all that is
 * missing; else the one nearest to its bound. It names the acquisition and the ion that decide. What would make the
 * stage pass has to bring all of its settings within the limit: `passesIf`, or what their own intervals share.
 */
export function worstOfStage<Setting extends InStage>(
  about: About,
  settings: readonly Setting[],
  whyNone: string,
  read: (setting: Setting) => Reading,
  passesIf?: () => PassesIf | null,
): Observation {
  const readings = settings.map((setting) => ({ setting, reading: read(setting) }));
  let worst: (typeof readings)[number] | null = null;
  for (const each of readings) {
    if (worst === null || closeness(each.reading) < closeness(worst.reading)) worst = each;
  }
  const unknown = readings.flatMap(({ reading }) => (reading.kind === "indeterminate" ? [reading] : []));
  const missing = [...new Set(unknown.flatMap((reading) => reading.missing))];
  const fails = worst !== null && outcomeOf(worst.reading) === "fail";
  if (!fails && unknown.length > 0) {
    return { ...about, kind: "indeterminate", missing, statement: unknown[0]!.statement };
  }
  if (worst === null) return { ...about, ...notApplicable(whyNone) };
  const { setting, reading } = worst;
  if (reading.kind !== "value" && reading.kind !== "impossible")
    return { ...about, ...notApplicable(whyNone) };
  return {
    ...about,
    ...reading,
    subject: { ...about.subject, acquisition: setting.acquisition.id, ion: setting.ion },
    passesIf:
      unknown.length > 0
        ? () => null
        : (passesIf ?? (() => passesForAll(readings.map((each) => each.reading)))),
    statement:
      textOf(reading.statement) +
      (unknown.length > 0 ? ` Others cannot be judged without ${missing.join(", ")}.` : ""),
  };
}

/** Smaller is worse; what was not judged comes last. */
function closeness(reading: Reading): number {
  if (reading.kind === "impossible") return Number.NEGATIVE_INFINITY;
  if (reading.kind !== "value") return Number.POSITIVE_INFINITY;
  return marginOf(reading.value, reading.pass) ?? Number.MAX_VALUE;
}

/** What brings every setting of the stage that misses its limit within it. */
function passesForAll(readings: readonly Reading[]): PassesIf | null {
  let all: PassesIf | null = null;
  for (const reading of readings) {
    if (reading.kind !== "value" && reading.kind !== "impossible") continue;
    if (outcomeOf(reading) === "pass") continue;
    const one = reading.passesIf();
    all = all === null ? one : bothPassIf(all, one);
    if (all === null) return null;
  }
  return all;
}
