import { type Catalogue } from './catalogue';

/** The parts of the catalogue as its pages and addresses call them: `/catalogue/gases/argon`. */
export const catalogueParts = [
  { slug: 'glass', key: 'glasses', name: 'Glass' },
  { slug: 'treatments', key: 'treatments', name: 'Treatments' },
  { slug: 'coatings', key: 'coatings', name: 'Coatings' },
  { slug: 'spacers', key: 'spacers', name: 'Spacers' },
  { slug: 'gases', key: 'gases', name: 'Gases' },
  { slug: 'grids', key: 'grids', name: 'Grids' },
  { slug: 'shapes', key: 'shapes', name: 'Shapes' },
  { slug: 'edge-work', key: 'edgeWork', name: 'Edge work' },
] as const satisfies readonly { slug: string; key: Exclude<keyof Catalogue, 'fabricators'>; name: string }[];

export type CataloguePart = (typeof catalogueParts)[number];
export type PartSlug = CataloguePart['slug'];
export type PartItem = Catalogue[CataloguePart['key']][number];

/** Pages that explain, beside those of the parts. */
export const cataloguePages = ['how-a-unit-is-made', 'sizes', 'questions'] as const;

/** Path of every public page, in the order in which a reader would take them. */
export function publicPaths(catalogue: Catalogue): string[] {
  return [
    '/',
    '/bench',
    '/catalogue',
    ...cataloguePages.map((page) => `/catalogue/${page}`),
    ...catalogueParts.flatMap(({ slug, key }) => [
      `/catalogue/${slug}`,
      ...catalogue[key].map(({ id }) => `/catalogue/${slug}/${encodeURIComponent(id)}`),
    ]),
    '/catalogue/makers',
    ...catalogue.fabricators.map(({ id }) => `/catalogue/makers/${encodeURIComponent(id)}`),
  ];
}
