import { type Capabilities } from '@shared/contracts/catalogue';

/** Limits on the width and height of a unit, mm and m². */
export interface AreaLimits {
  minWidth: number;
  minHeight: number;
  maxLong: number;
  maxShort: number;
  maxAreaM2: number;
  maxAspect: number;
}

/** What one maker allows of any unit, whatever it is made of. */
export function unitLimits({ unit }: Capabilities): AreaLimits {
  return {
    minWidth: Number(unit.minWidth),
    minHeight: Number(unit.minHeight),
    maxLong: Number(unit.maxLong),
    maxShort: Number(unit.maxShort),
    maxAreaM2: unit.maxAreaM2,
    maxAspect: unit.maxAspect,
  };
}

/** What is left of it for a glass and a treatment; null where the maker does not make that. */
export function limitsFor(made: Capabilities, glass: { id: string; nominalMm: number }, treatment: string): AreaLimits | null {
  const sheet = made.glass.find((own) => own.glass === glass.id);
  const oven = made.treatments.find(
    (own) => own.treatment === treatment && own.minNominalMm <= glass.nominalMm && glass.nominalMm <= own.maxNominalMm,
  );
  if (!sheet || !oven) return null;
  const whole = unitLimits(made);
  const minEdge = Number(oven.minEdge);
  return {
    ...whole,
    minWidth: Math.max(whole.minWidth, minEdge),
    minHeight: Math.max(whole.minHeight, minEdge),
    maxLong: Math.min(whole.maxLong, Number(sheet.maxLong), Number(oven.maxLong)),
    maxShort: Math.min(whole.maxShort, Number(sheet.maxShort), Number(oven.maxShort)),
  };
}

/** Heights allowed at a width, from and to, mm; null where none is. */
export function heightsAt(
  width: number,
  { minWidth, minHeight, maxLong, maxShort, maxAreaM2, maxAspect }: AreaLimits,
): [number, number] | null {
  if (width < minWidth || width > maxLong) return null;
  const from = Math.max(minHeight, width / maxAspect);
  // A unit wider than the longest short edge must have that edge upright.
  const to = Math.min(width <= maxShort ? maxLong : maxShort, (maxAreaM2 * 1e6) / width, width * maxAspect);
  return from <= to ? [from, to] : null;
}

/** The outline of all sizes allowed: corners as [width, height], mm, from the lower left, clockwise; the curve of the area in steps. */
export function sizeArea(limits: AreaLimits): [number, number][] {
  const { minWidth, minHeight, maxLong, maxShort, maxAreaM2, maxAspect } = limits;
  const area = maxAreaM2 * 1e6;
  const steps = Array.from({ length: Math.max(0, Math.ceil((maxLong - minWidth) / 25)) }, (_, i) => minWidth + 25 * i);
  const corners = [
    ...[minWidth, maxShort, maxLong, minHeight / maxAspect, minHeight * maxAspect, maxLong / maxAspect, maxShort / maxAspect],
    ...[area / maxLong, area / maxShort, area / minHeight, Math.sqrt(area / maxAspect), Math.sqrt(area * maxAspect)],
  ];
  // Just beyond the longest short edge the height falls: two points at one width.
  const widths = [...new Set([...steps, ...corners, maxShort + 1e-6])].sort((a, b) => a - b);
  const found = widths.flatMap((width): [number, [number, number]][] => {
    const heights = heightsAt(width, limits);
    return heights ? [[width, heights]] : [];
  });
  return [
    ...found.map(([width, [, to]]): [number, number] => [width, to]),
    ...found.reverse().map(([width, [from]]): [number, number] => [width, from]),
  ];
}
