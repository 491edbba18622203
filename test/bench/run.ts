import { cpus, totalmem } from 'node:os';
import { writeFileSync } from 'node:fs';
import { type Measure } from './measure';

/**
 * `npm run bench`: takes every measure in one sitting and writes them down with the machine
 * and the day. A part can be named: `npm run bench -- pricing`. Those that need the built
 * product say so when it is missing.
 */
const parts: Record<string, () => Promise<Measure[]>> = {
  pricing: async () => (await import('./pricing-bench')).measurePricing(),
  orders: async () => (await import('./orders-bench')).measureOrders(),
  pages: async () => (await import('./pages-bench')).measurePages(),
  browser: async () => (await import('./browser-bench')).measureBrowser(),
};

async function run(): Promise<void> {
  const wanted = process.argv.slice(2);
  const unknown = wanted.filter((name) => !(name in parts));
  if (unknown.length > 0) throw new Error(`there is no part ${unknown.join(', ')}: ${Object.keys(parts).join(', ')}`);
  const measures: Measure[] = [];
  for (const [name, measure] of Object.entries(parts)) {
    if (wanted.length > 0 && !wanted.includes(name)) continue;
    console.log(`measuring ${name}…`);
    const found = await measure();
    for (const { measure: what, ratio, toReach, reached } of found)
      console.log(`  ${reached ? 'reached' : 'SHORT  '}  ${what}: ${ratio} (to reach: ${toReach})`);
    measures.push(...found);
  }
  // A part of the measures does not replace the record of all of them.
  if (wanted.length === 0) writeFileSync('test/bench/README.md', page(measures));
}

function page(measures: readonly Measure[]): string {
  const rows = measures.map(
    ({ measure, ratio, toReach, reached, detail }) => `| ${measure} | ${ratio} | ${toReach} | ${reached ? 'yes' : '**no**'} | ${detail} |`,
  );
  return `# Measures

Written by \`npm run bench\`. Machines are noisy, so each is a ratio within one run where that can be; none is asserted in a test.

${new Date().toISOString().slice(0, 10)}; ${cpus().length} × ${cpus()[0]?.model ?? 'unknown processor'}, ${Math.round(totalmem() / 2 ** 30)} GiB; Node.js ${process.version}.

| measure | found | to reach | reached | how |
| --- | --- | --- | --- | --- |
${rows.join('\n')}
`;
}

await run();
