import { type CoatingItem } from '@shared/contracts/catalogue';
import { uncoatedEmissivity } from '@shared/glazing/thermal-en673';
import { benchMake, comparingUnit, heatAndLight } from '../comparing-unit';
import { decimals, percentText } from '../facts';
import { type PartView } from './part-view';

export const coatingView: PartView<CoatingItem> = {
  slug: 'coatings',
  kind: 'low-e coating',
  lead: 'A layer far thinner than a hair, on one surface of one lite, that lets light through and turns heat back.',
  guide: [
    `Bare glass gives off ${percentText(uncoatedEmissivity)} of the heat that a perfectly black surface would; a low-e surface gives off a few hundredths. Across the cavity most heat travels as radiation, so one such surface does more than a wider gap or a heavier gas.`,
    'Surfaces are numbered from outside. On surface 3 of a double unit the coating lets in more of the winter sun; on surface 2 it stops more of the summer sun. For the U-value the two are the same.',
    'A soft coat is silver and must face a sealed cavity. Along the edge it is ground away, so that the seal holds on bare glass and no damp creeps in under it. A hard coat is part of the glass and stands the weather.',
  ],
  caution:
    'A lite that takes up much sun grows hot, and may crack where a part of it lies in shade. Ask for the thermal stress to be checked by a licensed professional where coated or tinted glass is partly shaded.',
  facts: (coating) => [
    { label: 'Emissivity', value: String(coating.emissivity), note: `bare glass has ${uncoatedEmissivity}` },
    {
      label: 'Kind',
      value: coating.kind === 'soft' ? 'soft coat' : 'hard coat',
      note: coating.kind === 'soft' ? 'must face a cavity' : 'may face a cavity, the room or the weather',
    },
    { label: 'Light let through', value: percentText(coating.optics.visibleTransmittance), note: 'on 4 mm clear glass' },
    { label: 'Sun let through', value: percentText(coating.optics.solarTransmittance), note: 'on 4 mm clear glass, directly' },
    { label: 'Sun turned back', value: percentText(coating.optics.solarReflectanceOutside), note: 'from the coated face' },
  ],
  source: ({ source }) => source,
  comparison: (catalogue) => {
    const places = [
      { item: '', name: 'no coating', coating: null },
      ...catalogue.coatings.flatMap(({ id, name }) =>
        [3, 2].map((surface) => ({ item: id, name: `${name} on surface ${surface}`, coating: { id, surface } })),
      ),
    ];
    return {
      title: 'The same unit, coated differently',
      intro: 'Two lites of clear glass, 4 mm, with 16 mm of argon between.',
      columns: [
        { label: 'U-value', unit: 'W/m²K' },
        { label: 'Light', unit: '%' },
        { label: 'Solar gain g', unit: '%' },
        { label: 'Inside surface at −10 °C', unit: '°C' },
      ],
      rows: places.map(({ item, name, coating }) => {
        const { u, light, g, inside } = heatAndLight(comparingUnit(catalogue, { coating }), catalogue);
        return {
          item,
          name,
          cells: [decimals(u, 2), decimals(light * 100, 0), decimals(g * 100, 0), decimals(inside, 1)],
        };
      }),
      method:
        'U-value by EN 673:2011, centre of glass, vertical, 15 K over the cavity. Light and g by EN 410:2011 from broadband data, for comparing; spectral data of the very products decide. Inside surface by ISO 13788:2012 with 20 °C in the room and 0.13 m²K/W; the edge is colder.',
    };
  },
  offer: (coating) => (maker) => {
    const own = maker.capabilities.coatings.find((each) => each.coating === coating.id);
    return own ? (own.maxPerUnit === 1 ? 'one in a unit' : `up to ${own.maxPerUnit} in a unit`) : null;
  },
  bench: ({ id, name }, catalogue) => benchMake(comparingUnit(catalogue, { coating: { id, surface: /solar/.test(name) ? 2 : 3 } })),
};
