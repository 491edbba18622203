import { type Dependencies } from '../dependencies';
import { type MailContent, type NewMail } from './outbox-store';

const oneLine = (text: string) => text.replace(/\p{Cc}+/gu, ' ').trim();

/**
 * Numbers and dates a mail for `stores.outbox.write`. Subject and sender's name become one
 * line: a line break in them would begin another header.
 *
 * @throws TypeError when `to` or `replyTo` is not a single address
 */
export function newMail({ newId, clock, config }: Pick<Dependencies, 'newId' | 'clock' | 'config'>, content: MailContent): NewMail {
  for (const address of [content.to, content.replyTo]) {
    if (!/^[^\s<>,;@\p{Cc}]+@[^\s<>,;@\p{Cc}]+$/u.test(address)) throw new TypeError('a mail goes to one address and is answered to one');
  }
  const id = newId();
  return {
    ...content,
    fromName: oneLine(content.fromName),
    subject: oneLine(content.subject),
    id,
    messageId: `<${id}@${config.mail.from.split('@')[1]}>`,
    createdAt: clock(),
  };
}
