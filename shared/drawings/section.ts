import type { Catalogue } from '../contracts/catalogue';
import type { Unit } from '../contracts/units';
import { resolveUnit } from '../glazing/resolve-unit';
import type { MeasureSystem } from '../measures/parse-length';
import { describeSection, thicknessText } from './describe-section';
import { levelDimension } from './dimension-line';
import { type Drawing, type Item, round, type Sheet } from './drawing';
import { edgeOf } from './section-edge';
import { drawBar, drawTubes, nameEdges } from './section-fittings';
import { drawCoatings, drawLite, nameInterlayer } from './section-glass';
import { type Label, placeLabels } from './section-labels';
import { layersOf, overallMm } from './section-layers';
import { nameGases, numberSurfaces } from './section-marks';
import { textWidth } from './text-width';

/** The sheet of a section on screen; as high as that of an elevation, so that both stand side by side at one scale. */
export const sectionSheet: Sheet = { width: 280, height: 330, textSize: 14 };

export interface SectionOptions {
  system: MeasureSystem;
  sheet?: Sheet;
}

/** At most this many text sizes for a millimetre, so that a slim unit does not fill the sheet. */
const largestScale = 0.52;

/**
 * A section through the bottom edge of a unit, to one scale both ways: lites with their actual
 * thickness, coatings, spacer with desiccant, both seals, surfaces numbered, gas named.
 *
 * @throws TypeError when the unit names what the catalogue does not hold
 */
export function section(unit: Unit, catalogue: Catalogue, { system, sheet = sectionSheet }: SectionOptions): Drawing {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new TypeError(found.problems.map(({ detail }) => detail).join('; '));
  const { resolved } = found;
  const { textSize } = sheet;
  const labelSize = round(0.93 * textSize);
  const overall = overallMm(resolved);
  const room = { left: textWidth('outside', labelSize) + 0.8 * textSize, right: 7.5 * textSize };
  const scale = Math.min((sheet.width - room.left - room.right) / overall, largestScale * textSize);
  const left = room.left + (sheet.width - room.left - room.right - overall * scale) / 2;
  const right = left + overall * scale;
  const column = right + 1.3 * textSize;
  const top = 2.5 * textSize;
  const bottom = sheet.height - 2.4 * textSize;

  const layers = layersOf(resolved, left, scale);
  const lites = layers.filter((layer) => layer.kind === 'lite');
  const cavities = layers.filter((layer) => layer.kind === 'cavity');
  const edges = cavities.map((layer) => edgeOf(layer.cavity.spacer, layer.left, layer.right, bottom, scale, 0.11 * textSize));
  const edgeTop = Math.min(...edges.map((edge) => edge.top));
  const gases = nameGases(cavities, top, edgeTop, textSize);
  const coatings = drawCoatings(lites, layers, { top, deleted: Math.max(top, edgeTop - 0.3 * textSize), bottom, weight: 0.17 * textSize });
  const bar = drawBar(resolved, cavities, edgeTop - 0.5 * textSize, scale);
  const tubes = drawTubes(cavities, edges, bottom);

  // Leaders run level through what lies inside of them: below the texts in the cavities.
  const named = [...gases.named, ...nameInterlayer(lites), ...coatings.named];
  const step = Math.min(1.5 * textSize, ((edgeTop - gases.bottom) * 0.65) / Math.max(1, named.length));
  const labels: Label[] = [
    ...named.map((it, i) => ({ ...it, y: gases.bottom + (i + 0.6) * step })),
    ...bar.labels,
    ...tubes.labels,
    ...nameEdges(resolved, edges),
  ];
  const side = (text: string, x: number, anchor: 'start' | 'end'): Item => {
    return { kind: 'text', x: round(x), y: round(top + 0.7 * textSize), text, size: labelSize, anchor, role: 'soft', part: 'side' };
  };
  return {
    width: sheet.width,
    height: sheet.height,
    title: 'Section through the edge',
    description: describeSection(resolved, system),
    items: [
      ...lites.flatMap((layer) => drawLite(layer, top, bottom)),
      ...edges.flatMap((edge) => edge.items),
      ...bar.items,
      ...gases.items,
      ...coatings.items,
      ...tubes.items,
      side('outside', left - 0.6 * textSize, 'end'),
      side('inside', column, 'start'),
      ...numberSurfaces(layers, 2 * lites.length, top, sheet),
      ...placeLabels(labels, {
        bend: right + 0.5 * textSize,
        left: column,
        width: sheet.width - column,
        top: top + 1.1 * textSize,
        bottom: sheet.height - 0.3 * textSize,
        size: labelSize,
      }),
      ...levelDimension(left, right, sheet.height - 0.6 * textSize, thicknessText(overall, system), textSize),
    ],
  };
}
