import type { Unit } from '../contracts/units';

/**
 * The edge of a unit as a path, in mm, from the lower left of its bounding rectangle, y upward,
 * anticlockwise, closed. What areas, perimeters and drawings are made from.
 */
export interface Point {
  x: number;
  y: number;
}
export type Segment =
  | { kind: 'line'; to: Point }
  /** An arc of an upright ellipse (a circle where the radii agree), anticlockwise by `turn` radians of its parameter. */
  | { kind: 'arc'; to: Point; centre: Point; rx: number; ry: number; from: number; turn: number };
export interface Outline {
  start: Point;
  segments: Segment[];
}

/** The outline of a unit, seen from outside. Assumes a shape that `findShapeProblems` finds nothing wrong with. */
export function outlineOf(unit: Pick<Unit, 'width' | 'height' | 'shape'>): Outline {
  const w = Number(unit.width);
  const h = Number(unit.height);
  const { shape } = unit;
  switch (shape.class) {
    case 'rectangle':
      return straight([0, 0], [w, 0], [w, h], [0, h]);
    case 'raked-head': {
      const low = Number(shape.lowHeight);
      return shape.high === 'left' ? straight([0, 0], [w, 0], [w, low], [0, h]) : straight([0, 0], [w, 0], [w, h], [0, low]);
    }
    case 'gable': {
      const eaves = Number(shape.eaves);
      return straight([0, 0], [w, 0], [w, eaves], [w / 2, h], [0, eaves]);
    }
    case 'triangle':
      return straight([0, 0], [w, 0], [Number(shape.apex ?? '0'), h]);
    case 'octagon': {
      const c = Number(shape.cut);
      return straight([c, 0], [w - c, 0], [w, c], [w, h - c], [w - c, h], [c, h], [0, h - c], [0, c]);
    }
    case 'polygon': {
      const points = shape.points.map(({ x, y }) => [Number(x), Number(y)] as const);
      return straight(...(signedArea(points) < 0 ? points.reverse() : points));
    }
    case 'segment-arch': {
      const rise = Number(shape.rise);
      const radius = archRadius(w, rise);
      const centre = { x: w / 2, y: h - radius };
      const half = 2 * Math.atan2(rise, w / 2);
      const legs = h - rise;
      const arch: Segment = {
        kind: 'arc',
        to: { x: 0, y: legs },
        centre,
        rx: radius,
        ry: radius,
        from: Math.PI / 2 - half,
        turn: 2 * half,
      };
      const base: Segment = { kind: 'line', to: { x: w, y: 0 } };
      const sides: [Segment, Segment] = [
        { kind: 'line', to: { x: w, y: legs } },
        { kind: 'line', to: { x: 0, y: 0 } },
      ];
      return { start: { x: 0, y: 0 }, segments: legs > 0 ? [base, sides[0], arch, sides[1]] : [base, arch] };
    }
    case 'half-round':
      return {
        start: { x: 0, y: 0 },
        segments: [
          { kind: 'line', to: { x: w, y: 0 } },
          { kind: 'arc', to: { x: 0, y: 0 }, centre: { x: w / 2, y: 0 }, rx: w / 2, ry: h, from: 0, turn: Math.PI },
        ],
      };
    case 'circle':
    case 'ellipse':
      return {
        start: { x: w, y: h / 2 },
        segments: [
          { kind: 'arc', to: { x: 0, y: h / 2 }, centre: { x: w / 2, y: h / 2 }, rx: w / 2, ry: h / 2, from: 0, turn: Math.PI },
          { kind: 'arc', to: { x: w, y: h / 2 }, centre: { x: w / 2, y: h / 2 }, rx: w / 2, ry: h / 2, from: Math.PI, turn: Math.PI },
        ],
      };
  }
}

/** Radius of a circular segment over `width` that rises by `rise`, same unit as given. */
export function archRadius(width: number, rise: number): number {
  return (width * width) / (8 * rise) + rise / 2;
}

/**
 * The outline as the `d` of an SVG path, y downward from the top of a bounding rectangle of
 * `heightMm`, in mm.
 */
export function svgPath(outline: Outline, heightMm: number): string {
  const at = ({ x, y }: Point) => `${round(x)} ${round(heightMm - y)}`;
  const parts = outline.segments.map((segment) =>
    segment.kind === 'line'
      ? `L${at(segment.to)}`
      : `A${round(segment.rx)} ${round(segment.ry)} 0 ${segment.turn > Math.PI ? 1 : 0} 0 ${at(segment.to)}`,
  );
  return `M${at(outline.start)}${parts.join('')}Z`;
}

/** Twice-halved cross products: positive for corners in anticlockwise order. */
export function signedArea(points: readonly (readonly [number, number])[]): number {
  return points.reduce((sum, [x, y], i) => {
    const [nextX, nextY] = points[(i + 1) % points.length]!;
    return sum + (x * nextY - nextX * y) / 2;
  }, 0);
}

function straight(...points: (readonly [number, number])[]): Outline {
  const [first, ...rest] = points.map(([x, y]) => ({ x, y }));
  return { start: first!, segments: [...rest, first!].map((to) => ({ kind: 'line', to })) };
}

function round(value: number): number {
  return Math.round(value * 1e4) / 1e4;
}
