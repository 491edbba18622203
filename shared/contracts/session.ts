import * as z from 'zod';
import { endpoint } from './endpoint';
import { id, instant } from './primitives';

/** Sign-in, and who is signed in. */

export const roles = ['buyer', 'dealer-admin', 'sales', 'accounts', 'plant', 'fabricator-admin', 'operator'] as const;
export const role = z.enum(roles);
export type Role = z.infer<typeof role>;

export const companyKinds = ['dealer', 'fabricator', 'market'] as const;
export const companyKind = z.enum(companyKinds);
export type CompanyKind = z.infer<typeof companyKind>;

/** Which roles a company of a kind can give. */
export const rolesOf: Record<CompanyKind, readonly Role[]> = {
  dealer: ['buyer', 'dealer-admin'],
  fabricator: ['sales', 'accounts', 'plant', 'fabricator-admin'],
  market: ['operator'],
};

export const userSchema = z
  .object({
    id,
    name: z.string(),
    email: z.string(),
    roles: z.array(role),
    company: z.object({
      id,
      kind: companyKind,
      name: z.string(),
      measureSystem: z.enum(['imperial', 'metric']),
      timeZone: z.string(),
      locale: z.string(),
    }),
  })
  .meta({ id: 'User' });
export type User = z.infer<typeof userSchema>;

export const signIn = endpoint({
  id: 'session.sign-in',
  method: 'POST',
  path: '/api/auth/sign-in',
  summary: 'Sign in with e-mail and password; sets the session cookie and XSRF-TOKEN',
  body: z.strictObject({ email: z.string().trim().min(3).max(254), password: z.string().min(1).max(200) }),
  status: 200,
  answer: z.object({ user: userSchema }),
});

export const me = endpoint({
  id: 'session.me',
  method: 'GET',
  path: '/api/auth/me',
  summary: 'Who is signed in',
  status: 200,
  answer: z.object({ user: userSchema }),
});

export const signOut = endpoint({
  id: 'session.sign-out',
  method: 'POST',
  path: '/api/auth/sign-out',
  summary: 'End this session, on the server too',
  status: 204,
});

const sessionItem = z.object({ id, startedAt: instant, expiresAt: instant, userAgent: z.string(), current: z.boolean() });

export const listSessions = endpoint({
  id: 'session.list',
  method: 'GET',
  path: '/api/auth/sessions',
  summary: 'Own sessions that have not ended',
  status: 200,
  answer: z.object({ items: z.array(sessionItem), nextCursor: z.null() }),
});

export const revokeSession = endpoint({
  id: 'session.revoke',
  method: 'DELETE',
  path: '/api/auth/sessions/:id',
  summary: 'End one of one’s own sessions',
  params: z.object({ id }),
  status: 204,
});
