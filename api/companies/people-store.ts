import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import { type User } from '@shared/contracts/session';
import { type Db } from '../database/open-database';
import { companies, people, personRoles, sessions } from '../database/schema/companies';
import { type Member } from './actor';

/** Rows of people, their roles and sessions. */
export function peopleStore(db: Db) {
  const byEmail = db
    .select({ id: people.id, passwordHash: people.passwordHash, active: people.active })
    .from(people)
    .where(eq(sql`lower(${people.email})`, sql.placeholder('email')))
    .prepare();
  const bySession = db
    .select({
      personId: people.id,
      sessionId: sessions.id,
      name: people.name,
      email: people.email,
      orderLimitMinor: people.orderLimitMinor,
      companyId: companies.id,
      companyKind: companies.kind,
      companyName: companies.name,
      timeZone: companies.timeZone,
    })
    .from(sessions)
    .innerJoin(people, eq(people.id, sessions.personId))
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(
      and(
        eq(sessions.id, sql.placeholder('id')),
        isNull(sessions.revokedAt),
        gt(sessions.expiresAt, sql.placeholder('now')),
        eq(people.active, true),
      ),
    )
    .prepare();
  const byId = db
    .select({ person: people, company: companies })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(eq(people.id, sql.placeholder('id')))
    .prepare();
  const rolesOf = db
    .select({ role: personRoles.role })
    .from(personRoles)
    .where(eq(personRoles.personId, sql.placeholder('id')))
    .prepare();

  return {
    byEmail: (email: string) => byEmail.get({ email: email.toLowerCase() }),

    /** Who a living session belongs to; null when it ended, expired or its person was shut out. */
    memberOf: (sessionId: string, now: number): Member | null => {
      const found = bySession.get({ id: sessionId, now });
      return found ? { ...found, roles: rolesOf.all({ id: found.personId }).map(({ role }) => role) } : null;
    },

    /** @throws Error when there is no such person: ids come from a session */
    user: (personId: string): User => {
      const found = byId.get({ id: personId });
      if (!found) throw new Error(`no person ${personId}`);
      const { person, company } = found;
      return {
        id: person.id,
        name: person.name,
        email: person.email,
        roles: rolesOf.all({ id: personId }).map(({ role }) => role),
        company: {
          id: company.id,
          kind: company.kind,
          name: company.name,
          measureSystem: company.measureSystem,
          timeZone: company.timeZone,
          locale: company.locale,
        },
      };
    },

    name: (personId: string): string => db.select({ name: people.name }).from(people).where(eq(people.id, personId)).get()?.name ?? '',

    startSession: (row: typeof sessions.$inferInsert) => db.insert(sessions).values(row).run(),

    /** Ends a session of this person; false when it is not theirs or has ended. */
    revokeSession: (sessionId: string, personId: string, now: number): boolean =>
      db
        .update(sessions)
        .set({ revokedAt: now })
        .where(and(eq(sessions.id, sessionId), eq(sessions.personId, personId), isNull(sessions.revokedAt)))
        .run().changes > 0,

    livingSessions: (personId: string, now: number) =>
      db
        .select()
        .from(sessions)
        .where(and(eq(sessions.personId, personId), gt(sessions.expiresAt, now), isNull(sessions.revokedAt)))
        .all(),
  };
}
