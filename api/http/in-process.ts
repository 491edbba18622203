import { match, type MatchFunction } from 'path-to-regexp';
import { Refusal } from '@shared/contracts/problems';
import { type Dependencies } from '../dependencies';
import { type Exchange, type Route } from './serve';
import { toProblem } from './to-problem';

/**
 * The API for callers in the same process, such as server rendering: routes are matched,
 * permitted and parsed as over HTTP, as a visitor.
 */
export function createInProcess(routes: readonly Route[], dependencies: Dependencies) {
  const matchers: [Route, MatchFunction<Record<string, string>>][] = routes.map((route) => [
    route,
    match<Record<string, string>>(route.endpoint.path),
  ]);
  const noSession: Exchange = {
    userAgent: '',
    startSession: () => {
      throw new Error('no session can start without a browser');
    },
    endSession: () => undefined,
  };
  return {
    answer: async ({ method, url, body }: { method: string; url: string; body: unknown }): Promise<{ status: number; body: unknown }> => {
      const { pathname, searchParams } = new URL(url, 'http://in-process');
      try {
        for (const [route, matches] of matchers) {
          const found = route.endpoint.method === method && matches(pathname);
          if (!found) continue;
          const request = { params: found.params, query: Object.fromEntries(searchParams), body, idempotencyKey: undefined, userAgent: '' };
          return { status: route.endpoint.status, body: await route.answer(null, request, noSession, dependencies) };
        }
        throw new Refusal('not-found', 'There is no such call.');
      } catch (error) {
        const { problem, expected } = toProblem(error, 'in-process');
        if (!expected) dependencies.log.error({ err: error, path: pathname }, 'unexpected error');
        return { status: problem.status, body: problem };
      }
    },
  };
}
