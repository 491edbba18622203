import { Exact, exact } from '../money/exact';

/** Limits on a bounding rectangle, mm; `lightEnough` is asked with a size in mm where weight counts. */
export interface SizeLimits {
  minWidth: string;
  minHeight: string;
  /** both edges at least */
  minEdge: string;
  maxLong: string;
  maxShort: string;
  maxAreaM2: number;
  maxAspect: number;
  lightEnough: ((widthMm: number, heightMm: number) => boolean) | null;
}

/**
 * The nearest size that keeps every limit at once, or null where shrinking for one limit would
 * break a minimum. Edges are first brought inside their own limits, exactly; area, aspect and
 * weight then take from the long edge, in whole millimetres.
 */
export function nearestSize(width: string, height: string, limits: SizeLimits): { width: string; height: string } | null {
  const wide = exact(width).greaterThan(height);
  const low = { width: largest(limits.minWidth, limits.minEdge), height: largest(limits.minHeight, limits.minEdge) };
  let w = clamp(exact(width), low.width, exact(wide ? limits.maxLong : limits.maxShort));
  let h = clamp(exact(height), low.height, exact(wide ? limits.maxShort : limits.maxLong));
  if (!w || !h) return null;

  const fits = (x: Exact, y: Exact) => fitsArea(x, y, limits) && (limits.lightEnough?.(x.toNumber(), y.toNumber()) ?? true);
  // Aspect: the long edge comes in, unless the short one may not be left so short.
  const longest = (short: Exact) => short.times(limits.maxAspect).floor();
  if (w.greaterThan(h) && w.greaterThan(longest(h).plus(1))) w = longest(h);
  else if (h.greaterThan(w) && h.greaterThan(longest(w).plus(1))) h = longest(w);

  if (!fits(w, h)) {
    const takesFromWidth = w.greaterThanOrEqualTo(h);
    const [long, short] = takesFromWidth ? [w, h] : [h, w];
    const square = !fitsOriented(short, short, takesFromWidth, fits);
    const edge = largestFitting(square ? short : long, (value) => fitsOriented(value, square ? value : short, takesFromWidth, fits));
    if (!edge) return null;
    [w, h] = square ? [edge, edge] : takesFromWidth ? [edge, short] : [short, edge];
  }
  if (w.lessThan(low.width) || h.lessThan(low.height)) return null;
  return { width: w.toFixed(), height: h.toFixed() };
}

function fitsArea(w: Exact, h: Exact, { maxAreaM2 }: SizeLimits): boolean {
  return w.times(h).lessThanOrEqualTo(new Exact(String(maxAreaM2)).times(1e6));
}

function fitsOriented(long: Exact, short: Exact, takesFromWidth: boolean, fits: (x: Exact, y: Exact) => boolean): boolean {
  return takesFromWidth ? fits(long, short) : fits(short, long);
}

/** The largest whole millimetre up to `from` that fits, by halving; null when none does. */
function largestFitting(from: Exact, fits: (value: Exact) => boolean): Exact | null {
  let low = 0;
  let high = from.floor().toNumber() + 1;
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2);
    if (fits(new Exact(middle))) low = middle;
    else high = middle;
  }
  return low === 0 ? null : new Exact(low);
}

function clamp(value: Exact, low: Exact, high: Exact): Exact | null {
  if (low.greaterThan(high)) return null;
  if (value.lessThan(low)) return low;
  return value.greaterThan(high) ? high : value;
}

function largest(...values: string[]): Exact {
  return Exact.max(...values) as Exact;
}
