import { type GlassItem } from '@shared/contracts/catalogue';
import { glassDensity, interlayerDensity } from '@shared/glazing/weight';
import { benchMake, comparingUnit, heatAndLight, usualProducts } from '../comparing-unit';
import { decimals, type Fact, percentText } from '../facts';
import { sizeWords } from './offer-words';
import { type PartView } from './part-view';

export const glassView: PartView<GlassItem> = {
  slug: 'glass',
  kind: 'glass for sealed units',
  lead: 'The lites themselves: float glass from 2.5 to 12 mm, tinted or patterned, or two plies laminated with a film between.',
  guide: [
    'Glass is ordered by its nominal thickness and arrives a little thinner. Sealyard takes the actual thickness for weight, load and overall thickness, and the nominal one for U-values, as declared values do.',
    'Thicker glass carries more wind over a larger size, keeps out more noise, and weighs more: 2.5 kg on every square metre for each millimetre. It does next to nothing for the U-value; the coating and the gas do that.',
  ],
  caution:
    'Tinted glass grows hot in the sun and may crack at a shaded edge. Whether it must be heat-strengthened or tempered is for a licensed professional to decide.',
  facts: (glass) => [
    { label: 'Nominal thickness', value: String(glass.nominalMm), unit: 'mm' },
    {
      label: 'Actual thickness',
      value: String(glass.actualMm),
      unit: 'mm',
      note: glass.construction === 'laminated' ? 'the whole' : 'the least that the standard allows',
    },
    ...laminate(glass),
    { label: 'Weight', value: decimals(weightPerArea(glass), 1), unit: 'kg/m²' },
    { label: 'Light let through', value: percentText(glass.optics.visibleTransmittance), note: 'one lite' },
    { label: 'Sun let through', value: percentText(glass.optics.solarTransmittance), note: 'one lite, directly' },
    { label: 'Colour', value: glass.tint ?? 'clear' },
  ],
  source: ({ source }) => source,
  comparison: (catalogue) => {
    const { glass: usual, coating } = usualProducts(catalogue);
    return {
      title: 'Each glass as the outer lite',
      intro: `In front of 16 mm of argon and ${usual.name}${coating ? ` with ${coating.name} on surface 3` : ''}.`,
      columns: [
        { label: 'Weight of the lite', unit: 'kg/m²' },
        { label: 'U-value', unit: 'W/m²K' },
        { label: 'Light', unit: '%' },
        { label: 'Solar gain g', unit: '%' },
      ],
      rows: catalogue.glasses.map((glass) => {
        const { u, light, g } = heatAndLight(comparingUnit(catalogue, { outer: { glass: glass.id } }), catalogue);
        return {
          item: glass.id,
          name: glass.name,
          cells: [decimals(weightPerArea(glass), 1), decimals(u, 2), decimals(light * 100, 0), decimals(g * 100, 0)],
        };
      }),
      method:
        'U-value by EN 673:2011, centre of glass, vertical, 15 K over the cavity. Light and g by EN 410:2011 from broadband data, for comparing; spectral data of the very products decide. Spacer, frame and shading are left out.',
    };
  },
  offer: (glass) => (maker) => {
    const sheet = maker.capabilities.glass.find((own) => own.glass === glass.id);
    return sheet ? `up to ${sizeWords(sheet.maxLong, sheet.maxShort, maker.measureSystem)}` : null;
  },
  bench: (glass, catalogue) =>
    benchMake(comparingUnit(catalogue, { outer: { glass: glass.id }, inner: glass.tint ? {} : { glass: glass.id } })),
};

function laminate({ construction, plies, interlayerMm }: GlassItem): Fact[] {
  if (construction === 'monolithic') return [];
  return [
    { label: 'Plies', value: plies.join(' + '), unit: 'mm' },
    { label: 'Film between', value: String(interlayerMm), unit: 'mm' },
  ];
}

/** kg/m², by the actual thickness. */
function weightPerArea({ actualMm, interlayerMm }: GlassItem): number {
  return ((actualMm - interlayerMm) * glassDensity + interlayerMm * interlayerDensity) / 1000;
}
