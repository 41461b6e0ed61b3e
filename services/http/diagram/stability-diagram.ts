import type { StabilityRegionsAnswer } from "../shapes/stability-regions.ts";
import { axes, type Plot, plotOf, short } from "./plot.ts";
import { nameOf, regionLabels } from "./region-labels.ts";

type Bounded = StabilityRegionsAnswer["regions"][number];

const FRAME = { left: 92, right: 764, top: 56, bottom: 476 };
const DASHES = "7 4";
const TITLE = "Stability regions of an ideal quadrupole mass filter";

/**
 * The answer as a diagram for paper: size by the view box, told apart by line pattern and not by colour, and described in
 * words for those who cannot see it. Nothing in it is styled by CSS, so that the strictest content policy leaves it whole.
 */
export function stabilityDiagram({ box, regions, reason }: StabilityRegionsAnswer): string {
  const plot = plotOf(box, FRAME);
  const { left, right, top, bottom } = FRAME;
  const extent = `a from ${box.aMin} to ${box.aMax}, q from ${box.qMin} to ${box.qMax}`;
  return `${[
    '<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 800 580" role="img" aria-labelledby="title description" font-family="Helvetica, Arial, sans-serif" font-size="14" fill="none" stroke="black" stroke-width="1.25">',
    `<title id="title">${TITLE}</title>`,
    `<desc id="description">${describe(regions, extent)}</desc>`,
    '<rect width="800" height="580" fill="white" stroke="none"/>',
    `<text x="${left}" y="36" font-size="18" fill="black" stroke="none">${TITLE}</text>`,
    `<clipPath id="plot"><path d="M${left} ${top}H${right}V${bottom}H${left}Z"/></clipPath>`,
    '<g clip-path="url(#plot)" stroke-linejoin="round">',
    ...regions.map((region) => drawn(region, plot)),
    "</g>",
    axes(plot, box),
    regions.length > 0 ? regionLabels(regions, plot) : caption(400, 270, "No region in this box", "middle"),
    legend(),
    reason === null
      ? ""
      : caption(right, 36, "Further regions lie in this box beyond |a| or q = 12: not shown", "end"),
    "</svg>",
  ]
    .filter((line) => line !== "")
    .join("\n")}\n`;
}

function drawn({ arcs }: Bounded, plot: Plot): string {
  const at = ({ q, a }: { q: number; a: number }) => `${short(plot.xOf(q))} ${short(plot.yOf(a))}`;
  const outline = arcs.flatMap(({ points }) => points.slice(1)).map(at);
  const sides = arcs.map(({ points, lostTo }) => {
    const dashes = lostTo === "y" ? ` stroke-dasharray="${DASHES}"` : "";
    return `<path d="M${points.map(at).join("L")}" stroke-width="2"${dashes}/>`;
  });
  return [`<path d="M${outline.join("L")}Z" fill="#dcdcdc" stroke="none"/>`, ...sides].join("\n");
}

function legend(): string {
  const row = FRAME.bottom + 72;
  const sample = (x: number, dashes: string) =>
    `<path d="M${x} ${row - 5}h44" stroke-width="2"${dashes === "" ? "" : ` stroke-dasharray="${dashes}"`}/>`;
  return [
    sample(FRAME.left, ""),
    caption(FRAME.left + 52, row, "ions beyond are lost to the x rods", "start"),
    sample(FRAME.left + 310, DASHES),
    caption(FRAME.left + 362, row, "ions beyond are lost to the y rods", "start"),
    caption(
      FRAME.left,
      row + 22,
      "(n_x,n_y): bands of both planes. U and V pole-to-ground, V zero-to-peak; sinusoid. Figures: q, a.",
      "start",
    ),
  ].join("\n");
}

function caption(x: number, y: number, text: string, anchor: "start" | "middle" | "end"): string {
  return `<text x="${x}" y="${y}" text-anchor="${anchor}" font-size="13" fill="black" stroke="none">${text}</text>`;
}

function describe(regions: readonly Bounded[], extent: string): string {
  const shown = regions.map((region) => {
    const { inner, highTip, outer, lowTip } = region.corners;
    const corners = [inner, highTip, outer, lowTip].map(({ q, a }) => `(${figure(q)}, ${figure(a)})`);
    return `Region ${nameOf(region)} has its corners (q, a) at ${corners.join(", ")}.`;
  });
  return [`Diagram of ${extent}.`, ...(shown.length > 0 ? shown : ["No region lies in it."])].join(" ");
}

function figure(value: number): string {
  return value === 0 ? "0" : value.toPrecision(6).replace("-", "−");
}
