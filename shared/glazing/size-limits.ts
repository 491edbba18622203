import type { FabricatorItem } from '../contracts/catalogue';
import type { Evaluation, Reason } from '../contracts/evaluation';
import { formatLengthBoth } from '../measures/format-length';
import { formatArea, formatWeight } from '../measures/format-quantity';
import { geometryOf } from './geometry';
import { nearestSize, type SizeLimits } from './nearest-size';
import { ovenFor } from './oven-for';
import type { ResolvedUnit } from './resolve-unit';
import { weightOf } from './weight';

type Axis = 'width' | 'height';

/**
 * A maker's limits on size and weight, of the unit and of each lite's glass and treatment, on the
 * bounding rectangle. The nearest values keep all of them together.
 */
export function sizeReasons(unit: ResolvedUnit, geometry: Evaluation['geometry'], weight: number, fabricator: FabricatorItem): Reason[] {
  const { unit: limits } = fabricator.capabilities;
  const { width, height } = unit.unit;
  const axes = byLength(width, height);
  const found: (Omit<Reason, 'nearest' | 'nearestValue' | 'pointer'> & { axis: Axis })[] = [];
  const both = (mm: string) => formatLengthBoth(mm, fabricator.measureSystem);

  const edge = (code: string, axis: Axis, bound: string, least: boolean, what: string) => {
    const value = unit.unit[axis];
    if (least ? Number(value) >= Number(bound) : Number(value) <= Number(bound)) return;
    const detail = `${what} ${least ? 'from' : 'up to'} ${both(bound)}, not ${both(value)}`;
    found.push({ code, detail, limit: `${bound} mm`, actual: `${value} mm`, axis });
  };
  edge('width-min', 'width', limits.minWidth, true, 'width');
  edge('height-min', 'height', limits.minHeight, true, 'height');
  edge('long-edge-max', axes.long, limits.maxLong, false, 'long edge');
  edge('short-edge-max', axes.short, limits.maxShort, false, 'short edge');

  const system = fabricator.measureSystem;
  const bounding = geometry.boundingWidth * geometry.boundingHeight;
  if (bounding > limits.maxAreaM2 + 1e-9) {
    const [limit, actual] = [`${limits.maxAreaM2} m²`, `${round(bounding, 4)} m²`];
    const detail = `area up to ${limit} (${formatArea(limits.maxAreaM2, system)}), not ${actual}`;
    found.push({ code: 'area-max', detail, limit, actual, axis: axes.long });
  }
  if (geometry.aspect > limits.maxAspect + 1e-9) {
    const [limit, actual] = [`1 : ${limits.maxAspect}`, `1 : ${round(geometry.aspect, 2)}`];
    found.push({
      code: 'aspect-max',
      detail: `long edge up to ${limits.maxAspect} times the short edge, not ${round(geometry.aspect, 2)} times`,
      limit,
      actual,
      axis: axes.long,
    });
  }
  if (weight > limits.maxWeightKg + 1e-9) {
    const [limit, actual] = [`${limits.maxWeightKg} kg`, `${round(weight, 2)} kg`];
    const detail = `weight up to ${limit} (${formatWeight(limits.maxWeightKg, system)}), not ${actual}`;
    found.push({ code: 'weight-max', detail, limit, actual, axis: axes.long });
  }

  const own = ownLimits(unit, fabricator);
  for (const { code, what, minEdge, maxLong, maxShort } of own) {
    if (minEdge !== null) edge(`${code}-edge-min`, axes.short, minEdge, true, `${what}: short edge`);
    edge(`${code}-long-edge-max`, axes.long, maxLong, false, `${what}: long edge`);
    edge(`${code}-short-edge-max`, axes.short, maxShort, false, `${what}: short edge`);
  }
  if (found.length === 0) return [];

  const least = (values: string[]) => values.reduce((a, b) => (Number(b) < Number(a) ? b : a));
  const all: SizeLimits = {
    ...limits,
    minEdge: own.reduce((most, { minEdge }) => (minEdge !== null && Number(minEdge) > Number(most) ? minEdge : most), '0'),
    maxLong: least([limits.maxLong, ...own.map(({ maxLong }) => maxLong)]),
    maxShort: least([limits.maxShort, ...own.map(({ maxShort }) => maxShort)]),
    lightEnough: unit.unit.shape.class === 'rectangle' ? (w, h) => weightAt(unit, w, h) <= limits.maxWeightKg + 1e-9 : null,
  };
  const nearest = nearestSize(width, height, all);
  const changes = (axis: Axis) => nearest !== null && nearest[axis] !== unit.unit[axis];
  // A limit counted along one edge may be kept by the other.
  const placed = found.map((reason) => ({
    ...reason,
    axis: changes(reason.axis) || !changes(other(reason.axis)) ? reason.axis : other(reason.axis),
  }));
  // Where an edge without a reason of its own would have to follow, no one field mends it.
  const complete = (['width', 'height'] as const).every((axis) => !changes(axis) || placed.some((reason) => reason.axis === axis));
  return placed.map(({ axis, ...reason }) => {
    const value = complete && nearest && changes(axis) ? nearest[axis] : null;
    return { ...reason, nearest: value === null ? null : `${value} mm`, nearestValue: value, pointer: `/${axis}` };
  });
}

interface OwnLimits {
  code: 'glass' | 'treatment';
  what: string;
  minEdge: string | null;
  maxLong: string;
  maxShort: string;
}

/** What each glass and treatment in the unit is limited to, each product once. */
function ownLimits({ lites }: ResolvedUnit, { capabilities }: FabricatorItem): OwnLimits[] {
  const seen = new Set<object>();
  return lites.flatMap(({ glass, treatment }) => {
    const limits: OwnLimits[] = [];
    const sheet = capabilities.glass.find((candidate) => candidate.glass === glass.id);
    if (sheet && !seen.has(sheet)) {
      seen.add(sheet);
      limits.push({ code: 'glass', what: glass.name, minEdge: null, maxLong: sheet.maxLong, maxShort: sheet.maxShort });
    }
    const oven = ovenFor(capabilities, treatment.id, glass.nominalMm);
    if (oven && !seen.has(oven)) {
      seen.add(oven);
      limits.push({ code: 'treatment', what: treatment.name, minEdge: oven.minEdge, maxLong: oven.maxLong, maxShort: oven.maxShort });
    }
    return limits;
  });
}

function weightAt(unit: ResolvedUnit, widthMm: number, heightMm: number): number {
  const sized = { ...unit, widthMm, heightMm, unit: { ...unit.unit, width: String(widthMm), height: String(heightMm) } };
  return weightOf(sized, geometryOf(sized)).weight;
}

function byLength(width: string, height: string): { long: Axis; short: Axis } {
  return Number(width) > Number(height) ? { long: 'width', short: 'height' } : { long: 'height', short: 'width' };
}

function other(axis: Axis): Axis {
  return axis === 'width' ? 'height' : 'width';
}

function round(value: number, digits: number): number {
  return Math.round(value * 10 ** digits) / 10 ** digits;
}
