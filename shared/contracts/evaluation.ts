import * as z from 'zod';
import { named } from './primitives';
import { unitSchema } from './units';

/** What the engineering says of a unit. SI numbers; each result names its method and what it leaves out. */

export const method = z.object({
  name: z.string().meta({ description: 'method with edition, e.g. EN 673:2011' }),
  boundary: z.string().meta({ description: 'boundary conditions' }),
  leavesOut: z.string(),
});

/** A result that may not apply: then `statement` says why and there is no number. */
const applies = { applies: z.boolean(), statement: z.string().nullable(), method };
const maybe = z.number().nullable();

/** Why a unit cannot be built: a rule, its limit, what the unit has, and what would pass. */
export const reasonSchema = z.object({
  code: z.string(),
  detail: z.string(),
  limit: z.string(),
  actual: z.string(),
  nearest: z.string().nullable().meta({ description: 'nearest value that would pass, in the units of `actual`' }),
  /** All the nearest values of one maker, set together, pass together. */
  nearestValue: z.string().nullable().meta({
    description: 'what to write at `pointer` to pass: mm as a decimal string, an identity or a number; null when no one field does',
  }),
  pointer: z.string().meta({ description: 'JSON pointer into the unit: the field that causes it' }),
});
export type Reason = z.infer<typeof reasonSchema>;

export const geometrySchema = z.object({
  area: z.number().meta({ description: 'm²' }),
  perimeter: z.number().meta({ description: 'm' }),
  boundingWidth: z.number().meta({ description: 'm' }),
  boundingHeight: z.number().meta({ description: 'm' }),
  aspect: z.number().meta({ description: 'long edge ÷ short edge' }),
  unitedMeasure: z.number().meta({ description: 'width + height, m' }),
  overallThickness: z.number().meta({ description: 'm, actual glass thickness plus cavities' }),
  spacerLength: z.number().meta({ description: 'm, all cavities' }),
});

export const safetySchema = z.object({
  rule: z.string(),
  verdict: z.enum(['safety glazing asked for', 'cannot tell', 'not triggered']),
  trigger: z.string(),
  satisfiedBy: z.string(),
  satisfied: z.boolean().nullable(),
  caution: z.string(),
});

export const buildabilitySchema = z.object({
  fabricator: named,
  canBuild: z.boolean(),
  reasons: z.array(reasonSchema),
  advice: z.array(z.string()),
});

export const evaluationSchema = z
  .object({
    geometry: geometrySchema,
    weight: z.number().meta({ description: 'kg, whole unit' }),
    weightParts: z.object({ glass: z.number(), interlayer: z.number(), edge: z.number() }).meta({ description: 'kg' }),
    thermal: z.object({
      ...applies,
      uEn673: maybe.meta({ description: 'W/(m²·K), centre of glass, unrounded' }),
      cavities: z.array(z.object({ hs: z.number(), nusselt: z.number(), deltaT: z.number() })).meta({ description: 'W/(m²·K), –, K' }),
    }),
    solar: z.object({
      ...applies,
      g: maybe.meta({ description: 'total solar energy transmittance, 0 to 1' }),
      directTransmittance: maybe,
      lightTransmittance: maybe,
      lightReflectance: maybe,
      absorptance: z.array(z.number()),
    }),
    condensation: z.object({
      ...applies,
      insideSurface: maybe.meta({ description: '°C at the centre, inside' }),
      dewPoint: maybe.meta({ description: '°C of the room air' }),
      foggingHumidity: maybe.meta({ description: 'relative humidity of the room at which the centre fogs, 0 to 1' }),
      fogs: z.boolean().nullable(),
    }),
    load: z.object({
      ...applies,
      climate: z
        .object({ summer: z.number(), winter: z.number() })
        .nullable()
        .meta({ description: 'isochoric pressure of one cavity, kPa' }),
      insulatingUnitFactor: maybe,
      stress: z.array(z.object({ lite: z.int(), stressMpa: z.number(), allowableMpa: z.number(), deflectionMm: z.number() })),
      warnings: z.array(z.string()),
    }),
    safety: z.array(safetySchema),
    buildability: z.array(buildabilitySchema),
  })
  .meta({ id: 'Evaluation' });
export type Evaluation = z.infer<typeof evaluationSchema>;

export const evaluateRequest = z.strictObject({ unit: unitSchema });
