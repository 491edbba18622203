import type { Unit } from '../contracts/units';

/**
 * The canonical text of a make-up, equal for two units exactly when glass, treatment, coating and
 * its surface, cavity width, gas and spacer are the same from outside in; the size, the grid, the
 * edges and tubes do not count. Such as `clear-3:tempered|16:argon:stainless|clear-3:tempered:low-e-soft@3`.
 */
export function makeUpKey(unit: Pick<Unit, 'lites' | 'cavities'>): string {
  return unit.lites
    .flatMap(({ glass, treatment, coating }, i) => {
      const lite = [glass, treatment, ...(coating ? [`${coating.id}@${coating.surface}`] : [])].join(':');
      const cavity = unit.cavities[i];
      return cavity ? [lite, [plainNumber(cavity.width), cavity.gas, cavity.spacer].join(':')] : [lite];
    })
    .join('|');
}

/** A decimal string without needless zeros: `016.50` → `16.5`. */
function plainNumber(text: string): string {
  const [whole = '', fraction = ''] = text.split('.');
  const digits = fraction.replace(/0+$/, '');
  return `${whole.replace(/^0+(?=\d)/, '')}${digits === '' ? '' : `.${digits}`}`;
}
