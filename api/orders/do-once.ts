import { createHash } from 'node:crypto';
import { Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';

/** A call that may come twice: its endpoint, the caller's key, and what was asked. */
export interface RepeatableCall {
  endpoint: string;
  /** keys belong to the person who sends them */
  key: string;
  /** parsed parameters and body */
  request: unknown;
}

/**
 * Runs `work` in one immediate transaction, once for each key of a person; the same request
 * with the same key again finds what was made the first time.
 *
 * @param work makes something and answers its id, from which the answer is read
 * @returns the id of what was made now or then
 * @throws Refusal `key-reused` when the key came with another request; whatever `work` throws,
 *   and then the key is not used up
 */
export function doOnce(
  actor: Member,
  { endpoint, key, request }: RepeatableCall,
  { database, stores, clock }: Pick<Dependencies, 'database' | 'stores' | 'clock'>,
  work: () => string,
): string {
  const requestHash = createHash('sha256')
    .update(JSON.stringify([endpoint, request]))
    .digest('base64url');
  return database.immediately(() => {
    const seen = stores.idempotency.find(actor.personId, key);
    if (seen) {
      if (seen.requestHash !== requestHash) throw new Refusal('key-reused', 'Use a new Idempotency-Key for another request.');
      return seen.subjectId;
    }
    const subjectId = work();
    stores.idempotency.keep({ personId: actor.personId, key, endpoint, requestHash, subjectId, createdAt: clock() });
    return subjectId;
  });
}
