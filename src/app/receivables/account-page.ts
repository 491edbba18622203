import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { firstValueFrom, map } from 'rxjs';
import { listInvoices } from '@shared/contracts/receivables';
import { changeCredit, listMovements, listTradeAccounts, readCredit } from '@shared/contracts/trade-accounts';
import { termsText } from '@shared/calendar/terms';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { pagedList } from '../api-client/paged-list';
import { ProblemError } from '../api-client/problem-error';
import { Asker } from '../ui/asker';
import { CreditBar } from '../ui/credit-bar';
import { DayPipe } from '../ui/date-pipes';
import { ListFooter } from '../ui/list-footer';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { type LimitQuestion } from './limit-dialog';

/** One dealer's account: credit, open invoices, and every movement with the balance after it. */
@Component({
  selector: 'app-account-page',
  imports: [RouterLink, MatButton, CreditBar, DayPipe, MoneyPipe, ListFooter, ProblemNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './account-page.html',
  styleUrl: './tables.scss',
})
export class AccountPage {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  private readonly asker = inject(Asker);
  protected readonly account = loaded(this.id, (id) =>
    this.api.call(listTradeAccounts, { query: { limit: 200 } }).pipe(map(({ items }) => items.find((account) => account.id === id))),
  );
  protected readonly credit = loaded(this.id, (id) => this.api.call(readCredit, { params: { id } }));
  protected readonly open = loaded(this.id, (tradeAccount) =>
    this.api.call(listInvoices, { query: { tradeAccount, state: 'open', limit: 200 } }),
  );
  protected readonly movements = pagedList(
    computed(() => ({ id: this.id() })),
    ({ id, cursor }) => this.api.call(listMovements, { params: { id }, query: { limit: 30, cursor } }),
  );
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly termsText = termsText;
  protected readonly isZero = (amount: string) => !/[1-9]/.test(amount);

  protected placeOf(document: { kind: string; id: string }): string[] {
    return document.kind === 'invoice' ? ['/receivables/invoices', document.id] : ['/receivables/receipts', document.id];
  }

  protected async turnHold(onHold: boolean): Promise<void> {
    const dealer = this.account.value()?.dealer.name ?? 'this dealer';
    const reason = await this.asker.reason({
      title: onHold ? `Hold the account of ${dealer}?` : `Lift the hold on ${dealer}?`,
      text: onHold
        ? 'New orders on account are refused, or wait in credit review, until you lift it. The reason is kept.'
        : 'Orders on account go through again within the limit. The reason is kept.',
      confirm: onHold ? 'Hold the account' : 'Lift the hold',
    });
    if (reason) await this.change({ onHold, reason });
  }

  protected async changeLimit(): Promise<void> {
    const limit = this.credit.value()?.limit;
    if (!limit) return;
    const answer = await this.asker.open<{ limit: string; reason: string }>(async () => (await import('./limit-dialog')).LimitDialog, {
      limit,
      dealer: this.account.value()?.dealer.name ?? '',
    } satisfies LimitQuestion);
    if (answer) await this.change(answer);
  }

  private async change(body: { limit?: string; onHold?: boolean; reason: string }): Promise<void> {
    this.problem.set(null);
    try {
      this.credit.set(await firstValueFrom(this.api.call(changeCredit, { params: { id: this.id() }, body })));
    } catch (error) {
      this.problem.set(ProblemError.from(error));
    }
  }
}
