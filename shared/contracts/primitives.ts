import * as z from 'zod';
import { currencies } from '../money/currencies';

/** Field shapes that several contracts share. */

export const id = z
  .string()
  .min(1)
  .max(64)
  .regex(/^[\w.~-]+$/, 'letters, digits, dot, hyphen and underscore')
  .meta({ description: 'identity' });

/** A length in millimetres as a decimal string, above 0 and up to 100 m. */
export const lengthMm = z
  .string('a length in millimetres as a decimal string, such as "927.1"')
  .regex(/^\d{1,6}(\.\d{1,8})?$/, 'a plain decimal number of millimetres, such as 927.1')
  .refine((text) => /[1-9]/.test(text), 'must be above zero')
  .refine((text) => !(Number(text) > 100_000), 'must not be above 100 000 mm')
  .meta({ description: 'millimetres, decimal string' });

/** A plain decimal string, not negative, such as a rate. */
export const rate = z
  .string()
  .regex(/^\d{1,9}(\.\d{1,8})?$/, 'a plain decimal number, not negative')
  .meta({ description: 'decimal string' });

/** A percentage as a decimal string: `12` means 12 %. */
export const percent = z
  .string()
  .regex(/^\d{1,3}(\.\d{1,6})?$/, 'a plain decimal percentage')
  .refine((text) => Number(text) <= 100, 'must not be above 100 %')
  .meta({ description: 'percent, decimal string' });

/** A percentage that may pass 100, such as a mark-up. */
export const markUp = z
  .string()
  .regex(/^\d{1,3}(\.\d{1,4})?$/, 'a plain decimal percentage')
  .meta({ description: 'percent, decimal string' });

export const currency = z.enum(currencies).meta({ description: 'ISO 4217 code' });

/** Money on the wire. */
export const moneySchema = z
  .object({ amount: z.string().regex(/^-?\d{1,15}(\.\d{1,3})?$/), currency })
  .meta({ id: 'Money', description: 'amount as decimal string with the decimals of its currency' });

/** A calendar day, `YYYY-MM-DD`. */
export const day = z.iso.date();

/** An instant in UTC, `…Z`. */
export const instant = z.iso.datetime();

export const line = (max: number) =>
  z
    .string()
    .trim()
    .min(1)
    .max(max)
    .regex(/^[^\p{Cc}]*$/u, 'must not hold control characters');
export const text = (max: number) =>
  z
    .string()
    .trim()
    .max(max)
    .regex(/^[^\p{Cc}]*$|^[\P{Cc}\n\r\t]*$/u, 'must not hold control characters');

export const named = z.object({ id, name: z.string() });

/** Query parameters of every list. */
export const pageQuery = z.object({
  cursor: z.string().max(500).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});

/** The answer of every list: a page and the cursor of the next, null on the last. */
export const pageOf = <T extends z.ZodType>(item: T) => z.object({ items: z.array(item), nextCursor: z.string().nullable() });

export const quantity = z.int('a whole number').min(1, 'at least 1').max(10_000, 'at most 10 000');
