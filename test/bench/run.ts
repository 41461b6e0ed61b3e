import { writeFileSync } from "node:fs";
import type { BenchCase } from "./bench-case.ts";
import { DRIFT_BUDGET_CASES } from "./drift-budget-cases.ts";
import { HTTP_CASES } from "./http-cases.ts";
import { type CaseResult, measure } from "./measure.ts";
import { PHYSICS_CASES } from "./physics-cases.ts";
import { caseAsText } from "./print-table.ts";
import { REGIONS_CASES } from "./regions-cases.ts";
import { REVIEW_CASES } from "./review-cases.ts";
import { TRANSMISSION_CASES } from "./transmission-cases.ts";

const CASES: readonly BenchCase[] = [
  ...PHYSICS_CASES,
  ...REGIONS_CASES,
  ...DRIFT_BUDGET_CASES,
  ...TRANSMISSION_CASES,
  ...REVIEW_CASES,
  ...HTTP_CASES,
];

/** Words on the command line choose the cases whose names contain one of them. */
const wanted = process.argv.slice(2);
const chosen = CASES.filter(({ name }) => wanted.length === 0 || wanted.some((word) => name.includes(word)));

console.log(
  `Node.js ${process.version}, ${process.arch}; median (quartiles) per operation, sides alternating\n`,
);
const results: CaseResult[] = [];
for (const benchCase of chosen) {
  const result = await measure(benchCase);
  results.push(result);
  console.log(`${caseAsText(result)}\n`);
}
writeFileSync(
  new URL("./results.json", import.meta.url),
  `${JSON.stringify({ node: process.version, arch: process.arch, results }, null, 2)}\n`,
);
if (results.some(({ sameWork }) => sameWork === false)) process.exitCode = 1;
