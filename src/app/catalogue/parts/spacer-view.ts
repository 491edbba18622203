import { type SpacerItem } from '@shared/contracts/catalogue';
import { rankSpacers } from '@shared/glazing/rank-spacers';
import { thermalResultOf } from '@shared/glazing/thermal-en673';
import { spacerConductance, wholeWindowU } from '@shared/glazing/whole-window';
import { benchMake, comparingSize, comparingUnit, resolved } from '../comparing-unit';
import { decimals } from '../facts';
import { widthsWords } from './offer-words';
import { type PartView } from './part-view';

/** The frame of the window in the comparison: m wide all round, W/(m²·K). Chosen for the example. */
const frame = { kind: 'wood or plastic', width: 0.11, u: 1.4 } as const;

export const spacerView: PartView<SpacerItem> = {
  slug: 'spacers',
  kind: 'spacer for sealed units',
  lead: 'The bar round the perimeter that holds the lites apart, sets the width of the cavity and carries the desiccant.',
  guide: [
    'The spacer joins the warm lite to the cold one, so the edge of the glass is always colder than its centre. The less its walls conduct, the warmer the edge, and the more humid a room may be before the edge fogs.',
    'It does not change the U-value at the centre. In the whole window it counts along every metre of edge: much in small panes, little in large ones.',
    'The desiccant inside takes up what water vapour the seals let by. Whatever the bar is made of, it is the seals that decide how long a unit lasts.',
  ],
  facts: (spacer) => {
    const sum = spacerConductance(spacer.wallMm, spacer.conductivity);
    return [
      { label: 'Conductivity of the wall', value: String(spacer.conductivity), unit: 'W/(m·K)' },
      { label: 'Wall', value: String(spacer.wallMm), unit: 'mm' },
      {
        label: 'Walls together, Σ d·λ',
        value: decimals(sum, sum < 0.01 ? 4 : 3),
        unit: 'W/K',
        note: 'counts as thermally improved up to 0.007',
      },
      { label: 'Thermally improved', value: spacer.thermallyImproved ? 'yes' : 'no' },
      { label: 'Sightline', value: String(spacer.sightlineMm), unit: 'mm', note: 'spacer and seals seen from the edge' },
      { label: 'Weight', value: String(spacer.massPerMetre), unit: 'kg/m', note: 'with desiccant and seals, 12 mm cavity' },
      { label: 'Cavity widths', value: spacer.widthsMm.join(', '), unit: 'mm' },
    ];
  },
  source: ({ source }) => source,
  comparison: (catalogue) => {
    const { u } = thermalResultOf(resolved(comparingUnit(catalogue), catalogue));
    const [width, height] = [Number(comparingSize.width) / 1000, Number(comparingSize.height) / 1000];
    const [glassWidth, glassHeight] = [width - 2 * frame.width, height - 2 * frame.width];
    const whole = (psi: number) =>
      wholeWindowU({
        glassArea: glassWidth * glassHeight,
        glassU: u,
        frameArea: width * height - glassWidth * glassHeight,
        frameU: frame.u,
        edgeLength: 2 * (glassWidth + glassHeight),
        psi,
      });
    return {
      title: 'The whole window with each spacer',
      intro: `A window of ${comparingSize.width} × ${comparingSize.height} mm in wood or plastic (frame ${frame.width * 1000} mm wide, ${frame.u} W/m²K), glazed with 4 / 16 argon / 4 and low-e on surface 3 (${decimals(u, 2)} W/m²K). Warmest edge first.`,
      columns: [
        { label: 'Conductivity', unit: 'W/(m·K)' },
        { label: 'Edge ψ', unit: 'W/(m·K)' },
        { label: 'Window Uw', unit: 'W/m²K' },
      ],
      rows: rankSpacers(catalogue.spacers, frame.kind, true).map(({ spacer, psi }) => ({
        item: spacer.id,
        name: spacer.name,
        cells: [String(spacer.conductivity), decimals(psi, 2), decimals(whole(psi), 2)],
      })),
      method:
        'ψ and Uw by ISO 10077-1:2006 with the table of its annex E (from memory), which knows two classes of spacer and no more: within a class it gives the same figure. U-value of the glass by EN 673:2011. ψ tested for the very spacer and frame is better than either.',
    };
  },
  offer: (spacer) => (maker) => {
    const own = maker.capabilities.spacers.find((each) => each.spacer === spacer.id);
    return own ? `cavities of ${widthsWords(own.widths)}` : null;
  },
  bench: ({ id }, catalogue) => benchMake(comparingUnit(catalogue, { cavity: { spacer: id } })),
};
