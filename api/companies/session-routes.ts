import { listSessions, me, revokeSession, signIn, signOut } from '@shared/contracts/session';
import { Refusal } from '@shared/contracts/problems';
import { type Route, serve, serveAnyone } from '../http/serve';
import { signIn as signInUseCase } from './sign-in';

const iso = (at: number) => new Date(at).toISOString();

export const sessionRoutes: Route[] = [
  serveAnyone(signIn, signInUseCase),
  serve(me, (actor, _input, { stores }) => ({ user: stores.people.user(actor.personId) })),
  serve(signOut, (actor, _input, { stores, clock }, exchange) => {
    stores.people.revokeSession(actor.sessionId, actor.personId, clock());
    exchange.endSession();
  }),
  serve(listSessions, (actor, _input, { stores, clock }) => ({
    items: stores.people.livingSessions(actor.personId, clock()).map((session) => ({
      id: session.id,
      startedAt: iso(session.startedAt),
      expiresAt: iso(session.expiresAt),
      userAgent: session.userAgent,
      current: session.id === actor.sessionId,
    })),
    nextCursor: null,
  })),
  serve(revokeSession, (actor, { params }, { stores, clock }) => {
    if (!stores.people.revokeSession(params.id, actor.personId, clock()))
      throw new Refusal('not-found', 'There is no such session of yours.');
  }),
];
