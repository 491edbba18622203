import { type PriceListContent } from '@shared/contracts/price-lists';
import { type Unit } from '@shared/contracts/units';
import { type LineToPrice } from '@api/pricing/engine/price-unit';
import { catalogueData } from '../../seeds/reference/catalogue-data';

/** A small seeded generator (mulberry32), so that a run can be repeated. Gives 0 to 1, below 1. */
export function seededRandom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

/** How the sizes and make-ups of generated lines spread. */
export interface Spread {
  /** make-ups to choose from; fewer means that lines share more */
  makeUps: number;
  /** share of lines at a standard size, where the list has any */
  standard: number;
  /** share of triples */
  triple: number;
  /** share with a grid, worked edges, another shape, an extra */
  grid: number;
  edges: number;
  shape: number;
  extra: number;
}

/** As a dealer's schedules look: few make-ups, most rectangles, many sizes. */
export const everydaySpread: Spread = { makeUps: 24, standard: 0.25, triple: 0.2, grid: 0.15, edges: 0.1, shape: 0.03, extra: 0.03 };
/** Everything that a list can charge, more often than in life. */
export const wideSpread: Spread = { makeUps: 400, standard: 0.25, triple: 0.4, grid: 0.4, edges: 0.4, shape: 0.25, extra: 0.35 };

/** Lines that the list has all rates for. Sizes to 1/16 in or 1 mm, from 10 to 100 in or 250 to 2500 mm. */
export function lineFactory(content: PriceListContent, count: number, seed: number, spread: Spread = everydaySpread): LineToPrice[] {
  const random = seededRandom(seed);
  const pick = <Item>(items: readonly Item[]): Item => items[Math.floor(random() * items.length)]!;
  const chance = (share: number) => random() < share;
  const whole = (from: number, to: number) => from + Math.floor(random() * (to - from + 1));
  const imperial = content.measure === 'imperial';

  const side = () => (imperial ? sixteenths(whole(160, 1600)) : String(whole(250, 2500)));
  const makeUps = Array.from({ length: spread.makeUps }, () => makeUpOf(content, chance(spread.triple), pick, chance));

  return Array.from({ length: count }, () => {
    const standard = content.standardSizes.length > 0 && chance(spread.standard) ? pick(content.standardSizes) : undefined;
    const { lites, cavities } = pick(makeUps);
    const tubes = chance(spread.extra) && content.extras.some(({ applies }) => applies === 'capillary');
    const asked = content.extras.filter(({ applies }) => applies === 'asked');
    const unit: Unit = {
      width: standard ? inMm(standard.width, imperial) : side(),
      height: standard ? inMm(standard.height, imperial) : side(),
      shape: shapeOf(content, chance(spread.shape), pick),
      lites: chance(spread.edges) ? lites.map((lite) => ({ ...lite, edgeWork: pick(content.edgeWork).edgeWork })) : lites,
      cavities: tubes ? cavities.map((cavity) => ({ ...cavity, gas: 'air', capillary: true })) : cavities,
      ...(chance(spread.grid) ? { grid: { bar: pick(content.grids).bar, across: whole(0, 4), down: whole(0, 4) } } : {}),
    };
    const line: LineToPrice = { unit, quantity: chance(0.5) ? whole(1, 4) : whole(1, 80) };
    return asked.length > 0 && chance(spread.extra) ? { ...line, extras: [pick(asked).id] } : line;
  });
}

function makeUpOf(
  content: PriceListContent,
  triple: boolean,
  pick: <Item>(items: readonly Item[]) => Item,
  chance: (share: number) => boolean,
): Pick<Unit, 'lites' | 'cavities'> {
  const treated = content.treatments.map(({ treatment, nominalMm }) => ({
    treatment,
    glasses: content.glass.map(({ glass }) => glass).filter((glass) => nominalOf(glass) === nominalMm),
  }));
  const lites = Array.from({ length: triple ? 3 : 2 }, (_, i): Unit['lites'][number] => {
    const row = chance(0.6) ? pick(treated) : undefined;
    const glass = row && row.glasses.length > 0 ? pick(row.glasses) : pick(content.glass).glass;
    const lite = { glass, treatment: row && row.glasses.length > 0 ? row.treatment : 'annealed' };
    return chance(0.5) ? { ...lite, coating: { id: pick(content.coatings).coating, surface: 2 * i + (chance(0.5) ? 1 : 2) } } : lite;
  });
  const cavities = lites.slice(1).map(() => ({
    width: pick(['12', '14', '16']),
    gas: pick(content.gases).gas,
    spacer: pick(content.spacers).spacer,
  }));
  return { lites, cavities };
}

/** Shapes by class alone: what they are like inside does not matter to a price. */
function shapeOf(content: PriceListContent, other: boolean, pick: <Item>(items: readonly Item[]) => Item): Unit['shape'] {
  const plain = content.shapes.map(({ shape }) => shape).filter((shape) => shape === 'half-round' || shape === 'ellipse');
  if (!other) return { class: 'rectangle' };
  if (plain.length > 0 && pick([true, false])) return { class: pick(plain) };
  return content.shapes.some(({ shape }) => shape === 'triangle') ? { class: 'triangle' } : { class: 'rectangle' };
}

const nominalMm = new Map(catalogueData.glasses.map((glass) => [glass.id, glass.nominalMm]));
const nominalOf = (glass: string) => nominalMm.get(glass);

/** Sixteenths of an inch in mm: 1.5875 each, as whole ten-thousandths. */
function sixteenths(count: number): string {
  return tenThousandths(count * 15_875);
}

function inMm(size: string, imperial: boolean): string {
  return imperial ? tenThousandths(Math.round(Number(size) * 254_000)) : size;
}

function tenThousandths(count: number): string {
  const text = String(count).padStart(5, '0');
  const fraction = text.slice(-4).replace(/0+$/, '');
  return fraction === '' ? text.slice(0, -4) : `${text.slice(0, -4)}.${fraction}`;
}
