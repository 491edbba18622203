import { type RequestHandler, type Response, Router } from 'express';
import { type Config } from '../config';
import { mailFolder } from './mailbox';
import { listPage, mailPage, missingPage } from './mailbox-page';
import { storedMails } from './stored-mails';

const PAGE = 100;

/**
 * `/local/mail`: what the local mailbox has kept, for whoever tries the product on their own
 * machine. To be mounted only where mail stays local: it asks nobody to sign in.
 */
export function mailboxRoutes(config: Pick<Config, 'dataDir'>): Router {
  const mails = storedMails(mailFolder(config));
  const router = Router({ caseSensitive: true });
  const head: RequestHandler = (_request, response, next) => {
    response.set({
      'Cache-Control': 'no-store',
      'X-Content-Type-Options': 'nosniff',
      'Content-Security-Policy':
        "default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'; base-uri 'none'; form-action 'none'",
    });
    next();
  };
  const missing = (response: Response) => response.status(404).type('html').send(missingPage());

  router.get('/local/mail', head, async ({ query }, response) => {
    const { mails: shown, older } = await mails.list(PAGE, typeof query['before'] === 'string' ? query['before'] : undefined);
    response.type('html').send(listPage(shown, older));
  });

  router.get('/local/mail/:name', head, async ({ params }, response) => {
    const mail = await mails.read(String(params['name']));
    if (!mail) return void missing(response);
    response.type('html').send(mailPage(mail));
  });

  router.get('/local/mail/:name/attachments/:index', head, async ({ params }, response) => {
    const mail = await mails.read(String(params['name']));
    const index = String(params['index']);
    const attachment = /^\d{1,3}$/.test(index) ? mail?.attachments[Number(index)] : undefined;
    if (!attachment) return void missing(response);
    // A PDF opens in the browser; anything else is for saving, never for running here.
    const isPdf = attachment.contentType === 'application/pdf';
    response.removeHeader('Content-Security-Policy');
    response.type(isPdf ? 'application/pdf' : 'application/octet-stream');
    const name = attachment.fileName.replace(/[^\w.-]+/g, '-');
    response.set('Content-Disposition', `${isPdf ? 'inline' : 'attachment'}; filename="${name}"`);
    response.send(Buffer.from(attachment.bytes));
  });
  return router;
}
