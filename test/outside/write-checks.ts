import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { checksPage } from './checks-page';
import { glazingChecks } from './glazing-checks';

const page = join(fileURLToPath(new URL('.', import.meta.url)), 'README.md');
writeFileSync(page, checksPage(glazingChecks));
console.log(`wrote ${page}`);
