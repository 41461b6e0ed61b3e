import { readFileSync } from "node:fs";
import { ROOT } from "../running-service.ts";

export const read = (path: string): string => readFileSync(ROOT + path, "utf8");

/** The fenced blocks of a Markdown document in one language, in order. */
export function codeBlocks(document: string, language: string): string[] {
  return [...read(document).matchAll(/^```(\w*)\n([\s\S]*?)^```$/gm)]
    .filter(([, of]) => of === language)
    .map(([, , code]) => code!);
}

/** The body rows of the table whose header row begins with `header`, as cells without code marks. */
export function tableRows(document: string, header: string): string[][] {
  const lines = read(document).split("\n");
  const start = lines.findIndex((line) => line.startsWith(`| ${header} |`));
  if (start < 0) throw new Error(`${document} has no table that begins with the column ${header}.`);
  const end = lines.findIndex((line, index) => index > start && !line.startsWith("|"));
  return lines.slice(start + 2, end < 0 ? undefined : end).map((line) =>
    line
      .split("|")
      .slice(1, -1)
      .map((cell) => cell.trim().replaceAll("`", "")),
  );
}
