import type { Reason } from '../contracts/evaluation';

interface Named {
  id: string;
  name: string;
}

/** Why a product is refused that the maker does not work with; `nearest` is one it does. `made` are identities. */
export function notMade(
  code: string,
  what: string,
  item: Named,
  made: readonly string[],
  nearest: Named | undefined,
  pointer: string,
): Reason {
  return {
    code,
    detail: `does not make units with ${item.name}${nearest ? `; takes ${nearest.name}` : ''}`,
    limit: made.length === 0 ? `no ${what}` : made.join(', '),
    actual: item.id,
    nearest: nearest?.id ?? null,
    nearestValue: nearest?.id ?? null,
    pointer,
  };
}
