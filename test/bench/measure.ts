import type { BenchCase, Side } from "./bench-case.ts";

const NANOSECONDS = { ns: 1, us: 1e3, ms: 1e6 } as const;
const ROUNDS = 15;
const BATCH_NS = 15e6;
const WARM_UP_NS = 200e6;

/** Times of one side per operation, in the unit of its case. */
export interface SideResult {
  readonly label: string;
  readonly median: number;
  readonly quartileLow: number;
  readonly quartileHigh: number;
  readonly checksum: number;
}

export interface CaseResult {
  readonly name: string;
  readonly unit: string;
  readonly a: SideResult;
  readonly b: SideResult;
  /** Median of the rounds' quotients b/a: how many times faster a is. */
  readonly speed: number;
  readonly target: string;
  readonly met: boolean | null;
  readonly sameWork: boolean | null;
  readonly note: string | null;
}

function quantile(sorted: readonly number[], share: number): number {
  const at = share * (sorted.length - 1);
  const below = Math.floor(at);
  const low = sorted[below]!;
  return low + (at - below) * ((sorted[below + 1] ?? low) - low);
}

async function timeOf(side: Side, repeats: number): Promise<{ ns: number; checksum: number }> {
  let checksum = 0;
  const start = process.hrtime.bigint();
  for (let i = 0; i < repeats; i++) {
    const answer = side.run();
    checksum = typeof answer === "number" ? answer : await answer;
  }
  return { ns: Number(process.hrtime.bigint() - start), checksum };
}

/** Runs until the compiler has settled, and returns how many calls fill one round. */
async function warmUp(side: Side): Promise<number> {
  let spent = 0;
  let last = 0;
  do {
    last = (await timeOf(side, 1)).ns;
    spent += last;
  } while (spent < WARM_UP_NS);
  return Math.max(1, Math.round(BATCH_NS / last));
}

function summary(side: Side, times: readonly number[], checksum: number): SideResult {
  const sorted = [...times].sort((x, y) => x - y);
  return {
    label: side.label,
    median: quantile(sorted, 0.5),
    quartileLow: quantile(sorted, 0.25),
    quartileHigh: quantile(sorted, 0.75),
    checksum,
  };
}

function judge(benchCase: BenchCase, time: number, speed: number): { target: string; met: boolean | null } {
  const { target, unit } = benchCase;
  if (target === null) return { target: "none", met: null };
  if (target.of === "speed") return { target: `speed >= ${target.least}`, met: speed >= target.least };
  const stretch =
    target.stretch === undefined
      ? ""
      : ` (stretch ${target.stretch}: ${time <= target.stretch ? "met" : "not met"})`;
  return { target: `<= ${target.most} ${unit}${stretch}`, met: time <= target.most };
}

/** Both sides in turn, so that whatever slows the machine down slows both. */
export async function measure(benchCase: BenchCase): Promise<CaseResult> {
  const { a, b, unit, checksumTolerance } = benchCase;
  await benchCase.open?.();
  try {
    const repeatsA = await warmUp(a);
    const repeatsB = await warmUp(b);
    const scaleA = a.operations * repeatsA * NANOSECONDS[unit];
    const scaleB = b.operations * repeatsB * NANOSECONDS[unit];
    const timesA: number[] = [];
    const timesB: number[] = [];
    let checksumA = 0;
    let checksumB = 0;
    for (let round = 0; round < ROUNDS; round++) {
      const runA = await timeOf(a, repeatsA);
      const runB = await timeOf(b, repeatsB);
      timesA.push(runA.ns / scaleA);
      timesB.push(runB.ns / scaleB);
      checksumA = runA.checksum;
      checksumB = runB.checksum;
    }
    const speeds = timesA.map((time, i) => timesB[i]! / time).sort((x, y) => x - y);
    const speed = quantile(speeds, 0.5);
    const resultA = summary(a, timesA, checksumA);
    const difference = Math.abs(checksumA / a.operations - checksumB / b.operations);
    return {
      name: benchCase.name,
      unit,
      a: resultA,
      b: summary(b, timesB, checksumB),
      speed,
      ...judge(benchCase, resultA.median, speed),
      sameWork:
        checksumTolerance === null
          ? null
          : difference <= checksumTolerance * Math.abs(checksumA / a.operations),
      note: benchCase.note ?? null,
    };
  } finally {
    await benchCase.close?.();
  }
}
