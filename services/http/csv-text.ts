type Cell = string | number | null;

/** A spreadsheet runs a text that begins so as a formula. */
const FORMULA = /^[=+\-@\t\r]/;

function written(cell: Cell): string {
  if (cell === null) return "";
  if (typeof cell === "number") return String(cell);
  const harmless = FORMULA.test(cell) ? `'${cell}` : cell;
  return /[",\r\n]/.test(harmless) ? `"${harmless.replaceAll('"', '""')}"` : harmless;
}

/** A table as RFC 4180 has it: a header, CRLF after every line, quotes where they are needed, no formulas. */
export function csvText(header: readonly string[], rows: readonly (readonly Cell[])[]): string {
  return [header, ...rows].map((row) => `${row.map(written).join(",")}\r\n`).join("");
}
