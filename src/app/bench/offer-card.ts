import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { type Hint, type Offer } from '@shared/contracts/prices';
import { ChargeSheet } from '../ui/charge-sheet/charge-sheet';
import { MoneyPipe } from '../ui/money-pipe';
import { SizePipe } from '../ui/size-pipe';
import { MakerReasons } from './maker-reasons';
import { UnitDraft } from './unit-draft';

let count = 0;

/**
 * One maker's offer: lead time, unit and line price, and the charge sheet when open. While
 * its price is on its way, it shows whose offer it is, and no figure.
 */
@Component({
  selector: 'app-offer-card',
  imports: [ChargeSheet, MakerReasons, MoneyPipe, SizePipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './offer-card.html',
  styleUrls: ['./offer-card.scss', './quiet.scss'],
  host: { '[class.chosen]': 'chosen()', '[class.no]': '!canBuild()' },
})
export class OfferCard {
  readonly offer = input.required<Offer>();
  /** what stands in the place of a price that is not here: `pricing…`; empty when it is */
  readonly status = input.required<string>();
  readonly quantity = input.required<number>();
  /** lines are added at this maker */
  readonly chosen = input.required<boolean>();
  /** the charge sheet shows */
  readonly opened = input.required<boolean>();
  readonly pressed = output();
  protected readonly hintsId = `hints-${++count}`;
  private readonly draft = inject(UnitDraft);

  /** What the browser knows at once; the server's answer may add reasons of its list. */
  private readonly local = computed(
    () => this.draft.evaluation().buildability.find(({ fabricator }) => fabricator.id === this.offer().fabricator.id)?.reasons ?? [],
  );
  protected readonly pending = computed(() => this.status() !== '');
  protected readonly reasons = computed(() => (this.pending() ? this.local() : this.offer().reasons));
  protected readonly canBuild = computed(() => (this.pending() ? this.local().length === 0 : this.offer().canBuild));
  protected readonly line = computed(() => this.offer().lines[0]);
  protected readonly leadTime = computed(() => {
    const days = this.offer().leadTimeDays;
    if (days === null) return this.pending() ? '' : 'lead time on request';
    return `ready in ${days} working ${days === 1 ? 'day' : 'days'}`;
  });
  /** What an order of this line alone would come to, where more than the goods is charged. */
  protected readonly alone = computed(() => {
    const { orderCharges = [], tax = [], total } = this.offer();
    const more = [...orderCharges, ...tax].map(({ label }) => label);
    return total && more.length > 0 ? { total, more: more.join('; ') } : null;
  });

  protected take({ width, height }: Hint): void {
    this.draft.chooseSize(width, height);
  }
}
