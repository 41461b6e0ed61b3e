import type { CaseResult, SideResult } from "./measure.ts";

const digits = (value: number) => value.toPrecision(3);

function side({ label, median, quartileLow, quartileHigh, checksum }: SideResult, unit: string): string {
  const spread = `${digits(quartileLow)} to ${digits(quartileHigh)}`;
  return `  ${label.padEnd(52)} ${digits(median).padStart(8)} ${unit}  (${spread})  checksum ${checksum.toPrecision(12)}`;
}

/** One case as text: both sides with median, quartiles and checksum, the speed of a over b, and the verdict. */
export function caseAsText(result: CaseResult): string {
  const met = result.met === null ? "" : result.met ? ": MET" : ": MISSED";
  const work = result.sameWork === false ? "  THE CHECKSUMS DISAGREE" : "";
  const lines = [
    result.name,
    side(result.a, result.unit),
    side(result.b, result.unit),
    `  speed ${digits(result.speed)} times; target ${result.target}${met}${work}`,
  ];
  if (result.note !== null) lines.push(`  ${result.note}`);
  return lines.join("\n");
}
