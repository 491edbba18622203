import type { ResolvedUnit } from '../glazing/resolve-unit';
import { type Item, round } from './drawing';
import { type Edge } from './section-edge';
import { type Label } from './section-labels';
import { type CavityLayer } from './section-layers';

interface Fitting {
  items: Item[];
  labels: Label[];
}

/** A level grid bar, cut across, in the first cavity that is deep enough for it; its lower edge is at `lowest`. */
export function drawBar({ grid }: ResolvedUnit, cavities: readonly CavityLayer[], lowest: number, scale: number): Fitting {
  if (!grid || grid.down === 0) return { items: [], labels: [] };
  const { left, right } = cavities.find(({ cavity }) => cavity.widthMm > grid.bar.depthMm) ?? cavities[0]!;
  const width = Math.min(grid.bar.depthMm * scale, right - left);
  const height = grid.bar.widthMm * scale;
  const middle = (left + right) / 2;
  return {
    items: [
      {
        kind: 'rect',
        x: round(middle - width / 2),
        y: round(lowest - height),
        width: round(width),
        height: round(height),
        radius: round(Math.min(width, height) / 5),
        fill: 'tint',
        stroke: 'metal',
        weight: 1.2,
        part: 'bar',
      },
    ],
    labels: [{ x: middle, y: lowest - Math.min(height / 2, 8), text: 'grid bar' }],
  };
}

/** Open capillary tubes, from the cavity through spacer and seal to the outside air. */
export function drawTubes(cavities: readonly CavityLayer[], edges: readonly Edge[], bottom: number): Fitting {
  const open = cavities.flatMap(({ left, right, cavity }, i) =>
    cavity.capillary ? [{ x: left + (right - left) * 0.3, top: edges[i]!.top - 6 }] : [],
  );
  const inmost = open.at(-1);
  return {
    items: open.map(({ x, top }) => {
      return {
        kind: 'line',
        x1: round(x),
        y1: round(top),
        x2: round(x),
        y2: round(bottom + 3),
        stroke: 'ink',
        weight: 1.4,
        part: 'capillary tube',
      };
    }),
    labels: inmost ? [{ x: inmost.x, y: inmost.top + 1, text: 'capillary tube' }] : [],
  };
}

/** The parts of the inmost edge, and the spacer of every other material. */
export function nameEdges({ cavities }: ResolvedUnit, edges: readonly Edge[]): Label[] {
  const labels: Label[] = [];
  const named = new Set<string>();
  for (const [i, { spacer }] of [...cavities.entries()].reverse()) {
    if (!named.has(spacer.material)) labels.push({ ...edges[i]!.points.spacer, text: `${spacer.material} spacer` });
    named.add(spacer.material);
  }
  const { butyl, desiccant, secondary } = edges.at(-1)!.points;
  return [...labels, { ...butyl, text: 'butyl' }, { ...desiccant, text: 'desiccant' }, { ...secondary, text: 'secondary seal' }];
}
