import { DestroyRef, inject, type Signal, signal } from '@angular/core';
import { catchError, EMPTY, exhaustMap, finalize, type Observable, Subject, tap } from 'rxjs';
import { AttemptKey } from './attempt-key';
import { ProblemError } from './problem-error';

/** A call that must take effect once, however often its button is pressed. */
export interface SingleFlight<Asked, Answer> {
  /** Sends what is asked; while a call is out, further presses do nothing. */
  press(asked: Asked): void;
  flying: Signal<boolean>;
  /** what the last press was answered */
  answer: Signal<Answer | null>;
  /** why the last press was refused */
  problem: Signal<ProblemError | null>;
  /** leaves the last problem behind */
  clear(): void;
}

/**
 * Calls one at a time, each attempt under its own idempotency key. When it is not known whether
 * a call arrived, the next press of the same sends the same key, so that it cannot happen twice.
 * A call that is out is not called back when its page is left. To be called in an injection context.
 */
export function singleFlight<Asked, Answer>(
  send: (asked: Asked, idempotencyKey: string) => Observable<Answer>,
): SingleFlight<Asked, Answer> {
  const presses = new Subject<Asked>();
  const key = new AttemptKey();
  const flying = signal(false);
  const answer = signal<Answer | null>(null);
  const problem = signal<ProblemError | null>(null);

  presses
    .pipe(
      exhaustMap((asked) => {
        flying.set(true);
        problem.set(null);
        return send(asked, key.for(asked)).pipe(
          tap((answered) => {
            key.settle(null);
            answer.set(answered);
          }),
          catchError((error: unknown) => {
            const refused = ProblemError.from(error);
            key.settle(refused);
            problem.set(refused);
            return EMPTY;
          }),
          finalize(() => flying.set(false)),
        );
      }),
    )
    .subscribe();
  inject(DestroyRef).onDestroy(() => presses.complete());

  return { press: (asked) => presses.next(asked), flying, answer, problem, clear: () => problem.set(null) };
}
