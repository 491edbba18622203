import type { Evaluation } from '../contracts/evaluation';
import type { ResolvedUnit } from './resolve-unit';

/** kg/m³. Glass: EN 572-1 (from memory). PVB: common practice, no published source. */
export const glassDensity = 2500;
export const interlayerDensity = 1070;
/** The cavity width that `massPerMetre` of a spacer is given for, mm. */
const referenceCavityMm = 12;

/**
 * Weight in kg by the actual thickness of the glass; spacer, desiccant and seals per metre of
 * spacer, in proportion to the cavity's width. `area` in m² and `spacerLength` in m, all cavities
 * together, come from `geometryOf`.
 */
export function weightOf(
  { lites, cavities }: Pick<ResolvedUnit, 'lites' | 'cavities'>,
  { area, spacerLength }: { area: number; spacerLength: number },
): { weight: number; parts: Evaluation['weightParts'] } {
  let glass = 0;
  let interlayer = 0;
  for (const lite of lites) {
    glass += (lite.glass.actualMm - lite.glass.interlayerMm) * (glassDensity / 1000) * area;
    interlayer += lite.glass.interlayerMm * (interlayerDensity / 1000) * area;
  }
  const perMetre = cavities.reduce((sum, { spacer, widthMm }) => sum + (spacer.massPerMetre * widthMm) / referenceCavityMm, 0);
  const edge = (perMetre * spacerLength) / cavities.length;
  return { weight: glass + interlayer + edge, parts: { glass, interlayer, edge } };
}
