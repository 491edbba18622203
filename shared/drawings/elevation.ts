import type { Catalogue } from '../contracts/catalogue';
import type { Unit } from '../contracts/units';
import { outlineOf, type Point } from '../glazing/outline';
import { formatLength, formatLengthBoth } from '../measures/format-length';
import type { MeasureSystem } from '../measures/parse-length';
import { levelDimension, uprightDimension } from './dimension-line';
import { type Drawing, type Item, round, type Sheet } from './drawing';
import { cornersOf, cornersPath, crossing, insetCorners, isWithin, outlinePath, type Placing, placeX, placeY } from './placed-outline';
import { textWidth, wrapText } from './text-width';

/** The sheet of an elevation on screen. */
export const elevationSheet: Sheet = { width: 230, height: 330, textSize: 14 };

export interface ElevationOptions {
  system: MeasureSystem;
  tag?: string | null | undefined;
  sheet?: Sheet;
}

/**
 * A unit seen from outside, to scale: outline, sightline, grid bars, its dimensions and tag.
 *
 * @param unit a unit whose shape has no problems
 * @param catalogue where spacers and bars are looked up; what it does not hold is left out
 */
export function elevation(unit: Unit, catalogue: Catalogue, { system, tag, sheet = elevationSheet }: ElevationOptions): Drawing {
  const { textSize } = sheet;
  const width = Number(unit.width);
  const height = Number(unit.height);
  const outline = outlineOf(unit);
  const corners = cornersOf(outline);
  const second = secondHeight(unit);
  const room = {
    left: 3.1 * textSize,
    top: 3.1 * textSize,
    right: (second ? 3.1 : 0.4) * textSize,
    // Two lines of a tag that may have to stand below.
    bottom: (tag ? 0.8 + 1.1 * tagLines(tag, unit, sheet).length : 0.6) * textSize,
  };
  const scale = Math.min((sheet.width - room.left - room.right) / width, (sheet.height - room.top - room.bottom) / height);
  const x = room.left + (sheet.width - room.left - room.right - width * scale) / 2;
  const placing: Placing = { x, y: room.top + (sheet.height - room.top - room.bottom + height * scale) / 2, scale };
  const top = placeY(placing, height);
  const right = placeX(placing, width);

  const sightline = Math.max(
    0,
    ...unit.cavities.map((cavity) => catalogue.spacers.find(({ id }) => id === cavity.spacer)?.sightlineMm ?? 0),
  );
  const inner = insetCorners(corners, Math.min(sightline, width / 4, height / 4));
  const dimensionGap = 1.3 * textSize;
  const items: Item[] = [
    { kind: 'path', d: outlinePath(outline, placing), fill: 'glass', stroke: 'ink', weight: 0.1 * textSize, part: 'unit' },
    ...reflections(corners, width, height, placing, textSize),
    { kind: 'path', d: cornersPath(inner, placing), stroke: 'metal', weight: 0.13 * textSize, part: 'sightline' },
    ...bars(unit, catalogue, inner, placing),
    ...levelDimension(x, right, top - dimensionGap, formatLength(unit.width, system), textSize),
    ...uprightDimension(x - dimensionGap, top, placing.y, formatLength(unit.height, system), textSize, 'left'),
    ...(second
      ? uprightDimension(
          right + dimensionGap,
          placeY(placing, second.to),
          placeY(placing, second.from),
          formatLength(second.mm, system),
          textSize,
          'right',
        )
      : []),
    ...(tag ? placeTag(tag, unit, inner, placing, sheet) : []),
  ];
  return {
    width: sheet.width,
    height: sheet.height,
    title: tag ? `Elevation of ${tag}` : 'Elevation',
    description: describe(unit, catalogue, system, tag),
    items,
  };
}

/** A shape's second height, where it has one: from and to in mm above the bottom. */
function secondHeight({ shape, height }: Unit): { mm: string; from: number; to: number } | null {
  switch (shape.class) {
    case 'raked-head':
      return { mm: shape.lowHeight, from: 0, to: Number(shape.lowHeight) };
    case 'gable':
      return { mm: shape.eaves, from: 0, to: Number(shape.eaves) };
    case 'segment-arch':
      return { mm: shape.rise, from: Number(height) - Number(shape.rise), to: Number(height) };
    case 'octagon':
      return { mm: shape.cut, from: 0, to: Number(shape.cut) };
    default:
      return null;
  }
}

/** Three slanting strokes that say glass, where they fall within the edge. */
function reflections(corners: readonly Point[], width: number, height: number, placing: Placing, textSize: number): Item[] {
  const short = Math.min(width, height);
  const strokes: [x: number, y: number, length: number][] = [
    [0.2, 0.7, 0.29],
    [0.28, 0.66, 0.16],
    [0.62, 0.3, 0.22],
  ];
  return strokes.flatMap(([fromX, fromY, part]): Item[] => {
    const from = { x: fromX * width, y: fromY * height };
    const to = { x: from.x + part * short, y: from.y + part * short };
    if (!isWithin(corners, from) || !isWithin(corners, to)) return [];
    return [
      {
        kind: 'line',
        x1: round(placeX(placing, from.x)),
        y1: round(placeY(placing, from.y)),
        x2: round(placeX(placing, to.x)),
        y2: round(placeY(placing, to.y)),
        stroke: 'glass-edge',
        weight: 0.07 * textSize,
        part: 'reflection',
      },
    ];
  });
}

/** Grid bars at equal distances within the sightline; level bars run in front. */
function bars(unit: Unit, catalogue: Catalogue, inner: readonly Point[], placing: Placing): Item[] {
  const bar = unit.grid && catalogue.grids.find(({ id }) => id === unit.grid?.bar);
  if (!unit.grid || !bar) return [];
  const half = bar.widthMm / 2;
  const between = (along: 'x' | 'y', count: number) => {
    const values = inner.map((point) => point[along]);
    const from = Math.min(...values);
    const step = (Math.max(...values) - from) / (count + 1);
    return Array.from({ length: count }, (_, i) => from + step * (i + 1));
  };
  const rect = (left: number, bottom: number, right: number, top: number): Item => ({
    kind: 'rect',
    x: round(placeX(placing, left)),
    y: round(placeY(placing, top)),
    width: round((right - left) * placing.scale),
    height: round((top - bottom) * placing.scale),
    fill: 'sheet',
    stroke: 'metal',
    weight: 0.8,
    part: 'bar',
  });
  const upright = between('x', unit.grid.across).flatMap((at) => {
    const run = crossing(inner, 'x', at);
    return run ? [rect(at - half, run[0], at + half, run[1])] : [];
  });
  const level = between('y', unit.grid.down).flatMap((at) => {
    const run = crossing(inner, 'y', at);
    return run ? [rect(run[0], at - half, run[1], at + half)] : [];
  });
  return [...upright, ...level];
}

/** Where the tag goes: near the bottom of the glass, or below the unit where bars or its length leave no room. */
function placeTag(tag: string, unit: Unit, inner: readonly Point[], placing: Placing, sheet: Sheet): Item[] {
  const size = tagSize(sheet);
  const xs = inner.map(({ x }) => x);
  const sill = Math.min(...inner.map(({ y }) => y));
  const head = Math.max(...inner.map(({ y }) => y));
  const write = (text: string, x: number, y: number): Item => {
    return { kind: 'text', x: round(x), y: round(y), text, size, anchor: 'middle', role: 'soft', part: 'tag' };
  };
  if (!hasBars(unit) && (head - sill) * placing.scale > 4 * sheet.textSize) {
    const baseline = sill + (0.9 * sheet.textSize) / placing.scale;
    const runs = [baseline, baseline + size / placing.scale].map((y) => crossing(inner, 'y', y));
    const [from, to] = [Math.max(...runs.map((run) => run?.[0] ?? Infinity)), Math.min(...runs.map((run) => run?.[1] ?? -Infinity))];
    if (textWidth(tag, size) + sheet.textSize < (to - from) * placing.scale) {
      return [write(tag, placeX(placing, (from + to) / 2), placeY(placing, baseline))];
    }
  }
  const lines = tagLines(tag, unit, sheet);
  const half = Math.max(...lines.map((line) => textWidth(line, size))) / 2 + 2;
  const middle = placeX(placing, (Math.min(...xs) + Math.max(...xs)) / 2);
  const x = Math.max(half, Math.min(middle, sheet.width - half));
  return lines.map((line, i) => write(line, x, placing.y + (1.25 + 1.1 * i) * sheet.textSize));
}

const tagSize = ({ textSize }: Sheet) => round(0.93 * textSize);
/** Between the texts of the upright dimensions, where they may reach as low. */
const tagLines = (tag: string, unit: Unit, sheet: Sheet) =>
  wrapText(tag, tagSize(sheet), sheet.width - 4 - (secondHeight(unit) ? 5 * sheet.textSize : 0), 2);
const hasBars = ({ grid }: Unit) => grid !== undefined && grid.across + grid.down > 0;

function describe(unit: Unit, catalogue: Catalogue, system: MeasureSystem, tag: string | null | undefined): string {
  const shape = unit.shape.class.replaceAll('-', ' ');
  const bar = unit.grid && catalogue.grids.find(({ id }) => id === unit.grid?.bar);
  const grid = unit.grid && bar ? `, with a grid of ${unit.grid.across} upright and ${unit.grid.down} level bars, ${bar.name}` : '';
  const called = tag ? `, tagged “${tag}”` : '';
  return `To scale, seen from outside: a ${shape} ${formatLengthBoth(unit.width, system)} wide and ${formatLengthBoth(unit.height, system)} high${grid}${called}.`;
}
