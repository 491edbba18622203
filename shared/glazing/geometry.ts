import type { Evaluation } from '../contracts/evaluation';
import { outlineOf, type Outline, type Point } from './outline';
import type { ResolvedUnit } from './resolve-unit';

/**
 * Sizes of a unit, in SI: m and m². Overall thickness takes the actual thickness of the glass.
 * The spacer runs inside the edge by the sightline of its product, in each cavity.
 */
export function geometryOf({ unit, widthMm, heightMm, lites, cavities }: ResolvedUnit): Evaluation['geometry'] {
  const outline = outlineOf(unit);
  const thickness =
    lites.reduce((sum, { glass }) => sum + glass.actualMm, 0) + cavities.reduce((sum, { widthMm: width }) => sum + width, 0);
  const spacer = cavities.reduce((sum, cavity) => sum + insetPerimeter(outline, cavity.spacer.sightlineMm), 0);
  return {
    area: areaOf(outline) / 1e6,
    perimeter: perimeterOf(outline) / 1000,
    boundingWidth: widthMm / 1000,
    boundingHeight: heightMm / 1000,
    aspect: Math.max(widthMm, heightMm) / Math.min(widthMm, heightMm),
    unitedMeasure: (widthMm + heightMm) / 1000,
    overallThickness: thickness / 1000,
    spacerLength: spacer / 1000,
  };
}

/** Area within an outline, mm²: the corners by cross products, each arc by its own sector (Green's theorem). */
export function areaOf({ start, segments }: Outline): number {
  let from: Point = start;
  let twice = 0;
  for (const segment of segments) {
    const { to } = segment;
    if (segment.kind === 'line') {
      twice += from.x * to.y - to.x * from.y;
    } else {
      const { centre, rx, ry, turn } = segment;
      twice += rx * ry * turn + centre.x * (to.y - from.y) - centre.y * (to.x - from.x);
    }
    from = to;
  }
  return twice / 2;
}

/** Length of an outline, mm. */
export function perimeterOf({ start, segments }: Outline): number {
  let from: Point = start;
  let length = 0;
  for (const segment of segments) {
    length +=
      segment.kind === 'line' ? Math.hypot(segment.to.x - from.x, segment.to.y - from.y) : arcLength(segment.rx, segment.ry, segment.turn);
    from = segment.to;
  }
  return length;
}

/**
 * Length of the line that runs `inset` mm inside the outline. Where the edge turns by an angle, the
 * inner line is shorter by 2·inset·tan(angle/2); along a curve by inset × the angle it turns. A
 * rectangle's is shorter by 8 insets, a circle's by 2π. Exact but where a corner meets a curve, which
 * the square of the inset ÷ the radius leaves out. Never below zero.
 */
export function insetPerimeter(outline: Outline, inset: number): number {
  const { start, segments } = outline;
  const headings: { into: number; outOf: number }[] = [];
  let from: Point = start;
  let curved = 0;
  for (const segment of segments) {
    if (segment.kind === 'line') {
      const heading = Math.atan2(segment.to.y - from.y, segment.to.x - from.x);
      headings.push({ into: heading, outOf: heading });
    } else {
      const into = tangent(segment.rx, segment.ry, segment.from);
      const outOf = tangent(segment.rx, segment.ry, segment.from + segment.turn);
      headings.push({ into, outOf });
      const whole = 2 * Math.PI;
      curved += (((outOf - into) % whole) + whole) % whole || whole;
    }
    from = segment.to;
  }
  const corners = headings.reduce((sum, { outOf }, i) => {
    const { into } = headings[(i + 1) % headings.length]!;
    const turn = Math.atan2(Math.sin(into - outOf), Math.cos(into - outOf));
    return sum + 2 * Math.tan(turn / 2);
  }, 0);
  return Math.max(0, perimeterOf(outline) - inset * (corners + curved));
}

/** Heading of an upright ellipse's edge at parameter `t`, going anticlockwise. */
function tangent(rx: number, ry: number, t: number): number {
  return Math.atan2(ry * Math.cos(t), -rx * Math.sin(t));
}

/** Length of an arc: exact for a circle; for half an ellipse by the arithmetic-geometric mean. */
function arcLength(rx: number, ry: number, turn: number): number {
  if (Math.abs(rx - ry) < 1e-9) return rx * turn;
  return (ellipsePerimeter(rx, ry) * turn) / (2 * Math.PI);
}

/** Perimeter of an ellipse (Gauss): 2π·(a² − Σ 2ⁿ⁻¹·cₙ²) ÷ agm(a, b). Same unit as the radii. */
export function ellipsePerimeter(rx: number, ry: number): number {
  let a = Math.max(rx, ry);
  let b = Math.min(rx, ry);
  let sum = a * a - (a * a - b * b) / 2;
  for (let weight = 1; Math.abs(a - b) > 1e-12 * a; weight *= 2) {
    const c = (a - b) / 2;
    [a, b] = [(a + b) / 2, Math.sqrt(a * b)];
    sum -= weight * c * c;
  }
  return (2 * Math.PI * sum) / a;
}
