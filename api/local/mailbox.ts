import { randomUUID } from 'node:crypto';
import { createWriteStream, mkdirSync } from 'node:fs';
import { rename, rm } from 'node:fs/promises';
import { type AddressInfo } from 'node:net';
import { join } from 'node:path';
import { pipeline } from 'node:stream/promises';
import { SMTPServer } from 'smtp-server';
import { type Config } from '../config';

/** Larger than the PDF of a quote with 500 lines. */
const LARGEST_MAIL = 40 * 1024 * 1024;

export interface Mailbox {
  /** the port it listens on, the system's choice where port 0 was asked for */
  port: number;
  stop(): Promise<void>;
}

export const mailFolder = ({ dataDir }: Pick<Config, 'dataDir'>): string => join(dataDir, 'mail');

/**
 * A mail server on this machine that takes every mail and delivers none: it keeps each as a file
 * for `mailbox-routes` to show. Listens to this machine alone.
 *
 * @throws Error when the port is taken or the configuration sends mail elsewhere
 */
export async function startMailbox({ mail, dataDir }: Pick<Config, 'mail' | 'dataDir'>): Promise<Mailbox> {
  if (mail.kind !== 'local') throw new Error('the local mailbox is for MAIL=local');
  const folder = mailFolder({ dataDir });
  mkdirSync(folder, { recursive: true });
  const server = new SMTPServer({
    banner: 'Sealyard local mailbox',
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: LARGEST_MAIL,
    disableReverseLookup: true,
    onData: (stream, _session, done) => {
      // Under its name only once it is whole.
      const part = join(folder, `${randomUUID()}.part`);
      pipeline(stream, createWriteStream(part))
        .then(async () => {
          if (stream.sizeExceeded) {
            await rm(part, { force: true });
            throw Object.assign(new Error('too large'), { responseCode: 552 });
          }
          await rename(part, join(folder, `${String(Date.now()).padStart(13, '0')}-${randomUUID()}.eml`));
          done();
        })
        .catch((error: Error) => done(error));
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) => {
      reject(error.code === 'EADDRINUSE' ? new Error(`Port ${mail.port} is taken. Set LOCAL_SMTP_PORT to another one.`) : error);
    });
    server.listen(mail.port, '127.0.0.1', resolve);
  });
  // A client that hangs up in the middle is no fault of ours.
  server.on('error', () => undefined);
  return {
    port: (server.server.address() as AddressInfo).port,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  };
}
