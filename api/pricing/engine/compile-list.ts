import { type Catalogue } from '@shared/contracts/catalogue';
import { type PriceListContent, type PriceListVersion, type UnitFamily } from '@shared/contracts/price-lists';
import { type Currency, minorDigits } from '@shared/money/currencies';
import { Exact, exact } from '@shared/money/exact';
import { compileSizeCharges, type SizeRules } from './compile-size-charges';
import { compileTiers, type Discounts } from './discounts';
import { measuresOf, type Measures } from './measures';
import { indexProducts, type Products } from './index-products';

/** One rate of a list, ready to multiply. */
export interface Rule {
  /** among the rules of its list, from 0 */
  number: number;
  family: UnitFamily;
  rate: string;
  /** minor units for one part of the basis: see `Measures` for the parts of an area and a length */
  factor: Exact;
  /** the least a cavity costs, minor units; null without one */
  minimum: { minor: number; rate: string } | null;
  /** a rate of nothing makes no row */
  free: boolean;
  id: string;
  /** by the number of the lite, surface or cavity; at 0 where there is but one */
  labels: readonly string[];
}

export interface ExtraRule extends Rule {
  extra: string;
  applies: PriceListContent['extras'][number]['applies'];
  per: PriceListContent['extras'][number]['per'];
}

export interface QuantityBreak {
  atLeast: number;
  /** 0.03 for 3 % */
  part: Exact;
  /** as its row says it, -0.03 */
  rate: string;
  label: string;
  id: string;
}

/** A version of a list as look-ups and exact factors: what pricing a unit needs and nothing that depends on a dealer. */
export interface CompiledList extends SizeRules {
  version: string;
  name: string;
  content: PriceListContent;
  currency: Currency;
  /** minor units in a unit of the currency */
  minorPer: Exact;
  measures: Measures;
  products: Products;
  glass: ReadonlyMap<string, Rule>;
  /** by treatment, then by nominal thickness in mm */
  treatments: ReadonlyMap<string, ReadonlyMap<number, Rule>>;
  coatings: ReadonlyMap<string, Rule>;
  /** by the number of the cavity from outside, from 1 */
  assembly: ReadonlyMap<number, Rule>;
  spacers: ReadonlyMap<string, Rule>;
  gases: ReadonlyMap<string, Rule>;
  grids: ReadonlyMap<string, { bars: Rule; crossings: Rule }>;
  edgeWork: ReadonlyMap<string, Rule>;
  extras: readonly ExtraRule[];
  tiers: ReadonlyMap<string, Discounts>;
  /** the highest threshold first */
  quantityBreaks: readonly QuantityBreak[];
  /** a weight band or a delivery by weight */
  asksForWeight: boolean;
  ruleCount: number;
}

const compiled = new WeakMap<PriceListContent, { for: CompiledList; catalogue: Catalogue }>();

/**
 * Compiles a version once and keeps the result as long as its content lives. Published content
 * never changes; a draft that is edited must come as a new object, not as the old one altered.
 *
 * @throws TypeError when a rate is not a decimal string
 */
export function compileList(version: PriceListVersion, catalogue: Catalogue): CompiledList {
  const kept = compiled.get(version.content);
  if (kept && kept.catalogue === catalogue && kept.for.version === version.version && kept.for.name === version.name) return kept.for;
  const list = compile(version, catalogue);
  compiled.set(version.content, { for: list, catalogue });
  return list;
}

function compile({ version, name, content }: PriceListVersion, catalogue: Catalogue): CompiledList {
  const products = indexProducts(catalogue);
  const measures = measuresOf(content);
  const minorPer = new Exact(10).pow(minorDigits[content.currency]);
  const { perArea, perLength } = measures;

  let ruleCount = 0;
  const rule = (family: UnitFamily, rate: string, scale: Exact, entry: string, labels: readonly string[]): Rule => {
    const factor = exact(rate).times(minorPer).times(scale);
    return { number: ruleCount++, family, rate, factor, minimum: null, free: factor.isZero(), id: `${version}/${entry}`, labels };
  };
  const one = new Exact(1);

  const treatments = new Map<string, Map<number, Rule>>();
  for (const { treatment, nominalMm, rate } of content.treatments) {
    const byThickness = treatments.get(treatment) ?? new Map<number, Rule>();
    const what = treatmentWork(products, treatment);
    byThickness.set(nominalMm, rule('treatment', rate, perArea, `treatments/${treatment}/${nominalMm}`, numbered(what, 'lite')));
    treatments.set(treatment, byThickness);
  }

  const rules = {
    version,
    name,
    content,
    currency: content.currency,
    minorPer,
    measures,
    products,
    glass: new Map(
      content.glass.map(({ glass, rate }) => [glass, rule('glass', rate, perArea, `glass/${glass}`, numbered('glass', 'lite'))]),
    ),
    treatments,
    coatings: new Map(
      content.coatings.map(({ coating, rate }) => [
        coating,
        rule('coating', rate, perArea, `coatings/${coating}`, numbered(products.nameOf('coatings', coating), 'surface')),
      ]),
    ),
    assembly: new Map(
      content.assembly.map(({ cavity, rate }) => [
        cavity,
        rule('assembly', rate, perArea, `assembly/${cavity}`, numbered('assembly', 'cavity')),
      ]),
    ),
    spacers: new Map(
      content.spacers.map(({ spacer, rate }) => [
        spacer,
        rule('spacer', rate, perLength, `spacers/${spacer}`, numbered(`${products.nameOf('spacers', spacer)} spacer`, 'cavity')),
      ]),
    ),
    gases: new Map(
      content.gases.map(({ gas, rate, minimum }) => {
        const least = exact(minimum).times(minorPer).round().toNumber();
        const made = rule('gas', rate, perArea, `gases/${gas}`, numbered(products.nameOf('gases', gas), 'cavity'));
        return [gas, least === 0 ? made : { ...made, free: false, minimum: { minor: least, rate: minimum } }];
      }),
    ),
    grids: new Map(
      content.grids.map(({ bar, rate, perCrossing }) => {
        const label = products.nameOf('grids', bar);
        return [
          bar,
          {
            bars: rule('grid', rate, perLength, `grids/${bar}`, [`grid, ${label}`]),
            crossings: rule('grid', perCrossing, one, `grids/${bar}/crossing`, ['grid, crossings']),
          },
        ];
      }),
    ),
    edgeWork: new Map(
      content.edgeWork.map(({ edgeWork, rate }) => [
        edgeWork,
        rule('edge work', rate, perLength, `edgeWork/${edgeWork}`, numbered(`${products.nameOf('edgeWork', edgeWork)} edges`, 'lite')),
      ]),
    ),
    extras: content.extras.map(({ id, name: label, applies, per, rate }) => ({
      ...rule('extras', rate, one, `extras/${id}`, [label]),
      extra: id,
      applies,
      per,
    })),
    tiers: compileTiers(content),
    ...compileSizeCharges(content, measures, minorPer, version),
    quantityBreaks: content.quantityBreaks
      .map(({ atLeast, percent }) => {
        const part = exact(percent).dividedBy(100);
        const label = `${atLeast} or more, ${percent} %`;
        return { atLeast, part, rate: part.negated().toString(), label, id: `${version}/quantityBreaks/${atLeast}` };
      })
      .sort((a, b) => b.atLeast - a.atLeast),
    asksForWeight:
      content.sizeCharges.bands.some(({ kind }) => kind === 'weight') ||
      content.orderCharges.delivery.some(({ perWeight }) => !exact(perWeight).isZero()),
  };
  return { ...rules, ruleCount };
}

const most = { lite: 4, surface: 8, cavity: 3 };

/** `glass` → glass, `glass, lite 1`, `glass, lite 2`, … */
function numbered(what: string, place: keyof typeof most): string[] {
  return [what, ...Array.from({ length: most[place] }, (_, i) => `${what}, ${place} ${i + 1}`)];
}

/** The work as the shop calls it: tempering, not tempered. */
function treatmentWork(products: Products, treatment: string): string {
  const kind = products.treatments.get(treatment)?.kind;
  if (kind === 'tempered') return 'tempering';
  if (kind === 'heat-strengthened') return 'heat-strengthening';
  return products.nameOf('treatments', treatment);
}
