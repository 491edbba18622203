import { type LineInput } from '@shared/contracts/prices';
import { unitSchema, type UnitInput } from '@shared/contracts/units';
import { type Chance } from './chance';

/** What dealers of the demo market order: make-ups, sizes and seasons, all invented. */

type MakeUp = Pick<UnitInput, 'lites' | 'cavities'>;

const double = (
  glass: string,
  treatment: string,
  coating: string | null,
  gas: string,
  spacer: string,
  width: string,
  inner = glass,
): MakeUp => ({
  lites: [
    { glass, treatment, edgeWork: treatment === 'tempered' ? 'seamed' : undefined },
    {
      glass: inner,
      treatment,
      coating: coating ? { id: coating, surface: 3 } : undefined,
      edgeWork: treatment === 'tempered' ? 'seamed' : undefined,
    },
  ],
  cavities: [{ width, gas, spacer }],
});
const triple = (glass: string, gas: string, width: string): MakeUp => ({
  lites: [
    { glass, treatment: 'annealed', coating: { id: 'low-e-soft', surface: 2 } },
    { glass, treatment: 'annealed' },
    { glass, treatment: 'annealed', coating: { id: 'low-e-soft', surface: 5 } },
  ],
  cavities: [
    { width, gas, spacer: 'warm-edge' },
    { width, gas, spacer: 'warm-edge' },
  ],
});

/** What each maker is asked for, by weight. */
const wanted: Record<string, [number, MakeUp][]> = {
  northmere: [
    [30, double('clear-3', 'annealed', 'low-e-soft', 'argon', 'stainless', '16')],
    [16, double('clear-3', 'tempered', 'low-e-soft', 'argon', 'stainless', '16')],
    [14, double('clear-3', 'annealed', null, 'air', 'aluminium', '12')],
    [10, double('clear-4', 'annealed', 'low-e-soft', 'argon', 'warm-edge', '16')],
    [8, double('clear-6', 'tempered', 'low-e-soft', 'argon', 'stainless', '12')],
    [5, double('clear-5', 'tempered', 'low-e-hard', 'air', 'aluminium', '12')],
    [4, double('obscured-4', 'annealed', 'low-e-soft', 'argon', 'stainless', '14', 'clear-4')],
    [6, triple('clear-4', 'argon', '12')],
  ],
  'kestrel-ford': [
    [24, double('clear-6', 'tempered', 'low-e-soft', 'argon', 'stainless', '12')],
    [18, double('clear-6', 'annealed', 'low-e-soft', 'argon', 'stainless', '12')],
    [12, double('bronze-6', 'tempered', 'low-e-solar', 'argon', 'stainless', '12', 'clear-6')],
    [10, double('clear-8', 'tempered', 'low-e-soft', 'argon', 'stainless', '14')],
    [10, double('clear-4', 'annealed', 'low-e-soft', 'argon', 'warm-edge', '16')],
    [6, double('laminated-clear-6', 'annealed', 'low-e-soft', 'argon', 'stainless', '12', 'clear-6')],
  ],
  aldersund: [
    [30, triple('clear-4', 'argon', '16')],
    [14, triple('clear-4', 'krypton', '12')],
    [16, double('clear-4', 'annealed', 'low-e-soft', 'argon', 'warm-edge', '16')],
    [8, double('clear-6', 'tempered', 'low-e-soft', 'argon', 'stainless', '16')],
  ],
};

const MM_PER_SIXTEENTH = 1.5875;

/** Rooms and openings that tags name. */
const tags = [
  'Kitchen',
  'Bay, left',
  'Bay, right',
  'Bath',
  'Bedroom 1',
  'Bedroom 2',
  'Stair',
  'Hall',
  'Front',
  'Rear',
  'Dormer',
  'Porch',
  'W1',
  'W2',
  'W3',
  'Unit 4',
];

/** How busy a month is beside the average; sealed units sell in spring and autumn. Invented. */
const season = [0.6, 0.7, 0.95, 1.15, 1.25, 1.15, 1.05, 1.05, 1.2, 1.25, 1.0, 0.65];

export const seasonOf = (day: string): number => season[Number(day.slice(5, 7)) - 1] ?? 1;

/** Inches as millimetres, without the digits that binary floats add. */
const mm = (inches: number) => String(Number((inches * 25.4).toFixed(4)));

/** Standard sizes in mm of the lists that have them: dealers know them and use them. */
const standard: Record<string, [string, string][]> = {
  northmere: (
    [
      [30, 48],
      [36, 48],
      [36, 60],
      [24, 36],
      [28, 54],
      [48, 48],
      [30, 60],
    ] as const
  ).map(([w, h]) => [mm(w), mm(h)]),
  aldersund: [
    ['988', '1188'],
    ['1188', '1388'],
    ['788', '988'],
  ],
};

function sizeFor(maker: string, by: Chance): [string, string] {
  const standardSizes = standard[maker];
  if (standardSizes && by.happens(0.42)) return by.pick(standardSizes);
  if (maker === 'aldersund') return [String(by.whole(420, 1700)), String(by.whole(520, 1900))];
  const largest = maker === 'kestrel-ford' ? 900 : 640;
  // In eighths of an inch mostly, which is even sixteenths; fewer large ones than small ones.
  const edge = (low: number) =>
    (2 * Math.round((low + (largest - low) * by.next() * by.next()) / 2) * MM_PER_SIXTEENTH).toFixed(4).replace(/\.?0+$/, '');
  return [edge(260), edge(320)];
}

/** Lines of one order at a maker, each buildable there but for chance; the caller drops what is refused. */
export function linesFor(maker: string, by: Chance): LineInput[] {
  const makeUps = wanted[maker];
  if (!makeUps) throw new RangeError(`no demand for ${maker}`);
  const makeUp = by.weighted(makeUps);
  const count = by.weighted([
    [20, 1],
    [24, 2],
    [22, 3],
    [14, 5],
    [8, 8],
    [3, 14],
  ]);
  return Array.from({ length: count }, () => {
    const [width, height] = sizeFor(maker, by);
    return {
      unit: unitSchema.parse({ width, height, ...(by.happens(0.85) ? makeUp : by.weighted(makeUps)) }),
      quantity: by.weighted([
        [40, 1],
        [22, 2],
        [12, 3],
        [10, 4],
        [8, 6],
        [4, 12],
      ]),
      tag: by.pick(tags),
    };
  });
}

const surnames = [
  'Alder',
  'Brandt',
  'Cole',
  'Denby',
  'Ekman',
  'Farrow',
  'Goss',
  'Hollis',
  'Ives',
  'Jarrow',
  'Keel',
  'Lomax',
  'Mercer',
  'Nash',
  'Oakes',
  'Penn',
  'Quist',
  'Rowe',
  'Stead',
  'Thorne',
];

/** The dealer's own customer: an invented household. */
export function customerFor(by: Chance): { name: string; email: string } {
  const name = by.pick(surnames);
  return {
    name: `${by.pick(['Family', 'Mr', 'Ms', 'House'])} ${name}`,
    email: `${name.toLowerCase()}${by.whole(1, 99)}@household.example`,
  };
}
