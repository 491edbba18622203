import { join } from 'node:path';
import { readConfig } from '../config';
import { openDatabase } from '../database/open-database';
import { ledgerChecks, verifyLedger } from './verify-ledger';

/** `npm run verify:ledger`: says what disagrees in the database under DATA_DIR, and fails if anything does. */
const database = openDatabase(join(readConfig(process.env).dataDir, 'sealyard.db'), join(process.cwd(), 'api/database/migrations'));
try {
  const found = verifyLedger(database.db);
  for (const { check, row, expected, found: stands } of found) {
    console.log(`${check}: ${row} says ${stands}, its sources say ${expected}`);
  }
  console.log(
    found.length === 0 ? `All ${ledgerChecks.length} checks agree.` : `${found.length} of ${ledgerChecks.length} checks disagree.`,
  );
  process.exitCode = found.length === 0 ? 0 : 1;
} finally {
  database.close();
}
