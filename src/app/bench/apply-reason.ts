import { type Reason } from '@shared/contracts/evaluation';
import { type Unit } from '@shared/contracts/units';
import { removeLite } from './layers';

/** What of a unit a reason can ask to change. */
export type Buildable = Pick<Unit, 'width' | 'height' | 'lites' | 'cavities'>;

/** The unit with the nearest value of a reason written where it points; null where the reason knows none. */
export function applyReason(
  { width, height, lites, cavities }: Buildable,
  { code, pointer, nearestValue: value }: Reason,
): Buildable | null {
  const unit = { width, height, lites, cavities };
  const [first, second, part, below] = pointer.split('/').slice(1);
  const index = Number(second);
  if (value === null) return leaveOut(unit, code, index);
  if (first === 'width' || first === 'height') return { ...unit, [first]: value };
  if (first === 'cavities')
    return { ...unit, cavities: cavities.map((cavity, i) => (i === index ? { ...cavity, [part!]: value } : cavity)) };
  if (first !== 'lites') return null;
  return {
    ...unit,
    lites: lites.map((lite, i) => {
      if (i !== index) return lite;
      return part === 'coating' && below === 'id' && lite.coating
        ? { ...lite, coating: { ...lite.coating, id: value } }
        : { ...lite, [part!]: value };
    }),
  };
}

/** What to do about a reason whose nearest is not a value: leave out what the maker does not fit. */
function leaveOut(unit: Buildable, code: string, index: number): Buildable | null {
  switch (code) {
    case 'lites-max':
      return { ...unit, ...removeLite(unit, unit.lites.length - 1) };
    case 'capillary-not-made':
      return {
        ...unit,
        cavities: unit.cavities.map((cavity, i) =>
          i === index ? { width: cavity.width, gas: cavity.gas, spacer: cavity.spacer } : cavity,
        ),
      };
    case 'coating-max':
      return {
        ...unit,
        lites: unit.lites.map((lite, i) => {
          if (i !== index) return lite;
          const { coating: _, ...plain } = lite;
          return plain;
        }),
      };
    default:
      return null;
  }
}
