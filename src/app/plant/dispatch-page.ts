import { LiveAnnouncer } from '@angular/cdk/a11y';
import {
  afterNextRender,
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  ElementRef,
  inject,
  Injector,
  input,
  signal,
  untracked,
} from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatCheckbox } from '@angular/material/checkbox';
import { Title } from '@angular/platform-browser';
import { RouterLink } from '@angular/router';
import { firstValueFrom } from 'rxjs';
import { type BodyOf } from '@shared/contracts/endpoint';
import { dispatchOrder, moveOrder, type Order, type OrderLine, readOrder } from '@shared/contracts/orders';
import { ApiClient } from '../api-client/api-client';
import { loaded } from '../api-client/loaded';
import { ProblemError } from '../api-client/problem-error';
import { singleFlight } from '../api-client/single-flight';
import { Asker } from '../ui/asker';
import { type HoldsWork } from '../ui/asks-before-leaving';
import { DayPipe, InstantPipe } from '../ui/date-pipes';
import { Icon } from '../ui/icon';
import { ProblemNote } from '../ui/problem-note';
import { SizePipe } from '../ui/size-pipe';
import { StateMark } from '../ui/state-mark';
import { UnitThumb } from '../ui/unit-thumb';
import { packedUnits, quantityProblem, toDispatch } from './packing';

type Row = FormGroup<{ packed: FormControl<boolean>; quantity: FormControl<string> }>;

/** One order at the plant: what of it is packed, and its dispatch. */
@Component({
  selector: 'app-dispatch-page',
  imports: [ReactiveFormsModule, MatButton, MatCheckbox, RouterLink, InstantPipe, Icon, ProblemNote, SizePipe, StateMark, UnitThumb],
  providers: [DayPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './dispatch-page.html',
  styleUrl: './dispatch-page.scss',
})
export class DispatchPage implements HoldsWork {
  readonly id = input.required<string>();
  private readonly api = inject(ApiClient);
  private readonly asker = inject(Asker);
  private readonly announcer = inject(LiveAnnouncer);
  private readonly title = inject(Title);
  private readonly days = inject(DayPipe);
  private readonly injector = inject(Injector);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  protected readonly source = loaded(this.id, (id) => this.api.call(readOrder, { params: { id } }));
  protected readonly order = this.source.value;
  protected readonly flight = singleFlight((asked: { id: string; body: BodyOf<typeof dispatchOrder> }, idempotencyKey) =>
    this.api.call(dispatchOrder, { params: { id: asked.id }, body: asked.body, idempotencyKey }),
  );
  protected readonly moving = signal(false);
  protected readonly moveProblem = signal<ProblemError | null>(null);
  /** what is ticked and counted, by line */
  protected readonly rows = signal<ReadonlyMap<string, Row>>(new Map());
  private readonly ticks = signal(0);
  /** the number of the dispatch made last, on this visit */
  protected readonly made = signal<string | null>(null);

  protected readonly lines = computed(() =>
    (this.order()?.lines ?? []).map((line, i) => ({ line, name: line.tag ?? `line ${i + 1}`, left: line.quantity - line.dispatched })),
  );
  protected readonly left = computed(() => this.lines().reduce((sum, { left }) => sum + left, 0));
  private readonly packing = computed(() => {
    this.ticks();
    return this.lines().map(({ line, left }) => ({ line: line.id, left, ...this.rows().get(line.id)?.getRawValue() }));
  });
  protected readonly packed = computed(() => packedUnits(this.packing()));
  protected readonly allPacked = computed(() => this.packing().every(({ left, packed }) => left === 0 || packed));
  protected readonly wrong = computed(() => new Map(this.packing().map((row) => [row.line, quantityProblem(row)])));

  constructor() {
    effect(() => this.lay(this.order()));
    effect(() => {
      const answer = this.flight.answer();
      if (answer) untracked(() => this.take(answer));
    });
    effect(() => {
      // Somebody else dispatched or moved it first: show what is left now.
      const status = this.flight.problem()?.status;
      if (status === 409 || status === 422) untracked(() => this.source.reload());
    });
  }

  unsaved(): string | null {
    return this.packed() > 0 && !this.flight.flying() ? `${this.packed()} units ticked as packed for order ${this.order()?.number}` : null;
  }

  protected when({ promisedOn, requiredOn }: Order): string {
    const promised = promisedOn ? `promised ${this.days.transform(promisedOn)}` : 'promised for no day yet';
    return requiredOn ? `${promised}, needed by ${this.days.transform(requiredOn)}` : promised;
  }

  protected rowOf({ id }: OrderLine): Row | undefined {
    return this.rows().get(id);
  }

  protected tickAll(): void {
    const packed = !this.allPacked();
    for (const { line, left } of this.lines()) if (left > 0) this.rows().get(line.id)?.controls.packed.setValue(packed);
  }

  protected all(line: OrderLine, left: number): void {
    this.rows()
      .get(line.id)
      ?.setValue({ packed: true, quantity: String(left) });
  }

  protected async dispatch(): Promise<void> {
    const order = this.order();
    const lines = toDispatch(this.packing());
    if (!order || lines === null || this.flight.flying()) return;
    const units = this.packed();
    const sure = await this.asker.confirm({
      title: `Dispatch ${units === order.units ? 'all' : `${units} of`} ${order.units} units of ${order.number}?`,
      text: `They leave for ${order.shipTo.label}, ${order.shipTo.town}. The invoice for them is made at once; a dispatch cannot be taken back here.`,
      confirm: `Dispatch ${units} ${units === 1 ? 'unit' : 'units'}`,
      cancel: 'Not yet',
    });
    if (sure) this.flight.press({ id: order.id, body: { lines } });
  }

  protected async move(to: Order['state']): Promise<void> {
    const order = this.order();
    if (!order || this.moving()) return;
    this.moving.set(true);
    try {
      const moved = await firstValueFrom(this.api.call(moveOrder, { params: { id: order.id }, body: { to } }));
      this.moveProblem.set(null);
      this.source.set(moved);
      await this.announcer.announce(`Order ${moved.number} is now ${moved.state}`);
    } catch (error) {
      const problem = ProblemError.from(error);
      this.moveProblem.set(problem);
      if (problem.status === 409) this.source.reload();
    } finally {
      this.moving.set(false);
    }
  }

  /** Moves without a question; those that need a reason belong to the order's own page. */
  protected plainMoves({ moves }: Order): Order['moves'] {
    return moves.filter(({ needsReason }) => !needsReason);
  }

  private take(order: Order): void {
    this.made.set(order.dispatches.at(-1)?.number ?? null);
    this.source.set(order);
    afterNextRender(() => this.host.nativeElement.querySelector<HTMLElement>('.made')?.focus(), { injector: this.injector });
  }

  /** One row a line, untouched where only the order around it changed. */
  private lay(order: Order | undefined): void {
    if (!order) return;
    this.title.setTitle(`Dispatch ${order.number} · Sealyard`);
    const before = untracked(this.rows);
    const rows = new Map<string, Row>();
    for (const line of order.lines) {
      const left = line.quantity - line.dispatched;
      const known = before.get(line.id);
      const keeps = known && known.value.packed && Number(known.value.quantity) <= left && untracked(this.flight.answer) !== order;
      rows.set(line.id, keeps ? known : this.freshRow(left));
    }
    this.rows.set(rows);
  }

  private freshRow(left: number): Row {
    const row: Row = new FormGroup({
      packed: new FormControl(false, { nonNullable: true }),
      quantity: new FormControl(String(left), { nonNullable: true }),
    });
    row.valueChanges.subscribe(() => this.ticks.update((n) => n + 1));
    return row;
  }
}
