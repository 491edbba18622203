import { type Catalogue } from '@shared/contracts/catalogue';
import { type Unit } from '@shared/contracts/units';
import { areaOf, perimeterOf } from '@shared/glazing/geometry';
import { outlineOf } from '@shared/glazing/outline';
import { benchMake, comparingUnit } from '../comparing-unit';
import { decimals } from '../facts';
import { type PartView } from './part-view';

type ShapeItem = Catalogue['shapes'][number];
type ShapeClass = ShapeItem['class'];

/** What a maker must be told, beside width and height. */
const toGive: Record<ShapeClass, string> = {
  rectangle: 'nothing more',
  'raked-head': 'the lower height, and which side is the higher',
  gable: 'the height of the eaves',
  'segment-arch': 'the rise of the arch',
  'half-round': 'nothing more',
  circle: 'nothing more',
  ellipse: 'nothing more',
  triangle: 'where the apex stands, from the left',
  octagon: 'how much is cut from each corner',
  polygon: 'the coordinates of every corner',
};

export const shapeView: PartView<ShapeItem> = {
  slug: 'shapes',
  kind: 'shape of sealed units',
  lead: 'The outline of the unit, seen from outside. Everything but a rectangle is cut to its own shape and costs more.',
  guide: [
    'Every shape is given by the width and height of the rectangle round it, and by one or two sizes of its own. Left and right are those of someone who stands outside.',
    'Limits count on the rectangle round the shape. Sharp corners and tight curves have limits of their own at each maker.',
    'For anything but a rectangle send a drawing or a template along: what is measured in two places is believed.',
  ],
  facts: (shape) => [{ label: 'Beside width and height', value: toGive[shape.class] }],
  source: () => null,
  comparison: ({ shapes }) => ({
    title: 'How much glass is in each shape',
    intro: 'Each drawn into a rectangle of 1000 × 1200 mm; the circle into 1000 × 1000 mm, the half-round into 1200 × 600 mm.',
    columns: [
      { label: 'Area', unit: 'm²' },
      { label: 'Of its rectangle', unit: '%' },
      { label: 'Perimeter', unit: 'm' },
    ],
    rows: shapes.map((item) => {
      const unit = exampleShape(item.class);
      const outline = outlineOf(unit);
      const area = areaOf(outline) / 1e6;
      const whole = (Number(unit.width) * Number(unit.height)) / 1e6;
      return {
        item: item.id,
        name: item.name,
        cells: [decimals(area, 3), decimals((100 * area) / whole, 0), decimals(perimeterOf(outline) / 1000, 2)],
      };
    }),
    method:
      'By geometry. Raked head: lower side 700 mm. Gable: eaves 700 mm. Segment arch: rise 200 mm. Triangle: apex in the middle. Octagon: 250 mm cut. Polygon: six corners, as drawn.',
  }),
  offer: (shape) => (maker) => (maker.capabilities.shapes.includes(shape.class) ? 'made' : null),
  // The Bench takes rectangles.
  bench: (shape, catalogue) => (shape.class === 'rectangle' ? benchMake(comparingUnit(catalogue)) : null),
};

/** A shape of each class for pictures and figures, mm. */
export function exampleShape(shapeClass: ShapeClass): Pick<Unit, 'width' | 'height' | 'shape'> {
  const size = { width: '1000', height: '1200' };
  switch (shapeClass) {
    case 'raked-head':
      return { ...size, shape: { class: 'raked-head', lowHeight: '700', high: 'left' } };
    case 'gable':
      return { ...size, shape: { class: 'gable', eaves: '700' } };
    case 'segment-arch':
      return { ...size, shape: { class: 'segment-arch', rise: '200' } };
    case 'triangle':
      return { ...size, shape: { class: 'triangle', apex: '500' } };
    case 'octagon':
      return { ...size, shape: { class: 'octagon', cut: '250' } };
    case 'half-round':
      return { width: '1200', height: '600', shape: { class: 'half-round' } };
    case 'circle':
      return { width: '1000', height: '1000', shape: { class: 'circle' } };
    case 'polygon': {
      const points = [
        ['0', '0'],
        ['1000', '0'],
        ['1000', '800'],
        ['650', '1200'],
        ['250', '1200'],
        ['0', '500'],
      ].map(([x = '0', y = '0']) => ({ x, y }));
      return { ...size, shape: { class: 'polygon', points } };
    }
    default:
      return { ...size, shape: { class: shapeClass } };
  }
}
