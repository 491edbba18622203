import { type Drawing, type Item, type Role, round } from '@shared/drawings/drawing';
import { formatArea } from '@shared/measures/format-quantity';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { decimals } from './facts';
import { type AreaLimits, sizeArea } from './size-area';

const MM_PER_INCH = 25.4;

/** One outline of the chart. */
export interface SizeRegion {
  name: string;
  limits: AreaLimits;
  look: 'filled' | 'dashed';
}

export interface SizeChartOptions {
  system: MeasureSystem;
  /** what the chart speaks of: `Northmere Sealed Units` */
  title: string;
  /** side of the sheet, units of the drawing */
  side: number;
  /** longest edge shown, mm, so that charts side by side have one scale */
  upTo: number;
  /** whether limits are written at their lines; a small chart has no room */
  labelled: boolean;
}

/** Which sizes can be made: width to the right, height upward, at one scale. */
export function drawSizeChart(regions: readonly SizeRegion[], { system, title, side, upTo, labelled }: SizeChartOptions): Drawing {
  const text = 13;
  const frame = labelled
    ? { left: 52, top: 22, right: side - 18, bottom: side - 44 }
    : { left: 1, top: 1, right: side - 1, bottom: side - 1 };
  const step = tickStep(system, labelled);
  const most = upTo * 1.05;
  const scale = (frame.right - frame.left) / most;
  const x = (mm: number) => round(frame.left + mm * scale);
  const y = (mm: number) => round(frame.bottom - mm * scale);
  const ticks = Array.from({ length: Math.floor(most / step) + 1 }, (_, i) => i * step);
  const shown = (mm: number) => String(Math.round(system === 'imperial' ? mm / MM_PER_INCH : mm));
  const write = (words: string, at: { x: number; y: number }, anchor: 'start' | 'middle' | 'end', role: Role = 'soft'): Item => {
    return { kind: 'text', ...at, text: words, size: text, anchor, role };
  };
  const grid = ticks.flatMap((mm): Item[] => [
    { kind: 'line', x1: x(mm), y1: y(0), x2: x(mm), y2: y(most), stroke: 'line', weight: 0.8 },
    { kind: 'line', x1: x(0), y1: y(mm), x2: x(most), y2: y(mm), stroke: 'line', weight: 0.8 },
  ]);
  return {
    width: side,
    height: round(frame.bottom + (labelled ? 44 : 1)),
    title,
    description: regions.map(({ name, limits }) => describe(name, limits, system)).join(' '),
    items: [
      ...grid,
      ...(labelled
        ? [
            ...ticks.map((mm) => write(shown(mm), { x: x(mm), y: frame.bottom + text + 4 }, 'middle')),
            ...ticks.slice(1).map((mm) => write(shown(mm), { x: frame.left - 6, y: y(mm) + 4 }, 'end')),
            write(`width, ${system === 'imperial' ? 'in' : 'mm'}`, { x: frame.right, y: frame.bottom + 2 * text + 12 }, 'end'),
            write('height', { x: 4, y: 14 }, 'start'),
          ]
        : []),
      ...regions.map(({ limits, look }): Item => {
        const d = `${sizeArea(limits)
          .map(([width, height], i) => `${i === 0 ? 'M' : 'L'}${x(width)} ${y(height)}`)
          .join('')}Z`;
        return look === 'filled'
          ? { kind: 'path', d, fill: 'glass', stroke: 'ink', weight: labelled ? 1.4 : 1 }
          : { kind: 'path', d, stroke: 'copper', weight: labelled ? 2 : 1.6, dash: [5, 3] };
      }),
      ...(labelled && regions[0] ? labels(regions[0].limits, system, x, y, shown, write) : []),
    ],
  };
}

type Write = (words: string, at: { x: number; y: number }, anchor: 'start' | 'middle' | 'end', role?: Role) => Item;

/** The limits at their lines, inside the area where there is room. */
function labels(
  limits: AreaLimits,
  system: MeasureSystem,
  x: (mm: number) => number,
  y: (mm: number) => number,
  shown: (mm: number) => string,
  write: Write,
): Item[] {
  const { maxLong, maxShort, maxAreaM2, maxAspect, minWidth, minHeight } = limits;
  const area = maxAreaM2 * 1e6;
  const flat = Math.min(maxShort, area / maxLong);
  // The curve of the area, where it is the bound: from the longest edge to the longest short edge, or to itself.
  const middle = (flat + Math.min(maxShort, Math.sqrt(area))) / 2;
  return [
    write(`longest ${shown(maxLong)}`, { x: x((minWidth + flat) / 2), y: y(maxLong) - 6 }, 'middle', 'ink'),
    write(`area ${formatArea(maxAreaM2, system)}`, { x: x(middle) + 12, y: y(area / middle) }, 'start', 'ink'),
    ...(area > maxShort ** 2
      ? [write(`short edge ${shown(maxShort)}`, { x: x(maxShort) + 8, y: y(maxShort) - 6 }, 'start' as const, 'ink' as const)]
      : []),
    write(
      `long edge up to ${maxAspect} × the short`,
      { x: x(maxLong * 0.28), y: y((maxLong * 0.32) / maxAspect + minHeight) - 8 },
      'start',
      'ink',
    ),
    write(`from ${shown(minWidth)} × ${shown(minHeight)}`, { x: x(minWidth) + 10, y: y(minHeight * 3.2) }, 'start', 'ink'),
  ];
}

function describe(
  name: string,
  { minWidth, minHeight, maxLong, maxShort, maxAreaM2, maxAspect }: AreaLimits,
  system: MeasureSystem,
): string {
  const unit = system === 'imperial' ? 'in' : 'mm';
  const length = (mm: number) => (system === 'imperial' ? decimals(mm / MM_PER_INCH, 0) : decimals(mm, 0));
  return `${name}: from ${length(minWidth)} × ${length(minHeight)} ${unit}; long edge up to ${length(maxLong)} ${unit}, short edge up to ${length(maxShort)} ${unit}, area up to ${formatArea(maxAreaM2, system)}, long edge up to ${maxAspect} times the short.`;
}

/** Round numbers in the maker's measures. */
export function tickStep(system: MeasureSystem, fine: boolean): number {
  return system === 'metric' ? (fine ? 500 : 1000) : (fine ? 24 : 48) * MM_PER_INCH;
}
