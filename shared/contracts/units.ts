import * as z from 'zod';
import { id, lengthMm } from './primitives';

/**
 * The unit as it travels and rests: what a dealer orders. Lengths are decimal strings of
 * millimetres; width before height, seen from outside; lites and cavities from outside in.
 */

export const shapeClasses = [
  'rectangle',
  'raked-head',
  'gable',
  'segment-arch',
  'half-round',
  'circle',
  'ellipse',
  'triangle',
  'octagon',
  'polygon',
] as const;

export const shape = z.discriminatedUnion('class', [
  z.strictObject({ class: z.literal('rectangle') }),
  /** Right trapezoid: one side is `lowHeight`, the other the unit's height; `high` says which side is full. */
  z.strictObject({ class: z.literal('raked-head'), lowHeight: lengthMm, high: z.enum(['left', 'right']) }),
  /** House shape: vertical sides to `eaves`, apex in the middle of the width. */
  z.strictObject({ class: z.literal('gable'), eaves: lengthMm }),
  /** Rectangle with a circular segment of height `rise` on top. */
  z.strictObject({ class: z.literal('segment-arch'), rise: lengthMm }),
  z.strictObject({ class: z.literal('half-round') }),
  z.strictObject({ class: z.literal('circle') }),
  z.strictObject({ class: z.literal('ellipse') }),
  /** Base at the bottom; `apex` is its distance from the left edge (absent: at the left edge). */
  z.strictObject({ class: z.literal('triangle'), apex: lengthMm.optional() }),
  /** Rectangle with corners cut off at 45°, `cut` along each edge. */
  z.strictObject({ class: z.literal('octagon'), cut: lengthMm }),
  /** Corners in order, from the lower left of the bounding rectangle, y upward. */
  z.strictObject({
    class: z.literal('polygon'),
    points: z
      .array(z.strictObject({ x: z.string().regex(/^\d{1,6}(\.\d{1,8})?$/), y: z.string().regex(/^\d{1,6}(\.\d{1,8})?$/) }))
      .min(3)
      .max(24),
  }),
]);
export type Shape = z.infer<typeof shape>;

export const lite = z.strictObject({
  glass: id,
  treatment: id,
  coating: z.strictObject({ id, surface: z.int().min(1).max(8) }).optional(),
  edgeWork: id.optional(),
});
export type Lite = z.infer<typeof lite>;

export const cavity = z.strictObject({
  width: lengthMm,
  gas: id,
  spacer: id,
  capillary: z.boolean().optional().meta({ description: 'an open capillary tube; excludes a gas fill' }),
});
export type Cavity = z.infer<typeof cavity>;

export const grid = z.strictObject({
  bar: id,
  across: z.int().min(0).max(20).meta({ description: 'upright bars, dividing the width' }),
  down: z.int().min(0).max(20).meta({ description: 'level bars, dividing the height' }),
});

/** Three answers on purpose: what is not known is never taken for fine. */
const answer = z.boolean().optional();
const metres = z.number().min(-100).max(9000).optional();

export const place = z
  .strictObject({
    altitude: metres.meta({ description: 'm above sea level at the site' }),
    slope: z.number().min(0).max(90).optional().meta({ description: 'degrees from horizontal; 90 is vertical' }),
    door: answer.meta({ description: 'the unit is in a door' }),
    nearDoor: answer.meta({ description: 'within 610 mm of a door in either position' }),
    wetArea: answer.meta({ description: 'within 1 524 mm of a bath, shower or pool' }),
    stairs: answer.meta({ description: 'within 914 mm of stairs, ramps or landings' }),
    footOfStairs: answer.meta({ description: 'within 1 524 mm of the bottom tread' }),
    bottomEdge: metres.meta({ description: 'm above the floor' }),
    topEdge: metres.meta({ description: 'm above the floor' }),
    walkingSurface: z.number().min(0).max(1000).optional().meta({ description: 'm to the nearest walking surface, horizontally' }),
    windPressure: z.number().min(0).max(20_000).optional().meta({ description: 'Pa, 3-second gust' }),
    snowLoad: z.number().min(0).max(50_000).optional().meta({ description: 'Pa' }),
    insideTemperature: z.number().min(-20).max(60).optional().meta({ description: '°C' }),
    outsideTemperature: z.number().min(-70).max(60).optional().meta({ description: '°C' }),
    insideHumidity: z.number().min(0).max(1).optional().meta({ description: 'relative, 0 to 1' }),
  })
  .meta({ description: 'where the unit goes; SI units, everything optional' });
export type Place = z.infer<typeof place>;

/** The shape of a unit; `unitSchema` adds what its parts must agree on. */
const unitParts = z.strictObject({
  width: lengthMm,
  height: lengthMm,
  shape: shape.default({ class: 'rectangle' }),
  lites: z.array(lite).min(2, 'a sealed unit has at least two lites').max(4, 'at most four lites'),
  cavities: z.array(cavity).min(1, 'a sealed unit has at least one cavity').max(3),
  grid: grid.optional(),
  place: place.optional(),
});

export const unitSchema = unitParts
  .check((context) => {
    const unit = context.value;
    const issue = (path: (string | number)[], message: string) => context.issues.push({ code: 'custom', path, message, input: unit });
    if (unit.cavities.length !== unit.lites.length - 1) {
      issue(['cavities'], `${unit.lites.length} lites need ${unit.lites.length - 1} cavities, not ${unit.cavities.length}`);
    }
    for (const [i, { coating }] of unit.lites.entries()) {
      if (coating && coating.surface !== 2 * i + 1 && coating.surface !== 2 * i + 2) {
        issue(['lites', i, 'coating', 'surface'], `lite ${i + 1} has surfaces ${2 * i + 1} and ${2 * i + 2}`);
      }
    }
  })
  .meta({ id: 'Unit', description: 'a sealed unit, lites and cavities from outside in, lengths in mm as decimal strings' });

/** What makes one unit another unit: all but the place it goes to. */
export type Unit = z.infer<typeof unitSchema>;
export type UnitInput = z.input<typeof unitSchema>;
