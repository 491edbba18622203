import * as z from 'zod';

/** Every problem the API answers with (RFC 9457, July 2023). The key is the last part of `type`. */
export const problems = {
  'not-signed-in': { status: 401, title: 'Sign in first' },
  'wrong-credentials': { status: 401, title: 'E-mail or password is wrong' },
  'not-allowed': { status: 403, title: 'Your role does not include this' },
  'xsrf-missing': { status: 403, title: 'The request does not carry the XSRF header' },
  'not-found': { status: 404, title: 'Not found' },
  'not-in-this-state': { status: 409, title: 'Not possible in this state' },
  'changed-meanwhile': { status: 409, title: 'Someone changed this meanwhile' },
  'price-changed': { status: 409, title: 'The price is no longer the one shown' },
  'quote-expired': { status: 409, title: 'The quote is no longer valid' },
  'no-price-list': { status: 409, title: 'No price list is in force' },
  'over-credit': { status: 409, title: 'The order is above the credit available' },
  'account-on-hold': { status: 409, title: 'The trade account is on hold' },
  overdue: { status: 409, title: 'Invoices are overdue' },
  'account-not-open': { status: 409, title: 'The trade account is not open' },
  'cannot-build': { status: 409, title: 'The maker cannot build this' },
  'card-not-taken': { status: 409, title: 'This maker takes no cards' },
  'in-progress': { status: 409, title: 'The same request is still being worked on' },
  'too-large': { status: 413, title: 'Too large' },
  'wrong-media-type': { status: 415, title: 'Not a media type this takes' },
  invalid: { status: 422, title: 'Some of this cannot be used' },
  'key-reused': { status: 422, title: 'The idempotency key was used for another request' },
  'not-readable': { status: 400, title: 'The request cannot be read' },
  'too-many': { status: 429, title: 'Too many requests' },
  unexpected: { status: 500, title: 'Something went wrong on our side' },
  unavailable: { status: 503, title: 'Not ready yet' },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemCode = keyof typeof problems;

export const problemSchema = z
  .object({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    detail: z.string(),
    errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
    requestId: z.string().optional(),
  })
  .loose()
  .meta({ id: 'Problem' });
export type Problem = z.infer<typeof problemSchema>;

/** A field of the request and what is wrong with it; `pointer` is a JSON pointer (RFC 6901). */
export interface FieldError {
  pointer: string;
  detail: string;
}

/**
 * What a use case throws when it will not do what it was asked. Turned into a problem in one
 * place. `extra` joins the problem's members, for what a client needs to offer a way out.
 */
export class Refusal extends Error {
  constructor(
    readonly code: ProblemCode,
    detail: string,
    readonly errors: FieldError[] = [],
    readonly extra: Record<string, unknown> = {},
  ) {
    super(detail);
    this.name = 'Refusal';
  }
}

/** Path segments as a JSON pointer, escaped (RFC 6901). */
export function pointer(...segments: (string | number | symbol)[]): string {
  return segments.map((segment) => `/${String(segment).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
}
