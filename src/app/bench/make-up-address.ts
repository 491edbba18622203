import { type Catalogue } from '@shared/contracts/catalogue';
import { lengthMm } from '@shared/contracts/primitives';
import { type Lite } from '@shared/contracts/units';
import { type Cavity } from './draft';

/**
 * A make-up for the address, exact and without a sign that addresses must escape: layers from
 * outside in with a comma between, their parts with a colon:
 *
 * lite `glass:treatment:coating@surface:edge work`, cavity `width:gas:spacer:tube`; what is empty
 * at the end is left out.
 */
export function encodeMakeUp({ lites, cavities }: { lites: readonly Lite[]; cavities: readonly Cavity[] }): string {
  return lites
    .flatMap(({ glass, treatment, coating, edgeWork }, i) => {
      const lite = parts(glass, treatment, coating && `${coating.id}@${coating.surface}`, edgeWork);
      const cavity = cavities[i];
      return cavity ? [lite, parts(cavity.width, cavity.gas, cavity.spacer, cavity.capillary && 'tube')] : [lite];
    })
    .join(',');
}

/**
 * Reads what `encodeMakeUp` writes. A product that the catalogue does not hold is a problem where
 * the unit cannot be without it, else it is left out and said in `ignored`.
 */
export function decodeMakeUp(
  text: string,
  catalogue: Catalogue,
): { lites: Lite[]; cavities: Cavity[]; ignored: string[] } | { problem: string } {
  const layers = text.slice(0, 2000).split(',');
  const count = (layers.length + 1) / 2;
  if (layers.length % 2 === 0 || count < 2 || count > 4) return { problem: 'which is not lites and cavities in turn' };
  const has = (items: readonly { id: string }[], id: string) => items.some((item) => item.id === id);
  const lites: Lite[] = [];
  const cavities: Cavity[] = [];
  const ignored: string[] = [];
  for (const [i, layer] of layers.entries()) {
    const [first = '', second = '', third = '', fourth = ''] = layer.split(':');
    if (i % 2 === 0) {
      const index = i / 2;
      if (!has(catalogue.glasses, first)) return { problem: `which names glass “${first}”: the catalogue holds none` };
      if (!has(catalogue.treatments, second)) return { problem: `which names treatment “${second}”: the catalogue holds none` };
      const lite: Lite = { glass: first, treatment: second };
      if (third !== '') {
        const [coating = '', surface = ''] = third.split('@');
        const fits = surface === String(2 * index + 1) || surface === String(2 * index + 2);
        if (has(catalogue.coatings, coating) && fits) lite.coating = { id: coating, surface: Number(surface) };
        else ignored.push(`the coating “${third}” of lite ${index + 1}`);
      }
      if (fourth !== '') {
        if (has(catalogue.edgeWork, fourth)) lite.edgeWork = fourth;
        else ignored.push(`the edge work “${fourth}” of lite ${index + 1}`);
      }
      lites.push(lite);
    } else {
      const number = (i + 1) / 2;
      if (!lengthMm.safeParse(first).success) return { problem: `whose cavity ${number} has no width in mm` };
      if (!has(catalogue.gases, second)) return { problem: `which names gas “${second}”: the catalogue holds none` };
      if (!has(catalogue.spacers, third)) return { problem: `which names spacer “${third}”: the catalogue holds none` };
      const cavity: Cavity = { width: first, gas: second, spacer: third };
      if (fourth === 'tube') cavity.capillary = true;
      else if (fourth !== '') ignored.push(`“${fourth}” of cavity ${number}`);
      cavities.push(cavity);
    }
  }
  return { lites, cavities, ignored };
}

function parts(...words: (string | false | undefined)[]): string {
  return words
    .map((word) => word || '')
    .join(':')
    .replace(/:+$/, '');
}
