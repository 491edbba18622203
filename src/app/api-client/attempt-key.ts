import { type ProblemError } from './problem-error';

/**
 * The idempotency key of one attempt. As long as it is not known whether the server took the
 * call, the same request goes out under the same key again, so that it can take effect only
 * once; a changed request, or one after a clear answer, is a new attempt.
 */
export class AttemptKey {
  private open: { key: string; request: string } | undefined;

  /** The key for this request. @param request all that is sent, as a plain value */
  for(request: unknown): string {
    const text = JSON.stringify(request);
    if (this.open?.request !== text) this.open = { key: newKey(), request: text };
    return this.open.key;
  }

  /** The server answered, or could not be asked: only in doubt is the key kept. */
  settle(problem: ProblemError | null): void {
    const inDoubt =
      problem !== null && (problem.status === 0 || problem.status >= 500 || problem.status === 429 || problem.code === 'in-progress');
    if (!inDoubt) this.open = undefined;
  }
}

/** 128 random bits in hexadecimal; unlike `randomUUID` also at hand where the page came without TLS. */
function newKey(): string {
  return [...crypto.getRandomValues(new Uint8Array(16))].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}
