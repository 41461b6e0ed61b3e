import type { ErrorItem } from "../../contract/rule.ts";

/** One error for each item whose member repeats an earlier one's. */
export function duplicates<Member extends string>(
  items: readonly { readonly [M in Member]: string }[],
  member: Member,
  pointerOf: (index: number) => string,
): ErrorItem[] {
  const seen = new Map<string, number>();
  return items.flatMap((item, index) => {
    const first = seen.get(item[member]);
    if (first === undefined) {
      seen.set(item[member], index);
      return [];
    }
    return [
      {
        pointer: pointerOf(index),
        code: "not-unique",
        detail: `${member} repeats that of item ${first} in the same array; each must be unique.`,
      },
    ];
  });
}
