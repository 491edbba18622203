import { type Catalogue } from '@shared/contracts/catalogue';

/** One physical figure of an item, as text. */
export interface Fact {
  label: string;
  value: string;
  unit?: string;
  /** what the figure means or stands on, where that does not go without saying */
  note?: string;
}

/** Items side by side: a row each. */
export interface Comparison {
  title: string;
  /** what is the same in every row */
  intro: string;
  columns: readonly { label: string; unit?: string }[];
  rows: readonly { item: string; name: string; cells: readonly string[] }[];
  /** method, boundary and what is left out, for figures that are calculated */
  method: string;
}

/** What one maker does with an item, in a few words; null where it does not make it. */
export type OfferWords = (maker: Catalogue['fabricators'][number]) => string | null;

/** A number to so many decimals, with a true minus. */
export function decimals(value: number, places: number): string {
  return value.toFixed(places).replace('-', '−');
}

/** A share of one as a percentage. */
export function percentText(share: number, places = 0): string {
  return `${decimals(share * 100, places)} %`;
}
