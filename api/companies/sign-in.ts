import { type signIn as signInEndpoint } from '@shared/contracts/session';
import { type AnswerOf } from '@shared/contracts/endpoint';
import { Refusal } from '@shared/contracts/problems';
import { type Dependencies } from '../dependencies';
import { type Exchange, type Input } from '../http/serve';
import { type Actor } from './actor';
import { decoyHash, verifyPassword } from './passwords';

/** However often a token is renewed, after this long one signs in again. */
const SESSION_MS = 14 * 60 * 60 * 1000;

/**
 * Starts a session. An unknown address, a wrong password and a person shut out get the same
 * answer after the same work.
 */
export async function signIn(
  _actor: Actor,
  { body }: Input<typeof signInEndpoint>,
  { stores, clock, newId }: Dependencies,
  exchange: Exchange,
): Promise<AnswerOf<typeof signInEndpoint>> {
  const person = stores.people.byEmail(body.email);
  const right = await verifyPassword(person?.passwordHash ?? (await decoyHash()), body.password);
  if (!person || !right || !person.active) {
    throw new Refusal('wrong-credentials', 'This e-mail address and password do not belong together.');
  }
  const now = clock();
  const sessionId = newId();
  stores.people.startSession({
    id: sessionId,
    personId: person.id,
    startedAt: now,
    expiresAt: now + SESSION_MS,
    userAgent: exchange.userAgent,
  });
  exchange.startSession(sessionId, person.id);
  return { user: stores.people.user(person.id) };
}
