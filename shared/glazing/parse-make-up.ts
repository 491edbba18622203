import type { Catalogue } from '../contracts/catalogue';
import { lengthMm } from '../contracts/primitives';
import type { Lite, Unit } from '../contracts/units';
import { coatingWord, glassWords, treatmentWord, usualWord } from './make-up-words';

type Cavity = Unit['cavities'][number];
export type ParsedMakeUp = { lites: Lite[]; cavities: Cavity[] } | MakeUpProblem;
/** `word` is the part of the text that the problem is about, as it was written; null for the whole. */
export interface MakeUpProblem {
  problem: string;
  word: string | null;
}

const example = '4 / 16 argon / 4 low-e 3';

/**
 * Reads a make-up as the trade writes it, outside in, thicknesses in mm: `3 temp / 16 argon / 3 temp
 * low-e 3`. What the text never says (spacer, edge work) is taken from `fallback`; glass without a
 * word is clear and annealed, a cavity without a gas holds air. Reads what `makeUpText` writes.
 */
export function parseMakeUp(text: string, catalogue: Catalogue, fallback: Pick<Unit, 'lites' | 'cavities'>): ParsedMakeUp {
  if (text.trim() === '') return { problem: `Write the make-up from outside in, such as ${example}.`, word: null };
  const parts = text
    .replace(/low[\s-]?e(?![a-z])/gi, 'low-e')
    .replace(/heat[\s-]+strengthened/gi, 'heat-strengthened')
    .replace(/warm[\s-]+edge/gi, 'warm-edge')
    .split('/')
    .map((part) => part.split(/[\s,]+/).filter((word) => word !== '' && word.toLowerCase() !== 'mm'));
  const empty = parts.findIndex((words) => words.length === 0);
  if (empty >= 0) return { problem: `Part ${empty + 1} is empty: write lites and cavities in turn, such as ${example}.`, word: null };
  const count = (parts.length + 1) / 2;
  if (parts.length % 2 === 0) return { problem: 'Write lites and cavities in turn, with a lite at both ends.', word: null };
  if (count < 2 || count > 4) return { problem: `A sealed unit has two to four lites, not ${count}.`, word: null };

  const lites: Lite[] = [];
  const cavities: Cavity[] = [];
  for (const [i, words] of parts.entries()) {
    const index = Math.floor(i / 2);
    if (i % 2 === 0) {
      const lite = readLite(words, index, count, catalogue, fallback.lites[index]);
      if ('problem' in lite) return lite;
      lites.push(lite);
    } else {
      const cavity = readCavity(words, index, catalogue, fallback.cavities[index] ?? fallback.cavities.at(-1));
      if ('problem' in cavity) return cavity;
      cavities.push(cavity);
    }
  }
  return { lites, cavities };
}

function readLite(
  [first = '', ...rest]: string[],
  index: number,
  count: number,
  catalogue: Catalogue,
  fallback: Lite | undefined,
): Lite | MakeUpProblem {
  const thickness = thicknessOf(first);
  if (thickness === null) return { problem: `“${first}” is not a glass thickness in mm: begin each lite with one.`, word: first };
  const kinds = new Set(catalogue.glasses.flatMap(glassWords)).add('clear');
  const described: string[] = [];
  let treatment: string | undefined;
  let coating: Lite['coating'];

  for (let i = 0; i < rest.length; i++) {
    const word = rest[i]!;
    const usual = usualWord(word);
    const treated = catalogue.treatments.find((item) => usual === item.id || usual === treatmentWord(item, catalogue));
    // `low-e#3` and `low-e 3` say the same.
    const [, coated = '', joined] = /^(.*?)(?:[#@](\d+))?$/.exec(usual) ?? [];
    const product = catalogue.coatings.find((item) => coated === item.id || coated === coatingWord(item, catalogue));
    if (treated) {
      if (treatment !== undefined) return { problem: `“${word}” is a second treatment of lite ${index + 1}.`, word };
      treatment = treated.id;
    } else if (product) {
      if (coating) return { problem: `“${word}” is a second coating of lite ${index + 1}.`, word };
      let surface = joined === undefined ? null : Number(joined);
      while (surface === null && /^(on|surface|surf|s|#)$/.test(rest[i + 1]?.toLowerCase() ?? '')) i++;
      const next = /^(?:#|s)?(\d+)$/i.exec(rest[i + 1] ?? '')?.[1];
      if (surface === null && next !== undefined) {
        surface = Number(next);
        i++;
      }
      surface ??= index === 0 ? 2 : index === count - 1 ? 2 * count - 1 : null;
      if (surface === null)
        return { problem: `Say which surface of lite ${index + 1} is coated: ${2 * index + 1} or ${2 * index + 2}.`, word };
      if (surface !== 2 * index + 1 && surface !== 2 * index + 2) {
        return { problem: `Lite ${index + 1} has surfaces ${2 * index + 1} and ${2 * index + 2}, not ${surface}.`, word: String(surface) };
      }
      coating = { id: product.id, surface };
    } else if (kinds.has(usual)) {
      if (usual !== 'clear') described.push(usual);
    } else {
      return { problem: `“${word}” is neither a glass, a treatment nor a coating of the catalogue.`, word };
    }
  }

  const alike = catalogue.glasses.filter((item) => sameWords(glassWords(item), described));
  const glass = alike.find(({ nominalMm }) => nominalMm === thickness);
  if (!glass) {
    const comes = alike.map(({ nominalMm }) => nominalMm).join(', ');
    const what = described.length > 0 ? described.join(' ') : 'clear';
    return {
      problem: comes ? `${what} glass comes in ${comes} mm, not ${thickness} mm.` : `The catalogue holds no ${what} glass.`,
      word: first,
    };
  }
  treatment ??= catalogue.treatments.find(({ kind }) => kind === 'annealed')?.id;
  if (treatment === undefined) return { problem: `Say how lite ${index + 1} is treated.`, word: first };
  return {
    glass: glass.id,
    treatment,
    ...(coating ? { coating } : {}),
    ...(fallback?.edgeWork === undefined ? {} : { edgeWork: fallback.edgeWork }),
  };
}

function readCavity(
  [first = '', ...rest]: string[],
  index: number,
  catalogue: Catalogue,
  fallback: Cavity | undefined,
): Cavity | MakeUpProblem {
  const width = first.replace(/mm$/i, '');
  if (!lengthMm.safeParse(width).success)
    return { problem: `“${first}” is not a cavity width in mm: begin each cavity with one.`, word: first };
  let gas = catalogue.gases.find((item) => item.gas === 'air')?.id;
  let spacer = fallback?.spacer ?? catalogue.spacers[0]?.id;
  let capillary = false;
  for (const word of rest) {
    const usual = usualWord(word);
    const filled = catalogue.gases.find((item) => usual === item.id || usual === item.name);
    const bar = catalogue.spacers.find((item) => usual === item.id || usual === item.material);
    if (filled) gas = filled.id;
    else if (bar) spacer = bar.id;
    else if (usual === 'tube') capillary = true;
    else return { problem: `“${word}” is neither a gas nor a spacer of the catalogue.`, word };
  }
  if (gas === undefined || spacer === undefined) return { problem: `Say what cavity ${index + 1} holds.`, word: first };
  return { width, gas, spacer, ...(capillary ? { capillary } : {}) };
}

function thicknessOf(word: string): number | null {
  const match = /^(\d{1,3}(?:\.\d{1,2})?)(?:mm)?$/i.exec(word);
  return match ? Number(match[1]) : null;
}

function sameWords(a: readonly string[], b: readonly string[]): boolean {
  return a.length === b.length && a.every((word) => b.includes(word));
}
