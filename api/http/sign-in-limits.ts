import { type RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { Refusal } from '@shared/contracts/problems';

const WINDOW_MS = 15 * 60 * 1000;

/** Failed sign-ins are limited by the address they come from and by the account they try. */
export function signInLimits(): RequestHandler[] {
  const limiter = (limit: number, keyGenerator: (request: Parameters<RequestHandler>[0]) => string) =>
    rateLimit({
      windowMs: WINDOW_MS,
      limit,
      skipSuccessfulRequests: true,
      standardHeaders: 'draft-8',
      legacyHeaders: false,
      keyGenerator,
      handler: (_request, response) => {
        response.set('Retry-After', String(WINDOW_MS / 1000));
        throw new Refusal('too-many', 'Too many failed sign-ins. Wait a quarter of an hour and try again.');
      },
    });
  return [
    limiter(50, (request) => ipKeyGenerator(request.ip ?? '')),
    limiter(10, (request) => `account:${accountOf(request.body).trim().toLowerCase()}`),
  ];
}

function accountOf(body: unknown): string {
  return typeof body === 'object' && body !== null && 'email' in body && typeof body.email === 'string' ? body.email.slice(0, 254) : '';
}
