import { Refusal } from '@shared/contracts/problems';
import { type Currency } from '@shared/money/currencies';
import { minorOf } from '@shared/money/money';

/**
 * An amount of a request in minor units of the account's currency.
 *
 * @throws Refusal `invalid` at the pointer when it has more decimals than the currency
 */
export function amountAt(pointer: string, amount: string, currency: Currency): number {
  try {
    return minorOf(amount, currency);
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    throw new Refusal('invalid', error.message, [{ pointer, detail: error.message }]);
  }
}
