import { type Catalogue } from '@shared/contracts/catalogue';
import { type Draft } from './draft';

/** A layer as the list shows it. */
export interface LayerRow {
  kind: 'lite' | 'cavity';
  /** from 0, among its kind */
  index: number;
  /** into the unit */
  pointer: string;
  title: string;
  below: string;
  /** at the right: thickness, and the surfaces of a lite */
  size: string;
  surfaces: string;
}

/** Lites and cavities in turn, from outside in. What the catalogue does not hold goes by its identity. */
export function rowsOf({ lites, cavities }: Pick<Draft, 'lites' | 'cavities'>, catalogue: Catalogue): LayerRow[] {
  const name = (items: readonly { id: string; name: string }[], id: string) => items.find((item) => item.id === id)?.name ?? id;
  return lites.flatMap(({ glass, treatment, coating, edgeWork }, i) => {
    const product = catalogue.glasses.find(({ id }) => id === glass);
    const kind = product?.name.replace(/\s*\d.*$/, '') ?? glass;
    const details = [
      `lite ${i + 1}`,
      ...(coating ? [`${name(catalogue.coatings, coating.id)} on surface ${coating.surface}`] : []),
      ...(edgeWork ? [`${name(catalogue.edgeWork, edgeWork)} edges`] : []),
    ];
    const row: LayerRow = {
      kind: 'lite',
      index: i,
      pointer: `/lites/${i}`,
      title: capital(`${kind}, ${name(catalogue.treatments, treatment)}`),
      below: details.join(', '),
      size: product ? `${product.nominalMm} mm` : '',
      surfaces: `surfaces ${2 * i + 1}, ${2 * i + 2}`,
    };
    const cavity = cavities[i];
    if (!cavity) return [row];
    return [
      row,
      {
        kind: 'cavity' as const,
        index: i,
        pointer: `/cavities/${i}`,
        title: capital(`${name(catalogue.gases, cavity.gas)}, ${name(catalogue.spacers, cavity.spacer)} spacer`),
        below: cavity.capillary ? 'open capillary tube' : 'no capillary tube',
        size: `${cavity.width} mm`,
        surfaces: '',
      },
    ];
  });
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
