import { evaluate } from 'mathjs';
import { type ThermalCavity, uValueEn673 } from '@shared/glazing/thermal-en673';
import { wholeWindowU, linearTransmittance, type FrameKind } from '@shared/glazing/whole-window';
import { catalogueData } from '../../../seeds/reference/catalogue-data';
import type { Check } from '../check';

type Gas = ThermalCavity['gas'];

const bare = 0.837;

/** 4 mm lites with equal cavities, the coats on the inner face of each cavity. */
function u(widths: number[], gas: Gas, fill: number, emissivity: number): number {
  const cavities = widths.map((widthMm): ThermalCavity => ({ widthMm, gas, fill, emissivities: [bare, emissivity] }));
  return uValueEn673(Array(widths.length + 1).fill(0.004), cavities).u;
}

const tableC2: [make: string, widths: number[], emissivity: number, air: number, argon: number, krypton: number][] = [
  ['4-6-4, uncoated', [6], bare, 3.3, 3.0, 2.8],
  ['4-12-4, uncoated', [12], bare, 2.8, 2.7, 2.6],
  ['4-16-4, uncoated', [16], bare, 2.7, 2.6, 2.6],
  ['4-12-4, ε 0.2', [12], 0.2, 2.0, 1.8, 1.6],
  ['4-8-4, ε 0.1', [8], 0.1, 2.2, 1.9, 1.4],
  ['4-16-4, ε 0.05', [16], 0.05, 1.4, 1.2, 1.2],
  ['4-6-4-6-4, uncoated', [6, 6], bare, 2.3, 2.1, 1.8],
  ['4-12-4-12-4, two coats ε 0.05', [12, 12], 0.05, 1.0, 0.8, 0.5],
];

const published: Check[] = tableC2.flatMap(([make, widths, emissivity, ...values]) =>
  (['air', 'argon', 'krypton'] as const).map((gas, i) => ({
    what: `U-value of ${make}, ${gas}`,
    source: 'ISO 10077-1:2006, table C.2 (coarse, gas ≥ 90 %)',
    mark: 'from memory' as const,
    expected: values[i]!,
    tolerance: 0.1,
    ours: () => u(widths, gas, gas === 'air' ? 1 : 0.9, emissivity),
  })),
);

/** EN 673 for equal cavities, where each takes an equal share of the 15 K, written out as one expression. */
const symmetric = (cavities: number, width: number, e1: number, e2: number) =>
  evaluate(
    `rho = 1.699 * 0.9 + 1.232 * 0.1; mu = 2.164e-5 * 0.9 + 1.761e-5 * 0.1; la = 0.01684 * 0.9 + 0.02496 * 0.1; c = 519 * 0.9 + 1008 * 0.1;
     Gr = 9.81 * s^3 * 15 / n * rho^2 / (283 * mu^2); Pr = mu * c / la; Nu = max(1, 0.035 * (Gr * Pr)^0.38);
     hs = Nu * la / s + 4 * 5.67e-8 * 283^3 / (1 / e1 + 1 / e2 - 1);
     1 / (1 / 25 + 0.13 + (n + 1) * 0.004 + n / hs)`,
    { s: width, n: cavities, e1, e2 },
  ).entries.at(-1) as number;

const calculated: Check[] = [
  {
    what: 'U-value of 4-16-4, air, uncoated',
    source: 'EN 673:2011',
    mark: 'calculated',
    expected: 2.731,
    tolerance: 0.0005,
    ours: () => u([16], 'air', 1, bare),
  },
  {
    what: 'U-value of 4-16-4, 90 % argon, ε 0.03',
    source: 'EN 673:2011',
    mark: 'calculated',
    expected: 1.103,
    tolerance: 0.0005,
    ours: () => u([16], 'argon', 0.9, 0.03),
  },
  ...[1, 2, 3].map((n): Check => ({
    what: `U-value of ${n + 1} lites, 12 mm of 90 % argon, one coat ε 0.03 in each cavity`,
    source: 'EN 673:2011 as one expression, mathjs 15',
    mark: 'another way',
    expected: symmetric(n, 0.012, bare, 0.03),
    tolerance: 1e-6,
    ours: () => u(Array(n).fill(12), 'argon', 0.9, 0.03),
  })),
];

const annexE: [FrameKind, boolean, number, number][] = [
  ['wood or plastic', false, 0.06, 0.08],
  ['metal with thermal break', false, 0.08, 0.11],
  ['metal without thermal break', false, 0.02, 0.05],
  ['wood or plastic', true, 0.05, 0.06],
  ['metal with thermal break', true, 0.06, 0.08],
  ['metal without thermal break', true, 0.01, 0.04],
];

const edges: Check[] = annexE.flatMap(([frame, improved, uncoated, coated]) =>
  [uncoated, coated].map((expected, i) => ({
    what: `ψ of ${frame}, ${improved ? 'thermally improved' : 'ordinary'} spacer, ${i === 0 ? 'uncoated' : 'low-e'}`,
    source: 'ISO 10077-1:2006, annex E',
    mark: 'from memory' as const,
    expected,
    tolerance: 0,
    ours: () => linearTransmittance(frame, improved, i === 1),
  })),
);

const conductivityOf = (material: string) => catalogueData.spacers.find((spacer) => spacer.material === material)!.conductivity;

export const heatChecks: Check[] = [
  ...published,
  ...calculated,
  ...edges,
  {
    what: 'Uw of a window of 1.23 × 1.48 m, frame 0.1 m all round at 1.4, glass at 1.1, ψ 0.06',
    source: 'ISO 10077-1:2006, equation 1, mathjs 15',
    mark: 'another way',
    expected: evaluate('(1.03 * 1.28 * 1.1 + (1.23 * 1.48 - 1.03 * 1.28) * 1.4 + 2 * (1.03 + 1.28) * 0.06) / (1.23 * 1.48)') as number,
    tolerance: 1e-9,
    ours: () =>
      wholeWindowU({
        glassArea: 1.03 * 1.28,
        glassU: 1.1,
        frameArea: 1.23 * 1.48 - 1.03 * 1.28,
        frameU: 1.4,
        edgeLength: 2 * (1.03 + 1.28),
        psi: 0.06,
      }),
  },
  {
    what: 'Conductivity of aluminium ÷ that of stainless steel',
    source: 'ISO 10456, ISO 10077-2: 160 and 17 W/(m·K); about an eleventh is common practice, no published source',
    mark: 'from memory',
    expected: 9.4,
    tolerance: 0.05,
    ours: () => conductivityOf('aluminium') / conductivityOf('stainless'),
  },
];
