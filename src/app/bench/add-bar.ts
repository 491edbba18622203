import { ChangeDetectionStrategy, Component, computed, inject, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { Icon } from '../ui/icon';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { SizePipe } from '../ui/size-pipe';
import { ChosenMaker } from './chosen-maker';
import { CurrentQuotes } from './current-quotes';
import { LivePrice } from './live-price';
import { UnitDraft } from './unit-draft';

/** The line price and the one thing to do next; what became of it stands beside. On a phone it stays at the bottom. */
@Component({
  selector: 'app-add-bar',
  imports: [Icon, MatButton, MoneyPipe, ProblemNote, RouterLink, SizePipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './add-bar.html',
  styleUrls: ['./add-bar.scss', './quiet.scss'],
})
export class AddBar {
  /** the line is on its way to a quote */
  readonly sent = output();
  private readonly draft = inject(UnitDraft);
  private readonly price = inject(LivePrice);
  protected readonly maker = inject(ChosenMaker);
  protected readonly quotes = inject(CurrentQuotes);

  protected readonly quantity = computed(() => this.draft.quantity() ?? 1);
  protected readonly linePrice = computed(() => (this.price.offers() ? this.maker.offer()?.lines[0]?.linePrice : undefined));
  protected readonly current = computed(() => this.quotes.at(this.maker.offer()?.tradeAccount));
  /** The line added last, while its quote is the one that the next line goes to. */
  protected readonly added = computed(() => {
    const added = this.quotes.added();
    return added?.quote.id === this.current()?.id ? added : null;
  });
  /** Why nothing can be added now, or null. */
  protected readonly hindrance = computed(() => {
    const { unit, quantity, problems } = this.draft.reading();
    if (unit === null || quantity === null || problems.some(({ pointer }) => pointer === '/tag'))
      return 'A field cannot be used as it stands.';
    const offer = this.maker.offer();
    if (!offer) return this.price.state().is === 'pricing' ? 'Prices are on their way.' : 'There is no offer to add.';
    const local = this.draft.evaluation().buildability.find(({ fabricator }) => fabricator.id === offer.fabricator.id);
    const offers = this.price.offers();
    const can = offers ? offer.canBuild : (local?.canBuild ?? true);
    return can ? null : `${offer.fabricator.name} cannot build this. Take what it can build, or open another offer.`;
  });

  /** Adds the line as it stands, at the maker whose offer is open; the quote answers with its own price. */
  add(): void {
    const { unit, quantity, tag } = this.draft.reading();
    const offer = this.maker.offer();
    if (this.hindrance() !== null || unit === null || quantity === null || !offer) return;
    this.maker.wanted.set(offer.fabricator.id);
    this.quotes.add({ unit, quantity, ...(tag === undefined ? {} : { tag }) }, offer.tradeAccount);
    this.sent.emit();
  }
}
