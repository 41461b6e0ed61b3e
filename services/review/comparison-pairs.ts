import type { Instrument } from "./instrument.ts";

/** Something of the first case with what corresponds to it in another; null where nothing does. */
export interface Pair<Item> {
  readonly base: Item | null;
  readonly other: Item | null;
}

/** What items are matched by, in either case. */
export interface Key<Item> {
  readonly inBase: (item: Item) => string;
  readonly inOther: (item: Item) => string;
}

/**
 * Pairs the items of two cases that have the same key, by the first key and what is left by the next, in the order of
 * the base; what no key pairs stands alone.
 */
export function pairsOf<Item>(
  base: readonly Item[],
  other: readonly Item[],
  keys: readonly Key<Item>[],
): Pair<Item>[] {
  const partners = new Map<Item, Item>();
  const taken = new Set<Item>();
  for (const { inBase, inOther } of keys) {
    const waiting = new Map<string, Item[]>();
    for (const item of other) {
      if (taken.has(item)) continue;
      const key = inOther(item);
      const alike = waiting.get(key);
      if (alike === undefined) waiting.set(key, [item]);
      else alike.push(item);
    }
    for (const item of base) {
      const partner = partners.has(item) ? undefined : waiting.get(inBase(item))?.shift();
      if (partner === undefined) continue;
      partners.set(item, partner);
      taken.add(partner);
    }
  }
  return [
    ...base.map((item) => ({ base: item, other: partners.get(item) ?? null })),
    ...other.filter((item) => !taken.has(item)).map((item) => ({ base: null, other: item })),
  ];
}

/**
 * The place of a stage by its role: the first mass filter of one instrument corresponds to that of another, whatever
 * either is called.
 */
export function placesOf({ stages }: Instrument): (stage: string) => string {
  const places = new Map<string, string>();
  const counts = new Map<string, number>();
  for (const { name, role } of stages) {
    const count = (counts.get(role) ?? 0) + 1;
    counts.set(role, count);
    places.set(name, `${role} ${count}`);
  }
  return (stage) => places.get(stage) ?? stage;
}
