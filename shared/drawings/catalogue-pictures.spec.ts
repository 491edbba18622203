import { catalogueFactory } from '../../test/factories/catalogue-factory';
import { catalogueParts } from '../contracts/catalogue-parts';
import { cataloguePicture } from './catalogue-pictures';
import { type Drawing } from './drawing';
import { makingPictures, moisturePicture } from './making-pictures';
import { pictureSize } from './picture';

const catalogue = catalogueFactory();
const items = catalogueParts.flatMap(({ slug, key }) =>
  catalogue[key].map((item) => ({ name: `${slug} ${item.id}`, picture: cataloguePicture(slug, item) })),
);
const others = [
  ...Object.entries(makingPictures()).map(([name, picture]) => ({ name, picture })),
  { name: 'moisture', picture: moisturePicture() },
];

/** Corners of what has plain coordinates. */
function points({ items: drawn }: Drawing): [number, number][] {
  return drawn.flatMap((item): [number, number][] => {
    switch (item.kind) {
      case 'rect':
        return [[item.x, item.y], [item.x + item.width, item.y + item.height]]; // prettier-ignore
      case 'circle':
        return [[item.cx - item.r, item.cy - item.r], [item.cx + item.r, item.cy + item.r]]; // prettier-ignore
      case 'path':
        return [...item.d.matchAll(/[ML] ?(-?[\d.]+) (-?[\d.]+)/g)].map(([, x, y]) => [Number(x), Number(y)]);
      default:
        return [];
    }
  });
}

describe('pictures of the catalogue', () => {
  it.each([...items, ...others])('$name: within its frame, named and told in words', ({ picture }) => {
    expect(picture).toMatchObject(pictureSize);
    expect(picture.description).toMatch(/^[A-Z].{30,}\.$/s);
    expect(JSON.stringify(picture)).not.toMatch(/NaN|undefined|null|Infinity/);
    for (const [x, y] of points(picture)) {
      expect(x).toBeGreaterThanOrEqual(0);
      expect(x).toBeLessThanOrEqual(picture.width);
      expect(y).toBeGreaterThanOrEqual(0);
      expect(y).toBeLessThanOrEqual(picture.height);
    }
  });

  it('gives no two items the same picture', () => {
    const drawn = [...items, ...others].map(({ picture }) => JSON.stringify(picture.items));
    expect(new Set(drawn).size).toBe(drawn.length);
  });

  it('shows the tempered lite in many more pieces than the annealed one', () => {
    const lines = (kind: string) => {
      const item = catalogue.treatments.find((treatment) => treatment.kind === kind)!;
      return cataloguePicture('treatments', item).items.flatMap((drawn) => (drawn.kind === 'path' ? [...drawn.d.matchAll(/M/g)] : []))
        .length;
    };
    expect(lines('tempered')).toBeGreaterThan(5 * lines('annealed'));
    expect(lines('annealed')).toBeGreaterThan(lines('heat-strengthened'));
  });

  it('lets as many of five rays of sun through as the coating does', () => {
    for (const coating of catalogue.coatings) {
      const rays = cataloguePicture('coatings', coating).items.filter(
        (item) => item.kind === 'path' && item.stroke === 'bead' && / 150 /.test(item.d),
      );
      expect(rays).toHaveLength(Math.round(5 * coating.optics.solarTransmittance));
    }
  });
});
