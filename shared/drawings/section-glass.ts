import { type Item, round } from './drawing';
import { type Layer, type LiteLayer, surfaceAt } from './section-layers';

/** A point to be named by a label; `y` is the renderer's to choose where it is not given. */
export interface Named {
  x: number;
  text: string;
}

/** A lite, cut off above by a wavy line; a laminate with its interlayers. */
export function drawLite({ number, left, right, lite: { glass } }: LiteLayer, top: number, bottom: number): Item[] {
  const width = right - left;
  const wave = Math.min(4, width / 4);
  const crest = `q${round(width / 4)} ${round(-wave)} ${round(width / 2)} 0t${round(width / 2)} 0`;
  return [
    {
      kind: 'path',
      d: `M${round(left)} ${round(bottom)}V${round(top)}${crest}V${round(bottom)}Z`,
      fill: 'glass',
      stroke: 'ink',
      part: `lite ${number}`,
    },
    ...strokes(left, right, top, bottom),
    ...interlayersOf(glass).map(({ from, to }): Item => {
      return {
        kind: 'rect',
        x: round(left + from * width),
        y: round(top + wave / 2),
        width: round((to - from) * width),
        height: round(bottom - top - wave / 2),
        fill: { hatch: 'interlayer' },
        stroke: 'glass-edge',
        weight: 0.6,
        part: 'interlayer',
      };
    }),
  ];
}

/** Slanting strokes: the sign for glass cut across. */
function strokes(left: number, right: number, top: number, bottom: number): Item[] {
  const inset = Math.min(3, (right - left) / 5);
  const rise = Math.min(10, (right - left - 2 * inset) * 0.7);
  const items: Item[] = [];
  for (let y = top + 24; y < bottom - 10; y += 26) {
    items.push({
      kind: 'line',
      x1: round(left + inset),
      y1: round(y),
      x2: round(right - inset),
      y2: round(y - rise),
      stroke: 'glass-edge',
      weight: 0.8,
      part: 'glass',
    });
  }
  return items;
}

/** Where the interlayers of a laminate lie, as shares of its thickness from outside. */
function interlayersOf({ plies, actualMm }: { plies: readonly number[]; actualMm: number }): { from: number; to: number }[] {
  const glass = plies.reduce((sum, ply) => sum + ply, 0);
  const thickness = (actualMm - glass) / (plies.length - 1);
  let mm = 0;
  return plies.slice(0, -1).map((ply) => {
    const from = mm + ply;
    mm = from + thickness;
    return { from: from / actualMm, to: mm / actualMm };
  });
}

/** The interlayer of the inmost laminate. */
export function nameInterlayer(lites: readonly LiteLayer[]): Named[] {
  const laminate = lites.filter(({ lite }) => lite.glass.plies.length > 1).at(-1);
  const [interlayer] = laminate ? interlayersOf(laminate.lite.glass) : [];
  if (!laminate || !interlayer) return [];
  return [{ x: laminate.left + (laminate.right - laminate.left) * ((interlayer.from + interlayer.to) / 2), text: 'interlayer' }];
}

/**
 * A line on each coated surface. A soft coat ends at `deleted`, above the seals, where it is
 * taken off so that they hold; a hard coat runs to the edge.
 */
export function drawCoatings(
  lites: readonly LiteLayer[],
  layers: readonly Layer[],
  at: { top: number; deleted: number; bottom: number; weight: number },
): { items: Item[]; named: Named[] } {
  const items: Item[] = [];
  const named: Named[] = [];
  for (const { lite } of lites) {
    if (!lite.coating) continue;
    const { item, surface } = lite.coating;
    // The line lies on the glass, on its free side.
    const x = surfaceAt(layers, surface) + ((surface % 2 === 1 ? -1 : 1) * at.weight) / 2;
    items.push({
      kind: 'line',
      x1: round(x),
      y1: round(at.top),
      x2: round(x),
      y2: round(item.kind === 'soft' ? at.deleted : at.bottom),
      stroke: 'copper',
      weight: round(at.weight),
      part: `coating on ${surface}`,
    });
    named.push({ x, text: item.name });
  }
  return { items, named };
}
