import { isPlatformBrowser } from '@angular/common';
import { computed, DestroyRef, effect, inject, Injectable, PLATFORM_ID, signal, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { type ParamMap, type Params, Router } from '@angular/router';
import { debounce, Subject, timer } from 'rxjs';
import { isLeaving } from '../ui/is-leaving';
import { ChosenMaker } from './chosen-maker';
import { CurrentQuotes } from './current-quotes';
import { decodeDraft, type DraftAddress, encodeDraft } from './draft-address';
import { UnitDraft } from './unit-draft';

/** A pause in typing before the address follows, ms. */
const PAUSE = 400;
const names = ['size', 'units', 'tag', 'make', 'place'] as const satisfies readonly (keyof DraftAddress)[];

/**
 * Keeps the address and the Bench in step: what is typed replaces the address after a pause, what
 * is chosen is an entry of the history of its own; back, forward and links are read. A Bench
 * without a unit in its address stays as it was left.
 */
@Injectable()
export class BenchAddress {
  private readonly router = inject(Router);
  private readonly draft = inject(UnitDraft);
  private readonly maker = inject(ChosenMaker);
  private readonly quotes = inject(CurrentQuotes);
  private readonly writes = new Subject<'at once' | 'after a pause'>();
  /** the address as this wrote or read it last */
  private readonly known = signal<Params>({});
  /** just read: what is written of it is the same place, spelt as usual */
  private fresh = true;

  /** The Bench with what stands on it, also where its address is yet to follow. */
  readonly here = computed(() => {
    const wanted = this.wanted();
    return wanted === null ? this.router.url : this.router.serializeUrl(this.router.createUrlTree(['/bench'], { queryParams: wanted }));
  });

  constructor() {
    const route = this.router.routerState.root;
    route.queryParamMap.pipe(takeUntilDestroyed()).subscribe((params) => this.read(params));
    if (!isPlatformBrowser(inject(PLATFORM_ID))) return;

    effect(() => {
      const wanted = this.wanted();
      if (wanted === null) return;
      const entry = !this.fresh && untracked(this.draft.lastChange) === 'chosen';
      if (same(wanted, this.known())) this.fresh = false;
      else this.writes.next(entry || this.fresh ? 'at once' : 'after a pause');
    });
    this.writes
      .pipe(
        debounce((when) => timer(when === 'at once' ? 0 : PAUSE)),
        takeUntilDestroyed(),
      )
      .subscribe((when) => void this.write(when === 'at once' && !this.fresh));
    inject(DestroyRef).onDestroy(() => this.writes.complete());
  }

  /** The address of what stands on the Bench; null while it cannot be read. */
  private wanted(): Params | null {
    const { quantity, problems } = this.draft.reading();
    if (quantity === null || problems.some(({ pointer }) => ['/width', '/height', '/makeUp', '/tag'].includes(pointer))) return null;
    return { ...encodeDraft(this.draft.draft()), maker: this.maker.wanted(), quote: this.quotes.ids().join(',') || null };
  }

  private async write(entry: boolean): Promise<void> {
    const wanted = this.wanted();
    if (wanted === null || same(wanted, this.known())) return;
    // If they stay after all, it is made up for.
    if (isLeaving(this.router)) return this.writes.next('after a pause');
    this.known.set(wanted);
    await this.router.navigate([], { queryParams: wanted, queryParamsHandling: 'merge', replaceUrl: !entry, scroll: 'manual' });
  }

  private read(params: ParamMap): void {
    const found: Params = Object.fromEntries([...names, 'maker', 'quote'].map((name) => [name, params.get(name)]));
    if (same(found, untracked(this.known))) return;
    this.known.set(found);
    this.fresh = true;
    // The Bench itself, as the head of the page links to it: it stays as it was left.
    if (Object.values(found).every((value) => value === null)) return;
    const { draft, ignored } = decodeDraft((name) => params.get(name), this.draft.system(), this.draft.catalogue());
    const maker = params.get('maker');
    const known = maker === null || this.draft.catalogue().fabricators.some(({ id }) => id === maker);
    this.maker.wanted.set(known ? maker : null);
    this.quotes.use((params.get('quote') ?? '').split(','));
    if (names.some((name) => params.has(name))) this.draft.replace(draft, known ? ignored : [...ignored, `the maker “${maker}”`]);
  }
}

function same(a: Params, b: Params): boolean {
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
  return [...keys].every((key) => (a[key] ?? null) === (b[key] ?? null));
}
