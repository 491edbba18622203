import type { ResolvedCavity, ResolvedLite, ResolvedUnit } from '../glazing/resolve-unit';

/** A lite or a cavity of the section, placed on the sheet from `left` to `right`. Numbers count from 1, outside in. */
export type Layer =
  | { kind: 'lite'; number: number; left: number; right: number; lite: ResolvedLite }
  | { kind: 'cavity'; number: number; left: number; right: number; cavity: ResolvedCavity };

export type LiteLayer = Extract<Layer, { kind: 'lite' }>;
export type CavityLayer = Extract<Layer, { kind: 'cavity' }>;

/** Overall thickness in mm: actual thickness of the glass and the cavities. */
export function overallMm({ lites, cavities }: Pick<ResolvedUnit, 'lites' | 'cavities'>): number {
  return lites.reduce((sum, { glass }) => sum + glass.actualMm, 0) + cavities.reduce((sum, { widthMm }) => sum + widthMm, 0);
}

/** The layers of a unit from outside in, side by side from `left`, at `scale` units per mm. */
export function layersOf({ lites, cavities }: Pick<ResolvedUnit, 'lites' | 'cavities'>, left: number, scale: number): Layer[] {
  const layers: Layer[] = [];
  let mm = 0;
  const next = (widthMm: number) => {
    const from = left + mm * scale;
    mm += widthMm;
    return { left: from, right: left + mm * scale };
  };
  for (const [i, lite] of lites.entries()) {
    layers.push({ kind: 'lite', number: i + 1, ...next(lite.glass.actualMm), lite });
    const cavity = cavities[i];
    if (cavity && i < lites.length - 1) layers.push({ kind: 'cavity', number: i + 1, ...next(cavity.widthMm), cavity });
  }
  return layers;
}

/** Where a surface of the unit lies: surfaces 1 and 2 are the outer and inner face of lite 1, and so on. */
export function surfaceAt(layers: readonly Layer[], surface: number): number {
  const lite = layers.find((layer) => layer.kind === 'lite' && layer.number === Math.ceil(surface / 2));
  if (!lite) throw new RangeError(`there is no surface ${surface}`);
  return surface % 2 === 1 ? lite.left : lite.right;
}
