import type { Drawing, Fill, Item, PathItem, Role } from './drawing';
import { round } from './drawing';

/** Small pictures that explain: one size, one hand. Not to scale unless they say so. */
export const pictureSize = { width: 168, height: 126 };

export function picture(title: string, description: string, items: Item[]): Drawing {
  return { ...pictureSize, title, description, items };
}

/** Commands of a path with its numbers rounded: `trace('M', 3, 4, 'L', 5, 6)`. */
export function trace(...parts: (string | number)[]): string {
  return parts.map((part) => (typeof part === 'number' ? ` ${round(part)}` : part)).join('');
}

export function area(d: string, fill: Fill, stroke?: Role, weight = 1): PathItem {
  return { kind: 'path', d, fill, ...(stroke ? { stroke, weight } : {}) };
}

export function stroke(d: string, role: Role, weight = 1.4): PathItem {
  return { kind: 'path', d, stroke: role, weight };
}

export function box(x: number, y: number, width: number, height: number, fill: Fill, edge?: Role, weight = 1.2): Item {
  return {
    kind: 'rect',
    x: round(x),
    y: round(y),
    width: round(width),
    height: round(height),
    fill,
    ...(edge ? { stroke: edge, weight } : {}),
  };
}

export function dot(cx: number, cy: number, r: number, fill: Role): Item {
  return { kind: 'circle', cx: round(cx), cy: round(cy), r: round(r), fill };
}

/** A straight arrow from one point to another. */
export function arrow(x1: number, y1: number, x2: number, y2: number, role: Role, weight = 1.6): Item {
  return stroke(`${trace('M', x1, y1, 'L', x2, y2)}${head(x1, y1, x2, y2)}`, role, weight);
}

/** Warmth on its way: a wavy arrow, level, from `x1` to `x2`. */
export function warmth(x1: number, x2: number, y: number, role: Role = 'copper', weight = 1.6): Item {
  const way = Math.sign(x2 - x1);
  const waves = Math.max(1, Math.round(Math.abs(x2 - x1) / 12));
  const half = (x2 - x1) / waves / 2;
  const wave = trace('q', half / 2, -6, half, 0, 't', half, 0);
  return stroke(`${trace('M', x1, y)}${wave.repeat(waves)}${head(x2 - way, y, x2, y)}`, role, weight);
}

/** The two strokes of an arrow's head at its end. */
function head(x1: number, y1: number, x2: number, y2: number): string {
  const angle = Math.atan2(y2 - y1, x2 - x1);
  const at = (turn: number) => [x2 - 6 * Math.cos(angle + turn), y2 - 6 * Math.sin(angle + turn)] as const;
  return trace('M', ...at(0.5), 'L', x2, y2, 'L', ...at(-0.5));
}

/** A lite cut across, open at its top and bottom. */
export function cutLite(x: number, top: number, bottom: number, width: number): Item[] {
  const strokes: Item[] = [];
  for (let y = top + 16; y < bottom - 2; y += 18) {
    strokes.push(stroke(trace('M', x + width * 0.2, y, 'L', x + width * 0.8, y - width * 0.5), 'glass-edge', 0.8));
  }
  return [
    box(x, top, width, bottom - top, 'glass'),
    ...strokes,
    stroke(trace('M', x, top, 'V', bottom, 'M', x + width, top, 'V', bottom), 'ink', 1.2),
  ];
}

/** A lite seen from the front, a little from the side, so that its thickness shows. */
export function slab(x: number, y: number, width: number, height: number, thickness: number, face: Fill): Item[] {
  const lift = thickness * 0.6;
  return [
    area(trace('M', x, y, 'l', thickness, -lift, 'h', width, 'l', -thickness, lift, 'Z'), 'tint', 'ink'),
    area(trace('M', x + width, y, 'l', thickness, -lift, 'v', height, 'l', -thickness, lift, 'Z'), 'glass-edge', 'ink'),
    box(x, y, width, height, face, 'ink'),
  ];
}

/** A share from 0 to 1 that looks like chance and is the same every time. */
export function scatter(i: number, j: number): number {
  return ((i * 73 + j * 151 + i * j * 37 + 29) % 101) / 101;
}
