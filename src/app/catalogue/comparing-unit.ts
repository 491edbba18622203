import { type Catalogue, type CoatingItem, type GasItem, type GlassItem, type SpacerItem } from '@shared/contracts/catalogue';
import { type Lite, type Unit } from '@shared/contracts/units';
import { condensationOf } from '@shared/glazing/condensation';
import { type ResolvedUnit, resolveUnit } from '@shared/glazing/resolve-unit';
import { solarOf } from '@shared/glazing/solar-en410';
import { thermalResultOf } from '@shared/glazing/thermal-en673';

/** The window whose size declared values are given for, mm (EN 14351-1:2006, from memory). */
export const comparingSize = { width: '1230', height: '1480' };

/** The products of the unit that parts are compared in. */
export interface UsualProducts {
  glass: GlassItem;
  coating: CoatingItem | undefined;
  gas: GasItem;
  spacer: SpacerItem;
}

/** Clear 4 mm, a soft coat, argon and stainless steel; the first of its kind where a catalogue has no such product. */
export function usualProducts({ glasses, coatings, gases, spacers }: Catalogue): UsualProducts {
  const isClear4 = (glass: GlassItem) => glass.nominalMm === 4 && glass.tint === null && glass.construction === 'monolithic';
  return {
    glass: pick(glasses, isClear4),
    coating: coatings.find(({ kind }) => kind === 'soft') ?? coatings[0],
    gas: pick(gases, ({ gas }) => gas === 'argon'),
    spacer: pick(spacers, ({ material }) => material === 'stainless'),
  };
}

/** A double unit, 4 / 16 argon / 4 with a soft coat on surface 3, but for what is changed. */
export function comparingUnit(
  catalogue: Catalogue,
  change: {
    outer?: Partial<Lite>;
    inner?: Partial<Lite>;
    cavity?: Partial<Unit['cavities'][number]>;
    coating?: Lite['coating'] | null;
  } = {},
): Unit {
  const { glass, coating, gas, spacer } = usualProducts(catalogue);
  const plain: Lite = { glass: glass.id, treatment: catalogue.treatments[0]?.id ?? '' };
  const usualCoating = coating && { id: coating.id, surface: 3 };
  const coated = change.coating === undefined ? usualCoating : change.coating;
  const lite = (surfaces: readonly number[], own: Partial<Lite> | undefined): Lite => ({
    ...plain,
    ...(coated && surfaces.includes(coated.surface) ? { coating: coated } : {}),
    ...own,
  });
  return {
    ...comparingSize,
    shape: { class: 'rectangle' },
    lites: [lite([1, 2], change.outer), lite([3, 4], change.inner)],
    cavities: [{ width: '16', gas: gas.id, spacer: spacer.id, ...change.cavity }],
  };
}

/** The unit with its products. @throws RangeError for a product that the catalogue does not hold */
export function resolved(unit: Unit, catalogue: Catalogue): ResolvedUnit {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new RangeError(found.problems.map(({ detail }) => detail).join('; '));
  return found.resolved;
}

/** What the glass of a unit does to heat and light; `inside` is its inner surface in °C at −10 °C outside, 20 °C in the room. */
export function heatAndLight(unit: Unit, catalogue: Catalogue): { u: number; light: number; g: number; inside: number } {
  const found = resolved(unit, catalogue);
  const heat = thermalResultOf(found);
  const { lightTransmittance, g } = solarOf(found, heat);
  const { insideSurface } = condensationOf(heat.u, { insideTemperature: 20, outsideTemperature: -10 });
  return { u: heat.u, light: lightTransmittance ?? NaN, g: g ?? NaN, inside: insideSurface ?? NaN };
}

/** The `make` of the Bench's address. */
export function benchMake({ lites, cavities }: Unit): string {
  const layer = (...words: (string | undefined)[]) =>
    words
      .map((word) => word ?? '')
      .join(':')
      .replace(/:+$/, '');
  return lites
    .flatMap(({ glass, treatment, coating, edgeWork }, i) => {
      const own = layer(glass, treatment, coating && `${coating.id}@${coating.surface}`, edgeWork);
      const cavity = cavities[i];
      return cavity ? [own, layer(cavity.width, cavity.gas, cavity.spacer)] : [own];
    })
    .join(',');
}

function pick<T>(items: readonly T[], wanted: (item: T) => boolean): T {
  const found = items.find(wanted) ?? items[0];
  if (!found) throw new RangeError('the catalogue is empty');
  return found;
}
