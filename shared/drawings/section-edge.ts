import type { SpacerItem } from '../contracts/catalogue';
import { type Fill, type Item, round } from './drawing';

/**
 * Of the sightline, the part that the spacer takes; the secondary seal behind it takes the
 * rest. And the pressed thickness of the butyl. Common practice, no published source.
 */
const spacerShare = 0.6;
const butylMm = 0.5;

export interface EdgePoint {
  x: number;
  y: number;
}

/** The edge of one cavity, and a point of each part for a leader to start from. */
export interface Edge {
  items: Item[];
  top: number;
  points: { spacer: EdgePoint; butyl: EdgePoint; desiccant: EdgePoint; secondary: EdgePoint };
}

/**
 * Spacer filled with desiccant, a butyl seal on both flanks and the secondary seal behind, in
 * the cavity from `left` to `right` that ends at `bottom`. `scale` is in units per mm; what
 * would be thinner than `thinnest` is drawn that thick, for it would be lost in print.
 */
export function edgeOf(spacer: SpacerItem, left: number, right: number, bottom: number, scale: number, thinnest: number): Edge {
  const width = right - left;
  const depth = spacer.sightlineMm * scale;
  const top = bottom - depth;
  const height = depth * spacerShare;
  const butyl = Math.min(Math.max(butylMm * scale, thinnest), width / 5);
  const x1 = left + butyl;
  const x2 = right - butyl;
  const wall = Math.min(Math.max(spacer.wallMm * scale, thinnest), (x2 - x1) / 5, height / 5);
  const heel = top + height;
  const shoulder = spacer.material === 'warm-edge' ? 0 : Math.min(height * 0.3, (x2 - x1) * 0.22);
  const rect = (part: string, x: number, y: number, w: number, h: number, fill: Fill): Item => ({
    kind: 'rect',
    x: round(x),
    y: round(y),
    width: round(w),
    height: round(h),
    fill,
    part,
  });
  const sealed = { from: top + height * 0.12, to: top + height * 0.66 };
  const profile = (inset: number) => spacerProfile(x1 + inset, top + inset, x2 - inset, heel - inset, Math.max(0, shoulder - inset * 0.6));
  const items: Item[] = [
    rect('secondary seal', left, sealed.to, width, bottom - sealed.to, { hatch: 'secondary seal' }),
    rect('primary seal', left, sealed.from, butyl, sealed.to - sealed.from, 'butyl'),
    rect('primary seal', x2, sealed.from, butyl, sealed.to - sealed.from, 'butyl'),
    { kind: 'path', d: profile(0), fill: spacer.material === 'warm-edge' ? { hatch: 'foam' } : 'metal', part: 'spacer' },
    { kind: 'path', d: profile(wall), fill: { hatch: 'desiccant' }, part: 'desiccant' },
    { kind: 'path', d: profile(0), stroke: spacer.material === 'warm-edge' ? 'soft' : 'metal', weight: 0.6, part: 'spacer' },
    // The wall towards the cavity is pierced, so that the desiccant dries the gas.
    {
      kind: 'line',
      x1: round(x1 + wall + (x2 - x1) * 0.15),
      y1: round(top + wall / 2),
      x2: round(x2 - wall - (x2 - x1) * 0.15),
      y2: round(top + wall / 2),
      stroke: 'sheet',
      weight: round(wall * 1.2),
      dash: [1.2, 5],
      part: 'holes',
    },
  ];
  return {
    items,
    top,
    points: {
      spacer: { x: x2 - wall / 2, y: top + height * 0.08 },
      butyl: { x: x2 + butyl / 2, y: top + height * 0.34 },
      desiccant: { x: x1 + (x2 - x1) * 0.72, y: top + height * 0.6 },
      secondary: { x: left + width * 0.7, y: heel + (bottom - heel) * 0.55 },
    },
  };
}

/** A box with its two shoulders towards the outside cut off. */
function spacerProfile(x1: number, y1: number, x2: number, y2: number, shoulder: number): string {
  const at = (x: number, y: number) => `${round(x)} ${round(y)}`;
  return `M${at(x1, y1)}L${at(x2, y1)}L${at(x2, y2 - shoulder)}L${at(x2 - shoulder, y2)}L${at(x1 + shoulder, y2)}L${at(x1, y2 - shoulder)}Z`;
}
