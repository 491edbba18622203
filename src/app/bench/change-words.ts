import { type Catalogue } from '@shared/contracts/catalogue';
import { formatLength } from '@shared/measures/format-length';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { type Buildable } from './apply-reason';

/** What differs from one unit to another, each once, as one would say it: `clear 4 mm and 38 in wide`. */
export function changeWords(before: Buildable, after: Buildable, catalogue: Catalogue, system: MeasureSystem): string {
  const name = (items: readonly { id: string; name: string }[], id: string) => items.find((item) => item.id === id)?.name ?? id;
  const words = new Set<string>();
  if (after.width !== before.width) words.add(`${formatLength(after.width, system)} wide`);
  if (after.height !== before.height) words.add(`${formatLength(after.height, system)} high`);
  if (after.lites.length !== before.lites.length) words.add(`${after.lites.length} lites`);
  for (const [i, lite] of after.lites.entries()) {
    const old = before.lites[i]!;
    if (lite.glass !== old.glass) words.add(name(catalogue.glasses, lite.glass));
    if (lite.treatment !== old.treatment) words.add(name(catalogue.treatments, lite.treatment));
    if (lite.edgeWork !== old.edgeWork && lite.edgeWork) words.add(`${name(catalogue.edgeWork, lite.edgeWork)} edges`);
    if (old.coating && !lite.coating) words.add(`no coating on surface ${old.coating.surface}`);
    else if (lite.coating && lite.coating.id !== old.coating?.id) words.add(name(catalogue.coatings, lite.coating.id));
  }
  for (const [i, cavity] of after.cavities.entries()) {
    const old = before.cavities[i]!;
    if (cavity.width !== old.width) words.add(`a ${cavity.width} mm cavity`);
    if (cavity.gas !== old.gas) words.add(name(catalogue.gases, cavity.gas));
    if (cavity.spacer !== old.spacer) words.add(`${name(catalogue.spacers, cavity.spacer)} spacer`);
    if (old.capillary && !cavity.capillary) words.add('no capillary tube');
  }
  const all = [...words];
  return all.length < 2 ? (all[0] ?? '') : `${all.slice(0, -1).join(', ')} and ${all.at(-1)}`;
}
