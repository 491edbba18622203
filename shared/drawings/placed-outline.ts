import type { Outline, Point } from '../glazing/outline';
import { round } from './drawing';

/** Where a unit stands on the sheet: the lower left of its bounding rectangle, and units per mm. */
export interface Placing {
  x: number;
  y: number;
  scale: number;
}

export const placeX = ({ x, scale }: Placing, mm: number): number => x + mm * scale;
/** The outline counts upward, the sheet downward. */
export const placeY = ({ y, scale }: Placing, mm: number): number => y - mm * scale;

/** The outline of a unit as the `d` of a path on the sheet. */
export function outlinePath({ start, segments }: Outline, placing: Placing): string {
  const at = (point: Point) => `${round(placeX(placing, point.x))} ${round(placeY(placing, point.y))}`;
  const parts = segments.map((segment) => {
    if (segment.kind === 'line') return `L${at(segment.to)}`;
    const large = segment.turn > Math.PI ? 1 : 0;
    // Anticlockwise with y upward is sweep 0 with y downward.
    return `A${round(segment.rx * placing.scale)} ${round(segment.ry * placing.scale)} 0 ${large} 0 ${at(segment.to)}`;
  });
  return `M${at(start)}${parts.join('')}Z`;
}

/** Straight lines through these points, closed. */
export function cornersPath(corners: readonly Point[], placing: Placing): string {
  return `M${corners.map((point) => `${round(placeX(placing, point.x))} ${round(placeY(placing, point.y))}`).join('L')}Z`;
}

/** The outline as corners in mm, arcs cut into chords of about two degrees. */
export function cornersOf({ start, segments }: Outline): Point[] {
  const corners: Point[] = [start];
  for (const segment of segments) {
    if (segment.kind === 'arc') {
      const chords = Math.max(2, Math.ceil(segment.turn / (Math.PI / 90)));
      for (let i = 1; i < chords; i++) {
        const angle = segment.from + (segment.turn * i) / chords;
        corners.push({ x: segment.centre.x + segment.rx * Math.cos(angle), y: segment.centre.y + segment.ry * Math.sin(angle) });
      }
    }
    corners.push(segment.to);
  }
  return corners.filter((point, i) => {
    const next = corners[(i + 1) % corners.length]!;
    return Math.hypot(next.x - point.x, next.y - point.y) > 1e-6;
  });
}

/** Anticlockwise corners moved inward by `inset` mm, each to where its two edges meet again. */
export function insetCorners(corners: readonly Point[], inset: number): Point[] {
  return corners.map((corner, i) => {
    const before = direction(corners[(i + corners.length - 1) % corners.length]!, corner);
    const after = direction(corner, corners[(i + 1) % corners.length]!);
    const sine = before.x * after.y - before.y * after.x;
    const cosine = before.x * after.x + before.y * after.y;
    // Half the turn; a corner that turns right back has no inside.
    const slide = Math.abs(1 + cosine) < 1e-9 ? 0 : sine / (1 + cosine);
    return {
      x: corner.x - before.y * inset - before.x * slide * inset,
      y: corner.y + before.x * inset - before.y * slide * inset,
    };
  });
}

/** Where an upright (or level) line at `at` mm runs inside the corners: from its first crossing to its last. */
export function crossing(corners: readonly Point[], along: 'x' | 'y', at: number): [number, number] | null {
  const across = along === 'x' ? 'y' : 'x';
  const hits = corners.flatMap((a, i) => {
    const b = corners[(i + 1) % corners.length]!;
    if (a[along] > at === b[along] > at) return [];
    return [a[across] + ((at - a[along]) / (b[along] - a[along])) * (b[across] - a[across])];
  });
  return hits.length < 2 ? null : [Math.min(...hits), Math.max(...hits)];
}

/** Whether a point lies within the corners. */
export function isWithin(corners: readonly Point[], { x, y }: Point): boolean {
  let within = false;
  for (const [i, a] of corners.entries()) {
    const b = corners[(i + 1) % corners.length]!;
    if (a.y > y !== b.y > y && x < a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x)) within = !within;
  }
  return within;
}

function direction(from: Point, to: Point): Point {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  return { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
}
