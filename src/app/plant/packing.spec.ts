import { packedUnits, quantityProblem, toDispatch } from './packing';

const line = (overrides: object) => ({ line: 'a', left: 6, packed: true, quantity: '6', ...overrides });

describe('what is packed', () => {
  it('goes out line by line, as counted; what is not ticked stays', () => {
    const lines = [line({}), line({ line: 'b', quantity: ' 2 ' }), line({ line: 'c', packed: false })];
    expect(toDispatch(lines)).toEqual([
      { line: 'a', quantity: 6 },
      { line: 'b', quantity: 2 },
    ]);
    expect(packedUnits(lines)).toBe(8);
  });

  it('goes nowhere while nothing is ticked or a count cannot be', () => {
    expect(toDispatch([line({ packed: false })])).toBeNull();
    expect(toDispatch([line({}), line({ line: 'b', quantity: '7' })])).toBeNull();
  });

  it.each([['0'], [''], ['-1'], ['1.5'], ['1e2'], ['six']])('takes no count of "%s"', (quantity) => {
    expect(quantityProblem(line({ quantity }))).toBe('From 1 to 6.');
  });

  it('says how many are left when more are counted', () => {
    expect(quantityProblem(line({ quantity: '7' }))).toBe('Only 6 are left.');
    expect(quantityProblem(line({ left: 1, quantity: '2' }))).toBe('Only 1 is left.');
    expect(quantityProblem(line({ quantity: '7', packed: false }))).toBeNull();
  });
});
