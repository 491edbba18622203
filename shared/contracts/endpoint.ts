import { type z } from 'zod';

/** One place for what an endpoint is; routes, client and OpenAPI text all come from it. */
export interface Endpoint<
  Id extends string = string,
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Answer extends z.ZodType = z.ZodType,
> {
  /** `feature.verb`; key into the table of who may call what */
  id: Id;
  method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Express path: `/api/orders/:id` */
  path: string;
  summary: string;
  params?: Params;
  query?: Query;
  body?: Body;
  /** status of success and the schema of its body */
  status: 200 | 201 | 204;
  answer?: Answer;
  /** media type of a file answer, instead of JSON */
  file?: 'application/pdf';
  /** needs an `Idempotency-Key` header */
  idempotent?: boolean;
}

/** Declares an endpoint, keeping the exact types of its schemas. */
export function endpoint<
  const Id extends string,
  Params extends z.ZodType = z.ZodUndefined,
  Query extends z.ZodType = z.ZodUndefined,
  Body extends z.ZodType = z.ZodUndefined,
  Answer extends z.ZodType = z.ZodUndefined,
>(definition: Endpoint<Id, Params, Query, Body, Answer>): Endpoint<Id, Params, Query, Body, Answer> {
  return definition;
}

/** What a use case receives of a request, parsed. */
export interface InputOf<E extends Endpoint> {
  params: z.output<NonNullable<E['params']>>;
  query: z.output<NonNullable<E['query']>>;
  body: z.output<NonNullable<E['body']>>;
}
/** What a caller sends, before defaults. */
export type ParamsOf<E extends Endpoint> = z.input<NonNullable<E['params']>>;
export type QueryOf<E extends Endpoint> = z.input<NonNullable<E['query']>>;
export type BodyOf<E extends Endpoint> = z.input<NonNullable<E['body']>>;
/** What comes back. */
export type AnswerOf<E extends Endpoint> = z.output<NonNullable<E['answer']>>;
