import type { Check } from './check';
import { heatChecks } from './checks/heat';
import { lightChecks } from './checks/light';
import { loadChecks } from './checks/loads';
import { moistureChecks } from './checks/moisture';
import { shapeChecks } from './checks/shapes';

/** Every value of the glazing engineering that is held against one from outside, by subject. */
export const glazingChecks: { subject: string; checks: Check[] }[] = [
  { subject: 'Shapes, thickness and weight', checks: shapeChecks },
  { subject: 'Heat', checks: heatChecks },
  { subject: 'Light and sun', checks: lightChecks },
  { subject: 'Condensation', checks: moistureChecks },
  { subject: 'Loads', checks: loadChecks },
];
