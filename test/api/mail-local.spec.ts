import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import express from 'express';
import request from 'supertest';
import { escapeHtml } from '@api/local/mailbox-page';
import { mailboxRoutes } from '@api/local/mailbox-routes';
import { type Mailbox, mailFolder, startMailbox } from '@api/local/mailbox';
import { startMailWorker } from '@api/mail/mail-worker';
import { createMailSender, type OutgoingMail } from '@api/mail/mail-sender';
import { newMail } from '@api/mail/new-mail';
import { marketFactory } from '../factories/market-factory';

const bytes = Buffer.from('%PDF-1.3\nöäü\n%%EOF', 'latin1');

const outgoing = (change: Partial<OutgoingMail> = {}): OutgoingMail => ({
  messageId: '<one@sealyard.example>',
  fromName: 'Ottery Glass, Sash & Sons <nobody@else.example>',
  replyTo: 'buyer@ottery.example',
  to: 'customer@home.example',
  subject: 'Your quote Q-1, 36 1/2 × 48 1/4',
  body: 'Grüße\n\nthe quote is attached.',
  writtenAt: new Date(Date.UTC(2026, 8, 15, 15)),
  attachments: [{ fileName: 'Q-1.pdf', contentType: 'application/pdf', bytes }],
  ...change,
});

describe('local mailbox', () => {
  let dataDir: string;
  let mailbox: Mailbox;
  const app = () => express().use(mailboxRoutes({ dataDir }));
  const mailConfig = () => ({ kind: 'local' as const, port: mailbox.port, from: 'post@sealyard.example' });
  const send = async (mail: OutgoingMail) => {
    const sender = createMailSender(mailConfig());
    await sender.send(mail);
    sender.close();
  };
  const firstLink = (html: string) => /href="(\/local\/mail\/\d+-[\w-]+)"/.exec(html)?.[1] ?? '';

  beforeEach(async () => {
    dataDir = mkdtempSync(join(tmpdir(), 'sealyard-mail-'));
    mailbox = await startMailbox({ dataDir, mail: { kind: 'local', port: 0, from: 'post@sealyard.example' } });
  });
  afterEach(async () => {
    await mailbox.stop();
    rmSync(dataDir, { recursive: true });
  });

  it('takes a mail over SMTP and shows it with its PDF, byte for byte', async () => {
    await send(outgoing());
    const list = await request(app()).get('/local/mail');
    expect(list.status).toBe(200);
    expect(list.text).toContain('Your quote Q-1, 36 1/2 × 48 1/4');
    expect(list.text).toContain('to customer@home.example');

    const page = await request(app()).get(firstLink(list.text));
    expect(page.text).toContain('Grüße\n\nthe quote is attached.');
    expect(page.text).toContain('&lt;one@sealyard.example&gt;');
    expect(page.text).toContain('buyer@ottery.example');
    // The comma and the brackets stay within the name: there is one sender, ours.
    const from = /<dt>From<\/dt><dd>(.*?)<\/dd>/.exec(page.text)?.[1];
    expect(from).toBe('&quot;Ottery Glass, Sash &amp; Sons &lt;nobody@else.example&gt;&quot; &lt;post@sealyard.example&gt;');

    const attachment = await request(app())
      .get(/href="([^"]*attachments\/0)"/.exec(page.text)?.[1] ?? '')
      .buffer();
    expect(attachment.headers['content-type']).toBe('application/pdf');
    expect(attachment.headers['content-disposition']).toBe('inline; filename="Q-1.pdf"');
    expect(Buffer.compare(attachment.body as Buffer, bytes)).toBe(0);
  });

  it('shows what came by mail as text, never as markup', async () => {
    await send(outgoing({ subject: '<img src=x onerror="alert(1)">', body: '</pre><script>alert(2)</script>', attachments: [{ fileName: '"><b>.html', contentType: 'text/html', bytes: Buffer.from('<script>alert(3)</script>') }] })); // prettier-ignore
    const list = await request(app()).get('/local/mail');
    const page = await request(app()).get(firstLink(list.text));
    for (const { text, headers } of [list, page]) {
      expect(text).not.toMatch(/<(img|script|b)\b/);
      expect(headers['content-security-policy']).toContain("default-src 'none'");
    }
    expect(page.text).toContain('&lt;/pre&gt;&lt;script&gt;alert(2)&lt;/script&gt;');
    const attachment = await request(app()).get(/href="([^"]*attachments\/0)"/.exec(page.text)?.[1] ?? '');
    expect(attachment.headers['content-type']).toBe('application/octet-stream');
    expect(attachment.headers['content-disposition']).toMatch(/^attachment; filename="[\w.-]+"$/);
    expect(attachment.headers['x-content-type-options']).toBe('nosniff');
  });

  it('escapes every sign that means something in HTML', () => {
    expect(escapeHtml(`<a href="x" title='y'>&`)).toBe('&lt;a href=&quot;x&quot; title=&#39;y&#39;&gt;&amp;');
  });

  it('answers only for mails of its own folder', async () => {
    writeFileSync(join(dataDir, 'secret.eml'), 'Subject: secret\r\n\r\n');
    for (const path of [
      '/local/mail/..%2Fsecret',
      '/local/mail/secret',
      '/local/mail/%2E%2E%2Fsecret/attachments/0',
      '/local/mail/x/attachments/0',
    ]) {
      const answer = await request(app()).get(path);
      expect({ path, status: answer.status, secret: answer.text.includes('Subject: secret') }).toEqual({
        path,
        status: 404,
        secret: false,
      });
    }
  });

  it('says what to do while there is no mail', async () => {
    rmSync(mailFolder({ dataDir }), { recursive: true });
    expect((await request(app()).get('/local/mail')).text).toContain('No mail yet');
  });

  it('lists the newest first and leads on to older ones', async () => {
    for (let i = 0; i < 103; i++) {
      const name = `${1_700_000_000_000 + i}-00000000-0000-4000-8000-${String(i).padStart(12, '0')}`;
      writeFileSync(join(mailFolder({ dataDir }), `${name}.eml`), `Subject: number ${i}\r\nTo: a@home.example\r\n\r\ntext`);
    }
    const first = await request(app()).get('/local/mail');
    const numbers = (html: string) => [...html.matchAll(/number (\d+)</g)].map(([, number]) => Number(number));
    expect(numbers(first.text)).toEqual(Array.from({ length: 100 }, (_, i) => 102 - i));
    const older = /href="(\/local\/mail\?before=[^"]+)"/.exec(first.text)?.[1] ?? '';
    expect(numbers((await request(app()).get(older)).text)).toEqual([2, 1, 0]);
  });

  it('refuses a port that is taken, and says which setting to change', async () => {
    await expect(startMailbox({ dataDir, mail: mailConfig() })).rejects.toThrow('LOCAL_SMTP_PORT');
  });

  it('gets what the worker sends from the outbox', async () => {
    const market = await marketFactory();
    const { dependencies } = market;
    dependencies.stores.outbox.write(
      newMail(dependencies, {
        companyId: 'northmere',
        fromName: 'Northmere Sealed Units',
        replyTo: 'accounts@northmere.example',
        to: 'buyer@ottery.example',
        subject: 'Invoice 1',
        body: 'Attached.',
        attachments: [{ kind: 'invoice', id: 'i1', fileName: 'NM-1.pdf' }],
        subjectKind: 'invoice',
        subjectId: 'i1',
      }),
    );
    const worker = startMailWorker({ ...dependencies, config: { ...dependencies.config, mail: mailConfig() } }, async () => bytes, 5);
    while (dependencies.stores.outbox.mailsAbout('invoice', 'i1')[0]?.state !== 'sent')
      await new Promise((resolve) => setTimeout(resolve, 10));
    await worker.stop();
    expect(readdirSync(mailFolder({ dataDir }))).toHaveLength(1);
    expect((await request(app()).get('/local/mail')).text).toContain('Invoice 1');
    market.close();
  });
});
