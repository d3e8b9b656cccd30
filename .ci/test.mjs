/**
 * `npm test`: every check in turn, going on after a failure, with the sum of all tests as the last line.
 * `npm test -- --only unit,browser` runs single stages; `npm test -- --only unit some/file` hands on what follows.
 */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { findBrowser } from './browser.mjs';
import { install, root } from './install.mjs';

const reports = `${root}.cache/reports`;
const bin = (name) => `${root}node_modules/.bin/${name}`;

/** A stage fails if one of its commands does. A `report` holds counts; a stage without one counts only if it fails. */
const stages = [
  {
    name: 'types',
    commands: ['core', 'web', 'web/offline', 'web/work', 'web/build', 'test'].map((part) => ['tsc', '-p', part]),
  },
  { name: 'lint', commands: [['biome', 'check', '--error-on-warnings']] },
  { name: 'unused', commands: [['knip']] },
  vitest('unit'),
  vitest('external'),
  { name: 'build', commands: [['vite', 'build']] },
  vitest('built'),
  {
    name: 'browser',
    commands: [['playwright', 'test', '--config', 'test/browser/playwright.config.ts']],
    report: readPlaywright,
    needsBrowser: true,
  },
];

function vitest(name) {
  const outputFile = `--outputFile.json=${reports}/${name}.json`;
  const command = ['vitest', 'run', '--project', name, '--reporter=default', '--reporter=json', outputFile];
  return { name, commands: [command], report: readVitest };
}

function readVitest({ numPassedTests, numFailedTests, numFailedTestSuites }) {
  // A file that cannot be loaded fails as a suite and has no failed test.
  const failed = numFailedTests || Math.min(numFailedTestSuites, 1);
  return { passed: numPassedTests, failed };
}

function readPlaywright({ stats, errors }) {
  return { passed: stats.expected + stats.flaky, failed: stats.unexpected || Math.min(errors.length, 1) };
}

function runStage({ name, commands, report, needsBrowser }, extra) {
  console.log(`\n── ${name} ──`);
  const browser = needsBrowser ? findBrowser() : undefined;
  if (browser === null) return { passed: 0, failed: 1 };
  const file = `${reports}/${name}.json`;
  rmSync(file, { force: true });
  const env = { ...process.env, PLAYWRIGHT_JSON_OUTPUT_FILE: file, ...(browser && { CHROMIUM_PATH: browser }) };
  const statuses = commands.map(
    ([tool, ...args]) =>
      spawnSync(bin(tool), [...args, ...extra], { cwd: root, env, stdio: ['ignore', 'inherit', 'inherit'] }).status,
  );
  const ok = statuses.every((status) => status === 0);
  const counts = report && existsSync(file) ? report(JSON.parse(readFileSync(file, 'utf8'))) : { passed: 0, failed: 0 };
  return { passed: counts.passed, failed: ok ? counts.failed : Math.max(counts.failed, 1) };
}

const args = process.argv.slice(2);
const only = args[0] === '--only' ? args[1]?.split(',') : undefined;
const unknown = only?.filter((name) => !stages.some((stage) => stage.name === name)) ?? [];
if (unknown.length > 0 || (args[0] === '--only' && !only)) {
  console.error(`Stages are: ${stages.map((stage) => stage.name).join(', ')}`);
  process.exit(1);
}

install();
mkdirSync(reports, { recursive: true });
const outcomes = [];
for (const stage of stages.filter(({ name }) => !only || only.includes(name))) {
  const start = performance.now();
  const counts = runStage(stage, only ? args.slice(2) : []);
  outcomes.push({ name: stage.name, ...counts, seconds: (performance.now() - start) / 1000 });
}

console.log('');
for (const { name, passed, failed, seconds } of outcomes) {
  const verdict = failed > 0 ? `${failed} failed` : 'ok';
  console.log(
    `${name.padEnd(10)}${verdict.padEnd(12)}${String(passed).padStart(6)} passed${seconds.toFixed(1).padStart(9)} s`,
  );
}
const sum = (key) => outcomes.reduce((total, outcome) => total + outcome[key], 0);
console.log(`${sum('passed')} passed, ${sum('failed')} failed`);
process.exitCode = sum('failed') > 0 ? 1 : 0;
