import * as z from 'zod';
import { id, lengthMm } from './primitives';
import { shapeClasses } from './units';

/** What units are made of, with physical data, and who makes them. Public. */

const item = z.object({
  id,
  name: z.string(),
  summary: z.string().meta({ description: 'what it does, in one sentence' }),
  whenToChoose: z.string(),
});
/** 0 to 1, a share of light, sun or gas. */
const share = z.number().min(0).max(1);
const source = z.string().meta({ description: 'where the figures come from' });

/** Broadband optical data of one lite, seen from both faces. */
export const optics = z.object({
  visibleTransmittance: share,
  visibleReflectanceOutside: share,
  visibleReflectanceInside: share,
  solarTransmittance: share,
  solarReflectanceOutside: share,
  solarReflectanceInside: share,
});

export const glassItem = item.extend({
  construction: z.enum(['monolithic', 'laminated']),
  nominalMm: z.number(),
  actualMm: z.number().meta({ description: 'minimum thickness of the standard; of a laminate the whole' }),
  plies: z.array(z.number()).meta({ description: 'actual thickness of each glass ply, mm' }),
  interlayerMm: z.number().meta({ description: '0 for a single ply' }),
  tint: z.string().nullable(),
  optics,
  source,
});
export const treatmentItem = item.extend({
  kind: z.enum(['annealed', 'heat-strengthened', 'tempered']),
  allowableStressMpa: z.number().meta({ description: 'surface, 3 s, 8 breaks in 1 000' }),
  safetyGlazing: z.boolean().meta({ description: 'breaks safely enough to count as safety glazing' }),
  source,
});
export const coatingItem = item.extend({
  kind: z.enum(['soft', 'hard']),
  emissivity: z.number(),
  /** Of 4 mm clear glass with this coating; `Outside` is the coated face. Data for comparing. */
  optics,
  source,
});
export const spacerItem = item.extend({
  material: z.enum(['aluminium', 'stainless', 'warm-edge']),
  conductivity: z.number().meta({ description: 'W/(m·K) of the wall' }),
  wallMm: z.number(),
  sightlineMm: z.number().meta({ description: 'depth of spacer and seals seen from the edge' }),
  massPerMetre: z.number().meta({ description: 'kg/m for a 12 mm cavity, with desiccant and seals' }),
  thermallyImproved: z.boolean(),
  widthsMm: z.array(lengthMm),
  source,
});
export const gasItem = item.extend({
  gas: z.enum(['air', 'argon', 'krypton', 'xenon']),
  fill: z.number().gt(0).max(1).meta({ description: 'fraction of the named gas in the cavity, the rest air' }),
  source,
});
export const gridItem = item.extend({ widthMm: z.number(), depthMm: z.number().meta({ description: 'needs a cavity deeper than this' }) });
export const shapeItem = item.extend({ class: z.enum(shapeClasses) });
export const edgeWorkItem = item;

/** What one fabricator can make: each limit is a rule with a number. Lengths in mm, decimal strings. */
export const capabilities = z.object({
  lites: z.object({ max: z.int() }),
  unit: z.object({
    minWidth: lengthMm,
    minHeight: lengthMm,
    maxLong: lengthMm.meta({ description: 'longest long edge' }),
    maxShort: lengthMm.meta({ description: 'longest short edge' }),
    maxAreaM2: z.number(),
    maxAspect: z.number(),
    maxWeightKg: z.number(),
    maxOverall: lengthMm,
  }),
  glass: z.array(z.object({ glass: id, maxLong: lengthMm, maxShort: lengthMm })),
  treatments: z.array(
    z.object({
      treatment: id,
      minNominalMm: z.number(),
      maxNominalMm: z.number(),
      minEdge: lengthMm,
      maxLong: lengthMm,
      maxShort: lengthMm,
    }),
  ),
  coatings: z.array(z.object({ coating: id, maxPerUnit: z.int() })),
  spacers: z.array(z.object({ spacer: id, widths: z.array(lengthMm) })),
  gases: z.array(z.object({ gas: id, minCavity: lengthMm, maxCavity: lengthMm })),
  grids: z.array(z.object({ bar: id, minCavity: lengthMm })),
  edgeWork: z.array(id),
  shapes: z.array(z.enum(shapeClasses)),
  capillary: z.object({ offered: z.boolean(), adviseAboveM: z.number().meta({ description: 'm of altitude between plant and site' }) }),
});
export type Capabilities = z.infer<typeof capabilities>;

export const fabricatorItem = z.object({
  id,
  name: z.string(),
  about: z.string(),
  town: z.string(),
  measureSystem: z.enum(['imperial', 'metric']),
  plantAltitude: z.number().meta({ description: 'm above sea level' }),
  capabilities,
});

export const catalogueSchema = z
  .object({
    glasses: z.array(glassItem),
    treatments: z.array(treatmentItem),
    coatings: z.array(coatingItem),
    spacers: z.array(spacerItem),
    gases: z.array(gasItem),
    grids: z.array(gridItem),
    shapes: z.array(shapeItem),
    edgeWork: z.array(edgeWorkItem),
    fabricators: z.array(fabricatorItem),
  })
  .meta({ id: 'Catalogue' });

export type Catalogue = z.infer<typeof catalogueSchema>;
export type GlassItem = z.infer<typeof glassItem>;
export type TreatmentItem = z.infer<typeof treatmentItem>;
export type CoatingItem = z.infer<typeof coatingItem>;
export type SpacerItem = z.infer<typeof spacerItem>;
export type GasItem = z.infer<typeof gasItem>;
export type GridItem = z.infer<typeof gridItem>;
export type Optics = z.infer<typeof optics>;
export type FabricatorItem = z.infer<typeof fabricatorItem>;
