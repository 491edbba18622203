import * as z from 'zod';
import { currency, day, id, instant, line, percent, rate } from './primitives';
import { shapeClasses } from './units';

/**
 * A price list's content, as a fabricator writes it. Measures are in the list's own system:
 * imperial counts inches, ft² and ft; metric counts mm, m² and m. Rates and amounts are
 * decimal strings in the list's currency.
 */

/** The families of charges on a unit, in the order of the charge sheet. */
export const unitFamilies = [
  'glass',
  'treatment',
  'coating',
  'assembly',
  'spacer',
  'gas',
  'grid',
  'edge work',
  'extras',
  'shape',
  'size',
] as const;
export const unitFamily = z.enum(unitFamilies);
export type UnitFamily = z.infer<typeof unitFamily>;

/** The families on which percentages (shape, size) are taken. */
export const areaFamilies = ['glass', 'treatment', 'coating', 'assembly', 'gas'] as const satisfies readonly UnitFamily[];

/** Rows that follow the list charges on a charge sheet. */
export const rowFamilies = [...unitFamilies, 'net rate', 'quantity break', 'promotion'] as const;
export const rowFamily = z.enum(rowFamilies);
export type RowFamily = z.infer<typeof rowFamily>;

export const orderFamilies = ['minimum order', 'delivery', 'crates', 'surcharge', 'rush'] as const;
export const orderFamily = z.enum(orderFamilies);
export type OrderFamily = z.infer<typeof orderFamily>;

/** A size in the list's own measure. */
const measure = rate;
const charge = { percent: percent.default('0'), fixed: rate.default('0') };

/** Percent off by family. */
export const familyPercents = z.partialRecord(unitFamily, percent);

export const sizeBand = z.strictObject({
  kind: z.enum(['united', 'long edge', 'area', 'weight']),
  above: measure.meta({ description: 'in or mm; ft² or m²; lb or kg' }),
  ...charge,
});

export const priceListContent = z
  .strictObject({
    currency,
    measure: z.enum(['imperial', 'metric']),
    billing: z.strictObject({ increment: measure, minimumArea: measure }),
    glass: z.array(z.strictObject({ glass: id, rate })),
    treatments: z.array(z.strictObject({ treatment: id, nominalMm: z.number(), rate })),
    coatings: z.array(z.strictObject({ coating: id, rate })),
    /** Per area, by the number of the cavity from outside. */
    assembly: z.array(z.strictObject({ cavity: z.int().min(1).max(3), rate })),
    spacers: z.array(z.strictObject({ spacer: id, rate })),
    gases: z.array(z.strictObject({ gas: id, rate, minimum: rate })),
    grids: z.array(z.strictObject({ bar: id, rate, perCrossing: rate })),
    edgeWork: z.array(z.strictObject({ edgeWork: id, rate })),
    shapes: z.array(z.strictObject({ shape: z.enum(shapeClasses), ...charge })),
    /** `capillary`: per open tube; `always`: on every unit or line; `asked`: when the line names it. */
    extras: z.array(
      z.strictObject({
        id,
        name: line(80),
        applies: z.enum(['capillary', 'always', 'asked']),
        per: z.enum(['cavity', 'unit', 'line']),
        rate,
      }),
    ),
    standardSizes: z.array(z.strictObject({ width: measure, height: measure })),
    sizeCharges: z.strictObject({ nonStandard: z.strictObject(charge).nullable(), bands: z.array(sizeBand) }),
    tiers: z.array(z.strictObject({ tier: line(40), percents: familyPercents })),
    quantityBreaks: z.array(z.strictObject({ atLeast: z.int().min(2), percent })),
    orderCharges: z.strictObject({
      /** Goods below this are topped up to it. */
      minimumOrder: rate.nullable(),
      delivery: z.array(z.strictObject({ zone: line(40), flat: rate, perWeight: rate, freeAbove: rate.nullable() })),
      /** One crate for each `unitsPerCrate` units begun. */
      crates: z.strictObject({ unitsPerCrate: z.int().min(1), each: rate }).nullable(),
      /** Percent of goods. */
      surcharge: z.strictObject({ label: line(80), percent }).nullable(),
      /** Percent of goods by lead-time class; a class without a row costs nothing. */
      rush: z.array(z.strictObject({ leadTimeClass: id, percent })),
    }),
    tax: z.array(
      z.strictObject({ jurisdiction: line(40), label: line(80), rate: percent, on: z.array(z.enum(['goods', ...orderFamilies])) }),
    ),
  })
  .meta({ id: 'PriceListContent' });
export type PriceListContent = z.infer<typeof priceListContent>;

/** A version of a list with its identity, as the engine takes it. */
export interface PriceListVersion {
  /** identity of the version */
  version: string;
  /** name of the list and number of the version, as a row's rule quotes it */
  name: string;
  effectiveFrom: string;
  content: PriceListContent;
}

/** A price agreed with one trade account. */
export const contractPrice = z.discriminatedUnion('kind', [
  z.strictObject({ id, kind: z.literal('percent'), family: unitFamily, percent, from: day, until: day.nullable() }),
  /** `makeUp` is the canonical text of `makeUpKey` in shared/glazing. */
  z.strictObject({ id, kind: z.literal('net rate'), makeUp: z.string(), rate, from: day, until: day.nullable() }),
]);
export type ContractPrice = z.infer<typeof contractPrice>;

export const promotion = z.strictObject({
  id,
  name: line(80),
  code: line(40).nullable(),
  percents: familyPercents.or(z.strictObject({ all: percent })),
  from: day,
  until: day,
  minimumArea: rate.nullable(),
  tiers: z.array(line(40)),
});
export type Promotion = z.infer<typeof promotion>;

/** A dealer's terms for prices at one fabricator: what a price depends on beside unit and list. */
export const priceTerms = z.strictObject({
  tier: z.string(),
  contracts: z.array(contractPrice),
  promotions: z.array(promotion),
  promotionCode: z.string().nullable(),
  /** the day the price is asked for, in the fabricator's time zone */
  on: day,
});
export type PriceTerms = z.infer<typeof priceTerms>;

/** Who and where goods go, for delivery and tax. */
export interface Destination {
  zone: string;
  jurisdiction: string;
  exempt: boolean;
}

export const versionState = z.enum(['draft', 'scheduled', 'in force', 'past']);
export const priceListItem = z.object({
  version: id,
  list: z.object({ id, name: z.string() }),
  number: z.int(),
  state: versionState,
  effectiveFrom: instant.nullable(),
});
