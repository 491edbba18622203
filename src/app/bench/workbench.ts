import { ChangeDetectionStrategy, Component, computed, effect, inject, untracked, viewChild } from '@angular/core';
import { otherMeasure } from '@shared/measures/format-length';
import { Asker } from '../ui/asker';
import { AddBar } from './add-bar';
import { BenchAddress } from './bench-address';
import { CautionNotes } from './caution-notes';
import { CurrentQuotes } from './current-quotes';
import { CurveChart } from './curve-chart';
import { LivePrice } from './live-price';
import { MakeUpForm } from './make-up-form';
import { OfferPanel } from './offer-panel';
import { PlaceForm } from './place-form';
import { ResultStrip } from './result-strip';
import { ReaderMeasures } from './reader-measures';
import { SizeForm } from './size-form';
import { UnitDraft } from './unit-draft';
import { UnitDrawings } from './unit-drawings';
import { VisitorPanel } from './visitor-panel';

/** The Bench itself, once the catalogue is here: what, what comes of it, and what it costs. */
@Component({
  selector: 'app-workbench',
  imports: [AddBar, CautionNotes, CurveChart, MakeUpForm, OfferPanel, PlaceForm, ResultStrip, SizeForm, UnitDrawings, VisitorPanel],
  providers: [BenchAddress],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './workbench.html',
  styleUrls: ['./section-head.scss', './workbench.scss', './quiet.scss'],
  host: { '(document:keydown)': 'key($event)' },
})
export class Workbench {
  protected readonly draft = inject(UnitDraft);
  protected readonly price = inject(LivePrice);
  protected readonly measures = inject(ReaderMeasures);
  private readonly quotes = inject(CurrentQuotes);
  private readonly asker = inject(Asker);
  private readonly sizes = viewChild.required(SizeForm);
  private readonly addBar = viewChild<AddBar>('addBar');

  protected readonly ignored = computed(() =>
    [...this.draft.ignored(), ...(this.quotes.refused() ? ['a quote that takes no more lines, or is not yours'] : [])].join('; '),
  );

  constructor() {
    inject(BenchAddress);
    // The tag was for the line that is in the quote now; one typed meanwhile is for the next.
    effect(() => {
      const added = this.quotes.added();
      untracked(() => {
        if (added && this.draft.draft().tag.trim() === added.line.tag) this.draft.type({ tag: '' });
      });
    });
  }

  protected understood(): void {
    this.draft.ignored.set([]);
    this.quotes.refused.set(false);
  }

  protected add(): void {
    this.addBar()?.add();
  }

  /** The line is on its way: ready for the next size. */
  protected next(): void {
    this.sizes().focusWidth();
  }

  protected turnMeasures(): void {
    this.measures.choose(otherMeasure(this.draft.system()));
  }

  protected key(event: KeyboardEvent): void {
    const target = event.target instanceof Element ? event.target : null;
    const typing = target?.matches('input, select, textarea') ?? false;
    if (event.key === '?' && !typing) {
      event.preventDefault();
      void this.showKeys();
    } else if (event.key === 'Enter' && (event.ctrlKey || event.metaKey) && !event.repeat) {
      event.preventDefault();
      this.add();
    }
  }

  protected async showKeys(): Promise<void> {
    await this.asker.open(async () => (await import('./key-list')).KeyList);
  }
}
