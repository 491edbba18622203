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
 * The nearest size that keeps every limit at once, or null where none does with these edges. Each
 * edge is first brought inside its own limits, exactly; aspect, area and weight then take from the
 * longer edge alone, in whole millimetres.
 */
export function nearestSize(width: string, height: string, limits: SizeLimits): { width: string; height: string } | null {
  const wide = exact(width).greaterThan(height);
  const low = { width: largest(limits.minWidth, limits.minEdge), height: largest(limits.minHeight, limits.minEdge) };
  let w = clamp(exact(width), low.width, exact(wide ? limits.maxLong : limits.maxShort));
  let h = clamp(exact(height), low.height, exact(wide ? limits.maxShort : limits.maxLong));
  if (!w || !h) return null;

  const fits = (x: Exact, y: Exact) => fitsArea(x, y, limits) && (limits.lightEnough?.(x.toNumber(), y.toNumber()) ?? true);
  const slender = (long: Exact, short: Exact) => long.greaterThan(short.times(limits.maxAspect));
  if (w.greaterThan(h)) {
    const short = h;
    w = largestFitting(w, (long) => !slender(long, short) && fits(long, short));
  } else {
    const short = w;
    h = largestFitting(h, (long) => !slender(long, short) && fits(short, long));
  }
  // An edge that had to come in far may now be the short one.
  if (!w || !h || w.lessThan(low.width) || h.lessThan(low.height) || slender(Exact.max(w, h), Exact.min(w, h))) return null;
  return { width: w.toFixed(), height: h.toFixed() };
}

function fitsArea(w: Exact, h: Exact, { maxAreaM2 }: SizeLimits): boolean {
  return w.times(h).lessThanOrEqualTo(new Exact(String(maxAreaM2)).times(1e6));
}

/** `from` itself or the largest whole millimetre below it that fits, by halving; null when none does. */
function largestFitting(from: Exact, fits: (value: Exact) => boolean): Exact | null {
  if (fits(from)) return from;
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
