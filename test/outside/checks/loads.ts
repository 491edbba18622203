import psychrolib from 'psychrolib';
import { isochoricPressure, standardPressure, summer, winter } from '@shared/glazing/climate-load';
import { centreDeflection, centreMoment, displacedVolume } from '@shared/glazing/plates';
import { catalogueData } from '../../../seeds/reference/catalogue-data';
import type { Check } from '../check';

psychrolib.SetUnitSystem(psychrolib.SI);

const bv: [shortByLong: number, value: number][] = [
  [1.0, 0.0194],
  [0.9, 0.0237],
  [0.8, 0.0288],
  [0.7, 0.035],
  [0.6, 0.0421],
  [0.5, 0.0501],
  [0.4, 0.0587],
  [0.3, 0.0676],
  [0.2, 0.0767],
  [0.1, 0.0857],
];

const handbook: [longByShort: number, deflection: number, moment: number][] = [
  [1, 0.00406, 0.0479],
  [1.5, 0.00772, 0.0812],
  [2, 0.01013, 0.1017],
  [3, 0.01223, 0.1189],
];

/** Navier's double series at the centre of a plate with short edge 1, ours being Lévy's single one. */
function navier(ratio: number, poisson: number): { deflection: number; moment: number } {
  let deflection = 0;
  let moment = 0;
  for (let m = 1; m < 800; m += 2) {
    for (let n = 1; n < 800; n += 2) {
      const sign = (m + n) % 4 === 2 ? 1 : -1;
      const k = m ** 2 + (n / ratio) ** 2;
      deflection += sign / (m * n * k ** 2);
      moment += (sign * (m ** 2 + poisson * (n / ratio) ** 2)) / (m * n * k ** 2);
    }
  }
  return { deflection: (16 / Math.PI ** 6) * deflection, moment: (16 / Math.PI ** 4) * moment };
}

const plates: Check[] = [
  ...bv.map(([ratio, expected]): Check => ({
    what: `Bv at a/b ${ratio.toFixed(1)}`,
    source: 'EN 16612:2019 and DIN 18008-2, table of Bv',
    mark: 'from memory',
    expected,
    tolerance: 0.0001,
    ours: () => displacedVolume(1 / ratio, 0.23),
  })),
  ...handbook.flatMap(([ratio, deflection, moment]): Check[] => {
    const source = 'any handbook of plates after Timoshenko, table of plates simply supported on four edges, ν 0.3';
    return [
      {
        what: `Deflection α at b/a ${ratio}`,
        source,
        mark: 'published',
        expected: deflection,
        tolerance: 0.000005,
        ours: () => centreDeflection(ratio),
      },
      {
        what: `Moment β at b/a ${ratio}`,
        source,
        mark: 'published',
        expected: moment,
        tolerance: 0.00005,
        ours: () => centreMoment(ratio, 0.3),
      },
    ];
  }),
  ...[1, 1.32, 2.5, 6].flatMap((ratio): Check[] => {
    const second = navier(ratio, 0.23);
    const source = 'Navier’s double series, 160 000 terms, ν 0.23';
    return [
      {
        what: `Deflection α at b/a ${ratio}`,
        source,
        mark: 'another way',
        expected: second.deflection,
        tolerance: 1e-9,
        ours: () => centreDeflection(ratio),
      },
      {
        what: `Moment β at b/a ${ratio}`,
        source,
        mark: 'another way',
        expected: second.moment,
        tolerance: 1e-5,
        ours: () => centreMoment(ratio, 0.23),
      },
    ];
  }),
];

const weather: Check[] = [
  ...(
    [
      [1000, 89_875],
      [1500, 84_556],
      [2000, 79_495],
    ] as const
  ).flatMap(([altitude, expected]): Check[] => [
    // prettier-ignore
    { what: `Air pressure at ${altitude} m, Pa`, source: 'ISO 2533:1975', mark: 'calculated', expected, tolerance: 1, ours: () => standardPressure(altitude) },
    {
      what: `Air pressure at ${altitude} m, Pa`,
      source: 'psychrolib 1.1 (ASHRAE Handbook of Fundamentals, 2017)',
      mark: 'another way',
      expected: psychrolib.GetStandardAtmPressure(altitude),
      tolerance: 1,
      ours: () => standardPressure(altitude),
    },
  ]),
  {
    what: 'Isochoric pressure in summer, kPa',
    source: 'EN 16612:2019, DIN 18008-2',
    mark: 'from memory',
    expected: 16,
    tolerance: 0.05,
    ours: () => isochoricPressure(summer),
  },
  {
    what: 'Isochoric pressure in winter, kPa',
    source: 'EN 16612:2019, DIN 18008-2',
    mark: 'from memory',
    expected: -16.1,
    tolerance: 0.05,
    ours: () => isochoricPressure(winter),
  },
];

const strength: Check[] = Object.entries({ annealed: 23.3, 'heat-strengthened': 46.6, tempered: 93.1 }).map(([kind, expected]) => ({
  what: `Allowable surface stress, ${kind}, MPa`,
  source: 'ASTM E1300, appendix: 3 s, 8 in 1 000',
  mark: 'from memory' as const,
  expected,
  tolerance: 0,
  ours: () => catalogueData.treatments.find((treatment) => treatment.kind === kind)!.allowableStressMpa,
}));

export const loadChecks: Check[] = [...plates, ...weather, ...strength];
