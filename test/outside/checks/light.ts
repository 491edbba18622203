import { evaluate } from 'mathjs';
import { evaluateUnit } from '@shared/glazing/evaluate-unit';
import { stackPanes } from '@shared/glazing/solar-en410';
import { catalogueFactory, unitFactory } from '../../factories/catalogue-factory';
import type { Check } from '../check';

const clear = { glass: 'clear-4', treatment: 'annealed' };
const double = () =>
  evaluateUnit(unitFactory({ lites: [clear, clear], cavities: [{ width: '16', gas: 'air', spacer: 'aluminium' }] }), catalogueFactory())
    .solar;

/** Two unlike panes and three, seen from outside: τ and the outer ρ, τ, inner ρ of each. */
const panes = [
  { transmittance: 0.55, outside: 0.22, inside: 0.12 },
  { transmittance: 0.83, outside: 0.07, inside: 0.08 },
  { transmittance: 0.6, outside: 0.28, inside: 0.2 },
];

export const lightChecks: Check[] = [
  {
    what: 'Light through two clear 4 mm lites (τv 0.90, ρv 0.08)',
    source: 'EN 410:2011, double glazing',
    mark: 'calculated',
    expected: 0.815,
    tolerance: 0.0005,
    ours: () => stackPanes([1, 2].map(() => ({ transmittance: 0.9, outside: 0.08, inside: 0.08 }))).transmittance,
  },
  {
    what: 'Light through a clear double unit of the catalogue, 4-16-4',
    source: 'published for clear double units: 0.81 to 0.82',
    mark: 'from memory',
    expected: 0.815,
    tolerance: 0.005,
    ours: () => double().lightTransmittance!,
  },
  {
    what: 'Solar gain g of a clear double unit of the catalogue, 4-16-4',
    source: 'published for clear double units: 0.76 to 0.79',
    mark: 'from memory',
    expected: 0.775,
    tolerance: 0.015,
    ours: () => double().g!,
  },
  {
    what: 'Transmittance of two unlike panes',
    source: 'EN 410:2011, double glazing: τ1·τ2 ÷ (1 − ρ1′·ρ2), mathjs 15',
    mark: 'another way',
    expected: evaluate('0.55 * 0.83 / (1 - 0.12 * 0.07)') as number,
    tolerance: 1e-9,
    ours: () => stackPanes(panes.slice(0, 2)).transmittance,
  },
  {
    what: 'Transmittance of three unlike panes',
    source: 'EN 410:2011, triple glazing: τ1·τ2·τ3 ÷ ((1 − ρ1′·ρ2)(1 − ρ2′·ρ3) − τ2²·ρ1′·ρ3), mathjs 15',
    mark: 'another way',
    expected: evaluate('0.55 * 0.83 * 0.6 / ((1 - 0.12 * 0.07) * (1 - 0.08 * 0.28) - 0.83^2 * 0.12 * 0.28)') as number,
    tolerance: 1e-9,
    ours: () => stackPanes(panes).transmittance,
  },
  {
    what: 'What the middle one of three unlike panes keeps',
    source: 'rays followed back and forth, 200 times',
    mark: 'another way',
    expected: followRays(1),
    tolerance: 1e-9,
    ours: () => stackPanes(panes).absorptances[1]!,
  },
];

/** What pane `which` keeps of a ray from outside, by following every part of it between the panes. */
function followRays(which: number): number {
  // inward[i] falls on pane i from outside, outward[i] from inside.
  let inward = [1, 0, 0];
  let outward = [0, 0, 0];
  let kept = 0;
  for (let round = 0; round < 200; round++) {
    const nextInward = [0, 0, 0];
    const nextOutward = [0, 0, 0];
    for (const [i, { transmittance, outside, inside }] of panes.entries()) {
      const [fromOutside, fromInside] = [inward[i]!, outward[i]!];
      if (i === which) kept += fromOutside * (1 - transmittance - outside) + fromInside * (1 - transmittance - inside);
      if (i + 1 < panes.length) nextInward[i + 1]! += fromOutside * transmittance + fromInside * inside;
      if (i > 0) nextOutward[i - 1]! += fromInside * transmittance + fromOutside * outside;
    }
    inward = nextInward;
    outward = nextOutward;
  }
  return kept;
}
