import * as z from 'zod';
import { reasonSchema } from './evaluation';
import { instant, id, line, moneySchema, named, quantity } from './primitives';
import { orderFamily, rowFamily } from './price-lists';
import { unitSchema } from './units';

/** Prices: what is asked, and the charge sheets that answer. */

export const lineInput = z.strictObject({
  unit: unitSchema,
  quantity,
  tag: line(80).optional(),
  /** extras of the fabricator's list that are charged when asked for */
  extras: z.array(id).max(20).optional(),
});
export type LineInput = z.infer<typeof lineInput>;

export const priceRequest = z.strictObject({
  tradeAccount: id.optional(),
  lines: z.array(lineInput).min(1).max(500),
  shipTo: id.optional(),
  leadTimeClass: id.optional(),
  promotionCode: line(40).optional(),
  at: instant.optional(),
});
export type PriceRequest = z.infer<typeof priceRequest>;

/** One row of a charge sheet. `basis.quantity`, `rate`, `discountPercent` are unrounded decimal strings. */
export const chargeSchema = z.object({
  family: rowFamily,
  label: z.string(),
  basis: z.object({ quantity: z.string(), unit: z.string() }),
  rate: z.string(),
  list: moneySchema,
  discountPercent: z.string(),
  discountReason: z.string().nullable(),
  net: moneySchema,
  /** identity of the rule: version, part and entry */
  rule: z.string(),
});
export type ChargeRow = z.infer<typeof chargeSchema>;

/** What would make it cheaper: the same unit at another size. */
export const hintSchema = z.object({
  kind: z.enum(['standard size', 'increment below']),
  width: z.string(),
  height: z.string(),
  unitPrice: moneySchema,
  saves: moneySchema,
});
export type Hint = z.infer<typeof hintSchema>;

export const pricedLine = z.object({
  unitPrice: moneySchema,
  linePrice: moneySchema,
  charges: z.array(chargeSchema),
  hints: z.array(hintSchema),
});
export type PricedLine = z.infer<typeof pricedLine>;

export const orderCharge = z.object({ family: orderFamily, label: z.string(), net: moneySchema, rule: z.string() });
export const taxRow = z.object({ label: z.string(), rate: z.string(), base: moneySchema, amount: moneySchema });

export const totalsSchema = z.object({ goods: moneySchema, orderCharges: z.array(orderCharge), tax: z.array(taxRow), total: moneySchema });
export type Totals = z.infer<typeof totalsSchema>;

export const offerSchema = z.object({
  tradeAccount: id,
  fabricator: named,
  currency: z.string(),
  priceListVersion: id.nullable(),
  /** what a row's rule refers to, in words */
  priceList: z.object({ name: z.string(), effectiveFrom: instant }).nullable(),
  canBuild: z.boolean(),
  reasons: z.array(reasonSchema.extend({ line: z.int().meta({ description: 'index into the lines asked for' }) })),
  leadTimeDays: z.int().nullable(),
  lines: z.array(pricedLine).meta({ description: 'empty when it cannot be built' }),
  ...totalsSchema.partial().shape,
});
export type Offer = z.infer<typeof offerSchema>;
export const priceAnswer = z.object({ offers: z.array(offerSchema), pricedAt: instant });
