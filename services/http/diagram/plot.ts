/** A part of the (a, q) plane drawn into a rectangle of the page, in units of the view box. */
export interface Plot {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  xOf(q: number): number;
  yOf(a: number): number;
}

export interface Box {
  readonly aMin: number;
  readonly aMax: number;
  readonly qMin: number;
  readonly qMax: number;
}

type Frame = Pick<Plot, "left" | "right" | "top" | "bottom">;

export function plotOf({ aMin, aMax, qMin, qMax }: Box, frame: Frame): Plot {
  const { left, right, top, bottom } = frame;
  return {
    ...frame,
    xOf: (q) => left + ((q - qMin) / (qMax - qMin)) * (right - left),
    yOf: (a) => bottom - ((a - aMin) / (aMax - aMin)) * (bottom - top),
  };
}

/** A length on paper needs no more digits than a printer resolves. */
export function short(length: number): string {
  return String(Math.round(length * 100) / 100);
}

const TICK_LENGTH = 6;
const MOST_TICKS = 9;

/** The frame with ticks outside it, and the line a = 0 where it is in sight. */
export function axes(plot: Plot, box: Box): string {
  const { left, right, top, bottom } = plot;
  const zero = plot.yOf(0);
  const q = ticksBetween(box.qMin, box.qMax).map(({ value, text }) => {
    const x = short(plot.xOf(value));
    return `<path d="M${x} ${bottom}v${TICK_LENGTH}"/>${label(x, bottom + 22, "middle", text)}`;
  });
  const a = ticksBetween(box.aMin, box.aMax).map(({ value, text }) => {
    const y = plot.yOf(value);
    return `<path d="M${left} ${short(y)}h-${TICK_LENGTH}"/>${label(left - 11, short(y + 5), "end", text)}`;
  });
  return [
    zero > top && zero < bottom
      ? `<path d="M${left} ${short(zero)}H${right}" stroke="#767676" stroke-width="0.75"/>`
      : "",
    `<path d="M${left} ${top}H${right}V${bottom}H${left}Z"/>`,
    ...q,
    ...a,
    italic((left + right) / 2, bottom + 46, "q"),
    italic(left - 64, (top + bottom) / 2 + 6, "a"),
  ].join("\n");
}

function label(x: number | string, y: number | string, anchor: string, text: string): string {
  return `<text x="${x}" y="${y}" text-anchor="${anchor}" fill="black" stroke="none">${text}</text>`;
}

function italic(x: number, y: number, text: string): string {
  return `<text x="${short(x)}" y="${short(y)}" text-anchor="middle" font-style="italic" font-size="18" fill="black" stroke="none">${text}</text>`;
}

/** Round values: 1, 2 or 5 times a power of ten apart. */
function ticksBetween(least: number, most: number): { value: number; text: string }[] {
  const rough = (most - least) / MOST_TICKS;
  const decade = Number(`1e${Math.floor(Math.log10(rough))}`);
  const step = [1, 2, 5, 10].map((multiple) => multiple * decade).find((size) => size >= rough)!;
  const decimals = Math.min(100, Math.max(0, Math.ceil(-Math.log10(step) - 1e-9)));
  const first = Math.ceil(least / step - 1e-9);
  const last = Math.floor(most / step + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, index) => {
    const value = (first + index) * step;
    // Text of a number has a hyphen where print has a minus.
    return {
      value,
      text: value
        .toFixed(decimals)
        .replace(/^-(?=0\.?0*$)/, "")
        .replace("-", "−"),
    };
  });
}
