import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatTableModule } from '@angular/material/table';
import { RouterLink } from '@angular/router';
import { dayIn, daysBetween } from '@shared/calendar/days';
import { type OrderItem } from '@shared/contracts/orders';
import { Session } from '../session/session';
import { DayPipe } from '../ui/date-pipes';
import { filterAddress } from '../ui/filter-address';
import { Icon } from '../ui/icon';
import { ListFooter } from '../ui/list-footer';
import { ProblemNote } from '../ui/problem-note';
import { SearchField } from '../ui/search-field';
import { StateMark } from '../ui/state-mark';
import { plantStates, ToMake, unitsLeft } from './to-make';

/** What the plant has to make and to send out, by the day it is promised for. */
@Component({
  selector: 'app-plant-page',
  imports: [MatButton, MatTableModule, RouterLink, DayPipe, Icon, ListFooter, ProblemNote, SearchField, StateMark],
  providers: [ToMake],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './plant-page.html',
  styleUrls: ['../ui/work-table.scss', './plant-page.scss'],
})
export class PlantPage {
  readonly q = input<string>();
  readonly state = input<string>();
  protected readonly toMake = inject(ToMake);
  protected readonly filter = filterAddress();
  protected readonly columns = ['promised', 'number', 'dealer', 'po', 'left', 'state'];
  private readonly today = dayIn(inject(Session).user()?.company.timeZone ?? 'UTC', Date.now());
  protected readonly left = unitsLeft;

  protected readonly chosen = computed(() => plantStates.find((state) => state === this.state()));
  protected readonly filtered = computed(() => !!this.q() || this.chosen() !== undefined);
  protected readonly orders = computed(() => {
    const state = this.chosen();
    const q = (this.q() ?? '').toLowerCase();
    return this.toMake
      .orders()
      .filter((order) => state === undefined || order.state === state)
      .filter((order) => q === '' || [order.number, order.poNumber, order.dealer.name].some((text) => text.toLowerCase().includes(q)));
  });
  protected readonly unitsShown = computed(() => this.orders().reduce((sum, order) => sum + unitsLeft(order), 0));

  /** `2 days late`, `today`, `tomorrow`, or nothing for later days. */
  protected urgency({ promisedOn }: OrderItem): { words: string; late: boolean } | null {
    if (promisedOn === null) return null;
    const days = daysBetween(this.today, promisedOn);
    if (days < 0) return { words: days === -1 ? '1 day late' : `${-days} days late`, late: true };
    return days === 0 ? { words: 'today', late: false } : days === 1 ? { words: 'tomorrow', late: false } : null;
  }
}
