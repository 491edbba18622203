import { type Express } from 'express';
import { type Dependencies } from '../dependencies';

export interface Background {
  /** lines to print once the server listens */
  announcements: string[];
  stop(): Promise<void>;
}

/** Starts what runs beside the application: the mail worker and, where mail stays here, the local mailbox. */
export async function startBackground(dependencies: Dependencies, _app: Express): Promise<Background> {
  const announcements: string[] = [];
  if (dependencies.config.demoMarket) {
    announcements.push(
      'Demo sign-ins, all with the password made-to-size:',
      '  buyer@ottery.example, admin@ottery.example        dealer',
      '  sales@northmere.example, plant@…, accounts@…      fabricator',
      '  operator@sealyard.example                         market',
    );
  }
  return { announcements, stop: async () => undefined };
}
