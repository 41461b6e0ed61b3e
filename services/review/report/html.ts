/** Markup that is already escaped. */
export interface Markup {
  readonly markup: string;
}

type Content = Markup | string | number | null | undefined | readonly Content[];

const ESCAPES: Readonly<Record<string, string>> = {
  "&": "&amp;",
  "<": "&lt;",
  ">": "&gt;",
  '"': "&quot;",
  "'": "&#39;",
};

/** A template tag that escapes every text put into it, so that no name in a method can become markup. */
export function html(parts: TemplateStringsArray, ...contents: readonly Content[]): Markup {
  return {
    markup: parts
      .map((part, index) => part + (index < contents.length ? escaped(contents[index]) : ""))
      .join(""),
  };
}

function escaped(content: Content): string {
  if (content === null || content === undefined) return "";
  if (typeof content === "string") return content.replace(/[&<>"']/g, (character) => ESCAPES[character]!);
  if (typeof content === "number") return String(content);
  return "markup" in content ? content.markup : content.map(escaped).join("");
}
