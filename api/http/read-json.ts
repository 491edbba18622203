import { visit } from 'jsonc-parser';
import { pointer, Refusal } from '@shared/contracts/problems';

const DEEPEST = 64;

/**
 * Reads a JSON body strictly: no duplicate names, which JSON.parse resolves in silence and
 * different readers resolve differently (RFC 8259, section 4), and no absurd nesting.
 *
 * @throws Refusal `not-readable` for text that is not JSON or too deep, `invalid` at the pointer of a name given twice
 */
export function readJson(text: string): unknown {
  if (text === '') return undefined;
  if (depthOf(text) > DEEPEST) throw new Refusal('not-readable', `The JSON is nested deeper than ${DEEPEST} levels.`);
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    throw new Refusal('not-readable', 'The body is not JSON.');
  }
  refuseDuplicates(text);
  return value;
}

function depthOf(text: string): number {
  let depth = 0;
  let deepest = 0;
  let inString = false;
  for (let i = 0; i < text.length; i++) {
    const c = text.charCodeAt(i);
    if (inString) {
      if (c === 92 /* \ */) i++;
      else if (c === 34 /* " */) inString = false;
    } else if (c === 34) inString = true;
    else if (c === 91 /* [ */ || c === 123 /* { */) deepest = Math.max(deepest, ++depth);
    else if (c === 93 /* ] */ || c === 125 /* } */) depth--;
  }
  return deepest;
}

function refuseDuplicates(text: string): void {
  const names: Set<string>[] = [];
  visit(text, {
    onObjectBegin: () => {
      names.push(new Set());
    },
    onObjectEnd: () => {
      names.pop();
    },
    onObjectProperty: (name, _offset, _length, _line, _column, path) => {
      const seen = names.at(-1);
      if (seen?.has(name)) {
        throw new Refusal('invalid', `“${name}” is given twice.`, [{ pointer: pointer(...path(), name), detail: 'is given twice' }]);
      }
      seen?.add(name);
    },
  });
}
