import {
  type Catalogue,
  type CoatingItem,
  type GasItem,
  type GlassItem,
  type GridItem,
  type SpacerItem,
  type TreatmentItem,
} from '@shared/contracts/catalogue';

type Part = 'glasses' | 'treatments' | 'coatings' | 'spacers' | 'gases' | 'grids' | 'edgeWork';

/** The products of the catalogue by identity. */
export interface Products {
  catalogue: Catalogue;
  glasses: ReadonlyMap<string, GlassItem>;
  treatments: ReadonlyMap<string, TreatmentItem>;
  coatings: ReadonlyMap<string, CoatingItem>;
  spacers: ReadonlyMap<string, SpacerItem>;
  gases: ReadonlyMap<string, GasItem>;
  grids: ReadonlyMap<string, GridItem>;
  edgeWork: ReadonlyMap<string, Catalogue['edgeWork'][number]>;
  /** The product's name; its identity where the catalogue does not hold it. */
  nameOf(part: Part, id: string): string;
}

export function indexProducts(catalogue: Catalogue): Products {
  const by = <Item extends { id: string }>(items: readonly Item[]) => new Map(items.map((item) => [item.id, item]));
  const products = {
    catalogue,
    glasses: by(catalogue.glasses),
    treatments: by(catalogue.treatments),
    coatings: by(catalogue.coatings),
    spacers: by(catalogue.spacers),
    gases: by(catalogue.gases),
    grids: by(catalogue.grids),
    edgeWork: by(catalogue.edgeWork),
  };
  return { ...products, nameOf: (part, id) => products[part].get(id)?.name ?? id };
}
