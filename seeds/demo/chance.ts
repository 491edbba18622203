/** Chance that is the same in every installation (mulberry32, public domain; from memory). */
export interface Chance {
  /** 0 to below 1 */
  next(): number;
  /** whole number from `low` to `high`, both included */
  whole(low: number, high: number): number;
  pick<T>(items: readonly T[]): T;
  /** picks by weight, so that a weight of 2 comes up twice as often as 1 */
  weighted<T>(items: readonly (readonly [weight: number, item: T])[]): T;
  happens(probability: number): boolean;
}

export function chance(seed: number): Chance {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = state;
    t = Math.imul(t ^ (t >>> 15), t | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296;
  };
  const pick = <T>(items: readonly T[]): T => {
    const item = items[Math.floor(next() * items.length)];
    if (item === undefined) throw new RangeError('nothing to pick from');
    return item;
  };
  return {
    next,
    pick,
    whole: (low, high) => low + Math.floor(next() * (high - low + 1)),
    weighted: (items) => {
      let left = next() * items.reduce((sum, [weight]) => sum + weight, 0);
      for (const [weight, item] of items) {
        left -= weight;
        if (left < 0) return item;
      }
      return pick(items)[1];
    },
    happens: (probability) => next() < probability,
  };
}
