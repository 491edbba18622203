import psychrolib from 'psychrolib';
import { dewPoint, saturationPressure } from '@shared/glazing/condensation';
import type { Check } from '../check';

psychrolib.SetUnitSystem(psychrolib.SI);

const rooms: [celsius: number, humidity: number][] = [
  [20, 0.5],
  [20, 0.3],
  [20, 0.2],
  [24, 0.6],
  [18, 0.8],
  [30, 0.4],
];

export const moistureChecks: Check[] = [
  {
    what: 'Dew point of 20 °C and 50 %, °C',
    source: 'ISO 13788',
    mark: 'calculated',
    expected: 9.3,
    tolerance: 0.05,
    ours: () => dewPoint(20, 0.5),
  },
  ...rooms.map(([celsius, humidity]): Check => ({
    what: `Dew point of ${celsius} °C and ${humidity * 100} %, °C`,
    source: 'psychrolib 1.1 (ASHRAE Handbook of Fundamentals, 2017)',
    mark: 'another way',
    expected: psychrolib.GetTDewPointFromRelHum(celsius, humidity),
    tolerance: 0.1,
    ours: () => dewPoint(celsius, humidity),
  })),
  ...[-15, -5, 0.01, 10, 20, 35].map((celsius): Check => {
    const expected = psychrolib.GetSatVapPres(celsius);
    return {
      what: `Saturation pressure at ${celsius} °C, Pa`,
      source: 'psychrolib 1.1 (ASHRAE Handbook of Fundamentals, 2017); within 0.5 %',
      mark: 'another way',
      expected,
      tolerance: expected * 0.005,
      ours: () => saturationPressure(celsius),
    };
  }),
];
