import { z } from "zod";
import { CHECKS } from "./checks.ts";
import type { Limit } from "./limit.ts";

const LimitShown = z.record(z.string(), z.number()).meta({
  id: "LimitShown",
  description: "Parts of a limit, as criteria state them: min, max, minOfWidth and the like.",
});

const CatalogueEntry = z
  .strictObject({
    id: z.string(),
    computes: z.string().meta({ description: "What is computed, in one sentence." }),
    needs: z.array(z.string()).meta({ description: "Members of instrument and method that are read." }),
    quantities: z.array(z.strictObject({ quantity: z.string(), unit: z.string(), meaning: z.string() })),
    requiredByDefault: z.boolean(),
    defaults: z.strictObject({ pass: LimitShown, caution: LimitShown }).nullable(),
    basis: z.string().meta({ description: "Where the default limits come from." }),
  })
  .meta({ id: "CatalogueEntry" });

export const Catalogue = z.strictObject({ checks: z.array(CatalogueEntry) }).meta({ id: "Catalogue" });
export type Catalogue = z.output<typeof Catalogue>;

/** Every check with its default limits, for a quality department to read. */
export function catalogue(): Catalogue {
  return {
    checks: CHECKS.map(({ id, computes, needs, quantities, requiredByDefault, defaults, basis }) => ({
      id,
      computes,
      needs: [...needs],
      quantities: quantities.map((quantity) => ({ ...quantity })),
      requiredByDefault,
      defaults: defaults === null ? null : { pass: shown(defaults.pass), caution: shown(defaults.caution) },
      basis,
    })),
  };
}

function shown(limit: Limit): Record<string, number> {
  return Object.fromEntries(Object.entries(limit).filter(([, bound]) => bound !== undefined)) as Record<
    string,
    number
  >;
}

/** The catalogue as a page. */
export function catalogueMarkdown({ checks }: Catalogue): string {
  const sections = checks.map(
    ({ id, computes, needs, quantities, requiredByDefault, defaults, basis }) =>
      `## ${id}\n\n${computes}\n\n` +
      table(quantities.map(({ quantity, unit, meaning }) => [`\`${quantity}\``, unit, meaning])) +
      `\n- Pass: ${limitText(defaults?.pass)}\n- Caution: ${limitText(defaults?.caution)}\n` +
      `- Counts in the verdict by default: ${requiredByDefault ? "yes, as far as it can be computed" : "no"}\n` +
      `- Reads: ${needs.length === 0 ? "nothing" : needs.map((need) => `\`${need}\``).join(", ")}\n- Basis: ${basis}\n`,
  );
  return `# Checks of a sign-off\n\nDefault limits; a laboratory overrides every one in its criteria.\n\n${sections.join("\n")}`;
}

function table(rows: readonly (readonly string[])[]): string {
  return [
    "| quantity | unit | meaning |",
    "|---|---|---|",
    ...rows.map((row) => `| ${row.join(" | ")} |`),
    "",
  ].join("\n");
}

const PARTS: Readonly<Record<string, (bound: number) => string>> = {
  min: (bound) => `at least ${bound}`,
  max: (bound) => `at most ${bound}`,
  minOfWidth: (bound) => `at least ${bound} of the window's width`,
  maxOfWidth: (bound) => `at most ${bound} of the window's width`,
  minOfTolerance: (bound) => `at least ${bound} times the stated tolerance`,
  minCounts: (bound) => `at least ${bound} counts`,
};

function limitText(limit: Record<string, number> | undefined): string {
  if (limit === undefined) return "no limit";
  return Object.entries(limit)
    .map(([part, bound]) => PARTS[part]?.(bound) ?? `${part} ${bound}`)
    .join(" and ");
}
