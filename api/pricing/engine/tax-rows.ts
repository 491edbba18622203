import { type OrderFamily, type PriceListContent } from '@shared/contracts/price-lists';
import { exact } from '@shared/money/exact';
import { percentOf } from '@shared/money/money';

export interface TaxRow {
  label: string;
  rate: string;
  baseMinor: number;
  amountMinor: number;
}

/** Amounts of one document in minor units, negative on a credit note. */
export interface TaxableAmounts {
  goodsMinor: number;
  charges: readonly { family: OrderFamily; netMinor: number }[];
}

/**
 * Tax of one document: each rate of the jurisdiction once on all that it falls on, rounded half up
 * once, away from zero, so that a credit note mirrors its invoice. None where no rate is listed.
 */
export function taxRows({ tax }: Pick<PriceListContent, 'tax'>, jurisdiction: string, { goodsMinor, charges }: TaxableAmounts): TaxRow[] {
  return tax
    .filter((entry) => entry.jurisdiction === jurisdiction)
    .map(({ label, rate, on }) => {
      let baseMinor = on.includes('goods') ? goodsMinor : 0;
      for (const { family, netMinor } of charges) if (on.includes(family)) baseMinor += netMinor;
      return { label, rate, baseMinor, amountMinor: percentOf(baseMinor, exact(rate)) };
    });
}
