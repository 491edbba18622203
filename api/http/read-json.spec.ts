import { Refusal } from '@shared/contracts/problems';
import { readJson } from './read-json';

const refused = (text: string): Refusal => {
  try {
    readJson(text);
  } catch (error) {
    if (error instanceof Refusal) return error;
    throw error;
  }
  throw new Error('was taken');
};

describe('readJson', () => {
  it('reads JSON', () => {
    expect(readJson('{"a": [1, "}{[", {"b\\"": null}]}')).toEqual({ a: [1, '}{[', { 'b"': null }] });
  });
  it('takes an empty body for none', () => expect(readJson('')).toBeUndefined());
  it.each(['{', '{"a":}', 'nope', '[1,]', '{"a":1}{', "{'a':1}"])('refuses %s', (text) => expect(refused(text).code).toBe('not-readable'));
  it.each([20_000, 65])('refuses %s levels without falling over', (depth) => {
    expect(refused('['.repeat(depth) + ']'.repeat(depth)).code).toBe('not-readable');
  });
  it('takes 64 levels', () => expect(() => readJson('['.repeat(64) + ']'.repeat(64))).not.toThrow());
  it('points at a name given twice', () => {
    expect(refused('{"lines": [{"quantity": 1, "quantity": 2}]}').errors).toEqual([
      { pointer: '/lines/0/quantity', detail: 'is given twice' },
    ]);
  });
  it('allows the same name in different objects', () => {
    expect(readJson('{"a": {"x": 1}, "b": {"x": 1}}')).toEqual({ a: { x: 1 }, b: { x: 1 } });
  });
});
