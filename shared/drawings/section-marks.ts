import { type Item, round, type Sheet } from './drawing';
import { type Named } from './section-glass';
import { type CavityLayer, type Layer, surfaceAt } from './section-layers';
import { spreadApart } from './spread-apart';
import { textWidth } from './text-width';

/**
 * Gas and width in each cavity: level where there is room, upright in a slim cavity, and left to
 * a label where there is none. `bottom` is where the lowest of these texts ends.
 */
export function nameGases(
  cavities: readonly CavityLayer[],
  top: number,
  edgeTop: number,
  textSize: number,
): { items: Item[]; named: Named[]; bottom: number } {
  const size = 0.86 * textSize;
  const items: Item[] = [];
  const named: Named[] = [];
  let bottom = top + 0.8 * textSize;
  const write = (text: string, x: number, y: number, upward: boolean) =>
    items.push({
      kind: 'text',
      x: round(x),
      y: round(y),
      text,
      size: round(size),
      anchor: 'middle',
      role: 'soft',
      part: 'gas',
      ...(upward ? { upward } : {}),
    });
  for (const { left, right, cavity } of cavities) {
    const middle = (left + right) / 2;
    const gas = cavity.gas.gas;
    const wide = `${cavity.widthMm} mm`;
    const both = `${gas}, ${wide}`;
    const length = textWidth(both, size);
    if (Math.max(textWidth(gas, size), textWidth(wide, size)) + 0.5 * textSize <= right - left) {
      write(gas, middle, top + 1.6 * textSize, false);
      write(wide, middle, top + 2.7 * textSize, false);
      bottom = Math.max(bottom, top + 3 * textSize);
    } else if (right - left >= 1.15 * size && length <= (edgeTop - top) / 2) {
      write(both, middle + 0.35 * size, top + 0.8 * textSize + length / 2, true);
      bottom = Math.max(bottom, top + 0.8 * textSize + length);
    } else {
      named.push({ x: middle, text: both });
    }
  }
  return { items, named, bottom };
}

/** A numbered circle over each surface, with a leader to it. */
export function numberSurfaces(layers: readonly Layer[], count: number, top: number, { width, textSize }: Sheet): Item[] {
  const r = 0.6 * textSize;
  const y = 0.85 * textSize;
  const surfaces = Array.from({ length: count }, (_, i) => ({ number: i + 1, at: surfaceAt(layers, i + 1) }));
  const middles = spreadApart(
    surfaces.map(({ at }) => ({ wanted: at, size: 2 * r + 1.5 })),
    1,
    width - 1,
  );
  return surfaces.flatMap(({ number, at }, i): Item[] => {
    const middle = round(middles[i]!);
    return [
      { kind: 'line', x1: middle, y1: round(y + r), x2: round(at), y2: round(top - 4), stroke: 'soft', weight: 0.7, part: 'leader' },
      { kind: 'circle', cx: middle, cy: round(y), r: round(r), fill: 'sheet', stroke: 'ink', weight: 0.9, part: `surface ${number}` },
      {
        kind: 'text',
        x: middle,
        y: round(y + 0.28 * textSize),
        text: String(number),
        size: round(0.8 * textSize),
        anchor: 'middle',
        role: 'ink',
        part: 'surface number',
      },
    ];
  });
}
