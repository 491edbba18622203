import { retailUnitMinor } from './retail';

describe('retail price of a unit', () => {
  it('adds the mark-up, rounding half a cent up', () => {
    expect(retailUnitMinor(18423, '35')).toBe(24871); // 24871.05
    expect(retailUnitMinor(50, '25')).toBe(63); // 62.5
    expect(retailUnitMinor(100, '12.49')).toBe(112); // 112.49
  });

  it('is the wholesale price without a mark-up', () => {
    expect(retailUnitMinor(18423, '0')).toBe(18423);
  });

  it('keeps four decimals of the percentage', () => {
    expect(retailUnitMinor(1_000_000, '33.3333')).toBe(1_333_333);
  });
});
