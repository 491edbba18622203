import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { companies } from './companies';
import { id, instant, json, oneOf } from './columns';

/** A document to attach, made when the mail is sent. */
export interface MailAttachment {
  kind: 'quote' | 'order' | 'invoice';
  id: string;
  prices?: 'wholesale' | 'retail';
  fileName: string;
}

/** Mails are written inside the business transaction and sent by a worker. */
export const outboxMails = sqliteTable(
  'outbox_mails',
  {
    id: id(),
    companyId: text('company_id')
      .notNull()
      .references(() => companies.id),
    /** the same on every attempt, so that a duplicate is known as one */
    messageId: text('message_id').notNull(),
    fromName: text('from_name').notNull(),
    replyTo: text('reply_to').notNull(),
    to: text('to_address').notNull(),
    subject: text('subject').notNull(),
    body: text('body').notNull(),
    attachments: json<MailAttachment[]>('attachments').notNull(),
    /** what it is about, e.g. quote and its id */
    subjectKind: text('subject_kind').notNull(),
    subjectId: text('subject_id').notNull(),
    state: text('state', { enum: ['waiting', 'sent', 'failed'] }).notNull(),
    attempts: integer('attempts').notNull().default(0),
    nextAttemptAt: instant('next_attempt_at').notNull(),
    createdAt: instant('created_at').notNull(),
    sentAt: instant('sent_at'),
    lastError: text('last_error'),
  },
  (t) => [
    oneOf('outbox_mails_state', t.state, ['waiting', 'sent', 'failed']),
    uniqueIndex('outbox_mails_by_message').on(t.messageId),
    index('outbox_mails_due').on(t.state, t.nextAttemptAt),
    index('outbox_mails_by_subject').on(t.subjectKind, t.subjectId),
  ],
);
