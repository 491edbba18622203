import { computed, inject, Injectable, signal } from '@angular/core';
import { catchError, forkJoin, map, of, switchMap } from 'rxjs';
import { type Credit, listTradeAccounts, readCredit, type TradeAccount } from '@shared/contracts/trade-accounts';
import { type Money, money, minorOf } from '@shared/money/money';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';

/** A trade account of the dealer's with its credit; null where that could not be read. */
export interface AccountCredit {
  account: TradeAccount;
  credit: Credit | null;
}

/** The dealer's trade accounts, and how each stands. */
@Injectable()
export class OwnCredit {
  private readonly api = inject(ApiClient);
  private readonly read = loaded(signal(true), () =>
    this.api.call(listTradeAccounts, { query: { limit: 200 } }).pipe(
      switchMap(({ items }) =>
        items.length === 0
          ? of<AccountCredit[]>([])
          : forkJoin(
              items.map((account) =>
                this.api.call(readCredit, { params: { id: account.id } }).pipe(
                  map((credit): AccountCredit => ({ account, credit })),
                  catchError(() => of<AccountCredit>({ account, credit: null })),
                ),
              ),
            ),
      ),
    ),
  );

  readonly accounts = this.read.value;
  readonly problem = this.read.problem;
  readonly reload = () => this.read.reload();

  /** What is open on all invoices, and what of it is overdue, by currency: sums over currencies mean nothing. */
  readonly totals = computed(() => {
    const sums = new Map<string, { open: Money; overdue: Money }>();
    for (const { credit } of this.accounts() ?? []) {
      if (!credit) continue;
      const { currency } = credit.limit;
      const before = sums.get(currency);
      sums.set(currency, { open: plus(credit.receivable, before?.open), overdue: plus(credit.overdue, before?.overdue) });
    }
    return [...sums.values()];
  });
}

function plus(one: Money, other: Money | undefined): Money {
  return other ? money(minorOf(one.amount, one.currency) + minorOf(other.amount, other.currency), one.currency) : one;
}
