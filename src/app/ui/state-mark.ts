import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type OrderState } from '@shared/contracts/orders';
import { Icon } from './icon';
import { type IconName } from './icons';

/** Everything that stands in a state somewhere: orders, quotes, invoices, mails, accounts. */
export type MarkedState =
  OrderState | 'open' | 'ordered' | 'expired' | 'paid' | 'overdue' | 'waiting' | 'sent' | 'failed' | 'on hold' | 'reversed';

type Tone = 'quiet' | 'going' | 'done' | 'caution' | 'bad';

const marks: Record<MarkedState, { icon: IconName; tone: Tone }> = {
  'awaiting approval': { icon: 'hourglass_top', tone: 'caution' },
  'credit review': { icon: 'pause', tone: 'caution' },
  'awaiting payment': { icon: 'hourglass_top', tone: 'caution' },
  submitted: { icon: 'send', tone: 'going' },
  accepted: { icon: 'check', tone: 'going' },
  'in production': { icon: 'precision_manufacturing', tone: 'going' },
  ready: { icon: 'inventory_2', tone: 'going' },
  dispatched: { icon: 'local_shipping', tone: 'done' },
  delivered: { icon: 'task_alt', tone: 'done' },
  closed: { icon: 'task_alt', tone: 'quiet' },
  cancelled: { icon: 'block', tone: 'quiet' },
  refused: { icon: 'block', tone: 'bad' },
  open: { icon: 'schedule', tone: 'going' },
  ordered: { icon: 'check', tone: 'done' },
  expired: { icon: 'schedule', tone: 'caution' },
  paid: { icon: 'check', tone: 'done' },
  overdue: { icon: 'warning', tone: 'bad' },
  waiting: { icon: 'hourglass_top', tone: 'quiet' },
  sent: { icon: 'check', tone: 'done' },
  failed: { icon: 'error', tone: 'bad' },
  'on hold': { icon: 'pause', tone: 'bad' },
  reversed: { icon: 'undo', tone: 'quiet' },
};

/** A state as an icon and a word; `words` says it more exactly, such as `12 days overdue`. */
@Component({
  selector: 'app-state-mark',
  imports: [Icon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<app-icon [name]="mark().icon" />{{ words() ?? state() }}`,
  styles: `
    :host {
      display: inline-flex;
      align-items: center;
      gap: 5px;
      vertical-align: middle;
      white-space: nowrap;
      color: var(--sy-ink);
    }
    :host(.quiet) {
      color: var(--sy-soft);
    }
    :host(.done) {
      color: var(--sy-done);
    }
    :host(.caution) {
      background: var(--sy-warn);
      border-radius: 6px;
      padding: 1px 8px 1px 5px;
      margin-left: -5px;
    }
    :host(.bad) {
      color: var(--sy-error);
      font-weight: 700;
    }
  `,
  host: { '[class]': 'mark().tone' },
})
export class StateMark {
  readonly state = input.required<MarkedState>();
  readonly words = input<string>();
  protected readonly mark = computed(() => marks[this.state()]);
}
