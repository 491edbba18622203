import { createTransport } from 'nodemailer';
import { type Config } from '../config';

export interface OutgoingMail {
  messageId: string;
  fromName: string;
  replyTo: string;
  to: string;
  subject: string;
  /** plain text */
  body: string;
  writtenAt: Date;
  attachments: { fileName: string; contentType: string; bytes: Uint8Array }[];
}

export interface MailSender {
  /** @throws Error when the server does not take the mail */
  send(mail: OutgoingMail): Promise<void>;
  close(): void;
}

/** Sends over SMTP: to the server of the configuration, or to the local mailbox on this machine. */
export function createMailSender(mail: Config['mail']): MailSender {
  const timeouts = { connectionTimeout: 10_000, greetingTimeout: 10_000, socketTimeout: 60_000 };
  const transport =
    mail.kind === 'smtp'
      ? createTransport({ ...timeouts, url: mail.url })
      : createTransport({ ...timeouts, host: '127.0.0.1', port: mail.port, secure: false, ignoreTLS: true });
  return {
    send: async ({ messageId, fromName, replyTo, to, subject, body, writtenAt, attachments }) => {
      await transport.sendMail({
        messageId,
        // Address objects are not parsed, so that a comma or a bracket in a name makes no second address.
        from: { name: fromName, address: mail.from },
        replyTo: { name: '', address: replyTo },
        to: { name: '', address: to },
        subject,
        text: body,
        date: writtenAt,
        attachments: attachments.map(({ fileName, contentType, bytes }) => ({
          filename: fileName,
          contentType,
          content: Buffer.from(bytes),
        })),
        disableFileAccess: true,
        disableUrlAccess: true,
      });
    },
    close: () => transport.close(),
  };
}
