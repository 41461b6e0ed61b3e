import type { StabilityRegionsAnswer } from "../shapes/stability-regions.ts";
import { type Plot, short } from "./plot.ts";

type Bounded = StabilityRegionsAnswer["regions"][number];

interface Rectangle {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

/** Height of a line of text and mean width of a character at the size of the labels. */
const LINE = 18;
const CHARACTER = 7.6;
const GAP = 14;
/** A region that fills less of its extent than this is too slender for a label inside. */
const LEAST_FILL = 0.3;

interface Centre {
  readonly x: number;
  readonly y: number;
  readonly area: number;
}

/** "first (0,0)", or "(2,0)" where the region has no name. */
export function nameOf({ region: { x, y, name } }: Bounded): string {
  return `${name === null ? "" : `${name} `}(${x},${y})`;
}

/** A label inside each region that has room for it, beside the others with a line that leads there. */
export function regionLabels(regions: readonly Bounded[], plot: Plot): string {
  const taken: Rectangle[] = regions.map((region) => extentOf(inSight(region, plot)));
  return regions
    .map((region) => {
      const text = nameOf(region);
      const corners = inSight(region, plot);
      const extent = extentOf(corners);
      const width = text.length * CHARACTER;
      const { x, y, area } = centreOf(corners);
      const [across, down] = [extent.right - extent.left, extent.bottom - extent.top];
      const isLarge = across > 1.8 * width && down > 4 * LINE;
      const figures = isLarge ? tips(region, plot).join("\n") : "";
      if (isLarge && area > LEAST_FILL * across * down)
        return `${textAt(x, y + 5, "middle", text)}${figures}`;
      const rises = region.corners.highTip.a > 0;
      const place = isLarge ? placeAcross(x, y, width, rises) : placeBeside(extent, width, plot, taken);
      taken.push(place);
      const toRight = place.left > x;
      const end = toRight ? place.left - 3 : place.right + 3;
      return `<path d="M${short(x)} ${short(y)}L${short(end)} ${short(place.top + LINE / 2)}" stroke-width="0.75"/>${textAt(toRight ? place.left : place.right, place.top + 14, toRight ? "start" : "end", text)}${figures}`;
    })
    .join("\n");
}

/** The corners at which windows close, with their figures, as far as they are in sight. */
function tips({ corners: { highTip, lowTip } }: Bounded, plot: Plot): string[] {
  return [highTip, lowTip].flatMap(({ q, a }, index) => {
    const [x, y] = [plot.xOf(q), plot.yOf(a)];
    if (!(x > plot.left && x < plot.right && y > plot.top && y < plot.bottom)) return [];
    const toLeft = x > (plot.left + plot.right) / 2 + 200;
    const text = `${figure(q)}, ${figure(a)}`;
    return [
      `<circle cx="${short(x)}" cy="${short(y)}" r="3" fill="black" stroke="none"/>`,
      textAt(x + (toLeft ? -9 : 9), y + (index === 0 ? -4 : 14), toLeft ? "end" : "start", text),
    ];
  });
}

function figure(value: number): string {
  return value.toFixed(5).replace("-", "−");
}

function textAt(x: number, baseline: number, anchor: "start" | "middle" | "end", text: string): string {
  return `<text x="${short(x)}" y="${short(baseline)}" text-anchor="${anchor}" fill="black" stroke="white" stroke-width="4" paint-order="stroke">${text}</text>`;
}

/** The outline as far as the plot shows it. */
function inSight({ arcs }: Bounded, plot: Plot): (readonly [x: number, y: number])[] {
  const within = (value: number, least: number, most: number) => Math.min(most, Math.max(least, value));
  return arcs.flatMap(({ points }) =>
    points.map(
      ({ q, a }) =>
        [within(plot.xOf(q), plot.left, plot.right), within(plot.yOf(a), plot.top, plot.bottom)] as const,
    ),
  );
}

function extentOf(outline: readonly (readonly [number, number])[]): Rectangle {
  const x = outline.map(([value]) => value);
  const y = outline.map(([, value]) => value);
  return { left: Math.min(...x), right: Math.max(...x), top: Math.min(...y), bottom: Math.max(...y) };
}

/** The centre of area; of an outline without area the middle of its extent. */
function centreOf(outline: readonly (readonly [number, number])[]): Centre {
  const { left, right, top, bottom } = extentOf(outline);
  let [area, x, y] = [0, 0, 0];
  for (const [index, [x0, y0]] of outline.entries()) {
    const [x1, y1] = outline[(index + 1) % outline.length]!;
    const twice = (x0 - left) * (y1 - top) - (x1 - left) * (y0 - top);
    area += twice;
    x += twice * (x0 + x1 - 2 * left);
    y += twice * (y0 + y1 - 2 * top);
  }
  if (Math.abs(area) < 1) return { x: (left + right) / 2, y: (top + bottom) / 2, area: 0 };
  return { x: left + x / (3 * area), y: top + y / (3 * area), area: Math.abs(area) / 2 };
}

/** A place on the flat side of a slender region. */
function placeAcross(x: number, y: number, width: number, rises: boolean): Rectangle {
  const left = x + 3 * GAP;
  const top = rises ? y + GAP : y - GAP - LINE;
  return { left, right: left + width, top, bottom: top + LINE };
}

/** A free place above right, above left, below right or below left of the region, further off until one is free. */
function placeBeside(extent: Rectangle, width: number, plot: Plot, taken: readonly Rectangle[]): Rectangle {
  let nearest: Rectangle | null = null;
  for (let away = GAP; away < 200; away += LINE) {
    for (const above of [true, false]) {
      for (const right of [true, false]) {
        const left = right ? extent.right + GAP : extent.left - GAP - width;
        const top = above ? extent.top - away - LINE : extent.bottom + away;
        const place = { left, right: left + width, top, bottom: top + LINE };
        nearest ??= place;
        const fits =
          left > plot.left + 4 &&
          place.right < plot.right - 4 &&
          top > plot.top + 4 &&
          place.bottom < plot.bottom - 4;
        if (fits && !taken.some((other) => overlap(place, other))) return place;
      }
    }
  }
  return nearest!;
}

function overlap(one: Rectangle, other: Rectangle): boolean {
  return one.left < other.right && other.left < one.right && one.top < other.bottom && other.top < one.bottom;
}
