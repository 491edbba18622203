import type { Capabilities, Catalogue } from '../contracts/catalogue';
import type { Reason } from '../contracts/evaluation';
import { closest } from './closest';
import { notMade } from './not-made';
import type { ResolvedUnit } from './resolve-unit';

/**
 * A maker's limits on the cavities: spacer and its widths, gas, tube, and the grid, which lies in
 * the widest. The nearest width keeps spacer, gas and grid together.
 *
 * @param both writes a length of mm in both measures
 */
export function cavityReasons(unit: ResolvedUnit, made: Capabilities, catalogue: Catalogue, both: (mm: string) => string): Reason[] {
  const widest = Math.max(...unit.cavities.map(({ widthMm }) => widthMm));
  const withGrid = unit.cavities.findIndex(({ widthMm }) => widthMm === widest);
  const bar = unit.grid && made.grids.find((row) => row.bar === unit.grid?.bar.id);
  return [
    ...unit.cavities.flatMap((_, i) => oneCavity(unit, i, i === withGrid ? bar?.minCavity : undefined, made, catalogue, both)),
    ...gridReasons(unit, made, catalogue),
  ];
}

function oneCavity(
  unit: ResolvedUnit,
  i: number,
  gridMin: string | undefined,
  made: Capabilities,
  catalogue: Catalogue,
  both: (mm: string) => string,
): Reason[] {
  const { gas, spacer, widthMm, capillary } = unit.cavities[i]!;
  const at = `/cavities/${i}`;
  const written = unit.unit.cavities[i]!.width;
  const own = made.gases.find((row) => row.gas === gas.id);
  const bars = made.spacers.find((row) => row.spacer === spacer.id);
  const widths = bars?.widths ?? spacer.widthsMm;
  const suits = (width: string) =>
    (!own || (Number(width) >= Number(own.minCavity) && Number(width) <= Number(own.maxCavity))) &&
    (gridMin === undefined || Number(width) >= Number(gridMin));
  const width = closest(widths.filter(suits), (candidate) => Math.abs(Number(candidate) - widthMm)) ?? null;
  const tooWide = (code: string, detail: string, limit: string): Reason => ({
    code,
    detail: `${detail}, not ${both(written)}`,
    limit: `${limit} mm`,
    actual: `${written} mm`,
    nearest: width === null ? null : `${width} mm`,
    nearestValue: width,
    pointer: `${at}/width`,
  });

  const reasons: Reason[] = [];
  if (!bars) {
    const spacers = made.spacers.map((row) => row.spacer);
    const others = catalogue.spacers.filter(({ id }) => spacers.includes(id));
    const nearest = closest(others, ({ conductivity }) => Math.abs(conductivity - spacer.conductivity));
    reasons.push(notMade('spacer-not-made', 'spacer', spacer, spacers, nearest, `${at}/spacer`));
  } else if (!bars.widths.some((candidate) => Number(candidate) === widthMm)) {
    reasons.push(tooWide('cavity-width', `has ${spacer.name} spacer of ${bars.widths.join(', ')} mm`, bars.widths.join(', ')));
  }
  if (!own) {
    const gases = made.gases.map((row) => row.gas);
    const nearest = catalogue.gases.find(({ id }) => gases.includes(id));
    reasons.push(notMade('gas-not-made', 'gas', gas, gases, nearest, `${at}/gas`));
  } else if (widthMm < Number(own.minCavity)) {
    reasons.push(tooWide('gas-cavity-min', `fills ${gas.name} into cavities from ${both(own.minCavity)}`, own.minCavity));
  } else if (widthMm > Number(own.maxCavity)) {
    reasons.push(tooWide('gas-cavity-max', `fills ${gas.name} into cavities up to ${both(own.maxCavity)}`, own.maxCavity));
  }
  if (gridMin !== undefined && widthMm < Number(gridMin)) {
    reasons.push(tooWide('grid-cavity-min', `puts this grid into cavities from ${both(gridMin)}`, gridMin));
  }
  if (capillary && !made.capillary.offered) {
    const [limit, actual] = ['no tube', 'tube'];
    const detail = 'fits no capillary tubes';
    reasons.push({ code: 'capillary-not-made', detail, limit, actual, nearest: limit, nearestValue: null, pointer: `${at}/capillary` });
  }
  return reasons;
}

function gridReasons({ grid }: ResolvedUnit, made: Capabilities, catalogue: Catalogue): Reason[] {
  const bars = made.grids.map((row) => row.bar);
  if (!grid || bars.includes(grid.bar.id)) return [];
  const others = catalogue.grids.filter(({ id }) => bars.includes(id));
  const nearest = closest(others, ({ widthMm }) => Math.abs(widthMm - grid.bar.widthMm));
  return [notMade('grid-not-made', 'grid', grid.bar, bars, nearest, '/grid/bar')];
}
