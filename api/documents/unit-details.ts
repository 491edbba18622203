import { type Catalogue } from '@shared/contracts/catalogue';
import { type Unit } from '@shared/contracts/units';
import { formatLength } from '@shared/measures/format-length';
import { type MeasureSystem } from '@shared/measures/parse-length';

/** What of a unit the make-up does not say, a line each: shape, spacers, tubes, grid, edge work. */
export function unitDetails(unit: Unit, catalogue: Catalogue, system: MeasureSystem): string[] {
  const nameIn = (items: readonly { id: string; name: string }[], id: string) => items.find((item) => item.id === id)?.name ?? id;
  const each = (values: string[], what: (value: string, where: string) => string, part: string): string[] => {
    const distinct = [...new Set(values)];
    if (distinct.length === 1 && distinct[0] !== undefined) return [what(distinct[0], '')];
    return values.map((value, i) => what(value, `, ${part} ${i + 1}`));
  };
  const worked = unit.lites.flatMap(({ edgeWork }, i) => (edgeWork === undefined ? [] : [{ edgeWork, lite: i + 1 }]));
  const edges =
    worked.length === unit.lites.length
      ? each(
          worked.map(({ edgeWork }) => nameIn(catalogue.edgeWork, edgeWork)),
          (name, where) => `edges ${name}${where}`,
          'lite',
        )
      : worked.map(({ edgeWork, lite }) => `edges ${nameIn(catalogue.edgeWork, edgeWork)}, lite ${lite}`);
  return [
    ...shapeLines(unit, system),
    ...each(
      unit.cavities.map(({ spacer }) => nameIn(catalogue.spacers, spacer)),
      (name, where) => `spacer: ${name}${where}`,
      'cavity',
    ),
    ...unit.cavities.flatMap(({ capillary }, i) =>
      capillary ? [`open capillary tube${unit.cavities.length > 1 ? `, cavity ${i + 1}` : ''}`] : [],
    ),
    ...(unit.grid ? [`grid: ${nameIn(catalogue.grids, unit.grid.bar)}, ${unit.grid.across} upright, ${unit.grid.down} level`] : []),
    ...edges,
  ];
}

function shapeLines({ shape }: Unit, system: MeasureSystem): string[] {
  const name = shape.class.replaceAll('-', ' ');
  switch (shape.class) {
    case 'rectangle':
      return [];
    case 'raked-head':
      return [`${name}, high side ${shape.high}, low side ${formatLength(shape.lowHeight, system)}`];
    case 'gable':
      return [`${name}, eaves at ${formatLength(shape.eaves, system)}`];
    case 'segment-arch':
      return [`${name}, rise ${formatLength(shape.rise, system)}`];
    case 'triangle':
      return [`${name}, apex ${shape.apex === undefined ? 'at the left edge' : `${formatLength(shape.apex, system)} from the left edge`}`];
    case 'octagon':
      return [`${name}, corners cut ${formatLength(shape.cut, system)}`];
    case 'polygon':
      return [`${name}, corners in mm from the lower left: ${shape.points.map(({ x, y }) => `${x}, ${y}`).join('; ')}`];
    default:
      return [name];
  }
}
