import { and, asc, desc, eq, lte } from 'drizzle-orm';
import { type Db } from '../database/open-database';
import { type MailAttachment, outboxMails } from '../database/schema/mail';

/** What a use case says about a mail. */
export interface MailContent {
  /** the company in whose name it goes out */
  companyId: string;
  fromName: string;
  replyTo: string;
  /** one address */
  to: string;
  subject: string;
  /** plain text */
  body: string;
  attachments: MailAttachment[];
  /** what it is about, e.g. `quote` and its id */
  subjectKind: string;
  subjectId: string;
}

export interface NewMail extends MailContent {
  id: string;
  messageId: string;
  /** UTC epoch milliseconds */
  createdAt: number;
}

export type OutboxMail = typeof outboxMails.$inferSelect;

/** Rows of mails written and not yet, or already, sent. */
export function outboxStore(db: Db) {
  const mark = (id: string, change: Partial<typeof outboxMails.$inferInsert>) =>
    db
      .update(outboxMails)
      .set(change)
      .where(and(eq(outboxMails.id, id), eq(outboxMails.state, 'waiting')))
      .run();

  return {
    /**
     * Keeps a mail to be sent. Called inside the business transaction, so that the mail exists
     * exactly when what it speaks of does.
     */
    write: (mail: NewMail): void => {
      db.insert(outboxMails)
        .values({ ...mail, state: 'waiting', nextAttemptAt: mail.createdAt })
        .run();
    },

    /** Mails about one thing, newest first. */
    mailsAbout: (subjectKind: string, subjectId: string): OutboxMail[] =>
      db
        .select()
        .from(outboxMails)
        .where(and(eq(outboxMails.subjectKind, subjectKind), eq(outboxMails.subjectId, subjectId)))
        .orderBy(desc(outboxMails.createdAt), desc(outboxMails.id))
        .all(),

    /** Waiting mails whose next attempt has come, longest due first. */
    due: (now: number, limit: number): OutboxMail[] =>
      db
        .select()
        .from(outboxMails)
        .where(and(eq(outboxMails.state, 'waiting'), lte(outboxMails.nextAttemptAt, now)))
        .orderBy(asc(outboxMails.nextAttemptAt))
        .limit(limit)
        .all(),

    markSent: (id: string, attempts: number, sentAt: number) => mark(id, { state: 'sent', attempts, sentAt, lastError: null }),

    /** Another attempt is due at `nextAttemptAt`. */
    markDelayed: (id: string, attempts: number, nextAttemptAt: number, lastError: string) =>
      mark(id, { attempts, nextAttemptAt, lastError }),

    /** No attempt is made any more. */
    markFailed: (id: string, attempts: number, lastError: string) => mark(id, { state: 'failed', attempts, lastError }),
  };
}
export type OutboxStore = ReturnType<typeof outboxStore>;
