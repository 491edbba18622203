import { type MailAttachment } from '../database/schema/mail';
import { type Dependencies } from '../dependencies';
import { type MailSender } from './mail-sender';
import { type OutboxMail } from './outbox-store';

/** Makes the document to attach, as PDF, as the company that sends it has it. @throws Error when it has no such document */
export type RenderAttachment = (attachment: MailAttachment, companyId: string) => Promise<Uint8Array>;

const FIRST_DELAY_MS = 60_000;
const LONGEST_DELAY_MS = 6 * 60 * 60_000;
export const ATTEMPTS = 12;
const BATCH = 20;

/** How long to wait after so many attempts in vain: a minute, then twice as long each time, up to six hours. */
export function delayAfter(attempts: number): number {
  return Math.min(FIRST_DELAY_MS * 2 ** (attempts - 1), LONGEST_DELAY_MS);
}

/**
 * Sends the mails that are due, one after another, and marks each. A mail that could not be sent
 * is due again later; after the last attempt it stays as failed. Should the process end between
 * sending and marking, the mail goes out again under the same Message-ID: none is lost.
 *
 * @param signal stops before the next mail
 * @returns how many were sent
 */
export async function sendDueMails(
  { stores, clock, log }: Pick<Dependencies, 'stores' | 'clock' | 'log'>,
  sender: MailSender,
  renderAttachment: RenderAttachment,
  signal?: AbortSignal,
): Promise<number> {
  let sent = 0;
  for (const mail of stores.outbox.due(clock(), BATCH)) {
    if (signal?.aborted) break;
    const attempts = mail.attempts + 1;
    try {
      await sender.send(await complete(mail, renderAttachment));
    } catch (error) {
      const reason = (error instanceof Error ? error.message : String(error)).slice(0, 300);
      // The server's answer may name people: the log has the number alone.
      log.error({ mail: mail.id, attempts, code: (error as { code?: unknown }).code }, 'mail not sent');
      if (attempts >= ATTEMPTS) stores.outbox.markFailed(mail.id, attempts, reason);
      else stores.outbox.markDelayed(mail.id, attempts, clock() + delayAfter(attempts), reason);
      continue;
    }
    stores.outbox.markSent(mail.id, attempts, clock());
    sent += 1;
  }
  return sent;
}

async function complete(mail: OutboxMail, renderAttachment: RenderAttachment) {
  const attachments = [];
  for (const attachment of mail.attachments) {
    attachments.push({
      fileName: attachment.fileName,
      contentType: 'application/pdf',
      bytes: await renderAttachment(attachment, mail.companyId),
    });
  }
  const { messageId, fromName, replyTo, to, subject, body } = mail;
  return { messageId, fromName, replyTo, to, subject, body, writtenAt: new Date(mail.createdAt), attachments };
}
