import type { GasItem, GridItem, SpacerItem } from '../contracts/catalogue';
import { type shapeClasses, type Shape } from '../contracts/units';
import { outlineOf } from '../glazing/outline';
import type { Drawing, Item } from './drawing';
import { area, arrow, box, cutLite, picture, scatter, stroke, trace, warmth } from './picture';
import { cornersOf, cornersPath, insetCorners, outlinePath } from './placed-outline';
import { edgeOf } from './section-edge';

/** The edge of a unit with a spacer, enlarged to scale; arrows for the warmth that the spacer lets out. */
export function spacerPicture(spacer: SpacerItem): Drawing {
  const scale = 5;
  const [left, right, bottom] = [44, 124, 116];
  const edge = edgeOf(spacer, left, right, bottom, scale, 1.6);
  const arrows = spacer.conductivity > 50 ? 3 : spacer.conductivity > 5 ? 2 : 1;
  return picture(
    `${spacer.name} spacer`,
    `The edge of a unit with a 16 mm cavity, cut across, to scale: the ${spacer.name} spacer, its wall ${spacer.wallMm} mm thick, filled with desiccant, butyl on both flanks, the secondary seal below. ${arrows === 1 ? 'One arrow' : `${arrows} arrows`} of three for the warmth that leaves through it.`,
    [
      ...cutLite(left - 20, 8, bottom, 20),
      ...cutLite(right, 8, bottom, 20),
      ...edge.items,
      stroke(trace('M', left - 20, bottom, 'H', right + 20), 'ink', 1.2),
      ...Array.from({ length: arrows }, (_, i) => arrow(154, edge.top + 9 + i * 10, 10, edge.top + 9 + i * 10, 'copper', 1.6)),
    ],
  );
}

/** Molecules of the cavity: the heavier the gas, the larger and fewer they are drawn, and the less warmth crosses. */
export function gasPicture({ gas, name, fill }: GasItem): Drawing {
  const [left, right] = [42, 126];
  const looks = { air: { r: 1.8, step: 12, reach: 70 }, argon: { r: 3, step: 15, reach: 48 }, krypton: { r: 4.4, step: 19, reach: 34 }, xenon: { r: 5.6, step: 23, reach: 26 } }; // prettier-ignore
  const { r, step, reach } = looks[gas];
  const items: Item[] = [...cutLite(left - 16, 6, 120, 16), ...cutLite(right, 6, 120, 16)];
  for (let x = left + step / 2 + 1, i = 0; x < right - r; x += step, i++) {
    for (let y = 14, j = 0; y < 116; y += step, j++) {
      items.push({
        kind: 'circle',
        cx: Math.round(x + (scatter(i, j) - 0.5) * step * 0.5),
        cy: Math.round(y + (scatter(j, i + 5) - 0.5) * step * 0.5),
        r,
        fill: 'tint',
        stroke: 'glass-edge',
        weight: 1,
      });
    }
  }
  for (const y of [38, 64, 90]) items.push(warmth(right - 4, right - 4 - reach, y, 'copper', 1.8));
  const share = fill < 1 ? `, filled to ${Math.round(fill * 100)} %` : '';
  return picture(
    name,
    `A cavity with ${name}${share}, between two lites. Warmth from the right gets the less far, the heavier the gas.`,
    items,
  );
}

/** A lite with a grid, and the bar cut across, enlarged. */
export function gridPicture({ name, widthMm, depthMm }: GridItem): Drawing {
  const [x, y, width, height] = [14, 12, 76, 102];
  const bar = Math.max(2.5, widthMm * 0.16);
  const scale = 1.8;
  const [w, d] = [widthMm * scale, depthMm * scale];
  const [cx, cy] = [130, 63];
  const moulded = depthMm > 7;
  const profile = moulded
    ? trace(
        'M',
        cx - d / 2,
        cy - w * 0.2,
        'L',
        cx - d * 0.2,
        cy - w / 2,
        'H',
        cx + d * 0.2,
        'L',
        cx + d / 2,
        cy - w * 0.2,
        'V',
        cy + w * 0.2,
        'L',
        cx + d * 0.2,
        cy + w / 2,
        'H',
        cx - d * 0.2,
        'L',
        cx - d / 2,
        cy + w * 0.2,
        'Z',
      )
    : trace('M', cx - d / 2, cy - w / 2, 'h', d, 'v', w, 'h', -d, 'Z');
  return picture(
    name,
    `A lite divided by one upright and two level bars; beside it the bar cut across, ${widthMm} mm wide and ${depthMm} mm deep, to scale among the bars.`,
    [
      box(x, y, width, height, 'glass', 'ink', 1.4),
      box(x + width / 2 - bar / 2, y, bar, height, 'sheet', 'metal', 0.9),
      ...[1, 2].map((i) => box(x, y + (height * i) / 3 - bar / 2, width, bar, 'sheet', 'metal', 0.9)),
      stroke(trace('M', cx - 16, 8, 'V', 118, 'M', cx + 16, 8, 'V', 118), 'glass-edge', 3),
      area(profile, 'tint', 'metal', 1.8),
    ],
  );
}

/** A size that shows each shape for what it is, in mm. */
const sizes: Record<(typeof shapeClasses)[number], { width: string; height: string; shape: Shape }> = {
  rectangle: { width: '900', height: '1100', shape: { class: 'rectangle' } },
  'raked-head': { width: '1000', height: '1100', shape: { class: 'raked-head', lowHeight: '600', high: 'left' } },
  gable: { width: '1000', height: '1100', shape: { class: 'gable', eaves: '650' } },
  'segment-arch': { width: '1000', height: '1100', shape: { class: 'segment-arch', rise: '220' } },
  'half-round': { width: '1500', height: '750', shape: { class: 'half-round' } },
  circle: { width: '1000', height: '1000', shape: { class: 'circle' } },
  ellipse: { width: '1500', height: '950', shape: { class: 'ellipse' } },
  triangle: { width: '1500', height: '1000', shape: { class: 'triangle' } },
  octagon: { width: '1000', height: '1000', shape: { class: 'octagon', cut: '290' } },
  polygon: {
    width: '1400',
    height: '1000',
    shape: { class: 'polygon', points: [{ x: '0', y: '0' }, { x: '1400', y: '0' }, { x: '1250', y: '1000' }, { x: '700', y: '700' }, { x: '0', y: '900' }] }, // prettier-ignore
  },
};

/** The outline of a shape with its sightline. */
export function shapePicture({ class: shapeClass, name }: { class: (typeof shapeClasses)[number]; name: string }): Drawing {
  const size = sizes[shapeClass];
  const outline = outlineOf(size);
  const scale = Math.min(140 / Number(size.width), 104 / Number(size.height));
  const placing = { x: 84 - (Number(size.width) * scale) / 2, y: 63 + (Number(size.height) * scale) / 2, scale };
  return picture(name, `A unit in the shape of a ${name}, seen from outside.`, [
    area(outlinePath(outline, placing), 'glass', 'ink', 1.4),
    stroke(cornersPath(insetCorners(cornersOf(outline), 40), placing), 'metal', 1.8),
  ]);
}
