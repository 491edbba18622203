/**
 * Drizzle Kit does not write STRICT tables yet, and without them SQLite keeps 1.5 in an
 * INTEGER column. Adds STRICT to each CREATE TABLE of the migrations that lacks it.
 */
import { readdirSync, readFileSync, writeFileSync } from 'node:fs';

const folder = new URL('./migrations/', import.meta.url);
for (const name of readdirSync(folder).filter((file) => file.endsWith('.sql'))) {
  const path = new URL(name, folder);
  const before = readFileSync(path, 'utf8');
  const after = before.replace(/(CREATE TABLE [^;]*\n\))(;)/g, '$1 STRICT$2');
  if (after !== before) writeFileSync(path, after);
}
