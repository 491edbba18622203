import { lineFactory } from '../../../test/factories/quote-factory';
import { changeLine, copyLine, moveLine, putBackLine, removeLine } from './line-edits';

const lines = ['a', 'b', 'c'].map((id) => lineFactory({ id }));
const ids = (sent: { id?: string | undefined }[]) => sent.map(({ id }) => id ?? 'new');

describe('edits of the lines of a quote', () => {
  it('change one line and send the others as they are', () => {
    const sent = changeLine('b', { quantity: 2, tag: null })(lines);
    expect(ids(sent)).toEqual(['a', 'b', 'c']);
    expect(sent[1]).toEqual({ id: 'b', unit: lines[1]!.unit, quantity: 2 });
    expect(sent[0]).toEqual({ id: 'a', unit: lines[0]!.unit, quantity: 6, tag: 'tag a' });
  });

  it('copy a line right after itself', () => {
    expect(ids(copyLine('b')(lines))).toEqual(['a', 'b', 'new', 'c']);
  });

  it('move a line by one, and not beyond the ends', () => {
    expect(ids(moveLine('c', -1)(lines))).toEqual(['a', 'c', 'b']);
    expect(ids(moveLine('a', 1)(lines))).toEqual(['b', 'a', 'c']);
    expect(ids(moveLine('a', -1)(lines))).toEqual(['a', 'b', 'c']);
    expect(ids(moveLine('c', 1)(lines))).toEqual(['a', 'b', 'c']);
  });

  it('remove a line and put it back where it stood, keeping what was changed meanwhile', () => {
    expect(ids(removeLine('b')(lines))).toEqual(['a', 'c']);
    const meanwhile = [lineFactory({ id: 'a', quantity: 9 }), lineFactory({ id: 'c' })];
    const sent = putBackLine(lines[1]!, 1)(meanwhile);
    expect(ids(sent)).toEqual(['a', 'new', 'c']);
    expect(sent[1]).toEqual({ unit: lines[1]!.unit, quantity: 6, tag: 'tag b' });
    expect(sent[0]!.quantity).toBe(9);
  });

  it('keep the extras that a line was asked for with', () => {
    expect(removeLine('a')([lines[0]!, lineFactory({ id: 'b', extras: ['crate'] })])[0]!.extras).toEqual(['crate']);
  });
});
