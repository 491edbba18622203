import type { Catalogue } from '../contracts/catalogue';
import type { Unit } from '../contracts/units';
import { coatingWord, glassWords, treatmentWord } from './make-up-words';

/**
 * A make-up as the trade writes it, outside in: `3 temp / 16 argon / 3 temp low-e 3`. Annealed and
 * clear go without saying; spacers, edge work and the grid are not part of the text. A product the
 * catalogue does not hold is written by its identity.
 */
export function makeUpText({ lites, cavities }: Pick<Unit, 'lites' | 'cavities'>, catalogue: Catalogue): string {
  const parts = lites.flatMap(({ glass, treatment, coating }, i) => {
    const product = catalogue.glasses.find(({ id }) => id === glass);
    const treated = catalogue.treatments.find(({ id }) => id === treatment);
    const lite = [
      ...(product ? [String(product.nominalMm), ...glassWords(product)] : [glass]),
      ...(treated?.kind === 'annealed' ? [] : [treated ? treatmentWord(treated, catalogue) : treatment]),
      ...(coating ? [coatingWord(coating, catalogue), String(coating.surface)] : []),
    ].join(' ');
    const cavity = cavities[i];
    return cavity ? [lite, [cavity.width, cavity.gas, ...(cavity.capillary ? ['tube'] : [])].join(' ')] : [lite];
  });
  return parts.join(' / ');
}
