import { ChangeDetectionStrategy, Component, computed, inject, linkedSignal } from '@angular/core';
import { type Offer } from '@shared/contracts/prices';
import { Session } from '../session/session';
import { MoneyPipe } from '../ui/money-pipe';
import { ProblemNote } from '../ui/problem-note';
import { ChosenMaker } from './chosen-maker';
import { CreditLine } from './credit-line';
import { LivePrice } from './live-price';
import { MakerList } from './maker-list';
import { OfferCard } from './offer-card';
import { UnitDraft } from './unit-draft';

/** The offers of all makers with whom the dealer holds an account; one of them is open and takes the lines. */
@Component({
  selector: 'app-offer-panel',
  imports: [CreditLine, MakerList, OfferCard, ProblemNote],
  providers: [MoneyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './offer-panel.html',
  styleUrls: ['./section-head.scss', './offer-panel.scss'],
})
export class OfferPanel {
  protected readonly price = inject(LivePrice);
  protected readonly maker = inject(ChosenMaker);
  private readonly draft = inject(UnitDraft);
  private readonly session = inject(Session);
  private readonly money = inject(MoneyPipe);

  protected readonly quantity = computed(() => this.draft.quantity() ?? 1);
  protected readonly failed = computed(() => {
    const state = this.price.state();
    return state.is === 'failed' ? state.problem : null;
  });
  /** The charge sheet of the chosen offer shows, until it is folded. */
  protected readonly unfolded = linkedSignal({ source: () => this.maker.offer()?.tradeAccount, computation: () => true });
  /** Those that can build it first; what is on its way stands where it stood. */
  protected readonly offers = computed(() => {
    const offers = this.price.lastOffers();
    return [...offers.filter(({ canBuild }) => canBuild), ...offers.filter(({ canBuild }) => !canBuild)];
  });
  protected readonly named = computed(() => this.offers().map(({ fabricator }) => fabricator.id));
  protected readonly hasOthers = computed(() =>
    this.draft.evaluation().buildability.some(({ fabricator }) => !this.named().includes(fabricator.id)),
  );
  protected readonly mayReadCredit = computed(() => this.session.may('trade-accounts.credit'));
  /** What stands in the place of a price. */
  protected readonly status = computed(() => {
    switch (this.price.state().is) {
      case 'priced':
        return '';
      case 'pricing':
        return 'pricing…';
      default:
        return 'no price';
    }
  });

  /** What is read out once prices are here. */
  protected readonly spoken = computed(() => {
    const offers = this.price.offers();
    if (!offers) return '';
    const priced = offers.flatMap(({ fabricator, lines: [line] }) =>
      line ? [`${fabricator.name} ${this.money.transform(line.unitPrice)} each`] : [],
    );
    return priced.length === 0 ? 'No maker with whom you hold an account can build this.' : `Prices: ${priced.join(', ')}.`;
  });

  protected press({ fabricator, tradeAccount }: Offer): void {
    if (this.maker.offer()?.tradeAccount === tradeAccount) this.unfolded.update((open) => !open);
    else this.maker.wanted.set(fabricator.id);
  }
}
