import { type MailSender, type OutgoingMail } from '@api/mail/mail-sender';
import { newMail } from '@api/mail/new-mail';
import { type MailContent } from '@api/mail/outbox-store';
import { ATTEMPTS, delayAfter, sendDueMails } from '@api/mail/send-due-mails';
import { startMailWorker } from '@api/mail/mail-worker';
import { type Market, marketFactory } from '../factories/market-factory';

const MINUTE = 60_000;
const pdf = async () => new TextEncoder().encode('%PDF-');

const content = (change: Partial<MailContent> = {}): MailContent => ({
  companyId: 'ottery',
  fromName: 'Ottery Glass & Sash',
  replyTo: 'buyer@ottery.example',
  to: 'customer@home.example',
  subject: 'Your windows',
  body: 'Dear customer,\n\nhere is our quote.',
  attachments: [{ kind: 'quote', id: 'q1', prices: 'retail', fileName: 'Q-1.pdf' }],
  subjectKind: 'quote',
  subjectId: 'q1',
  ...change,
});

/** Takes every mail; `fails` says which attempts it refuses. */
function senderFactory(fails: (attempt: number) => boolean = () => false) {
  const sent: OutgoingMail[] = [];
  let attempts = 0;
  const sender: MailSender = {
    send: async (mail) => {
      attempts += 1;
      if (fails(attempts)) throw new Error('connection refused');
      sent.push(mail);
    },
    close: () => undefined,
  };
  return { sender, sent, attempts: () => attempts };
}

describe('outbox', () => {
  let market: Market;
  const write = (change?: Partial<MailContent>) => market.dependencies.stores.outbox.write(newMail(market.dependencies, content(change)));
  const about = () => market.dependencies.stores.outbox.mailsAbout('quote', 'q1');

  beforeEach(async () => {
    market = await marketFactory();
  });
  afterEach(() => market.close());

  it('loses a mail together with the transaction it was written in, and keeps it with one that held', () => {
    const { database } = market.dependencies;
    expect(() =>
      database.immediately(() => {
        write();
        throw new Error('credit does not reach');
      }),
    ).toThrow('credit does not reach');
    expect(about()).toEqual([]);
    database.immediately(() => write());
    expect(about()).toMatchObject([{ state: 'waiting', attempts: 0, subject: 'Your windows' }]);
  });

  it('sends what is due once, with its attachment, and marks it', async () => {
    write();
    const { sender, sent } = senderFactory();
    const asked: unknown[] = [];
    const render = async (attachment: unknown) => {
      asked.push(attachment);
      return pdf();
    };
    expect(await sendDueMails(market.dependencies, sender, render)).toBe(1);
    expect(await sendDueMails(market.dependencies, sender, render)).toBe(0);
    expect(asked).toEqual([{ kind: 'quote', id: 'q1', prices: 'retail', fileName: 'Q-1.pdf' }]);
    expect(sent).toHaveLength(1);
    expect(sent[0]).toMatchObject({ to: 'customer@home.example', attachments: [{ fileName: 'Q-1.pdf', contentType: 'application/pdf' }] });
    expect(about()).toMatchObject([{ state: 'sent', attempts: 1, sentAt: market.clock.now, lastError: null }]);
  });

  it('sends a mail again under the same Message-ID when the process ends between sending and marking', async () => {
    write();
    const { sender, sent } = senderFactory();
    const { stores } = market.dependencies;
    const crashing = {
      ...market.dependencies,
      stores: {
        ...stores,
        outbox: {
          ...stores.outbox,
          markSent: () => {
            throw new Error('power cut');
          },
        },
      },
    };
    await expect(sendDueMails(crashing, sender, pdf)).rejects.toThrow('power cut');
    expect(await sendDueMails(market.dependencies, sender, pdf)).toBe(1);
    expect(sent).toHaveLength(2);
    expect(sent[0]!.messageId).toMatch(/^<[\w-]+@sealyard\.example>$/);
    expect(sent[1]).toEqual(sent[0]);
    expect(about()).toMatchObject([{ state: 'sent' }]);
  });

  it('waits longer after each attempt in vain, and tries not a millisecond early', async () => {
    write();
    const { sender, sent, attempts } = senderFactory((attempt) => attempt <= 2);
    await sendDueMails(market.dependencies, sender, pdf);
    expect(about()).toMatchObject([{ state: 'waiting', attempts: 1, lastError: 'connection refused' }]);
    market.clock.now += MINUTE - 1;
    await sendDueMails(market.dependencies, sender, pdf);
    expect(attempts()).toBe(1);
    market.clock.now += 1;
    await sendDueMails(market.dependencies, sender, pdf);
    market.clock.now += 2 * MINUTE - 1;
    await sendDueMails(market.dependencies, sender, pdf);
    expect(attempts()).toBe(2);
    market.clock.now += 1;
    await sendDueMails(market.dependencies, sender, pdf);
    expect(sent).toHaveLength(1);
    expect(about()).toMatchObject([{ state: 'sent', attempts: 3 }]);
  });

  it('doubles from a minute to six hours', () => {
    expect([1, 2, 3, 9, 10, 11].map((attempt) => delayAfter(attempt) / MINUTE)).toEqual([1, 2, 4, 256, 360, 360]);
  });

  it('gives up after the last attempt and keeps the mail as failed', async () => {
    write();
    const { sender, attempts } = senderFactory(() => true);
    for (let i = 0; i < ATTEMPTS + 3; i++) {
      await sendDueMails(market.dependencies, sender, pdf);
      market.clock.now += 7 * 60 * MINUTE;
    }
    expect(attempts()).toBe(12);
    expect(about()).toMatchObject([{ state: 'failed', attempts: 12, lastError: 'connection refused', sentAt: null }]);
  });

  it('counts a document that cannot be made as an attempt, and goes on with the next mail', async () => {
    write();
    write({ subjectId: 'q2', attachments: [] });
    const { sender, sent } = senderFactory();
    await sendDueMails(market.dependencies, sender, async () => {
      throw new Error('no such quote');
    });
    expect(about()).toMatchObject([{ state: 'waiting', attempts: 1, lastError: 'no such quote' }]);
    expect(sent).toHaveLength(1);
  });

  it('lets no line break begin another header, and no list of addresses be one address', () => {
    const mail = newMail(market.dependencies, content({ subject: 'Hello\r\nBcc: all@home.example', fromName: 'A\nB' }));
    expect(mail.subject).toBe('Hello Bcc: all@home.example');
    expect(mail.fromName).toBe('A B');
    for (const to of ['a@b.example, c@d.example', 'a@b.example\r\nBcc: c@d.example', '<a@b.example>', 'nobody']) {
      expect(() => newMail(market.dependencies, content({ to }))).toThrow(TypeError);
    }
  });

  it('never sends from two rounds at once, and a stop waits for the mail under way', async () => {
    write();
    let rendering = 0;
    let most = 0;
    let release: (value: Uint8Array) => void = () => undefined;
    const render = () => {
      rendering += 1;
      most = Math.max(most, rendering);
      return new Promise<Uint8Array>((resolve) => {
        release = (value) => {
          rendering -= 1;
          resolve(value);
        };
      });
    };
    // Nothing listens on port 1: sending fails at once, which is all that this needs.
    const config = { ...market.dependencies.config, mail: { kind: 'local' as const, port: 1, from: 'post@sealyard.example' } };
    const worker = startMailWorker({ ...market.dependencies, config }, render, 1);
    await new Promise((resolve) => setTimeout(resolve, 40));
    let stopped = false;
    const stopping = worker.stop().then(() => (stopped = true));
    await new Promise((resolve) => setTimeout(resolve, 20));
    expect({ most, stopped }).toEqual({ most: 1, stopped: false });
    release(await pdf());
    await stopping;
    expect(about()).toMatchObject([{ state: 'waiting', attempts: 1 }]);
  });
});
