import { z } from 'zod';
import { type Endpoint } from '@shared/contracts/endpoint';
import { endpoints } from '@shared/contracts/endpoints';
import { problemSchema } from '@shared/contracts/problems';
import { whoMayCall } from '@shared/contracts/who-may-call';

/** The OpenAPI 3.1 text of the whole API, made from the schemas that validate it. */
export function describeApi(publicUrl: string): Record<string, unknown> & { openapi: string } {
  const schemas: Record<string, unknown> = {};
  const reference = (schema: z.ZodType, io: 'input' | 'output') => {
    const { $defs, $schema, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any', target: 'draft-2020-12' });
    void $schema;
    for (const [name, definition] of Object.entries($defs ?? {})) schemas[name] ??= relocate(definition);
    return relocate(rest);
  };
  const problem = { description: 'a problem', content: { 'application/problem+json': { schema: reference(problemSchema, 'output') } } };
  const paths: Record<string, Record<string, unknown>> = {};
  for (const endpoint of endpoints as readonly Endpoint[]) {
    const path = endpoint.path.replace(/:(\w+)/g, '{$1}');
    (paths[path] ??= {})[endpoint.method.toLowerCase()] = {
      operationId: endpoint.id,
      summary: endpoint.summary,
      'x-who-may-call': whoMayCall[endpoint.id as keyof typeof whoMayCall],
      parameters: [
        ...parametersOf(endpoint.params, 'path', reference),
        ...parametersOf(endpoint.query, 'query', reference),
        ...(endpoint.idempotent
          ? [{ in: 'header', name: 'Idempotency-Key', required: true, schema: { type: 'string', minLength: 8 } }]
          : []),
      ],
      ...(endpoint.body
        ? { requestBody: { required: true, content: { 'application/json': { schema: reference(endpoint.body, 'input') } } } }
        : {}),
      responses: { [endpoint.status]: answerOf(endpoint, reference), default: problem },
    };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Sealyard',
      version: '1',
      description: 'Made-to-size sealed units: specify, price, order. Lengths in mm as decimal strings; engineering results in SI units.',
    },
    servers: [{ url: publicUrl }],
    paths,
    components: { schemas },
  };
}

type Reference = (schema: z.ZodType, io: 'input' | 'output') => unknown;

function answerOf(endpoint: Endpoint, reference: Reference) {
  if (endpoint.file) return { description: 'the document', content: { [endpoint.file]: { schema: { type: 'string', format: 'binary' } } } };
  if (!endpoint.answer) return { description: 'done' };
  return { description: 'the answer', content: { 'application/json': { schema: reference(endpoint.answer, 'output') } } };
}

function parametersOf(schema: z.ZodType | undefined, where: 'path' | 'query', reference: Reference) {
  if (!schema) return [];
  const { properties = {}, required = [] } = reference(schema, 'input') as { properties?: Record<string, unknown>; required?: string[] };
  return Object.entries(properties).map(([name, property]) => ({ in: where, name, required: required.includes(name), schema: property }));
}

/** References to `#/$defs/…` become references to the components. */
function relocate(schema: unknown): unknown {
  return JSON.parse(JSON.stringify(schema).replaceAll('"#/$defs/', '"#/components/schemas/')) as unknown;
}
