import type { CoatingItem, GlassItem, TreatmentItem } from '../contracts/catalogue';
import { crackStar, dice } from './break-patterns';
import type { Drawing, Fill, Item, Role } from './drawing';
import { area, arrow, box, cutLite, dot, picture, slab, stroke, trace, warmth } from './picture';

const tints: Record<string, Role> = { bronze: 'bead', grey: 'seal', gray: 'seal', green: 'glass-edge' };

/** A lite with its thickness; tinted or patterned as it is, a laminate with its film and the cracks that it holds. */
export function glassPicture(glass: GlassItem): Drawing {
  const thickness = Math.max(3, glass.actualMm * 1.5);
  const face: Fill = (glass.tint && tints[glass.tint]) || 'glass';
  const [x, y, width, height] = [34, 32, 84, 80];
  const items: Item[] = slab(x, y, width, height, thickness, face);
  if (glass.construction === 'laminated') {
    // The film runs along the middle of the edge.
    const lift = thickness * 0.3;
    items.push(
      stroke(trace('M', x + thickness / 2, y - lift, 'h', width, 'v', height), 'copper', 1.8),
      stroke(crackStar({ x: x + 8, y: y + 6, size: 68 }, 9, 3), 'glass-edge', 0.9),
    );
  } else if (glass.tint === 'obscured') {
    for (let i = 0; i < 9; i++) {
      for (let j = 0; j < 8; j++)
        items.push({ kind: 'circle', cx: x + 7 + i * 9 - (j % 2) * 2, cy: y + 8 + j * 9, r: 3, stroke: 'glass-edge', weight: 0.8 });
    }
  } else {
    const role = face === 'glass' ? 'glass-edge' : 'ink';
    for (const [fromX, fromY, length] of [
      [16, 46, 26],
      [26, 48, 14],
      [54, 68, 18],
    ] as const) {
      items.push(stroke(trace('M', x + fromX, y + fromY, 'l', length, -length), role, 1));
    }
  }
  const said =
    glass.construction === 'laminated' ? ' Two lites held together by a film, which still holds the pieces when they crack.' : '';
  return picture(glass.name, `A lite of ${glass.name}, ${glass.actualMm} mm thick, thickness to scale among the glasses.${said}`, items);
}

const breaks: Record<TreatmentItem['kind'], { path: (square: { x: number; y: number; size: number }) => string; words: string }> = {
  annealed: { path: (square) => crackStar(square, 11, 1), words: 'long, sharp shards that run from the blow to the edge' },
  'heat-strengthened': { path: (square) => crackStar(square, 7, 0), words: 'a few large pieces that run to the edge' },
  tempered: { path: (square) => dice(square, 11), words: 'a great many small, blunt pieces' },
};

/** How glass breaks after a treatment. */
export function treatmentPicture({ kind, name }: TreatmentItem): Drawing {
  const square = { x: 36, y: 16, size: 94 };
  const { path, words } = breaks[kind];
  return picture(`${name} glass, broken`, `A lite of ${name} glass that a blow has broken into ${words}.`, [
    box(square.x, square.y, square.size, square.size, 'glass'),
    stroke(path(square), 'ink', 0.9),
    stroke(trace('M', square.x, square.y, 'h', square.size, 'v', square.size, 'h', -square.size, 'Z'), 'ink', 1.4),
    dot(square.x + square.size * 0.42, square.y + square.size * 0.4, 3.2, 'copper'),
  ]);
}

/** Warmth from the room turned back, and how much of five rays of sun passes: by the coating's own figures. */
export function coatingPicture({ name, kind, emissivity, optics }: CoatingItem): Drawing {
  const [left, right] = [74, 94];
  const passing = Math.round(5 * optics.solarTransmittance);
  const items: Item[] = [...cutLite(left, 8, 118, right - left), box(right, 8, 3.4, 110, 'copper')];
  for (let i = 0; i < 5; i++) {
    const y = 20 + i * 10;
    if (i < passing) items.push(arrow(14, y, 150, y + 8, 'bead', 1.4));
    else items.push(arrow(14, y, left - 1, y + 4, 'bead', 1.4), arrow(left - 1, y + 4, 30, y + 10, 'bead', 1.4));
  }
  const back = emissivity <= 0.05 ? 3 : 2;
  for (let i = 0; i < 3; i++) {
    const y = 84 + i * 14;
    items.push(warmth(154, right + 8, y, 'copper', 1.5));
    if (i < back)
      items.push(stroke(trace('M', right + 8, y, 'q', -5, 3, 1, 5), 'copper', 1.5), arrow(right + 9, y + 5, 136, y + 5, 'copper', 1.2));
    else items.push(warmth(left - 4, 40, y, 'copper', 0.8));
  }
  return picture(
    name,
    `A lite cut across, coated on its right face with a ${kind} coat. Of the warmth that the room sends it takes up ${percent(emissivity)} and turns the rest back; of the sun from the left ${percent(optics.solarTransmittance)} passes.`,
    items,
  );
}

const percent = (share: number) => `${Math.round(share * 100)} %`;

const edgeWords: Record<string, string> = {
  seamed: 'the sharp arrises taken off, the rest as it was cut',
  ground: 'flat and matt, with small bevels',
  polished: 'flat and shining, with small bevels',
};

/** The edge of a lite, cut across, as a kind of edge work leaves it; as it was cut for work that has no picture. */
export function edgeWorkPicture({ id, name }: { id: string; name: string }): Drawing {
  const [left, right, end] = [46, 122, 94];
  const smooth = id === 'ground' || id === 'polished';
  const bevel = smooth ? 6 : id === 'seamed' ? 10 : 0;
  const width = right - left - 2 * bevel;
  // As cut, the edge is uneven.
  const sole = smooth ? trace('h', width) : [2, -3, 3, -1, 2, -3].map((rise) => trace('l', width / 6, rise)).join('');
  const profile = `${trace('M', left, 10, 'V', end - bevel, 'l', bevel, bevel)}${sole}${trace('l', bevel, -bevel, 'V', 10)}`;
  const items: Item[] = [area(`${profile}Z`, 'glass'), stroke(profile, 'ink', 1.4)];
  for (let y = 32; y < end - 12; y += 18) items.push(stroke(trace('M', left + 12, y, 'l', right - left - 24, -14), 'glass-edge', 0.8));
  if (id === 'ground') {
    for (let x = left + 10; x < right - 8; x += 5) items.push(stroke(trace('M', x, end + 3, 'l', 4, 5), 'soft', 0.9));
  }
  if (id === 'polished') {
    for (const x of [-26, -13, 0, 13, 26]) items.push(stroke(trace('M', 84 + x, end + 5, 'l', x * 0.25, 9), 'copper', 1.4));
  }
  return picture(`${name} edge`, `The edge of a lite, cut across: ${edgeWords[id] ?? 'as it was cut'}.`, items);
}
