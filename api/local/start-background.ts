import { renderAttachment } from '../documents/render-attachment';
import { type Dependencies } from '../dependencies';
import { startMailWorker } from '../mail/mail-worker';
import { startMailbox } from './mailbox';

export interface Background {
  /** lines to print once the application listens */
  announcements: string[];
  stop(): Promise<void>;
}

/** Starts what runs beside the application: the local mailbox, where mail stays here, and the worker that sends. */
export async function startBackground(dependencies: Dependencies): Promise<Background> {
  const { config } = dependencies;
  const mailbox = config.mail.kind === 'local' ? await startMailbox(config) : null;
  // Port 0 lets the mailbox take a free one: the worker has to be told which.
  const mail = config.mail.kind === 'local' && mailbox ? { ...config.mail, port: mailbox.port } : config.mail;
  const worker = startMailWorker({ ...dependencies, config: { ...config, mail } }, (attachment, companyId) =>
    renderAttachment(attachment, companyId, dependencies),
  );
  return {
    announcements: [
      ...(mailbox ? [`Mail stays on this machine: ${config.publicUrl}/local/mail`] : []),
      ...(config.demoMarket ? demoSignIns : []),
    ],
    stop: async () => {
      await worker.stop();
      await mailbox?.stop();
    },
  };
}

const demoSignIns = [
  'Demo sign-ins, all with the password made-to-size:',
  '  buyer@ottery.example, admin@ottery.example                                   a dealer',
  '  sales@northmere.example, plant@northmere.example, accounts@northmere.example  a fabricator',
  '  operator@sealyard.example                                                    the market',
];
