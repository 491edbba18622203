import type { SpacerItem } from '../contracts/catalogue';
import type { Drawing, Item } from './drawing';
import { area, arrow, box, cutLite, dot, picture, scatter, slab, stroke, trace } from './picture';
import { edgeOf } from './section-edge';

export type MakingStepName = 'cut' | 'edge deleted' | 'washed' | 'spacer filled' | 'primary seal' | 'pressed' | 'secondary seal' | 'marked';

/** How a unit is made, step by step. */
export function makingPictures(): Record<MakingStepName, Drawing> {
  return {
    cut: picture('Cutting', 'A large sheet of glass, divided by lines into lites; a wheel scores the next line.', [
      ...slab(16, 22, 132, 92, 3, 'glass'),
      stroke(trace('M', 70, 22, 'v', 92, 'M', 70, 74, 'h', 78), 'ink', 1.2),
      { kind: 'line', x1: 116, y1: 22, x2: 116, y2: 74, stroke: 'copper', weight: 1.8, dash: [5, 3] },
      { kind: 'circle', cx: 116, cy: 50, r: 6, fill: 'sheet', stroke: 'copper', weight: 1.8 },
      dot(116, 50, 1.6, 'copper'),
    ]),
    'edge deleted': picture(
      'The coating leaves the edge',
      'A coated lite, its coating taken off in a band along the edge by a grinding wheel.',
      [
        box(20, 14, 116, 98, 'glass', 'ink', 1.4),
        ...Array.from({ length: 11 }, (_, i) => stroke(trace('M', 32, 28 + i * 7, 'h', 92), 'copper', 1.6)),
        { kind: 'circle', cx: 130, cy: 62, r: 14, fill: 'sheet', stroke: 'metal', weight: 2.4 },
        dot(130, 62, 2.4, 'metal'),
        stroke(trace('M', 120, 44, 'a', 20, 20, 0, 0, 1, 22, 2), 'soft', 1.2),
        arrow(150, 84, 150, 108, 'soft', 1.4),
      ],
    ),
    washed: picture('Washing', 'A lite runs between two turning brushes; clean water drips off.', [
      ...cutLite(78, 4, 122, 12),
      ...[54, 114].flatMap((x): Item[] => [
        ...Array.from({ length: 18 }, (_, i) => {
          const angle = (i * Math.PI) / 9;
          return stroke(
            trace('M', x + 14 * Math.cos(angle), 62 + 14 * Math.sin(angle), 'L', x + 23 * Math.cos(angle), 62 + 23 * Math.sin(angle)),
            'metal',
            1.2,
          );
        }),
        { kind: 'circle', cx: x, cy: 62, r: 14, fill: 'tint', stroke: 'ink', weight: 1.2 },
        dot(x, 62, 2.2, 'ink'),
      ]),
      ...[
        [66, 96],
        [70, 110],
        [98, 100],
        [103, 114],
        [64, 24],
        [103, 30],
      ].map(([x, y]) => area(trace('M', x!, y! - 5, 'q', 4, 6, 0, 8, 'q', -4, -2, 0, -8, 'Z'), 'glass-edge')),
    ]),
    'spacer filled': picture(
      'Filling the spacer',
      'A spacer bar, bent at its corner; beads of desiccant run from a funnel into its open end.',
      [
        area(trace('M', 54, 34, 'h', 24, 'v', 60, 'h', 76, 'v', 24, 'h', -100, 'Z'), 'metal', 'ink'),
        area(trace('M', 58, 34, 'h', 16, 'v', 64, 'h', 76, 'v', 16, 'h', -92, 'Z'), { hatch: 'desiccant' }),
        area(trace('M', 46, 6, 'h', 40, 'l', -14, 18, 'v', 6, 'h', -12, 'v', -6, 'Z'), 'tint', 'ink'),
        ...Array.from({ length: 9 }, (_, i) => dot(54 + (i % 5) * 6 + 2 * scatter(i, 1), 9 + Math.floor(i / 5) * 5, 2.2, 'bead')),
      ],
    ),
    'primary seal': picture('The primary seal', 'A spacer cut across, with a cord of butyl along both flanks, laid on by two nozzles.', [
      area(trace('M', 52, 36, 'h', 64, 'v', 34, 'l', -14, 14, 'h', -36, 'l', -14, -14, 'Z'), 'metal'),
      area(trace('M', 56, 40, 'h', 56, 'v', 29, 'l', -12, 11, 'h', -32, 'l', -12, -11, 'Z'), { hatch: 'desiccant' }),
      ...[
        { x: 47, way: -1 },
        { x: 121, way: 1 },
      ].flatMap(({ x, way }): Item[] => [
        { kind: 'circle', cx: x, cy: 54, r: 5.4, fill: 'butyl' },
        area(
          trace('M', x + way * 7, 49, 'l', way * 10, -4, 'h', way * 20, 'v', 18, 'h', -way * 20, 'l', -way * 10, -4, 'Z'),
          'tint',
          'ink',
        ),
        arrow(x + way * 34, 54, x + way * 16, 54, 'butyl', 1.6),
      ]),
    ]),
    pressed: picture(
      'Pressing, and filling with gas',
      'Two lites pressed onto the spacer from both sides, while gas takes the place of the air between them.',
      [
        ...cutLite(48, 6, 112, 16),
        ...cutLite(104, 6, 112, 16),
        ...edgeOf(spacer, 64, 104, 112, 3, 1.6).items.filter(({ part }) => part !== 'secondary seal'),
        ...[34, 66].flatMap((y) => [arrow(14, y, 44, y, 'copper', 2), arrow(154, y, 124, y, 'copper', 2)]),
        ...Array.from({ length: 9 }, (_, i): Item => {
          return {
            kind: 'circle',
            cx: 71 + (i % 3) * 12 + 3 * scatter(i, 2),
            cy: 26 + Math.floor(i / 3) * 15 + 4 * scatter(i, 7),
            r: 3,
            fill: 'tint',
            stroke: 'glass-edge',
          };
        }),
        arrow(84, 2, 84, 18, 'glass-edge', 1.6),
      ],
    ),
    'secondary seal': picture(
      'The secondary seal',
      'The edge of a unit, cut across; a nozzle fills the groove between the lites behind the spacer.',
      [
        ...cutLite(44, 6, 92, 20),
        ...cutLite(104, 6, 92, 20),
        ...edgeOf(spacer, 64, 104, 92, 4, 1.6).items,
        area(trace('M', 78, 122, 'v', -12, 'l', 3, -12, 'h', 6, 'l', 3, 12, 'v', 12, 'Z'), 'tint', 'ink'),
        stroke(trace('M', 84, 98, 'v', -6), 'soft', 3),
        arrow(106, 112, 136, 112, 'copper', 1.8),
      ],
    ),
    marked: picture('Marked and ready', 'A finished unit with the label that says who made it, when and what it is.', [
      ...slab(34, 26, 84, 88, 8, 'glass'),
      stroke(trace('M', 39, 31, 'h', 74, 'v', 78, 'h', -74, 'Z'), 'metal', 2),
      box(76, 80, 32, 24, 'sheet', 'copper', 1.2),
      ...[0, 3, 5, 9, 11, 15, 17, 20, 23].map((x, i) => stroke(trace('M', 80 + x, 84, 'v', 10), 'ink', i % 3 === 0 ? 1.8 : 0.9)),
      stroke(trace('M', 80, 99, 'h', 20), 'soft', 1.2),
      stroke(trace('M', 50, 66, 'l', 22, -22, 'm', -12, 26, 'l', 12, -12), 'glass-edge', 1),
    ]),
  };
}

/** How vapour gets in at a seal that has given way, and where it shows. */
export function moisturePicture(): Drawing {
  const [left, right, bottom] = [46, 118, 104];
  const edge = edgeOf(spacer, left, right, bottom, 4.4, 1.6);
  const fog = Array.from({ length: 18 }, (_, i) =>
    dot(left + 3 + (i % 3) * 5 + 2 * scatter(i, 4), 12 + Math.floor(i / 3) * 6 + 3 * scatter(i, 9), 1 + scatter(i, 2), 'glass-edge'),
  );
  const water = trace('M', left - 18, bottom + 9, 'q', 6, -5, 12, 0);
  return picture(
    'How moisture gets in',
    'The edge of an old unit, cut across. Water stands at its foot; vapour creeps along a crack in the secondary seal, past butyl that has let go of the glass and desiccant that is full, and fogs the cold inner face of the outer lite.',
    [
      ...cutLite(left - 18, 4, bottom, 18),
      ...cutLite(right, 4, bottom, 18),
      ...edge.items,
      ...fog,
      stroke(trace('M', left + 2, bottom, 'l', 3, -8, 'l', -3, -7, 'l', 3, -8, 'l', -3, -9), 'ink', 1.8),
      arrow(left + 4, bottom - 30, left + 8, edge.top - 4, 'copper', 1.8),
      stroke(`${water}${trace('t', 12, 0).repeat(8)}`, 'glass-edge', 1.4),
      arrow(left + 22, bottom + 16, left + 5, bottom + 2, 'copper', 1.8),
    ],
  );
}

/** An ordinary bar, for these pictures alone. */
const spacer: SpacerItem = {
  id: 'picture',
  name: 'aluminium',
  summary: '',
  whenToChoose: '',
  material: 'aluminium',
  conductivity: 160,
  wallMm: 0.35,
  sightlineMm: 12,
  massPerMetre: 0.2,
  thermallyImproved: false,
  widthsMm: [],
  source: '',
};
