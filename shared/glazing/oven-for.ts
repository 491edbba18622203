import type { Capabilities } from '../contracts/catalogue';
import { closest } from './closest';

type Oven = Capabilities['treatments'][number];

/**
 * The limits of a treatment for a thickness in mm: a maker may list one treatment by ranges of
 * thickness. The nearest range where none holds it; undefined for a treatment it does not make.
 */
export function ovenFor({ treatments }: Capabilities, treatment: string, nominalMm: number): Oven | undefined {
  const outside = ({ minNominalMm, maxNominalMm }: Oven) => Math.max(minNominalMm - nominalMm, nominalMm - maxNominalMm, 0);
  const rows = treatments.filter((row) => row.treatment === treatment);
  return closest(rows, outside);
}
