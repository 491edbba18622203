import { setTimeout as pause } from 'node:timers/promises';
import { type Dependencies } from '../dependencies';
import { createMailSender } from './mail-sender';
import { type RenderAttachment, sendDueMails } from './send-due-mails';

export interface MailWorker {
  /** Ends after the mail under way. */
  stop(): Promise<void>;
}

/**
 * Looks for due mails every `everyMs` and sends them. One round ends before the next begins, so
 * that no mail is ever sent by two rounds at once.
 */
export function startMailWorker(
  dependencies: Pick<Dependencies, 'config' | 'stores' | 'clock' | 'log'>,
  renderAttachment: RenderAttachment,
  everyMs = 1000,
): MailWorker {
  const sender = createMailSender(dependencies.config.mail);
  const stopping = new AbortController();
  const { signal } = stopping;
  const work = async () => {
    while (!signal.aborted) {
      try {
        await sendDueMails(dependencies, sender, renderAttachment, signal);
      } catch (error) {
        dependencies.log.error({ err: error }, 'mail worker');
      }
      await pause(everyMs, undefined, { signal, ref: false }).catch(() => undefined);
    }
  };
  const working = work();
  return {
    stop: async () => {
      stopping.abort();
      await working;
      sender.close();
    },
  };
}
