import { open, readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { type ParsedMail, simpleParser } from 'mailparser';

/** A mail as the list shows it. */
export interface MailSummary {
  name: string;
  receivedAt: Date;
  from: string;
  to: string;
  subject: string;
}

export interface StoredMail extends MailSummary {
  replyTo: string;
  messageId: string;
  text: string;
  attachments: { fileName: string; contentType: string; bytes: Uint8Array }[];
}

const NAME = /^\d{13}-[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/;
/** Headers come first and are far shorter than this. */
const HEAD_BYTES = 32 * 1024;

/** The mails that the local mailbox has kept, read from their files. */
export function storedMails(folder: string) {
  const names = async (): Promise<string[]> => {
    const files = await readdir(folder).catch((error: NodeJS.ErrnoException) => {
      if (error.code === 'ENOENT') return [];
      throw error;
    });
    return files
      .filter((file) => file.endsWith('.eml'))
      .map((file) => file.slice(0, -'.eml'.length))
      .filter((name) => NAME.test(name))
      .sort()
      .reverse();
  };
  const head = async (name: string): Promise<MailSummary> => {
    const file = await open(join(folder, `${name}.eml`));
    try {
      const { buffer, bytesRead } = await file.read(Buffer.alloc(HEAD_BYTES), 0, HEAD_BYTES, 0);
      const text = buffer.subarray(0, bytesRead).toString('latin1');
      const end = text.search(/\r?\n\r?\n/);
      return summaryOf(name, await simpleParser(Buffer.from(end < 0 ? text : text.slice(0, end), 'latin1')));
    } finally {
      await file.close();
    }
  };

  return {
    /** Newest first, from the one before `before`; `older` when there are more. */
    list: async (limit: number, before?: string): Promise<{ mails: MailSummary[]; older: string | null }> => {
      const all = (await names()).filter((name) => before === undefined || name < before);
      const shown = all.slice(0, limit);
      return { mails: await Promise.all(shown.map(head)), older: all.length > limit ? (shown.at(-1) ?? null) : null };
    },

    /** One mail; null when there is none of this name. */
    read: async (name: string): Promise<StoredMail | null> => {
      if (!NAME.test(name)) return null;
      const bytes = await readFile(join(folder, `${name}.eml`)).catch((error: NodeJS.ErrnoException) => {
        if (error.code === 'ENOENT') return null;
        throw error;
      });
      if (!bytes) return null;
      const mail = await simpleParser(bytes);
      return {
        ...summaryOf(name, mail),
        replyTo: mail.replyTo?.text ?? '',
        messageId: mail.messageId ?? '',
        text: mail.text ?? '',
        attachments: mail.attachments.map(({ filename, contentType, content }, i) => {
          return { fileName: filename ?? `attachment-${i + 1}`, contentType, bytes: content };
        }),
      };
    },
  };
}

function summaryOf(name: string, mail: ParsedMail): MailSummary {
  const to = [mail.to ?? []].flat().map(({ text }) => text);
  return {
    name,
    receivedAt: new Date(Number(name.slice(0, 13))),
    from: mail.from?.text ?? '',
    to: to.join(', '),
    subject: mail.subject ?? '',
  };
}
