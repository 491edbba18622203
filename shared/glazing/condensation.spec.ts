import fc from 'fast-check';
import { condensationOf, dewPoint, saturationPressure } from './condensation';

describe('dewPoint', () => {
  it('is where the air holds all it can', () => {
    fc.assert(
      fc.property(fc.double({ min: -15, max: 40, noNaN: true }), fc.double({ min: 0.05, max: 1, noNaN: true }), (celsius, humidity) => {
        expect(saturationPressure(dewPoint(celsius, humidity))).toBeCloseTo(humidity * saturationPressure(celsius), 5);
      }),
    );
  });
});

describe('condensationOf', () => {
  const winter = { insideTemperature: 20, outsideTemperature: -10 };

  it('fogs exactly above the humidity it names', () => {
    const humidity = condensationOf(2.7, winter).foggingHumidity!;
    expect(condensationOf(2.7, { ...winter, insideHumidity: humidity + 0.001 }).fogs).toBe(true);
    expect(condensationOf(2.7, { ...winter, insideHumidity: humidity - 0.001 }).fogs).toBe(false);
  });

  it('takes the surface from the inside resistance', () => {
    expect(condensationOf(2, winter).insideSurface).toBeCloseTo(20 - 2 * 30 * 0.13, 12);
  });

  it('does not say that it will not fog when the humidity is not known', () => {
    const result = condensationOf(1.1, winter);
    expect(result).toMatchObject({ applies: true, dewPoint: null, fogs: null });
    expect(result.statement).toMatch(/not given/);
    expect(condensationOf(1.1, { ...winter, insideHumidity: 0 })).toMatchObject({ dewPoint: null, fogs: false });
  });

  it('says the winter it took when none is given', () => {
    expect(condensationOf(1.1, {}).method.boundary).toContain('inside 20 °C, outside -10 °C');
  });

  it('does not apply when the outside is as warm as the room', () => {
    expect(condensationOf(1.1, { insideTemperature: 20, outsideTemperature: 20 })).toMatchObject({
      applies: false,
      insideSurface: null,
      fogs: null,
    });
  });
});
