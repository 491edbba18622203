import { randomUUID } from 'node:crypto';
import { type ErrorRequestHandler, type Express, type RequestHandler, type Response, Router, text } from 'express';
import { Refusal } from '@shared/contracts/problems';
import { type Actor, type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';
import { type createAuthentication } from './authenticate';
import { readJson } from './read-json';
import { type FileAnswer, type Route } from './serve';
import { signInLimits } from './sign-in-limits';
import { toProblem } from './to-problem';

/** Largest JSON body; 500 lines of a schedule are about 400 kB. */
const BODY_LIMIT = '2mb';

const memberOf = (response: Response): Actor => (response.locals['member'] as Member | undefined) ?? null;

/** Gives each request a number that stands in the answer, in problems and in the log. */
export const numberRequest: RequestHandler = (_request, response, next) => {
  const requestId = randomUUID();
  response.locals['requestId'] = requestId;
  response.set('X-Request-Id', requestId);
  next();
};

/** Mounts every route below /api, with problems for whatever goes wrong. */
export function mountRoutes(
  app: Express,
  routes: readonly Route[],
  authentication: ReturnType<typeof createAuthentication>,
  dependencies: Dependencies,
): void {
  const router = Router({ caseSensitive: true });
  router.use('/api', (_request, response, next) => {
    response.set('Cache-Control', 'no-store');
    next();
  });
  router.use('/api', authentication.identify);
  const body = [demandJson, text({ type: 'application/json', limit: BODY_LIMIT }), parseJson];

  for (const route of routes) {
    const { endpoint } = route;
    const handlers: RequestHandler[] = endpoint.body ? [...body] : [];
    if (endpoint.id === 'session.sign-in') handlers.push(...signInLimits());
    router[endpoint.method.toLowerCase() as 'get'](endpoint.path, ...handlers, async (request, response) => {
      const actor = memberOf(response);
      if (actor && endpoint.method !== 'GET' && endpoint.id !== 'session.sign-in') authentication.demandXsrf(request, actor);
      const answer = await route.answer(
        actor,
        {
          params: request.params,
          query: request.query,
          body: request.body as unknown,
          idempotencyKey: request.get('idempotency-key'),
          userAgent: (request.get('user-agent') ?? '').slice(0, 200),
        },
        {
          userAgent: (request.get('user-agent') ?? '').slice(0, 200),
          startSession: (sessionId, personId) => authentication.startSession(response, sessionId, personId),
          endSession: () => authentication.endSession(response),
        },
        dependencies,
      );
      send(response, route, answer);
    });
  }

  router.use('/api', () => {
    throw new Refusal('not-found', 'There is no such call.');
  });
  router.use(problemHandler(dependencies));
  app.use(router);
}

function send(response: Response, { endpoint }: Route, answer: unknown): void {
  if (endpoint.status === 204) {
    response.status(204).end();
  } else if (endpoint.file) {
    const file = answer as FileAnswer;
    response.status(200).type(endpoint.file);
    response.set('Content-Disposition', `inline; filename="${file.fileName.replace(/[^\w.-]+/g, '-')}"`);
    response.send(Buffer.from(file.bytes));
  } else {
    response.status(endpoint.status).json(answer);
  }
}

const demandJson: RequestHandler = (request, _response, next) => {
  const hasBody = request.headers['transfer-encoding'] !== undefined || Number(request.headers['content-length'] ?? 0) > 0;
  const charset = /charset\s*=\s*"?([^\s;"]+)/i.exec(request.get('content-type') ?? '')?.[1];
  // JSON between systems is UTF-8 (RFC 8259, section 8.1); what reads other charsets reads UTF-7 too.
  if (charset && charset.toLowerCase() !== 'utf-8') throw new Refusal('wrong-media-type', 'Send JSON in UTF-8.');
  if (hasBody && !request.is('application/json')) throw new Refusal('wrong-media-type', 'Send application/json.');
  next();
};

const parseJson: RequestHandler = (request, _response, next) => {
  request.body = readJson(typeof request.body === 'string' ? request.body : '');
  next();
};

/** The one place where errors become answers; what we did not expect is logged whole, told in short. */
export function problemHandler({ log }: Pick<Dependencies, 'log'>): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    const requestId = String(response.locals['requestId'] ?? '');
    if (response.headersSent) return next(error);
    const { problem, expected } = toProblem(error, requestId);
    if (!expected) log.error({ err: error, requestId, path: request.path }, 'unexpected error');
    response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
  };
}
