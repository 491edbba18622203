import * as z from 'zod';
import { endpoint } from './endpoint';

export const readHealth = endpoint({
  id: 'system.health',
  method: 'GET',
  path: '/api/health',
  summary: 'Answers once migrated and ready',
  status: 200,
  answer: z.object({ status: z.literal('ok') }),
});

export const readOpenApi = endpoint({
  id: 'system.openapi',
  method: 'GET',
  path: '/api/openapi.json',
  summary: 'This description',
  status: 200,
  answer: z.looseObject({ openapi: z.string() }),
});
