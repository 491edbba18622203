import { computed, type Signal, signal } from '@angular/core';
import { takeUntilDestroyed, toObservable } from '@angular/core/rxjs-interop';
import { catchError, combineLatest, EMPTY, type Observable, switchMap, tap } from 'rxjs';
import { ProblemError } from './problem-error';

interface Page<T> {
  items: T[];
  nextCursor: string | null;
}

/** A list read page by page, as signals. */
export interface PagedList<T> {
  items: Signal<T[]>;
  loading: Signal<boolean>;
  problem: Signal<ProblemError | null>;
  hasMore: Signal<boolean>;
  /** appends the next page */
  more(): void;
  reload(): void;
}

/** Begins again at the first page whenever `query` changes. To be called in an injection context. */
export function pagedList<Query extends object, T>(
  query: Signal<Query>,
  read: (query: Query & { cursor?: string }) => Observable<Page<T>>,
): PagedList<T> {
  const items = signal<T[]>([]);
  const loading = signal(true);
  const problem = signal<ProblemError | null>(null);
  const next = signal<string | null>(null);
  const turn = signal({ n: 0, cursor: undefined as string | undefined });
  let shown: Query | undefined;

  combineLatest([toObservable(query), toObservable(turn)])
    .pipe(
      switchMap(([wanted, { cursor }]) => {
        const from = wanted === shown ? cursor : undefined;
        shown = wanted;
        loading.set(true);
        problem.set(null);
        return read(from === undefined ? wanted : { ...wanted, cursor: from }).pipe(
          tap((page) => {
            items.update((before) => (from === undefined ? page.items : [...before, ...page.items]));
            next.set(page.nextCursor);
            loading.set(false);
          }),
          catchError((error: unknown) => {
            problem.set(ProblemError.from(error));
            loading.set(false);
            return EMPTY;
          }),
        );
      }),
      takeUntilDestroyed(),
    )
    .subscribe();

  return {
    items,
    loading,
    problem,
    hasMore: computed(() => next() !== null),
    more: () => {
      const cursor = next();
      if (cursor !== null && !loading()) turn.update(({ n }) => ({ n: n + 1, cursor }));
    },
    reload: () => turn.update(({ n }) => ({ n: n + 1, cursor: undefined })),
  };
}
