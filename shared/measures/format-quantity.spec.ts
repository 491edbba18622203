import { formatAltitude, formatArea, formatWeight } from './format-quantity';

describe('quantities for reading', () => {
  it('writes weight, area and altitude in either system', () => {
    expect([formatWeight(16.6, 'imperial'), formatWeight(16.6, 'metric')]).toEqual(['36.6 lb', '16.6 kg']);
    expect([formatArea(1.136207, 'imperial'), formatArea(1.136207, 'metric')]).toEqual(['12.23 ft²', '1.14 m²']);
    expect([formatAltitude(1798.32, 'imperial'), formatAltitude(1798.32, 'metric')]).toEqual(['5900 ft', '1798 m']);
  });
});
