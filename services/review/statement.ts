/** A number for a sentence: this many significant digits, without an exponent where a person would write none. */
export function digits(value: number, significant: number): string {
  const magnitude = Math.abs(value);
  if (magnitude !== 0 && (magnitude < 1e-4 || magnitude >= 1e7)) return value.toExponential(significant - 1);
  return String(Number(value.toPrecision(significant)));
}

/** Names in a sentence: "a", "a and b", "a, b and c". */
export function listed(names: readonly string[]): string {
  if (names.length <= 1) return names.join("");
  return `${names.slice(0, -1).join(", ")} and ${names[names.length - 1]}`;
}
