import { computed, inject, Injectable, signal } from '@angular/core';
import { CurrentQuotes } from './current-quotes';
import { LivePrice } from './live-price';

/** The maker whose offer is open: the one chosen, else one with a quote begun, else the first that can build the unit. */
@Injectable()
export class ChosenMaker {
  private readonly price = inject(LivePrice);
  private readonly quotes = inject(CurrentQuotes);
  /** identity of the maker that was chosen in the panel or the address */
  readonly wanted = signal<string | null>(null);

  /** The open offer, or one of an earlier unit while a new price is on its way. */
  readonly offer = computed(() => {
    const offers = this.price.lastOffers();
    const able = offers.filter(({ canBuild }) => canBuild);
    return (
      offers.find(({ fabricator }) => fabricator.id === this.wanted()) ??
      able.find(({ tradeAccount }) => this.quotes.at(tradeAccount)) ??
      able[0] ??
      offers[0]
    );
  });
}
