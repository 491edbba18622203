import { catalogueFactory, tripleFactory, unitFactory } from '../../test/factories/catalogue-factory';
import type { Unit, UnitInput } from '../contracts/units';
import { geometryOf } from './geometry';
import { resolveUnit } from './resolve-unit';
import { safetyGlazingOf } from './safety-glazing';

const catalogue = catalogueFactory();
const flagsOf = (unit: Unit) => {
  const found = resolveUnit(unit, catalogue);
  if ('problems' in found) throw new Error(JSON.stringify(found.problems));
  return safetyGlazingOf(found.resolved, geometryOf(found.resolved).area);
};
/** A window of 1 × 1.2 m, 12.9 ft². */
const large = { width: '1000', height: '1200' };
const flag = (rule: string, place: UnitInput['place'], overrides: Partial<UnitInput> = {}) =>
  flagsOf(unitFactory({ ...large, ...overrides, place })).find((one) => one.rule.startsWith(rule))!;
const verdict = (rule: string, place: UnitInput['place'], overrides?: Partial<UnitInput>) => flag(rule, place, overrides).verdict;
const inches = (n: number) => n * 0.0254;
const [asked, unknown, clear] = ['safety glazing asked for', 'cannot tell', 'not triggered'];

describe('safetyGlazingOf', () => {
  it('cannot tell anything of a unit whose place is not known', () => {
    expect(flagsOf(unitFactory(large)).map((one) => one.verdict)).toEqual(Array(6).fill(unknown));
  });

  it('defers on every flag to the local code and a professional', () => {
    for (const { caution, trigger, satisfiedBy } of flagsOf(unitFactory(large))) {
      expect(caution).toMatch(/exceptions.*local code decides.*licensed professional/);
      expect(trigger.length * satisfiedBy.length).toBeGreaterThan(0);
    }
  });

  it.each([
    [true, asked],
    [false, clear],
    [undefined, unknown],
  ])('door: %s', (door, expected) => {
    expect(verdict('R308.4.1', { door })).toBe(expected);
  });

  it.each([
    [{ nearDoor: true, bottomEdge: inches(59) }, asked],
    [{ nearDoor: true, bottomEdge: inches(60) }, clear],
    [{ nearDoor: true }, unknown],
    [{ nearDoor: false }, clear],
    [{ bottomEdge: inches(20) }, unknown],
    [{ bottomEdge: inches(61) }, clear],
  ])('beside a door: %j', (place, expected) => {
    expect(verdict('R308.4.2', place)).toBe(expected);
  });

  const low = { bottomEdge: inches(14), topEdge: inches(62), walkingSurface: inches(30) };
  it.each([
    [low, asked],
    [{ ...low, bottomEdge: inches(18) }, clear],
    [{ ...low, bottomEdge: inches(17.9) }, asked],
    [{ ...low, topEdge: inches(36) }, clear],
    [{ ...low, walkingSurface: inches(36) }, asked],
    [{ ...low, walkingSurface: inches(36.1) }, clear],
    [{ ...low, walkingSurface: undefined }, unknown],
    [{ bottomEdge: inches(14), walkingSurface: 0 }, asked],
    [{ topEdge: inches(50), walkingSurface: 0 }, asked],
    [{ topEdge: inches(80), walkingSurface: 0 }, clear],
    [{ walkingSurface: 2 }, clear],
  ])('windows, where all four hold: %j', (place, expected) => {
    expect(verdict('R308.4.3', place)).toBe(expected);
  });

  it('lets a window of 9 ft² and no more off, whatever else is unknown', () => {
    expect(verdict('R308.4.3', {}, { width: '914.4', height: '914.4' })).toBe(clear);
    expect(verdict('R308.4.3', low, { width: '914.4', height: '914.5' })).toBe(asked);
  });

  it.each([
    [{ wetArea: true, bottomEdge: 1 }, asked],
    [{ wetArea: true, bottomEdge: inches(60) }, clear],
    [{ wetArea: true }, unknown],
  ])('wet areas: %j', (place, expected) => {
    expect(verdict('R308.4.5', place)).toBe(expected);
  });

  it.each([
    [{ stairs: true, bottomEdge: inches(35) }, asked],
    [{ stairs: true, bottomEdge: inches(36) }, clear],
    [{ stairs: true }, unknown],
    [{ bottomEdge: inches(35) }, unknown],
  ])('stairs: %j', (place, expected) => {
    expect(verdict('R308.4.6', place)).toBe(expected);
  });

  it.each([
    [{ footOfStairs: true }, asked],
    [{ footOfStairs: true, bottomEdge: inches(36) }, clear],
    [{ footOfStairs: false }, clear],
    [{}, unknown],
  ])('foot of stairs: %j', (place, expected) => {
    expect(verdict('R308.4.7', place)).toBe(expected);
  });

  it('names the answer that triggered it', () => {
    expect(flag('R308.4.3', low).trigger).toMatch(
      /1\.20 m² is over 9 ft².*bottom edge 14\.0 in.*under 18 in.*top edge.*walking surface within 36 in/,
    );
    expect(flag('R308.4.2', { nearDoor: true }).trigger).toBe(
      'Not known: the height of the bottom edge. Known: within 24 in (610 mm) of a door.',
    );
    expect(flag('R308.4.2', { nearDoor: true, bottomEdge: 2 }).trigger).toMatch(/^Bottom edge 78\.7 in .* not under 60 in/);
  });

  it('asks for Category II in doors and above 9 ft²', () => {
    const small = { width: '600', height: '600' };
    expect(flag('R308.4.1', { door: true }, small).satisfiedBy).toMatch(/Category II/);
    expect(flag('R308.4.5', { wetArea: true }, small).satisfiedBy).not.toMatch(/Category II/);
    expect(flag('R308.4.5', { wetArea: true }).satisfiedBy).toMatch(/Category II/);
  });

  describe('what satisfies it', () => {
    const at = { place: { door: true } };
    const satisfied = (lites: [glass: string, treatment: string][]) => {
      const cavities = lites.slice(1).map(() => ({ width: '12', gas: 'air', spacer: 'stainless' }));
      return flagsOf(unitFactory({ ...at, cavities, lites: lites.map(([glass, treatment]) => ({ glass, treatment })) }))[0]!.satisfied;
    };

    it.each<[[string, string][], boolean | null]>([
      [[['clear-4', 'tempered'], ['clear-4', 'tempered']], true], // prettier-ignore
      [[['clear-4', 'tempered'], ['laminated-clear-6', 'annealed']], true], // prettier-ignore
      [[['clear-4', 'tempered'], ['clear-4', 'annealed']], false], // prettier-ignore
      [[['clear-4', 'heat-strengthened'], ['clear-4', 'tempered']], false], // prettier-ignore
      [[['clear-4', 'tempered'], ['clear-4', 'annealed'], ['clear-4', 'tempered']], null], // prettier-ignore
      [[['clear-4', 'tempered'], ['clear-4', 'tempered'], ['clear-4', 'tempered']], true], // prettier-ignore
    ])('%j: %s', (lites, expected) => {
      expect(satisfied(lites)).toBe(expected);
    });

    it('says nothing where the rule is not triggered', () => {
      expect(flagsOf(tripleFactory({ place: { door: false } }))[0]!.satisfied).toBeNull();
    });
  });
});
