import { and, asc, desc, eq, lte, sql } from 'drizzle-orm';
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

  // Written with every order and invoice: built once.
  const place = sql.placeholder;
  const insert = db
    .insert(outboxMails)
    .values({
      id: place('id'),
      companyId: place('companyId'),
      messageId: place('messageId'),
      fromName: place('fromName'),
      replyTo: place('replyTo'),
      to: place('to'),
      subject: place('subject'),
      body: place('body'),
      attachments: place('attachments'),
      subjectKind: place('subjectKind'),
      subjectId: place('subjectId'),
      state: 'waiting',
      nextAttemptAt: place('createdAt'),
      createdAt: place('createdAt'),
    })
    .prepare();

  return {
    /**
     * Keeps a mail to be sent. Called inside the business transaction, so that the mail exists
     * exactly when what it speaks of does.
     */
    write: (mail: NewMail): void => {
      insert.run({ ...mail });
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
