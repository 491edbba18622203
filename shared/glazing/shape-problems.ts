import type { FieldError } from '../contracts/problems';
import type { Unit } from '../contracts/units';
import { outlineOf, type Point } from './outline';

/** Sharper corners cannot be cut and sealed: common practice, no published source. Degrees. */
export const minimumCorner = 15;
/** How far two dimensions that must agree may differ, mm: a shop's cutting tolerance. */
const tolerance = 1;

type Shaped = Pick<Unit, 'width' | 'height' | 'shape'>;

/** What is wrong with a unit's shape, each at its field; empty for one that can be drawn and cut. */
export function findShapeProblems(unit: Shaped): FieldError[] {
  const problems = dimensionProblems(unit);
  if (problems.length > 0) return problems;
  const sharp = sharpestCorner(unit);
  if (sharp !== null && sharp < minimumCorner) {
    const pointer = unit.shape.class === 'polygon' ? '/shape/points' : '/shape';
    return [{ pointer, detail: `the sharpest corner is ${sharp.toFixed(1)}°; below ${minimumCorner}° glass cannot be cut and sealed` }];
  }
  return [];
}

function dimensionProblems({ width, height, shape }: Shaped): FieldError[] {
  const w = Number(width);
  const h = Number(height);
  const below = (value: string, field: string, name: string) =>
    Number(value) < h ? [] : [{ pointer: `/shape/${field}`, detail: `${name} of ${value} mm must be below the height of ${height} mm` }];
  switch (shape.class) {
    case 'rectangle':
    case 'ellipse':
      return [];
    case 'raked-head':
      return below(shape.lowHeight, 'lowHeight', 'the low side');
    case 'gable':
      return below(shape.eaves, 'eaves', 'eaves');
    case 'segment-arch':
      if (Number(shape.rise) > w / 2)
        return [
          { pointer: '/shape/rise', detail: `an arch over ${width} mm rises by half of that at most: ${w / 2} mm, not ${shape.rise} mm` },
        ];
      if (Number(shape.rise) > h)
        return [{ pointer: '/shape/rise', detail: `the rise of ${shape.rise} mm is more than the height of ${height} mm` }];
      return [];
    case 'half-round':
      return Math.abs(h - w / 2) <= tolerance
        ? []
        : [{ pointer: '/height', detail: `a half-round is half as high as it is wide: ${w / 2} mm, not ${height} mm` }];
    case 'circle':
      return Math.abs(h - w) <= tolerance
        ? []
        : [{ pointer: '/height', detail: `a circle is as high as it is wide: ${width} mm, not ${height} mm` }];
    case 'triangle':
      return Number(shape.apex ?? '0') <= w
        ? []
        : [{ pointer: '/shape/apex', detail: `the apex at ${shape.apex} mm lies beyond the width of ${width} mm` }];
    case 'octagon':
      return 2 * Number(shape.cut) < Math.min(w, h)
        ? []
        : [{ pointer: '/shape/cut', detail: `cuts of ${shape.cut} mm leave nothing of the short edge: below ${Math.min(w, h) / 2} mm` }];
    case 'polygon':
      return polygonProblems(
        shape.points.map(({ x, y }) => ({ x: Number(x), y: Number(y) })),
        w,
        h,
      );
  }
}

function polygonProblems(points: Point[], w: number, h: number): FieldError[] {
  const at = (i: number) => points[(i + points.length) % points.length]!;
  for (const [i, point] of points.entries()) {
    const pointer = `/shape/points/${i}`;
    if (point.x > w || point.y > h) return [{ pointer, detail: `corner ${i + 1} lies outside the bounding rectangle of ${w} × ${h} mm` }];
    if (length(point, at(i + 1)) < tolerance)
      return [{ pointer, detail: `corner ${i + 1} and the next are the same point; the last corner joins the first by itself` }];
  }
  const spans = (values: number[], whole: number) => Math.min(...values) <= tolerance && whole - Math.max(...values) <= tolerance;
  if (!spans(points.map((p) => p.x), w)) return [{ pointer: '/shape/points', detail: `the corners must span the width from 0 to ${w} mm` }]; // prettier-ignore
  if (!spans(points.map((p) => p.y), h)) return [{ pointer: '/shape/points', detail: `the corners must span the height from 0 to ${h} mm` }]; // prettier-ignore
  for (let i = 0; i < points.length; i++) {
    for (let j = i + 2; j < points.length; j++) {
      if (i === 0 && j === points.length - 1) continue;
      if (meet(at(i), at(i + 1), at(j), at(j + 1))) {
        return [
          {
            pointer: `/shape/points/${j}`,
            detail: `the edge after corner ${i + 1} meets the edge after corner ${j + 1}: edges must not cross or touch`,
          },
        ];
      }
    }
  }
  return [];
}

/** Smallest interior angle between straight edges, degrees; null where the outline has an arc. */
function sharpestCorner(unit: Shaped): number | null {
  const { start, segments } = outlineOf(unit);
  if (segments.some((segment) => segment.kind === 'arc')) return null;
  const corners = [start, ...segments.slice(0, -1).map((segment) => segment.to)];
  const angles = corners.map((corner, i) => {
    const before = corners[(i + corners.length - 1) % corners.length]!;
    const after = corners[(i + 1) % corners.length]!;
    const inward = Math.atan2(before.y - corner.y, before.x - corner.x) - Math.atan2(after.y - corner.y, after.x - corner.x);
    return ((inward * 180) / Math.PI + 720) % 360;
  });
  return Math.min(...angles);
}

/** Whether two segments share a point. */
function meet(a: Point, b: Point, c: Point, d: Point): boolean {
  const side = (p: Point, q: Point, r: Point) => Math.sign((q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x));
  const within = (p: Point, q: Point, r: Point) =>
    Math.min(p.x, q.x) <= r.x && r.x <= Math.max(p.x, q.x) && Math.min(p.y, q.y) <= r.y && r.y <= Math.max(p.y, q.y);
  const [s1, s2, s3, s4] = [side(a, b, c), side(a, b, d), side(c, d, a), side(c, d, b)];
  if (s1 !== s2 && s3 !== s4) return true;
  return (s1 === 0 && within(a, b, c)) || (s2 === 0 && within(a, b, d)) || (s3 === 0 && within(c, d, a)) || (s4 === 0 && within(c, d, b));
}

function length(a: Point, b: Point): number {
  return Math.hypot(b.x - a.x, b.y - a.y);
}
