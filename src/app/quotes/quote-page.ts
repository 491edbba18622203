import { LiveAnnouncer } from '@angular/cdk/a11y';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input, viewChild } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Title } from '@angular/platform-browser';
import { RouterLink } from '@angular/router';
import { Asker } from '../ui/asker';
import { type HoldsWork } from '../ui/asks-before-leaving';
import { DayPipe, InstantPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { Icon } from '../ui/icon';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { StateMark } from '../ui/state-mark';
import { TotalsTable } from '../ui/totals-table';
import { DetailsForm } from './details-form';
import { QuoteDesk } from './quote-desk';
import { QuoteLines } from './quote-lines';

/** Mails that wait in the outbox leave within seconds; until then their state is asked for again. */
const ASK_AGAIN_MS = 2500;

/** One quote: its lines, what they cost, whom it is for, and the way to an order. */
@Component({
  selector: 'app-quote-page',
  imports: [MatButton, RouterLink, DayPipe, InstantPipe, Icon, MoneyPipe, ProblemNote, StateMark, TotalsTable, DetailsForm, QuoteLines],
  providers: [QuoteDesk, DayPipe, InstantPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './quote-page.html',
  styleUrl: './quote-page.scss',
  host: { '(window:beforeunload)': 'holdPage($event)' },
})
export class QuotePage implements HoldsWork {
  readonly id = input.required<string>();
  /** the line that is open */
  readonly line = input<string>();
  protected readonly desk = inject(QuoteDesk);
  private readonly asker = inject(Asker);
  private readonly announcer = inject(LiveAnnouncer);
  private readonly title = inject(Title);
  private readonly instants = inject(InstantPipe);
  private readonly days = inject(DayPipe);
  private readonly details = viewChild(DetailsForm);
  protected readonly address = filterAddress();
  protected readonly quote = this.desk.quote;
  protected readonly hasMarkUp = computed(() => /[1-9]/.test(this.quote()?.markUpPercent ?? ''));

  protected readonly about = computed(() => {
    const quote = this.quote();
    if (!quote) return '';
    const { fabricator, units, customer, createdBy, createdAt } = quote;
    const whom = customer ? `, for ${customer.name}` : '';
    return `${fabricator.name}, ${units} ${units === 1 ? 'unit' : 'units'}${whom}, by ${createdBy} on ${this.instants.transform(createdAt)}`;
  });
  protected readonly held = computed(() => {
    const quote = this.quote();
    if (!quote) return '';
    const { state, priceList, priceListVersion, pricedAt, validUntil } = quote;
    const until = state === 'open' ? ` and held until ${this.days.transform(validUntil)}` : '';
    const since = this.instants.transform(priceList.effectiveFrom);
    return `Prices of ${priceList.name} (version ${priceListVersion}), in force since ${since}, taken ${this.instants.transform(pricedAt)}${until}.`;
  });

  constructor() {
    effect(() => this.desk.use(this.id()));
    effect(() => {
      const quote = this.quote();
      if (quote) this.title.setTitle(`Quote ${quote.number} · Sealyard`);
    });
    effect((onCleanup) => {
      if (!this.quote()?.mails.some(({ state }) => state === 'waiting')) return;
      const timer = setTimeout(() => this.desk.source.reload(), ASK_AGAIN_MS);
      onCleanup(() => clearTimeout(timer));
    });
  }

  unsaved(): string | null {
    return this.details()?.dirty() ? `customer, mark-up, notes or validity of ${this.quote()?.number}` : null;
  }

  protected holdPage(event: BeforeUnloadEvent): void {
    if (this.unsaved() !== null || this.desk.saving()) event.preventDefault();
  }

  protected pdf(prices: 'wholesale' | 'retail'): string {
    return `/api/quotes/${encodeURIComponent(this.id())}/pdf?prices=${prices}`;
  }

  protected async rePrice(): Promise<void> {
    const taken = await this.asker.open<boolean>(async () => (await import('./re-price-dialog')).RePriceDialog, this.desk, 640);
    if (taken) await this.announcer.announce('Today’s prices are taken and held');
  }

  protected async mail(): Promise<void> {
    const sent = await this.asker.open<boolean>(async () => (await import('./mail-dialog')).MailDialog, this.desk, 620);
    if (sent) await this.announcer.announce('The mail is on its way');
  }
}
