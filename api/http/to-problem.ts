import { type Problem, problems, Refusal } from '@shared/contracts/problems';

/** Turns whatever was thrown into a problem (RFC 9457); null when it is our own fault and must be logged. */
export function toProblem(error: unknown, requestId: string): { problem: Problem; expected: boolean } {
  const refusal = error instanceof Refusal ? error : fromExpress(error);
  const code = refusal?.code ?? 'unexpected';
  const { status, title } = problems[code];
  return {
    expected: refusal !== null,
    problem: {
      ...refusal?.extra,
      type: `/problems/${code}`,
      title,
      status,
      detail: refusal?.message ?? `Nothing was changed. If it happens again, tell us this number: ${requestId}`,
      ...(refusal && refusal.errors.length > 0 ? { errors: refusal.errors } : {}),
      requestId,
    },
  };
}

/** Errors that body parsing raises carry a `type`; anything else is not a refusal. */
function fromExpress(error: unknown): Refusal | null {
  if (typeof error !== 'object' || error === null || !('type' in error)) return null;
  switch (error.type) {
    case 'entity.too.large':
      return new Refusal('too-large', 'The request is larger than this call takes.', [{ pointer: '/', detail: 'too large' }]);
    case 'encoding.unsupported':
    case 'charset.unsupported':
      return new Refusal('wrong-media-type', 'Send JSON in UTF-8.');
    case 'request.aborted':
    case 'request.size.invalid':
      return new Refusal('not-readable', 'The request ended early.');
    default:
      return null;
  }
}
