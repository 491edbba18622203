/** Fractions of whole numbers: the arithmetic of a checker that trusts neither floats nor decimals. */
export interface Ratio {
  top: bigint;
  /** above zero */
  bottom: bigint;
}

/** `-12.5` as −125/10. */
export function ratio(text: string): Ratio {
  const [whole = '', fraction = ''] = text.split('.');
  return { top: BigInt(whole + fraction), bottom: 10n ** BigInt(fraction.length) };
}

export const times = (a: Ratio, b: Ratio): Ratio => ({ top: a.top * b.top, bottom: a.bottom * b.bottom });
export const plus = (a: Ratio, b: Ratio): Ratio => ({ top: a.top * b.bottom + b.top * a.bottom, bottom: a.bottom * b.bottom });
export const over = (a: Ratio, by: bigint): Ratio => ({ top: a.top, bottom: a.bottom * by });
export const larger = (a: Ratio, b: Ratio): Ratio => (a.top * b.bottom < b.top * a.bottom ? b : a);

/** `a` up to the next whole multiple of `step`. */
export function upTo(a: Ratio, step: Ratio): Ratio {
  const top = a.top * step.bottom;
  const bottom = a.bottom * step.top;
  const steps = (top + bottom - 1n) / bottom;
  return { top: step.top * steps, bottom: step.bottom };
}

/** In hundredths: whether exactly half a cent is left over, and the whole cents with halves away from zero. */
export function cents(amount: Ratio): { tie: boolean; cents: number } {
  const size = amount.top < 0n ? -amount.top : amount.top;
  const doubled = size * 200n;
  const whole = (doubled + amount.bottom) / (2n * amount.bottom);
  const tie = doubled % (2n * amount.bottom) === amount.bottom;
  return { tie, cents: Number(amount.top < 0n ? -whole : whole) };
}

export const toNumber = ({ top, bottom }: Ratio): number => Number((top * 10n ** 18n) / bottom) / 1e18;
