import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { readCredit } from '@shared/contracts/trade-accounts';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { CreditBar } from '../ui/credit-bar';

/** Credit at the maker whose offer is open. */
@Component({
  selector: 'app-credit-line',
  imports: [CreditBar],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (credit.value(); as found) {
      <p>Credit at {{ maker() }}</p>
      <app-credit-bar [credit]="found" />
    } @else if (credit.problem()) {
      <p>Credit at {{ maker() }} cannot be read just now. The order checks it again.</p>
    } @else {
      <p>Credit at {{ maker() }}</p>
      <span class="sy-waiting"></span>
    }
  `,
  styles: `
    :host {
      display: block;
      min-height: 58px;
    }
    p {
      color: var(--sy-soft);
      font-size: 13px;
      font-weight: 700;
    }
  `,
})
export class CreditLine {
  readonly tradeAccount = input.required<string>();
  readonly maker = input.required<string>();
  private readonly api = inject(ApiClient);
  protected readonly credit = loaded(this.tradeAccount, (id) => this.api.call(readCredit, { params: { id } }));
}
