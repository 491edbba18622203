import { execFileSync } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';

/** A file that breaks each rule, and the rule that must name it. */
const offences: [rule: string, file: string, text: string][] = [
  ['shared-is-pure', 'shared/glazing/a.ts', "import 'node:fs';"],
  ['shared-is-pure', 'shared/glazing/b.ts', "import 'express';"],
  ['shared-is-pure', 'shared/glazing/c.ts', "import '../../api/orders/place';"],
  ['src-knows-no-server', 'src/app/bench/a.ts', "import '../../../api/orders/place';"],
  ['features-stand-alone', 'src/app/bench/b.ts', "import '../quotes/q';"],
  ['only-database-opens-a-connection', 'api/orders/a.ts', "import 'better-sqlite3';"],
  ['only-http-and-edges-know-express', 'api/orders/b.ts', "import 'express';"],
  ['only-stores-speak-drizzle', 'api/orders/c.ts', "import 'drizzle-orm';"],
  ['only-the-mail-sender-knows-nodemailer', 'api/orders/d.ts', "import 'nodemailer';"],
  ['only-the-card-gateway-knows-stripe', 'api/orders/e.ts', "import 'stripe';"],
  ['only-authenticate-knows-passport', 'api/orders/f.ts', "import 'passport';"],
  ['no-circles', 'api/orders/g.ts', "import { h } from './h'; export const g = h;"],
  ['tests-stay-out-of-the-product', 'api/orders/i.ts', "import '../../test/factories/f';"],
];
const innocents: [file: string, text: string][] = [
  ['api/orders/place.ts', "import '../../shared/money/m'; export const place = 1;"],
  ['api/orders/h.ts', "import { g } from './g'; export const h = g;"],
  ['api/orders/order-store.ts', "import 'drizzle-orm';"],
  ['api/mail/mail-sender.ts', "import 'nodemailer';"],
  ['shared/money/m.ts', "import 'decimal.js'; import 'zod'; export const m = 1;"],
  ['src/app/quotes/q.ts', "import '../ui/u'; export const q = 1;"],
  ['src/app/ui/u.ts', 'export const u = 1;'],
  ['test/factories/f.ts', "import '../../api/orders/place'; export const f = 1;"],
  ['server.ts', "import './api/orders/place';"],
];

interface Violation {
  rule: { name: string };
  from: string;
}

describe('import rules', () => {
  const folder = mkdtempSync(join(tmpdir(), 'rules-'));
  let violations: Violation[] = [];

  beforeAll(() => {
    for (const [file, text] of [...offences.map(([, ...rest]) => rest), ...innocents] as [string, string][]) {
      mkdirSync(join(folder, dirname(file)), { recursive: true });
      writeFileSync(join(folder, file), text);
    }
    mkdirSync(join(folder, 'seeds'));
    symlinkSync(join(process.cwd(), 'node_modules'), join(folder, 'node_modules'));
    for (const file of ['tsconfig.json', '.dependency-cruiser.cjs']) cpSync(join(process.cwd(), file), join(folder, file));
    const cruise = join(process.cwd(), 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs');
    const args = [
      cruise,
      '--config',
      '.dependency-cruiser.cjs',
      '--output-type',
      'json',
      'server.ts',
      'src',
      'api',
      'shared',
      'seeds',
      'test',
    ];
    const output = run(args, folder);
    violations = (JSON.parse(output) as { summary: { violations: Violation[] } }).summary.violations;
  }, 60_000);
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  it.each(offences)('%s bites at %s', (rule, file) => {
    expect(violations.filter(({ from }) => from === file).map((violation) => violation.rule.name)).toContain(rule);
  });

  it('leaves what is allowed alone', () => {
    const files = innocents.map(([file]) => file).filter((file) => file !== 'api/orders/h.ts');
    expect(violations.filter(({ from }) => files.includes(from))).toEqual([]);
  });
});

function run(args: string[], cwd: string): string {
  try {
    return execFileSync(process.execPath, args, { cwd, encoding: 'utf8', maxBuffer: 1e8 });
  } catch (error) {
    // It exits with the number of errors; its report is on stdout all the same.
    return (error as { stdout: string }).stdout;
  }
}
