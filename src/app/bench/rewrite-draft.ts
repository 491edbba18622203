import { type MeasureSystem } from '@shared/measures/parse-length';
import { lengthText, readLength } from '../ui/read-length';
import { type Draft, placeLengths } from './draft';
import { altitudeText, readAltitude } from './read-altitude';
import { temperatureWithUnit } from './read-temperature';

/** The same draft with its texts written in the other measures. What cannot be read stays as it was typed. */
export function rewriteDraft(draft: Draft, system: MeasureSystem): Draft {
  const from = draft.system;
  if (from === system) return draft;
  const length = (text: string) => {
    const read = readLength(text, from, { optional: true, zero: true });
    return 'mm' in read && read.mm !== null ? lengthText(read.mm, system) : text;
  };
  const place = { ...draft.place };
  for (const field of placeLengths) place[field] = length(place[field]);
  const altitude = readAltitude(place.altitude, from);
  if ('value' in altitude && altitude.value !== null) place.altitude = altitudeText(String(altitude.value), system);
  place.outsideTemperature = temperatureWithUnit(place.outsideTemperature, from);
  return { ...draft, system, width: length(draft.width), height: length(draft.height), place };
}
