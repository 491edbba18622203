import { createHmac, timingSafeEqual } from 'node:crypto';
import { type CookieOptions, type Request as HttpRequest, type RequestHandler, type Response } from 'express';
import jwt from 'jsonwebtoken';
import { Passport } from 'passport';
import { Strategy } from 'passport-jwt';
import { Refusal } from '@shared/contracts/problems';
import { type Member } from '../companies/actor';
import { type Dependencies } from '../dependencies';

const ISSUER = 'sealyard';
/** A session idle for this long has to sign in again. */
const TOKEN_SECONDS = 2 * 60 * 60;
/** A token older than this is renewed by the next request. */
const RENEW_AFTER_SECONDS = 10 * 60;

interface Token {
  sub: string;
  jti: string;
  iat: number;
}

export interface SignedIn {
  member: Member;
  issuedAt: number;
}

/** The only place that knows of tokens and cookies. */
export function createAuthentication({
  config,
  clock,
  findMember,
}: Pick<Dependencies, 'config' | 'clock'> & { findMember: (sessionId: string) => Member | null }) {
  const sessionCookie = config.production ? '__Host-sealyard' : 'sealyard-session';
  const base: CookieOptions = { path: '/', sameSite: 'lax', secure: config.production };
  const passport = new Passport();
  passport.use(
    new Strategy(
      {
        jwtFromRequest: (request: HttpRequest) => (request.cookies as Record<string, string> | undefined)?.[sessionCookie] ?? null,
        secretOrKey: config.sessionSecret,
        algorithms: ['HS256'],
        issuer: ISSUER,
      },
      (token: Token, done: (error: unknown, found: SignedIn | false) => void) => {
        const member = findMember(token.jti);
        done(null, member && member.personId === token.sub ? { member, issuedAt: token.iat } : false);
      },
    ),
  );

  const xsrfOf = (sessionId: string) => createHmac('sha256', config.sessionSecret).update(`xsrf:${sessionId}`).digest('base64url');

  function startSession(response: Response, sessionId: string, personId: string): void {
    const token = jwt.sign({}, config.sessionSecret, {
      algorithm: 'HS256',
      issuer: ISSUER,
      subject: personId,
      jwtid: sessionId,
      expiresIn: TOKEN_SECONDS,
    });
    response.cookie(sessionCookie, token, { ...base, httpOnly: true });
    response.cookie('XSRF-TOKEN', xsrfOf(sessionId), base);
  }

  function endSession(response: Response): void {
    response.clearCookie(sessionCookie, { ...base, httpOnly: true });
    response.clearCookie('XSRF-TOKEN', base);
  }

  /** Finds who asks; a wrong, expired or revoked token makes a visitor of them. */
  const identify: RequestHandler = (request, response, next) => {
    const check = passport.authenticate('jwt', { session: false }, (error: unknown, found: SignedIn | false) => {
      if (error) return next(error);
      if (found) {
        response.locals['member'] = found.member;
        if (clock() / 1000 - found.issuedAt > RENEW_AFTER_SECONDS) startSession(response, found.member.sessionId, found.member.personId);
      }
      next();
    }) as RequestHandler;
    return check(request, response, next);
  };

  /** Refuses a change that a signed-in browser was tricked into. */
  function demandXsrf(request: HttpRequest, member: Member): void {
    const sent = Buffer.from(request.get('x-xsrf-token') ?? '');
    const due = Buffer.from(xsrfOf(member.sessionId));
    if (sent.length !== due.length || !timingSafeEqual(sent, due)) {
      throw new Refusal('xsrf-missing', 'Send the XSRF-TOKEN cookie back in the X-XSRF-TOKEN header.');
    }
  }

  return { identify, demandXsrf, startSession, endSession };
}
