import { type Catalogue } from '@shared/contracts/catalogue';
import { type Reason } from '@shared/contracts/evaluation';
import { formatLength } from '@shared/measures/format-length';
import { type MeasureSystem } from '@shared/measures/parse-length';

/** What each reason says, once: two lites of the same glass are refused for the same reason. */
export function detailsOf(reasons: readonly Reason[]): string[] {
  return [...new Set(reasons.map(({ detail }) => detail))];
}

/** The nearest that would do for one reason, as one would say it: `4 mm clear`, `38 in wide`, `no tube`. */
export function nearestWords({ pointer, nearest, nearestValue, code }: Reason, catalogue: Catalogue, system: MeasureSystem): string | null {
  if (nearestValue === null) return code === 'coating-max' ? 'one coating less' : nearest;
  const [first, , part] = pointer.split('/').slice(1);
  if (first === 'width') return `${formatLength(nearestValue, system)} wide`;
  if (first === 'height') return `${formatLength(nearestValue, system)} high`;
  const named = (items: readonly { id: string; name: string }[]) => items.find(({ id }) => id === nearestValue)?.name ?? nearestValue;
  switch (part) {
    case 'glass':
      return named(catalogue.glasses);
    case 'treatment':
      return named(catalogue.treatments);
    case 'coating':
      return named(catalogue.coatings);
    case 'edgeWork':
      return `${named(catalogue.edgeWork)} edges`;
    case 'gas':
      return named(catalogue.gases);
    case 'spacer':
      return `${named(catalogue.spacers)} spacer`;
    case 'width':
      return `a ${nearestValue} mm cavity`;
    default:
      return nearest;
  }
}

/** All that would change, each once, as a list one can read: `clear 4 mm and 38 in wide`. */
export function takesWords(reasons: readonly Reason[], catalogue: Catalogue, system: MeasureSystem): string {
  const words = [...new Set(reasons.map((reason) => nearestWords(reason, catalogue, system)).filter((text) => text !== null))];
  return words.length < 2 ? (words[0] ?? '') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`;
}
