import { type z } from 'zod';
import { type AnswerOf, type Endpoint, type InputOf } from '@shared/contracts/endpoint';
import { type EndpointId } from '@shared/contracts/endpoints';
import { type FieldError, pointer, Refusal } from '@shared/contracts/problems';
import { mayCall, whoMayCall } from '@shared/contracts/who-may-call';
import { type Actor, type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';

/** A request as far as use cases may know of it, whoever carried it. */
export interface Request {
  params: unknown;
  query: unknown;
  body: unknown;
  idempotencyKey: string | undefined;
  userAgent: string;
}

/** What a session use case may do to the answer. */
export interface Exchange {
  userAgent: string;
  startSession(sessionId: string, personId: string): void;
  endSession(): void;
}

/** A document as a use case answers it. */
export interface FileAnswer {
  fileName: string;
  bytes: Uint8Array;
}

export interface Route {
  endpoint: Endpoint;
  /** Checks permission, parses, runs the use case. @throws Refusal */
  answer(actor: Actor, request: Request, exchange: Exchange, dependencies: Dependencies): Promise<unknown>;
}

export type Input<E extends Endpoint> = InputOf<E> & {
  /** set on every endpoint declared idempotent */
  idempotencyKey: string;
};

/** JSON of the contract's type; where the contract has none, nothing or a document. */
type Answering<E extends Endpoint> = AnswerOf<E> extends undefined ? FileAnswer | void : AnswerOf<E>;

type UseCase<E extends Endpoint, Who> = (
  actor: Who,
  input: Input<E>,
  dependencies: Dependencies,
  exchange: Exchange,
) => Answering<E> | Promise<Answering<E>>;

/** Binds an endpoint for signed-in callers to its use case. */
export function serve<E extends Endpoint>(endpoint: E, useCase: UseCase<E, Member>): Route {
  if (whoMayCall[endpoint.id as EndpointId] === 'anyone') throw new Error(`${endpoint.id} is open to visitors: use serveAnyone`);
  return route(endpoint, (actor, input, dependencies, exchange) => {
    if (!actor) throw new Refusal('not-signed-in', 'Your session has ended or you are not signed in.');
    return useCase(actor, input, dependencies, exchange);
  });
}

/** Binds an endpoint that visitors may call too. */
export function serveAnyone<E extends Endpoint>(endpoint: E, useCase: UseCase<E, Actor>): Route {
  return route(endpoint, useCase);
}

function route<E extends Endpoint>(endpoint: E, useCase: UseCase<E, Actor>): Route {
  return {
    endpoint,
    answer: async (actor, request, exchange, dependencies) => {
      permit(endpoint, actor);
      const input = parseInput(endpoint, request);
      return useCase(actor, input, dependencies, exchange);
    },
  };
}

function permit(endpoint: Endpoint, actor: Actor): void {
  const id = endpoint.id as EndpointId;
  if (mayCall(id, actor?.roles ?? [])) return;
  if (!actor) throw new Refusal('not-signed-in', 'Your session has ended or you are not signed in.');
  throw new Refusal('not-allowed', `This is not for ${actor.roles.join(', ')}.`);
}

function parseInput<E extends Endpoint>(endpoint: E, request: Request): Input<E> {
  const errors: FieldError[] = [];
  const parse = (schema: z.ZodType | undefined, value: unknown) => {
    if (!schema) return undefined;
    const result = schema.safeParse(value);
    if (!result.success) errors.push(...result.error.issues.flatMap(fieldErrors));
    return result.data;
  };
  const params = endpoint.params?.safeParse(request.params);
  if (params && !params.success) throw new Refusal('not-found', 'There is nothing at this address.');
  const query = parse(endpoint.query, request.query);
  const body = parse(endpoint.body, request.body);
  const key = request.idempotencyKey;
  if (endpoint.idempotent && (key === undefined || !/^[\x21-\x7e]{8,200}$/.test(key))) {
    errors.push({ pointer: '/Idempotency-Key', detail: 'this call needs an Idempotency-Key header of 8 to 200 visible characters' });
  }
  if (errors.length > 0) {
    const first = errors[0];
    throw new Refusal(
      'invalid',
      errors.length === 1 && first ? `${first.pointer}: ${first.detail}` : `${errors.length} fields cannot be used.`,
      errors,
    );
  }
  return { params: params?.data, query, body, idempotencyKey: key ?? '' } as unknown as Input<E>;
}

/** A zod issue as field errors; an unknown key is reported at the key, a union at its first branch that fits best. */
function fieldErrors(issue: z.core.$ZodIssue): FieldError[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({ pointer: pointer(...issue.path, key), detail: 'is not known here' }));
  }
  const at = issue.path.length > 0 ? pointer(...issue.path) : '/';
  return [{ pointer: at, detail: issue.message }];
}
