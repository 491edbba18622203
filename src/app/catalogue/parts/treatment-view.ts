import { type TreatmentItem } from '@shared/contracts/catalogue';
import { benchMake, comparingUnit } from '../comparing-unit';
import { decimals } from '../facts';
import { sizeWords } from './offer-words';
import { type PartView } from './part-view';

export const treatmentView: PartView<TreatmentItem> = {
  slug: 'treatments',
  kind: 'glass treatment',
  lead: 'What is done to a lite after it is cut: nothing, or heat and air, to make it stronger or safer when it breaks.',
  guide: [
    'Heating and quick cooling put the surface of the glass under pressure. Before it can break, a load must first undo that pressure; so treated glass carries more.',
    'Each lite of a unit is treated on its own. A treated lite can no longer be cut, drilled or ground: measure twice.',
  ],
  caution:
    'Strength is not safety. Which lites must be safety glazing is for the local code and a licensed professional to decide; the Bench flags the places that IRC R308.4 names, and says what it did not check.',
  facts: (treatment) => [
    {
      label: 'Allowable surface stress',
      value: String(treatment.allowableStressMpa),
      unit: 'MPa',
      note: 'load of 3 seconds, 8 breaks in 1 000',
    },
    { label: 'Counts as safety glazing', value: treatment.safetyGlazing ? 'yes, where it is marked as such' : 'no, unless laminated' },
    { label: 'Can be cut afterwards', value: treatment.kind === 'annealed' ? 'yes' : 'no' },
  ],
  source: ({ source }) => source,
  comparison: ({ treatments }) => {
    const least = Math.min(...treatments.map(({ allowableStressMpa }) => allowableStressMpa));
    return {
      title: 'Strength side by side',
      intro: 'Stress that the surface may take in a gust of three seconds.',
      columns: [{ label: 'Allowable stress', unit: 'MPa' }, { label: 'Against the weakest' }, { label: 'Safety glazing' }],
      rows: treatments.map(({ id, name, allowableStressMpa, safetyGlazing }) => ({
        item: id,
        name,
        cells: [decimals(allowableStressMpa, 1), `${decimals(allowableStressMpa / least, 1)} ×`, safetyGlazing ? 'yes' : 'no'],
      })),
      method:
        'ASTM E1300, appendix (from memory): 3 seconds, 8 breaks in 1 000. Long loads such as snow, the edge, holes and clamps are left out. This is no design of glass under load.',
    };
  },
  offer: (treatment) => (maker) => {
    const own = maker.capabilities.treatments.filter((range) => range.treatment === treatment.id);
    if (own.length === 0) return null;
    return own
      .map(
        (range) =>
          `${range.minNominalMm} to ${range.maxNominalMm} mm thick, up to ${sizeWords(range.maxLong, range.maxShort, maker.measureSystem)}`,
      )
      .join('; ');
  },
  bench: ({ id }, catalogue) => benchMake(comparingUnit(catalogue, { outer: { treatment: id }, inner: { treatment: id } })),
};
