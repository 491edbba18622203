import { Refusal } from '@shared/contracts/problems';

/**
 * Where the next page begins: the sort values of the last item of this one. Opaque to the
 * caller; a keyset, so that the hundredth page costs what the first does.
 */
export function writeCursor(values: readonly (string | number)[]): string {
  return Buffer.from(JSON.stringify(values)).toString('base64url');
}

/** @throws Refusal `invalid` at `/cursor` unless it is one that writeCursor made of a number and a string, or two strings */
export function readCursor<First extends 'string' | 'number'>(
  cursor: string | undefined,
  first: First,
): [First extends 'number' ? number : string, string] | undefined {
  if (cursor === undefined) return undefined;
  try {
    const values: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
    if (Array.isArray(values) && values.length === 2 && typeof values[0] === first && typeof values[1] === 'string') {
      return values as [First extends 'number' ? number : string, string];
    }
  } catch {
    // falls through to the refusal: whatever it was, it is no cursor of ours
  }
  throw new Refusal('invalid', 'The cursor is not one that this list gave out.', [
    { pointer: '/cursor', detail: 'not a cursor of this list' },
  ]);
}

/** Cuts rows read with `limit + 1` into a page and the cursor of the next. */
export function toPage<Row, Item>(
  rows: readonly Row[],
  limit: number,
  toItem: (row: Row) => Item,
  keyOf: (row: Row) => [string | number, string],
): { items: Item[]; nextCursor: string | null } {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return { items: shown.map(toItem), nextCursor: rows.length > limit && last ? writeCursor(keyOf(last)) : null };
}
