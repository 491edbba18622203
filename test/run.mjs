/**
 * `npm test`: everything that guards the product. Types, lint and import rules first, then
 * the unit and API tests, then a build and the browser tests against it. The counts of the
 * last line come from Jest's own reports; a step that fails without a report counts as one.
 */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';

const reports = 'test-results';
rmSync(reports, { recursive: true, force: true });
mkdirSync(reports);
let passed = 0;
let failed = 0;

function run(what, command, args, report) {
  console.log(`\n— ${what}`);
  const started = Date.now();
  const { status } = spawnSync(command, args, { stdio: 'inherit', env: { ...process.env, FORCE_COLOR: '0' } });
  console.log(`— ${what}: ${status === 0 ? 'done' : 'FAILED'} in ${Math.round((Date.now() - started) / 1000)} s`);
  if (report && existsSync(report)) {
    const counts = JSON.parse(readFileSync(report, 'utf8'));
    passed += counts.numPassedTests;
    failed += counts.numFailedTests + counts.numRuntimeErrorTestSuites;
    if (counts.numPendingTests + counts.numTodoTests > 0) {
      console.log(`— ${counts.numPendingTests + counts.numTodoTests} skipped: a skipped test counts as failed`);
      failed += counts.numPendingTests + counts.numTodoTests;
    }
    if (status !== 0 && counts.numFailedTests + counts.numRuntimeErrorTestSuites === 0) failed += 1;
  } else if (status === 0 && !report) {
    passed += 1;
  } else {
    failed += 1;
  }
  return status === 0;
}

const jest = (projects, report) => ['jest', '--selectProjects', ...projects, '--json', `--outputFile=${report}`, '--silent=false'];

run('types', 'npx', ['tsc', '--noEmit', '-p', 'tsconfig.json']);
run('lint', 'npx', ['eslint', '.']);
run('format', 'npx', ['prettier', '--check', '--log-level', 'warn', '.']);
run('import rules', 'npx', ['depcruise', '--config', '.dependency-cruiser.cjs', 'server.ts', 'src', 'api', 'shared', 'seeds', 'test']);
run('unit, API and outside tests', 'npx', jest(['server', 'angular'], `${reports}/unit.json`), `${reports}/unit.json`);
if (run('build', 'npx', ['ng', 'build'])) {
  run('browser tests', 'npx', [...jest(['browser'], `${reports}/browser.json`), '--runInBand'], `${reports}/browser.json`);
}

console.log(`\n${passed} passed, ${failed} failed`);
process.exit(failed > 0 || passed === 0 ? 1 : 0);
