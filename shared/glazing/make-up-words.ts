import type { Catalogue, CoatingItem, GlassItem, TreatmentItem } from '../contracts/catalogue';

/** The short words that a make-up is written with, outside in. */

const shortWord: Record<string, string> = {
  laminated: 'lam',
  clr: 'clear',
  gray: 'grey',
  tempered: 'temp',
  toughened: 'temp',
  tmp: 'temp',
  'heat-strengthened': 'hs',
  ann: 'annealed',
  ar: 'argon',
  kr: 'krypton',
  xe: 'xenon',
  alu: 'aluminium',
  aluminum: 'aluminium',
  steel: 'stainless',
  capillary: 'tube',
};

const kindWord: Record<TreatmentItem['kind'], string> = { annealed: 'annealed', 'heat-strengthened': 'hs', tempered: 'temp' };

/** One spelling for the ways a word is written. */
export function usualWord(word: string): string {
  const plain = word.toLowerCase();
  return shortWord[plain] ?? plain;
}

/** What tells a glass from plain clear of its thickness: nothing for clear, `bronze`, `lam`. */
export function glassWords({ name }: GlassItem): string[] {
  return name
    .split(/\s+/)
    .filter((word) => !/^\d/.test(word) && word !== 'mm')
    .map(usualWord)
    .filter((word) => word !== 'clear');
}

/** The first treatment of a kind goes by the kind's word, another by its identity. */
export function treatmentWord(treatment: TreatmentItem, { treatments }: Catalogue): string {
  return treatments.find(({ kind }) => kind === treatment.kind)?.id === treatment.id ? kindWord[treatment.kind] : treatment.id;
}

/** The catalogue's first coating is `low-e`, another goes by its identity. */
export function coatingWord(coating: Pick<CoatingItem, 'id'>, { coatings }: Catalogue): string {
  return coatings[0]?.id === coating.id ? 'low-e' : coating.id;
}
