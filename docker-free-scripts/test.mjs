/**
 * `npm test`: sets up what is missing, then runs every check and every test, here and in CI alike.
 *
 *   npm test                        everything
 *   npm test -- --only unit,api     some parts: checks, unit, reference, api, architecture, e2e
 *
 * The last line is always `N passed, N failed`.
 */
import { existsSync, mkdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import process from 'node:process';
import { parseArgs } from 'node:util';
import { ensureBuilt } from './lib/build.mjs';
import { runChecks } from './lib/checks.mjs';
import { ensureDebianPackages } from './lib/debian.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { listenForEnd, run } from './lib/processes.mjs';
import { Remedy, runScript, say } from './lib/say.mjs';
import { projectDir, requireNode20 } from './lib/settings.mjs';
import { showCheck } from './lib/show-check.mjs';
import { playwrightCounts, vitestCounts } from './lib/test-counts.mjs';

const vitestParts = ['unit', 'reference', 'api', 'architecture'];
const parts = ['checks', ...vitestParts, 'e2e'];
const total = { passed: 0, failed: 0 };

await runScript(async () => {
  requireNode20();
  const wanted = wantedParts();
  const { orGoOn, wasAsked } = listenForEnd();
  try {
    await setUp(wanted);
    orGoOn();
    if (wanted.includes('checks')) add(await runChecks(showCheck));
    orGoOn();
    const needsBuild = wanted.includes('api') || wanted.includes('e2e');
    const built = needsBuild ? await builds(orGoOn) : true;
    orGoOn();
    const vitest = vitestParts.filter((part) => wanted.includes(part));
    if (vitest.length > 0) add(await runVitest(vitest));
    orGoOn();
    if (wanted.includes('e2e') && built) add(await runPlaywright());
  } catch (error) {
    if (wasAsked()) say('Ended early; the count is not complete.');
    else process.stderr.write(`\n${error instanceof Remedy ? error.message : String(error)}\n`);
    total.failed += 1;
  }
  say('Done.');
  process.stdout.write(`${total.passed} passed, ${total.failed} failed\n`);
  return total.failed === 0 && total.passed > 0 ? 0 : 1;
});

function wantedParts() {
  const { values } = parseArgs({ options: { only: { type: 'string' } } });
  const wanted = values.only?.split(',').map((part) => part.trim()) ?? parts;
  const unknown = wanted.find((part) => !parts.includes(part));
  if (unknown !== undefined) throw new Remedy(`--only ${unknown}: choose from ${parts.join(', ')}.`);
  return wanted;
}

/** @param {string[]} wanted */
async function setUp(wanted) {
  const needsDatabase = wanted.includes('api') || wanted.includes('e2e');
  await ensureDebianPackages(
    ...(needsDatabase ? /** @type {const} */ (['mariadb', 'poppler']) : []),
    ...(wanted.includes('unit') ? /** @type {const} */ (['poppler']) : []),
  );
  if (wanted.includes('e2e')) await ensureBrowser();
  await ensureNodePackages();
  mkdirSync(path.join(projectDir, '.tmp'), { recursive: true });
}

/** Where the quicker edition cannot be had, the whole browser serves as well. */
async function ensureBrowser() {
  try {
    await ensureDebianPackages('chromium');
  } catch (error) {
    if (!existsSync('/usr/bin/chromium')) throw error;
    say('The journeys go through /usr/bin/chromium, and take longer.');
  }
}

/** A build that fails is one failure, and the other tests still have their say. @param {() => void} orGoOn */
async function builds(orGoOn) {
  try {
    await ensureBuilt(orGoOn);
    return true;
  } catch (error) {
    process.stdout.write(`${error instanceof Error ? error.message : String(error)}\n`);
    total.failed += 1;
    return false;
  }
}

/** @param {string[]} projects */
async function runVitest(projects) {
  say(`Tests: ${projects.join(', ')}.`);
  const report = freshReport('vitest.json');
  const names = projects.flatMap((name) => (name === 'unit' ? ['unit', 'unit-dom'] : [name]));
  const code = await shown('vitest', [
    'run',
    ...names.map((name) => `--project=${name}`),
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ]);
  return vitestCounts(report, code);
}

async function runPlaywright() {
  say('Journeys in the browser, against the built product on a throw-away database.');
  const report = freshReport('e2e.json');
  const code = await shown('playwright', ['test'], { PLAYWRIGHT_JSON_OUTPUT_FILE: report });
  return playwrightCounts(report, code);
}

/** @param {string} name */
function freshReport(name) {
  const file = path.join(projectDir, '.tmp', name);
  rmSync(file, { force: true });
  return file;
}

/** @param {string} name @param {string[]} args @param {NodeJS.ProcessEnv} [env] */
async function shown(name, args, env = {}) {
  const done = await run(path.join(projectDir, 'node_modules/.bin', name), args, {
    cwd: projectDir,
    env: { ...process.env, NODE_ENV: 'test', ...env },
    show: true,
  });
  return done.code;
}

/** @param {{ passed: number, failed: number }} counts */
function add({ passed, failed }) {
  total.passed += passed;
  total.failed += failed;
}
