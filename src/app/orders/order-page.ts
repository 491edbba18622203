import { LiveAnnouncer } from '@angular/cdk/a11y';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Title } from '@angular/platform-browser';
import { Router, RouterLink } from '@angular/router';
import { firstValueFrom } from 'rxjs';
import { dayIn } from '@shared/calendar/days';
import { moveOrder, type Order, type OrderState, readOrder } from '@shared/contracts/orders';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';
import { Asker } from '../ui/asker';
import { DayPipe, InstantPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { Icon } from '../ui/icon';
import { ProblemNote } from '../ui/problem-note';
import { StateMark } from '../ui/state-mark';
import { TotalsTable } from '../ui/totals-table';
import { isLate } from './is-late';
import { OrderLines } from './order-lines';
import { whatHappensNext } from './what-happens-next';

type Move = Order['moves'][number];

/** Moves that end an order: asked once, never the filled button. */
const ends: readonly OrderState[] = ['cancelled', 'refused'];

/** One order, for the dealer who placed it and for the fabricator who makes it. */
@Component({
  selector: 'app-order-page',
  imports: [MatButton, RouterLink, DayPipe, InstantPipe, Icon, ProblemNote, StateMark, TotalsTable, OrderLines],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './order-page.html',
  styleUrl: './order-page.scss',
})
export class OrderPage {
  readonly id = input.required<string>();
  /** the line that is open */
  readonly line = input<string>();
  private readonly api = inject(ApiClient);
  private readonly asker = inject(Asker);
  private readonly announcer = inject(LiveAnnouncer);
  private readonly title = inject(Title);
  private readonly session = inject(Session);
  private readonly timeZone = this.session.user()?.company.timeZone ?? 'UTC';
  protected readonly address = filterAddress();
  protected readonly isDealer = this.session.user()?.company.kind === 'dealer';
  /** Arrived here from placing it, this time. */
  protected readonly justPlaced = inject(Router).currentNavigation()?.extras.state?.['placed'] === true;

  protected readonly source = loaded(this.id, (id) => this.api.call(readOrder, { params: { id } }));
  protected readonly order = this.source.value;
  protected readonly moving = signal(false);
  protected readonly problem = signal<ProblemError | null>(null);
  protected readonly next = computed(() => {
    const order = this.order();
    return order ? whatHappensNext(order, this.isDealer ? 'dealer' : 'fabricator') : '';
  });
  protected readonly forward = computed(() => this.order()?.moves.filter(({ to }) => !ends.includes(to)) ?? []);
  protected readonly ending = computed(() => this.order()?.moves.filter(({ to }) => ends.includes(to)) ?? []);
  protected readonly late = computed(() => {
    const order = this.order();
    return order !== undefined && isLate(order, dayIn(this.timeZone, Date.now()));
  });
  /** Clerks look at the account before they release an order. */
  protected readonly seesAccount = !this.isDealer && this.session.may('trade-accounts.movements');
  /** Where this reader finds invoices. */
  protected readonly invoices = this.isDealer ? '/money/invoices' : '/receivables/invoices';

  constructor() {
    effect(() => {
      const order = this.order();
      if (order) this.title.setTitle(`Order ${order.number} · Sealyard`);
    });
  }

  protected pdf(): string {
    return `/api/orders/${encodeURIComponent(this.id())}/pdf`;
  }

  protected lineOf(order: Order, id: string): string {
    const line = order.lines.find((each) => each.id === id);
    return line ? (line.tag ?? `line ${order.lines.indexOf(line) + 1}`) : '';
  }

  protected async move({ to, label, needsReason }: Move): Promise<void> {
    const order = this.order();
    if (!order || this.moving()) return;
    const reason = needsReason
      ? await this.asker.reason({
          title: `${label.replace(/ order$/, '')} order ${order.number}?`,
          text: this.consequence(to, order),
          confirm: label,
        })
      : undefined;
    if (needsReason && reason === undefined) return;
    this.moving.set(true);
    try {
      const moved = await firstValueFrom(
        this.api.call(moveOrder, { params: { id: order.id }, body: { to, ...(reason === undefined ? {} : { reason }) } }),
      );
      this.problem.set(null);
      this.source.set(moved);
      await this.announcer.announce(`Order ${moved.number} is now ${moved.state}`);
    } catch (error) {
      const problem = ProblemError.from(error);
      this.problem.set(problem);
      // Somebody moved it first: show where it stands now.
      if (problem.status === 409) this.source.reload();
    } finally {
      this.moving.set(false);
    }
  }

  private consequence(to: OrderState, { dealer, fabricator, units }: Order): string {
    const reader = this.isDealer ? fabricator.name : dealer.name;
    const what = `${units} ${units === 1 ? 'unit' : 'units'} will not be made, and any credit they bind is free at once.`;
    return ends.includes(to)
      ? `${what} This cannot be taken back. ${reader} reads your reason.`
      : `${reader} reads your reason in the order’s history.`;
  }
}
