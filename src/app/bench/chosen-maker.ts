import { computed, inject, Injectable, signal } from '@angular/core';
import { LivePrice } from './live-price';

/** The maker whose offer is open: the one chosen, else the first that can build the unit. */
@Injectable()
export class ChosenMaker {
  private readonly price = inject(LivePrice);
  /** identity of the maker that was chosen in the panel or the address */
  readonly wanted = signal<string | null>(null);

  /** The open offer, or one of an earlier unit while a new price is on its way. */
  readonly offer = computed(() => {
    const offers = this.price.lastOffers();
    return offers.find(({ fabricator }) => fabricator.id === this.wanted()) ?? offers.find(({ canBuild }) => canBuild) ?? offers[0];
  });
}
