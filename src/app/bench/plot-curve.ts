interface Point {
  widthMm: number;
  u: number;
}

/** A curve placed on a sheet of 300 × 186, with its grid. */
export interface Plot {
  width: number;
  height: number;
  path: string;
  levels: { y: number; label: string }[];
  ticks: { x: number; label: string; own: boolean }[];
  dot: { x: number; y: number; label: string; labelY: number } | null;
}

const sheet = { width: 300, height: 186, left: 34, right: 14, top: 16, bottom: 28 };

/** Places U-values over cavity widths; the levels are round numbers that hold the whole curve. */
export function plotCurve(points: readonly Point[], own: Point | null): Plot {
  const all = own ? [...points, own] : points;
  const values = all.map(({ u }) => u);
  const widths = all.map(({ widthMm }) => widthMm);
  const [from, to] = [Math.min(...widths, 6), Math.max(...widths, 24)];
  const step = stepFor(Math.max(...values) - Math.min(...values));
  const low = Math.floor(Math.min(...values) / step + 1e-9) * step;
  const high = Math.ceil(Math.max(...values) / step - 1e-9) * step;
  const x = (width: number) => round(sheet.left + ((width - from) / (to - from)) * (sheet.width - sheet.left - sheet.right));
  const y = (u: number) => round(sheet.top + ((high - u) / (high - low)) * (sheet.height - sheet.top - sheet.bottom));
  const count = Math.round((high - low) / step);
  const usual = [6, 12, 18, 24].filter((width) => !own || Math.abs(width - own.widthMm) > 2.5);
  return {
    width: sheet.width,
    height: sheet.height,
    path: points.map(({ widthMm, u }, i) => `${i === 0 ? 'M' : 'L'}${x(widthMm)} ${y(u)}`).join(''),
    levels: Array.from({ length: count + 1 }, (_, i) => ({ y: y(low + i * step), label: (low + i * step).toFixed(step < 0.1 ? 2 : 1) })),
    ticks: [
      ...usual.map((width) => ({ x: x(width), label: `${width}`, own: false })),
      ...(own ? [{ x: x(own.widthMm), label: `${own.widthMm} mm`, own: true }] : []),
    ],
    dot: own ? { x: x(own.widthMm), y: y(own.u), label: own.u.toFixed(2), labelY: y(own.u) - 10 } : null,
  };
}

/** A step of 1, 2 or 5 that cuts a range into three to six. */
function stepFor(range: number): number {
  const rough = Math.max(range, 0.02) / 4;
  const power = 10 ** Math.floor(Math.log10(rough));
  const factor = [1, 2, 5, 10].find((each) => each * power >= rough - 1e-9) ?? 10;
  return factor * power;
}

function round(value: number): number {
  return Math.round(value * 10) / 10;
}
