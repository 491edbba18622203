import type { Catalogue } from '../contracts/catalogue';
import type { FieldError } from '../contracts/problems';
import type { Unit } from '../contracts/units';
import { resolveUnit, type ResolvedUnit } from './resolve-unit';
import { findShapeProblems } from './shape-problems';

/**
 * Why such a unit cannot exist, whoever would make it: each with a JSON pointer into the unit.
 * Empty when it can exist. Limits of size are not among them: those are a maker's own (`canBuild`).
 */
export function findImpossibilities(unit: Unit, catalogue: Catalogue): FieldError[] {
  const found = resolveUnit(unit, catalogue);
  const shapeProblems = findShapeProblems(unit);
  if ('problems' in found) return [...found.problems, ...shapeProblems];
  return [...coatingProblems(found.resolved), ...cavityProblems(found.resolved), ...gridProblems(found.resolved), ...shapeProblems];
}

/** Soft coats live only inside a sealed cavity; a hard coat may face the weather or the room. */
function coatingProblems({ lites }: ResolvedUnit): FieldError[] {
  const last = 2 * lites.length;
  return lites.flatMap(({ coating }, i) => {
    if (!coating) return [];
    const { item, surface } = coating;
    const pointer = `/lites/${i}/coating/surface`;
    if (surface !== 2 * i + 1 && surface !== 2 * i + 2) {
      return [{ pointer, detail: `lite ${i + 1} has surfaces ${2 * i + 1} and ${2 * i + 2}, not ${surface}` }];
    }
    if (item.kind === 'soft' && (surface === 1 || surface === last)) {
      const instead = surface === 1 ? 2 : last - 1;
      const faces = surface === 1 ? 'the weather' : 'the room';
      return [
        { pointer, detail: `surface ${surface} faces ${faces}; ${item.name} only lasts facing a cavity, such as on surface ${instead}` },
      ];
    }
    return [];
  });
}

function cavityProblems({ cavities }: ResolvedUnit): FieldError[] {
  return cavities.flatMap(({ capillary, gas }, i) =>
    capillary && gas.gas !== 'air'
      ? [{ pointer: `/cavities/${i}/capillary`, detail: `an open capillary tube lets ${gas.name} escape: choose air, or no tube` }]
      : [],
  );
}

function gridProblems({ grid, cavities, widthMm, heightMm }: ResolvedUnit): FieldError[] {
  if (!grid) return [];
  const { bar, across, down } = grid;
  const problems: FieldError[] = [];
  if (across + down === 0) problems.push({ pointer: '/grid/across', detail: 'a grid has at least one bar: leave the grid out for none' });
  if (across * bar.widthMm >= widthMm)
    problems.push({ pointer: '/grid/across', detail: `${across} bars of ${bar.widthMm} mm leave no glass in ${widthMm} mm` });
  if (down * bar.widthMm >= heightMm)
    problems.push({ pointer: '/grid/down', detail: `${down} bars of ${bar.widthMm} mm leave no glass in ${heightMm} mm` });
  const deepest = Math.max(...cavities.map((cavity) => cavity.widthMm));
  if (bar.depthMm >= deepest) {
    problems.push({ pointer: '/grid/bar', detail: `${bar.name} is ${bar.depthMm} mm deep and needs a wider cavity than ${deepest} mm` });
  }
  return problems;
}
