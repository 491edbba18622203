import { type Catalogue } from '@shared/contracts/catalogue';
import { line as lineOf, quantity as quantitySchema } from '@shared/contracts/primitives';
import { type FieldError } from '@shared/contracts/problems';
import { type Lite, type Place, type Unit } from '@shared/contracts/units';
import { findImpossibilities } from '@shared/glazing/find-impossibilities';
import { parseMakeUp } from '@shared/glazing/parse-make-up';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { exact } from '@shared/money/exact';
import { readLength } from '../ui/read-length';
import { readAltitude } from './read-altitude';
import { readHumidity } from './read-humidity';
import { readTemperature } from './read-temperature';

export type Cavity = Unit['cavities'][number];

/** Questions about the place that take yes, no or not known. */
export const placeQuestions = ['door', 'nearDoor', 'wetArea', 'stairs', 'footOfStairs'] as const;
export type PlaceQuestion = (typeof placeQuestions)[number];
/** Lengths that the place has, m in the unit. */
export const placeLengths = ['bottomEdge', 'topEdge', 'walkingSurface'] as const;
export type PlaceLength = (typeof placeLengths)[number];

/** Where the unit goes, as it was typed and chosen. */
export type PlaceAnswers = Record<PlaceLength | 'altitude' | 'outsideTemperature' | 'insideHumidity', string> &
  Partial<Record<PlaceQuestion, boolean>>;

/** One line as it stands on the Bench: texts as they are typed, products by identity. */
export interface Draft {
  /** the measures in which bare numbers of the texts are read */
  system: MeasureSystem;
  width: string;
  height: string;
  quantity: string;
  tag: string;
  /** the make-up as it is being typed; null when it is written from the layers */
  makeUp: string | null;
  lites: Lite[];
  cavities: Cavity[];
  place: PlaceAnswers;
}

/** What a draft says. `unit` and `quantity` are null where they cannot be read. */
export interface ReadDraft {
  unit: Unit | null;
  quantity: number | null;
  /** undefined without one */
  tag: string | undefined;
  /** by JSON pointer into the unit, or `/quantity`, `/tag`, `/makeUp`; a place that cannot be read does not take the unit away */
  problems: FieldError[];
}

export const emptyPlace: PlaceAnswers = {
  altitude: '',
  bottomEdge: '',
  topEdge: '',
  walkingSurface: '',
  outsideTemperature: '',
  insideHumidity: '',
};

/** A draft to begin with: a common size and a common make-up of what the catalogue holds. */
export function firstDraft(system: MeasureSystem, catalogue: Catalogue): Draft {
  const glass = catalogue.glasses[0]?.id ?? '';
  const treatment = catalogue.treatments[0]?.id ?? '';
  const plain = { glass, treatment };
  const spacer = (catalogue.spacers.find(({ material }) => material === 'stainless') ?? catalogue.spacers[0])?.id ?? '';
  const gas = catalogue.gases[0]?.id ?? '';
  const fallback = { lites: [plain, plain], cavities: [{ width: '16', gas, spacer }] };
  const usual = parseMakeUp('4 / 16 argon / 4 low-e 3', catalogue, fallback);
  const size = system === 'imperial' ? { width: '36', height: '48' } : { width: '900', height: '1200' };
  return {
    system,
    ...size,
    quantity: '1',
    tag: '',
    makeUp: null,
    ...('problem' in usual ? fallback : { lites: usual.lites, cavities: usual.cavities }),
    place: emptyPlace,
  };
}

/** Reads a draft as a unit, a quantity and a tag, with a message for each field that cannot be read. */
export function readDraft(draft: Draft, catalogue: Catalogue): ReadDraft {
  const problems: FieldError[] = [];
  const size = (field: 'width' | 'height') => {
    const read = readLength(draft[field], draft.system);
    if ('mm' in read) return read.mm;
    problems.push({ pointer: `/${field}`, detail: read.problem });
    return null;
  };
  const width = size('width');
  const height = size('height');
  const place = readPlace(draft, problems);
  if (draft.makeUp !== null) {
    const parsed = parseMakeUp(draft.makeUp, catalogue, draft);
    if ('problem' in parsed) problems.push({ pointer: '/makeUp', detail: parsed.problem });
  }

  const quantity = /^\d{1,6}$/.test(draft.quantity.trim()) ? quantitySchema.safeParse(Number(draft.quantity)) : null;
  if (!quantity?.success) problems.push({ pointer: '/quantity', detail: 'A whole number from 1 to 10 000.' });
  const tag = draft.tag.trim() === '' ? undefined : lineOf(80).safeParse(draft.tag);
  if (tag && !tag.success) problems.push({ pointer: '/tag', detail: 'At most 80 letters on one line.' });

  let unit: Unit | null = null;
  if (width !== null && height !== null && !problems.some(({ pointer }) => pointer === '/makeUp')) {
    const { lites, cavities } = draft;
    const candidate: Unit = { width, height, shape: { class: 'rectangle' }, lites, cavities, ...(place ? { place } : {}) };
    const impossible = findImpossibilities(candidate, catalogue);
    problems.push(...impossible);
    if (impossible.length === 0) unit = candidate;
  }
  return { unit, quantity: quantity?.success ? quantity.data : null, tag: tag?.data, problems };
}

/** The place in SI units, or nothing where nothing is known. What cannot be read is left out and said. */
function readPlace({ place, system }: Draft, problems: FieldError[]): Place | undefined {
  const known: Place = {};
  const take = (field: keyof PlaceAnswers, read: { value: number | null } | { problem: string }) => {
    if ('problem' in read) problems.push({ pointer: `/place/${field}`, detail: read.problem });
    else if (read.value !== null) Object.assign(known, { [field]: read.value });
  };
  take('altitude', readAltitude(place.altitude, system));
  for (const field of placeLengths) {
    const read = readLength(place[field], system, { optional: true, zero: true });
    take(field, 'problem' in read ? read : { value: read.mm === null ? null : metres(read.mm) });
  }
  take('outsideTemperature', readTemperature(place.outsideTemperature, system));
  take('insideHumidity', readHumidity(place.insideHumidity));
  for (const question of placeQuestions) {
    if (place[question] !== undefined) known[question] = place[question];
  }
  return Object.keys(known).length === 0 ? undefined : known;
}

function metres(mm: string): number {
  return exact(mm).dividedBy(1000).toNumber();
}
