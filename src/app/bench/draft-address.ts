import { type Catalogue } from '@shared/contracts/catalogue';
import { lengthMm, line as lineOf, quantity as quantitySchema } from '@shared/contracts/primitives';
import { MM_PER_INCH } from '@shared/measures/constants';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { exact } from '@shared/money/exact';
import { lengthText, readLength, writtenIn } from '../ui/read-length';
import { type Draft, firstDraft, placeLengths, placeQuestions } from './draft';
import { decodeMakeUp, encodeMakeUp } from './make-up-address';
import { altitudeText, readAltitude } from './read-altitude';
import { readHumidity } from './read-humidity';
import { readTemperature, temperatureWithUnit } from './read-temperature';

/**
 * The draft in the address, readable and short:
 *
 * `size=36.5x48.25in&units=6&tag=Bay,%20left&make=clear-3:tempered,16:argon:stainless,clear-3:tempered:low-e-soft@3&place=altitude:5900ft,door:no`
 *
 * What is as usual is left out. Lengths keep their unit, so that a link reads the same for everybody.
 */
export type DraftAddress = Record<'size' | 'units' | 'tag' | 'make' | 'place', string | null>;

const placeWords = {
  altitude: 'altitude',
  bottomEdge: 'bottom',
  topEdge: 'top',
  walkingSurface: 'walk',
  outsideTemperature: 'outside',
  insideHumidity: 'humidity',
  door: 'door',
  nearDoor: 'near-door',
  wetArea: 'wet',
  stairs: 'stairs',
  footOfStairs: 'foot-of-stairs',
} as const satisfies Record<string, string>;

/** Writes a draft whose size, quantity and tag can be read; what of the place cannot be read is left out. */
export function encodeDraft(draft: Draft): DraftAddress {
  return {
    size: encodeSize(draft),
    units: draft.quantity.trim() === '1' ? null : String(Number(draft.quantity)),
    tag: draft.tag.trim() || null,
    make: encodeMakeUp(draft),
    place: encodePlace(draft) || null,
  };
}

/**
 * Reads a draft from an address written by `encodeDraft`, or by hand. What cannot be used is as
 * usual instead, and said in `ignored`, a sentence each.
 */
export function decodeDraft(
  get: (name: keyof DraftAddress) => string | null,
  system: MeasureSystem,
  catalogue: Catalogue,
): { draft: Draft; ignored: string[] } {
  const draft = firstDraft(system, catalogue);
  const ignored: string[] = [];
  const ignore = (what: string, value: string) => ignored.push(`${what} “${value.length > 60 ? `${value.slice(0, 60)}…` : value}”`);

  const size = get('size');
  if (size !== null) {
    const read = decodeSize(size);
    if (read) Object.assign(draft, { width: lengthText(read.width, system), height: lengthText(read.height, system) });
    else ignore('the size', size);
  }
  const units = get('units');
  if (units !== null) {
    if (/^\d{1,6}$/.test(units) && quantitySchema.safeParse(Number(units)).success) draft.quantity = String(Number(units));
    else ignore('the number of units', units);
  }
  const tag = get('tag');
  if (tag !== null && tag.trim() !== '') {
    const read = lineOf(80).safeParse(tag);
    if (read.success) draft.tag = read.data;
    else ignore('the tag', tag);
  }
  const make = get('make');
  if (make !== null) {
    const read = decodeMakeUp(make, catalogue);
    if ('problem' in read) ignored.push(`the make-up, ${read.problem}`);
    else {
      Object.assign(draft, { lites: read.lites, cavities: read.cavities });
      ignored.push(...read.ignored);
    }
  }
  const place = get('place');
  if (place !== null) draft.place = decodePlace(place, draft, ignore);
  return { draft, ignored };
}

function encodeSize({ width, height, system }: Draft): string | null {
  const sides = [width, height].map((text) => {
    const read = readLength(text, system);
    return 'mm' in read ? read.mm : null;
  });
  const [w, h] = sides;
  if (typeof w !== 'string' || typeof h !== 'string') return null;
  const inches = [w, h].map((mm) => exact(mm).dividedBy(MM_PER_INCH));
  if (writtenIn(width, system) === 'imperial' && inches.every((value) => value.decimalPlaces() <= 6)) {
    return `${inches.map((value) => value.toFixed()).join('x')}in`;
  }
  return `${w}x${h}mm`;
}

function decodeSize(text: string): { width: string; height: string } | null {
  const [, first, second, unit] = /^(.{1,30}?)\s*[x×]\s*(.{1,30}?)\s*(in|mm)?$/i.exec(text.trim()) ?? [];
  if (first === undefined || second === undefined) return null;
  const system = unit?.toLowerCase() === 'in' ? 'imperial' : 'metric';
  const [width, height] = [first, second].map((side) => {
    const read = readLength(side, system);
    return 'mm' in read && read.mm !== null && lengthMm.safeParse(read.mm).success ? read.mm : null;
  });
  return width && height ? { width, height } : null;
}

function encodePlace({ place, system }: Draft): string {
  const parts: [keyof typeof placeWords, string][] = [];
  const altitude = readAltitude(place.altitude, system);
  if ('value' in altitude && altitude.value !== null) {
    const text = altitudeText(String(altitude.value), system).replace(' ', '');
    parts.push(['altitude', /m$/.test(text) ? text : `${text}${system === 'imperial' ? 'ft' : 'm'}`]);
  }
  for (const field of placeLengths) {
    const read = readLength(place[field], system, { optional: true, zero: true });
    if ('mm' in read && read.mm !== null) parts.push([field, encodeLength(read.mm, place[field], system)]);
  }
  const temperature = readTemperature(place.outsideTemperature, system);
  if ('value' in temperature && temperature.value !== null) {
    const written = temperatureWithUnit(place.outsideTemperature, system);
    parts.push(['outsideTemperature', written.replace(/[−–]/, '-').replace(/[\s°]/g, '').toUpperCase()]);
  }
  const humidity = readHumidity(place.insideHumidity);
  if ('value' in humidity && humidity.value !== null) parts.push(['insideHumidity', place.insideHumidity.replace('%', '').trim()]);
  for (const question of placeQuestions) {
    if (place[question] !== undefined) parts.push([question, place[question] ? 'yes' : 'no']);
  }
  return parts.map(([field, value]) => `${placeWords[field]}:${value}`).join(',');
}

function encodeLength(mm: string, text: string, system: MeasureSystem): string {
  const inches = exact(mm).dividedBy(MM_PER_INCH);
  return writtenIn(text, system) === 'imperial' && inches.decimalPlaces() <= 6 ? `${inches.toFixed()}in` : `${mm}mm`;
}

function decodePlace(text: string, { system, place }: Draft, ignore: (what: string, value: string) => void): Draft['place'] {
  const answers = { ...place };
  for (const part of text
    .split(',')
    .filter((each) => each !== '')
    .slice(0, 40)) {
    const [word = '', value = ''] = part.split(/:(.*)/s);
    const field = (Object.keys(placeWords) as (keyof typeof placeWords)[]).find((key) => placeWords[key] === word);
    const question = placeQuestions.find((each) => each === field);
    const length = placeLengths.find((each) => each === field);
    if (question && (value === 'yes' || value === 'no')) answers[question] = value === 'yes';
    else if (length) {
      const read = readLength(value, 'metric', { zero: true });
      if ('mm' in read && read.mm !== null) answers[length] = lengthText(read.mm, system);
      else ignore('of the place', part);
    } else if (field === 'altitude') {
      const read = readAltitude(value, 'metric');
      if ('value' in read && read.value !== null) answers.altitude = altitudeText(String(read.value), system);
      else ignore('of the place', part);
    } else if (field === 'outsideTemperature') {
      const read = readTemperature(value, 'metric');
      const own = system === 'imperial' ? 'F' : 'C';
      if ('value' in read && read.value !== null)
        answers.outsideTemperature = value.endsWith(own) ? value.slice(0, -1) : temperatureWithUnit(value, 'metric');
      else ignore('of the place', part);
    } else if (field === 'insideHumidity') {
      const read = readHumidity(value);
      if ('value' in read && read.value !== null) answers.insideHumidity = value;
      else ignore('of the place', part);
    } else ignore('of the place', part);
  }
  return answers;
}
