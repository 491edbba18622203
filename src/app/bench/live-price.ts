import { isPlatformBrowser } from '@angular/common';
import { computed, DOCUMENT, inject, Injectable, linkedSignal, PLATFORM_ID, type Signal, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { catchError, combineLatest, EMPTY, fromEvent, map, type Observable, of, startWith, switchMap, timer } from 'rxjs';
import { priceLinesEndpoint } from '@shared/contracts/bench';
import { type LineInput, type Offer } from '@shared/contracts/prices';
import { ApiClient } from '../api-client/api-client';
import { ProblemError } from '../api-client/problem-error';
import { Session } from '../session/session';
import { UnitDraft } from './unit-draft';

/** The typing pause before a price is asked for, ms. */
const PAUSE = 150;

export type PriceState =
  /** prices are not for this reader */
  | { is: 'closed' }
  /** the draft is no unit that could be priced */
  | { is: 'waiting' }
  | { is: 'pricing' }
  | { is: 'priced'; offers: Offer[] }
  | { is: 'failed'; problem: ProblemError };

type Answer = { is: 'pricing' } | { is: 'priced'; offers: Offer[] } | { is: 'failed'; problem: ProblemError };
interface Asked {
  line: LineInput | null;
  answer: Answer;
}

const sameText = (a: unknown, b: unknown) => JSON.stringify(a) === JSON.stringify(b);

/**
 * The offers for the unit on the Bench, on the dealer's terms. From the first key on an offer of
 * before is no longer current; a new call takes the place of one under way, whose answer is never
 * shown.
 */
@Injectable()
export class LivePrice {
  private readonly api = inject(ApiClient);
  private readonly session = inject(Session);
  private readonly draft = inject(UnitDraft);
  private readonly turn = signal(0);

  /** whether this reader has prices at all */
  readonly open = computed(() => this.session.may('prices.price'));
  /** What is priced: the unit without its place, which no price depends on. */
  readonly line: Signal<LineInput | null> = computed(
    () => {
      const unit = this.draft.unit();
      const quantity = this.draft.quantity();
      if (!this.open() || unit === null || quantity === null) return null;
      const { place: _, ...priced } = unit;
      return { unit: priced, quantity };
    },
    { equal: sameText },
  );

  private readonly asked = toSignal(
    combineLatest([toObservable(this.line), toObservable(this.turn)]).pipe(switchMap(([line]) => this.ask(line))),
    { initialValue: { line: null, answer: { is: 'pricing' } } as Asked },
  );

  readonly state = computed<PriceState>(() => {
    if (!this.open()) return { is: 'closed' };
    const line = this.line();
    if (line === null) return { is: 'waiting' };
    const { line: of, answer } = this.asked();
    // The answer to anything but what stands on the Bench this moment is none.
    return of === line ? answer : { is: 'pricing' };
  });
  readonly offers = computed(() => {
    const state = this.state();
    return state.is === 'priced' ? state.offers : null;
  });

  /** The offers, or those of an earlier unit until new ones are here: for who the makers are, never for their prices. */
  readonly lastOffers = linkedSignal<{ offers: Offer[] | null; user: string | undefined }, Offer[]>({
    source: () => ({ offers: this.offers(), user: this.session.user()?.id }),
    computation: ({ offers, user }, before) => offers ?? (before && before.source.user === user ? before.value : []),
  }).asReadonly();

  constructor() {
    const window = inject(DOCUMENT).defaultView;
    if (!isPlatformBrowser(inject(PLATFORM_ID)) || !window) return;
    fromEvent(window, 'online').subscribe(() => {
      const state = this.state();
      if (state.is === 'failed' && state.problem.status === 0) this.retry();
    });
  }

  retry(): void {
    this.turn.update((n) => n + 1);
  }

  private ask(line: LineInput | null): Observable<Asked> {
    if (line === null) return EMPTY;
    return timer(PAUSE).pipe(
      switchMap(() =>
        this.api.call(priceLinesEndpoint, { body: { lines: [line] } }).pipe(
          map(({ offers }): Answer => ({ is: 'priced', offers })),
          catchError((error: unknown) => of<Answer>({ is: 'failed', problem: ProblemError.from(error) })),
        ),
      ),
      startWith<Answer>({ is: 'pricing' }),
      map((answer) => ({ line, answer })),
    );
  }
}
