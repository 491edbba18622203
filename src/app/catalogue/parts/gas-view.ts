import { type Catalogue, type GasItem } from '@shared/contracts/catalogue';
import { mixWithAir } from '@shared/glazing/gas-properties';
import { thermalResultOf } from '@shared/glazing/thermal-en673';
import { uCurve } from '@shared/glazing/u-curve';
import { benchMake, comparingUnit, resolved } from '../comparing-unit';
import { decimals, percentText } from '../facts';
import { type PartView } from './part-view';

export const gasView: PartView<GasItem> = {
  slug: 'gases',
  kind: 'gas fill for sealed units',
  lead: 'What fills the cavity. A heavy gas carries less heat from lite to lite than air does, and cannot be seen.',
  guide: [
    'Each gas has its best width. In a narrower cavity heat is conducted straight across; in a wider one the gas begins to turn over and carries it. Denser gases are at their best in narrower cavities.',
    'A fill is worth most beside a low-e coating. Without one, radiation carries most of the heat and the gas can change little.',
    'An open capillary tube and a gas fill exclude each other: the gas would leave the way the air comes in. Where a unit must breathe on its way over high ground, it is filled with air.',
  ],
  practice: 'a fill is 90 % of the named gas when new, and loses a little of it every year.',
  facts: ({ gas, fill }) => {
    const { density, viscosity, conductivity } = mixWithAir(gas, fill);
    return [
      { label: 'Fill', value: percentText(fill), note: fill < 1 ? 'the rest is air' : undefined },
      { label: 'Conductivity', value: decimals(conductivity * 1000, 1), unit: 'mW/(m·K)', note: 'of the fill, at 10 °C' },
      { label: 'Density', value: decimals(density, 2), unit: 'kg/m³', note: 'of the fill, at 10 °C' },
      { label: 'Viscosity', value: decimals(viscosity * 1e6, 1), unit: 'µPa·s', note: 'of the fill, at 10 °C' },
    ].map(({ note, ...fact }) => (note === undefined ? fact : { ...fact, note }));
  },
  source: ({ source }) => `Fill: ${source}. Properties: EN 673:2011 (from memory), mixed by share`,
  comparison: (catalogue) => ({
    title: 'The same unit with each gas',
    intro: 'Two lites of 4 mm. The best width is the one with the lowest U-value between 6 and 20 mm, beside a soft low-e coating.',
    columns: [
      { label: 'U-value, 16 mm, low-e', unit: 'W/m²K' },
      { label: 'U-value, 16 mm, no coating', unit: 'W/m²K' },
      { label: 'Best width', unit: 'mm' },
      { label: 'U-value there', unit: 'W/m²K' },
    ],
    rows: catalogue.gases.map(({ id, name }) => {
      const u = (coating?: null) =>
        thermalResultOf(resolved(comparingUnit(catalogue, { cavity: { gas: id }, ...(coating === null ? { coating } : {}) }), catalogue)).u;
      const best = bestWidth(catalogue, id);
      return { item: id, name, cells: [decimals(u(), 2), decimals(u(null), 2), decimals(best.widthMm, 0), decimals(best.u, 2)] };
    }),
    method:
      'EN 673:2011, centre of glass, vertical, 15 K over the cavity, mean 283 K, outside 25 W/(m²·K), inside 0.13 m²K/W. Spacer, frame and the loss of gas over the years are left out.',
  }),
  offer: (gas) => (maker) => {
    const own = maker.capabilities.gases.find((each) => each.gas === gas.id);
    return own ? `cavities from ${own.minCavity} to ${own.maxCavity} mm` : null;
  },
  bench: ({ id }, catalogue) =>
    benchMake(comparingUnit(catalogue, { cavity: { gas: id, width: String(widthInRange(bestWidth(catalogue, id).widthMm)) } })),
};

/** U-value by cavity width for a gas beside the usual coating, by whole millimetres. */
export function curveOf(catalogue: Catalogue, gas: string): { widthMm: number; u: number }[] {
  const widths = Array.from({ length: 15 }, (_, i) => 6 + i);
  return uCurve(resolved(comparingUnit(catalogue, { cavity: { gas } }), catalogue), 0, widths);
}

function bestWidth(catalogue: Catalogue, gas: string): { widthMm: number; u: number } {
  return curveOf(catalogue, gas).reduce((best, each) => (each.u < best.u ? each : best));
}

/** The widths that spacers come in are even from 6 to 20. */
function widthInRange(width: number): number {
  return Math.round(width / 2) * 2;
}
