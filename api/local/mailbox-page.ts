import { type MailSummary, type StoredMail } from './stored-mails';

/** Pages of the local mailbox: whole without scripts, everything that came by mail escaped. */

const escapes: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Text that cannot begin a tag, an entity or end an attribute. */
export const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (sign) => escapes[sign] ?? sign);

const style = `
:root { color-scheme: light dark; --paper: light-dark(#fbfbf8, #0c1c17); --sheet: light-dark(#fff, #12261f); --ink: light-dark(#12332b, #e3eee8); --soft: light-dark(#4b6158, #9db3a9); --line: light-dark(#d8ded8, #2a4238); --copper: light-dark(#a8541f, #f0a36b); }
* { box-sizing: border-box; }
body { margin: 0; font: 400 15px/1.45 Lato, 'Segoe UI', sans-serif; background: var(--paper); color: var(--ink); }
main { max-width: 860px; margin: 0 auto; padding: 28px 16px 60px; }
h1 { font-size: 22px; margin: 0 0 4px; overflow-wrap: anywhere; }
p { margin: 0 0 18px; color: var(--soft); }
a { color: var(--copper); font-weight: 700; }
a:focus-visible { outline: 2px solid var(--copper); outline-offset: 2px; }
ol { list-style: none; margin: 0 0 20px; padding: 0; border-top: 1px solid var(--line); }
li { border-bottom: 1px solid var(--line); padding: 10px 0; overflow-wrap: anywhere; }
li span { display: block; color: var(--soft); font-size: 14px; }
dl { display: grid; grid-template-columns: auto 1fr; gap: 2px 16px; margin: 0 0 18px; font-size: 14px; }
dt { color: var(--soft); } dd { margin: 0; overflow-wrap: anywhere; }
pre { font: inherit; white-space: pre-wrap; overflow-wrap: anywhere; background: var(--sheet); border: 1px solid var(--line); border-radius: 8px; padding: 16px 18px; margin: 0 0 18px; }
ul { margin: 0 0 20px; padding: 0; list-style: none; }
`;

const page = (title: string, content: string) => `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><meta name="robots" content="noindex">
<title>${escapeHtml(title)}</title><style>${style}</style></head><body><main>${content}</main></body></html>`;

const when = (at: Date) => `<time datetime="${at.toISOString()}">${at.toISOString().slice(0, 16).replace('T', ' ')} UTC</time>`;

export function listPage(mails: readonly MailSummary[], older: string | null): string {
  const rows = mails.map(
    ({ name, subject, to, receivedAt }) =>
      `<li><a href="/local/mail/${name}">${escapeHtml(subject || 'no subject')}</a><span>to ${escapeHtml(to)}, ${when(receivedAt)}</span></li>`,
  );
  return page(
    'Local mailbox',
    `<h1>Local mailbox</h1><p>What Sealyard has sent from this machine. Nothing here left it.</p>
${rows.length > 0 ? `<ol>${rows.join('\n')}</ol>` : '<p>No mail yet. Mail a quote to a customer, and it will stand here within a few seconds.</p>'}
${older ? `<a href="/local/mail?before=${older}">Older mails</a>` : ''}`,
  );
}

export function mailPage(mail: StoredMail): string {
  const head: [string, string][] = [
    ['From', mail.from],
    ['Reply to', mail.replyTo],
    ['To', mail.to],
    ['Message-ID', mail.messageId],
  ];
  const attachments = mail.attachments.map(
    ({ fileName, bytes }, i) =>
      `<li><a href="/local/mail/${mail.name}/attachments/${i}">${escapeHtml(fileName)}</a>, ${Math.ceil(bytes.length / 1024)} kB</li>`,
  );
  return page(
    mail.subject || 'no subject',
    `<p><a href="/local/mail">All mails</a></p><h1>${escapeHtml(mail.subject || 'no subject')}</h1><p>${when(mail.receivedAt)}</p>
<dl>${head.map(([name, value]) => `<dt>${name}</dt><dd>${escapeHtml(value)}</dd>`).join('')}</dl>
<pre>${escapeHtml(mail.text)}</pre>
${attachments.length > 0 ? `<ul aria-label="Attachments">${attachments.join('')}</ul>` : ''}`,
  );
}

export const missingPage = (): string =>
  page('No such mail', '<h1>No such mail</h1><p>There is no mail at this address. <a href="/local/mail">All mails</a></p>');
