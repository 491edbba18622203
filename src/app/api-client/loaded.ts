import { computed, type Signal, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { catchError, combineLatest, map, type Observable, of, startWith, switchMap } from 'rxjs';
import { ProblemError } from './problem-error';

type State<T> = { is: 'loading' } | { is: 'here'; value: T } | { is: 'refused'; problem: ProblemError };

/** Something read from the server, as signals. What was shown stays until its successor is here. */
export interface Loaded<T> {
  /** undefined until the first answer, and after a refusal */
  value: Signal<T | undefined>;
  loading: Signal<boolean>;
  problem: Signal<ProblemError | null>;
  reload(): void;
  /** takes over what a change answered, without asking again */
  set(value: T): void;
}

/**
 * Reads again whenever `request` changes; a request of undefined reads nothing.
 * To be called in an injection context.
 */
export function loaded<Request, T>(request: Signal<Request | undefined>, read: (request: Request) => Observable<T>): Loaded<T> {
  const turn = signal(0);
  const taken = signal<{ request: Request | undefined; turn: number; value: T } | null>(null);
  const state = toSignal(
    combineLatest([toObservable(request), toObservable(turn)]).pipe(
      switchMap(([wanted]) =>
        wanted === undefined
          ? of<State<T>>({ is: 'loading' })
          : read(wanted).pipe(
              map((value): State<T> => ({ is: 'here', value })),
              catchError((error: unknown) => of<State<T>>({ is: 'refused', problem: ProblemError.from(error) })),
              startWith<State<T>>({ is: 'loading' }),
            ),
      ),
    ),
    { initialValue: { is: 'loading' } as State<T> },
  );
  let last: { request: Request | undefined; value: T } | undefined;
  const value = computed(() => {
    const set = taken();
    const now = state();
    if (set && set.request === request() && set.turn === turn()) return set.value;
    if (now.is === 'here') {
      last = { request: request(), value: now.value };
      return now.value;
    }
    // While reading the same thing again, what was there stays on the screen.
    return now.is === 'loading' && last && last.request === request() ? last.value : undefined;
  });
  return {
    value,
    loading: computed(() => state().is === 'loading'),
    problem: computed(() => {
      const now = state();
      return now.is === 'refused' ? now.problem : null;
    }),
    reload: () => turn.update((n) => n + 1),
    set: (answer) => taken.set({ request: request(), turn: turn(), value: answer }),
  };
}
