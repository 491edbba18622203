import { computed, type Signal, signal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { catchError, combineLatest, map, type Observable, of, startWith, switchMap } from 'rxjs';
import { ProblemError } from './problem-error';

type State<Request, T> =
  | { is: 'loading' }
  /** what was answered, and to which asking */
  | { is: 'here'; value: T; request: Request; turn: number }
  | { is: 'refused'; problem: ProblemError };

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
      switchMap(([wanted, asked]) =>
        wanted === undefined
          ? of<State<Request, T>>({ is: 'loading' })
          : read(wanted).pipe(
              map((value): State<Request, T> => ({ is: 'here', value, request: wanted, turn: asked })),
              catchError((error: unknown) => of<State<Request, T>>({ is: 'refused', problem: ProblemError.from(error) })),
              startWith<State<Request, T>>({ is: 'loading' }),
            ),
      ),
    ),
    { initialValue: { is: 'loading' } as State<Request, T> },
  );
  let last: { request: Request | undefined; value: T } | undefined;
  const value = computed(() => {
    const set = taken();
    const now = state();
    if (set && set.request === request() && set.turn === turn()) {
      last = set;
      return set.value;
    }
    if (now.is === 'here' && now.request === request() && now.turn === turn()) {
      last = now;
      return now.value;
    }
    // While reading the same thing again, what was there stays on the screen.
    return now.is !== 'refused' && last && last.request === request() ? last.value : undefined;
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
