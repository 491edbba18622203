import type { ResolvedUnit } from '../glazing/resolve-unit';
import { Exact } from '../money/exact';
import { MM_PER_INCH } from '../measures/constants';
import type { MeasureSystem } from '../measures/parse-length';
import { overallMm } from './section-layers';

/** A thickness of `mm` as `0.86 in` or `21.84 mm`, to two decimals. */
export function thicknessText(mm: number, system: MeasureSystem): string {
  // Sums of catalogue thicknesses carry a float's last digits; a nanometre is finer than any of them.
  const exactMm = new Exact(mm.toFixed(6));
  return system === 'imperial' ? `${exactMm.dividedBy(MM_PER_INCH).toFixed(2)} in` : `${exactMm.toDecimalPlaces(2).toFixed()} mm`;
}

/** The section in words, from outside in. */
export function describeSection(resolved: ResolvedUnit, system: MeasureSystem): string {
  const { lites, cavities } = resolved;
  const parts = lites.flatMap(({ glass, treatment, coating }, i) => {
    const coated = coating ? `, ${coating.item.name} on surface ${coating.surface}` : '';
    const lite = `lite ${i + 1}, ${glass.name}, ${treatment.kind}, ${thicknessText(glass.actualMm, 'metric')} thick${coated}`;
    const cavity = cavities[i];
    if (!cavity || i === lites.length - 1) return [lite];
    const tube = cavity.capillary ? ' and an open capillary tube' : '';
    return [lite, `${cavity.widthMm} mm of ${cavity.gas.gas} with ${article(cavity.spacer.material)} spacer${tube}`];
  });
  return `To scale, from outside in: ${parts.join('; ')}. The spacer holds desiccant; butyl seals its flanks, the secondary seal closes the edge. Surfaces are numbered 1 to ${2 * lites.length}; overall thickness ${thicknessText(overallMm(resolved), system)}.`;
}

const article = (word: string) => `${/^[aeiou]/.test(word) ? 'an' : 'a'} ${word}`;
