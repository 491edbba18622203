/**
 * A drawing as plain data: what is drawn, never how. Screen, print and PDF each render it in
 * their own colours. Lengths are in the drawing's own units, y downward from the top left.
 */

/** What a line or a surface stands for; the renderer knows its colour. */
export type Role = 'ink' | 'soft' | 'line' | 'glass' | 'glass-edge' | 'metal' | 'copper' | 'butyl' | 'seal' | 'bead' | 'sheet' | 'tint';

/** Materials shown by a pattern; `hatches` says how each tile looks. */
export type Hatch = 'desiccant' | 'secondary seal' | 'interlayer' | 'foam';

export type Fill = Role | { hatch: Hatch };

/** Names what an item shows, so that it can be found again: `lite 1`, `label`, `surface 2`. */
interface Part {
  part?: string;
}
interface Stroked {
  stroke?: Role;
  /** width of the stroke, 1 where absent */
  weight?: number;
  dash?: readonly [number, number];
}
interface Filled {
  fill?: Fill;
}

export type PathItem = { kind: 'path'; d: string } & Part & Stroked & Filled;
export type LineItem = { kind: 'line'; x1: number; y1: number; x2: number; y2: number } & Part & Stroked;
export type RectItem = { kind: 'rect'; x: number; y: number; width: number; height: number; radius?: number } & Part & Stroked & Filled;
export type CircleItem = { kind: 'circle'; cx: number; cy: number; r: number } & Part & Stroked & Filled;
export interface TextItem extends Part {
  kind: 'text';
  /** the point on the baseline that `anchor` speaks of */
  x: number;
  y: number;
  text: string;
  size: number;
  anchor: 'start' | 'middle' | 'end';
  role: Role;
  bold?: boolean;
  /** reads upward, turned about (x, y) */
  upward?: boolean;
}
export type Item = PathItem | LineItem | RectItem | CircleItem | TextItem;

export interface Drawing {
  width: number;
  height: number;
  /** a few words */
  title: string;
  /** what one sees, in a sentence or two, for those who do not see it */
  description: string;
  items: Item[];
}

/** Room to draw in, in the drawing's units, and the size of its text. */
export interface Sheet {
  width: number;
  height: number;
  textSize: number;
}

/** A hundredth of a unit is finer than any screen or printer. */
export const round = (value: number): number => Math.round(value * 100) / 100 + 0;

/** A tile of a pattern: `ground` below, `dots` or slanting `lines` in `ink` over it. */
export interface Tile {
  size: number;
  ground: Role;
  ink: Role;
  dots: readonly { cx: number; cy: number; r: number }[];
  lines: readonly { x1: number; y1: number; x2: number; y2: number; weight: number }[];
}

/** From corner to corner, and the two halves that meet the neighbouring tiles. */
const slant = (size: number, weight: number) => [
  { x1: 0, y1: size, x2: size, y2: 0, weight },
  { x1: -1, y1: 1, x2: 1, y2: -1, weight },
  { x1: size - 1, y1: size + 1, x2: size + 1, y2: size - 1, weight },
];

export const hatches: Record<Hatch, Tile> = {
  desiccant: {
    size: 6,
    ground: 'sheet',
    ink: 'bead',
    dots: [
      { cx: 1.6, cy: 1.6, r: 1.35 },
      { cx: 4.6, cy: 4.5, r: 1.35 },
    ],
    lines: [],
  },
  'secondary seal': { size: 5, ground: 'seal', ink: 'soft', dots: [], lines: slant(5, 0.7) },
  interlayer: { size: 3, ground: 'tint', ink: 'glass-edge', dots: [{ cx: 1.5, cy: 1.5, r: 0.6 }], lines: [] },
  foam: {
    size: 4,
    ground: 'seal',
    ink: 'soft',
    dots: [
      { cx: 1, cy: 1, r: 0.5 },
      { cx: 3, cy: 3, r: 0.5 },
    ],
    lines: [],
  },
};
