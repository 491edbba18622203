import { type Reason } from '@shared/contracts/evaluation';
import { type MeasureSystem } from '@shared/measures/parse-length';
import { lengthText } from '../ui/read-length';
import { type Draft } from './draft';
import { removeLite } from './layers';

type Change = Pick<Draft, 'width' | 'height' | 'lites' | 'cavities'>;

/** Whether taking the nearest of all these reasons makes the unit one that the maker can build. */
export function canApplyNearest(reasons: readonly Reason[]): boolean {
  return reasons.length > 0 && reasons.every((reason) => reason.nearestValue !== null || withoutValue(reason) !== null);
}

/** The draft's size and layers with every nearest value written where its reason points. */
export function applyNearest(reasons: readonly Reason[], { width, height, lites, cavities, system }: Draft): Change {
  return reasons.reduce<Change>(
    (change, reason) => {
      if (reason.nearestValue === null) return withoutValue(reason)?.(change) ?? change;
      return write(change, reason.pointer, reason.nearestValue, system);
    },
    { width, height, lites, cavities },
  );
}

function write(change: Change, pointer: string, value: string, system: MeasureSystem): Change {
  const [first, second, part, below] = pointer.split('/').slice(1);
  if (first === 'width' || first === 'height') return { ...change, [first]: lengthText(value, system) };
  const index = Number(second);
  if (first === 'cavities') {
    return { ...change, cavities: change.cavities.map((cavity, i) => (i === index ? { ...cavity, [part!]: value } : cavity)) };
  }
  return {
    ...change,
    lites: change.lites.map((lite, i) => {
      if (i !== index) return lite;
      return part === 'coating' && below === 'id' && lite.coating
        ? { ...lite, coating: { ...lite.coating, id: value } }
        : { ...lite, [part!]: value };
    }),
  };
}

/** What to do about a reason whose nearest is not a value: leave out what the maker does not fit. */
function withoutValue({ code, pointer }: Reason): ((change: Change) => Change) | null {
  const index = Number(pointer.split('/')[2]);
  switch (code) {
    case 'lites-max':
      return (change) => ({ ...change, ...removeLite(change, change.lites.length - 1) });
    case 'capillary-not-made':
      return (change) => ({
        ...change,
        cavities: change.cavities.map((cavity, i) =>
          i === index ? { width: cavity.width, gas: cavity.gas, spacer: cavity.spacer } : cavity,
        ),
      });
    case 'coating-max':
      return (change) => ({
        ...change,
        lites: change.lites.map((lite, i) => {
          if (i !== index) return lite;
          const { coating: _, ...plain } = lite;
          return plain;
        }),
      });
    default:
      return null;
  }
}
