/** `npm start`: builds what is stale, then serves. */
import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';

const bundle = 'dist/sealyard/server/server.mjs';
const sources = [
  'src',
  'api',
  'shared',
  'seeds',
  'assets',
  'server.ts',
  'angular.json',
  'tsconfig.json',
  'tsconfig.app.json',
  'package-lock.json',
];

function newest(path) {
  const stat = statSync(path);
  if (!stat.isDirectory()) return /\.spec\.ts$/.test(path) ? 0 : stat.mtimeMs;
  return Math.max(0, ...readdirSync(path).map((name) => newest(join(path, name))));
}

if (!existsSync(bundle) || Math.max(...sources.map(newest)) > statSync(bundle).mtimeMs) {
  console.log('Building Sealyard; this takes about a minute…');
  const built = spawnSync('npx', ['ng', 'build'], { stdio: 'inherit' });
  if (built.status !== 0) process.exit(built.status ?? 1);
}
process.argv[1] = join(process.cwd(), bundle);
await import(join(process.cwd(), bundle));
