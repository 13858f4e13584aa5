// @ts-check
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureBuild } from './build.mjs';
import { ensureModules } from './modules.mjs';
import { ensurePackages } from './packages.mjs';
import { freePort } from './ports.mjs';
import { startPostgres } from './postgres.mjs';
import { startRedis } from './redis.mjs';
import { LaunchProblem, runCommand } from './run-command.mjs';
import { testParts } from './test-parts.mjs';

const folder = path.resolve('.data/test');

/** @type {import('./child.mjs').Child[]} */
const services = [];

/** Runs the parts, or those named; prints `N passed, N failed` as the last line. */
async function main() {
  const wanted = process.argv.slice(2);
  const unknown = wanted.find((name) => !(name in testParts));
  if (unknown) throw new LaunchProblem(`No part "${unknown}"; parts: ${Object.keys(testParts).join(', ')}`);
  const names = wanted.length > 0 ? wanted : Object.keys(testParts);
  const needs = names.map((name) => testParts[name]?.needs);
  if (needs.some(Boolean)) await ensurePackages({ withBrowser: needs.includes('build') });
  await ensureModules();
  mkdirSync(folder, { recursive: true });
  let env = { ...process.env, NEXT_TELEMETRY_DISABLED: '1', TZ: 'UTC' };
  const total = { passed: 0, failed: 0 };
  for (const name of names) {
    const part = testParts[name];
    if (!part) continue;
    const started = Date.now();
    console.log(`\n── ${name} ──`);
    if (part.needs && services.length === 0) env = { ...env, ...(await startServices()) };
    if (part.needs === 'build') await ensureBuild();
    const result = part.commands
      ? await runCommands(part.commands, env)
      : await runProjects(name, part.projects ?? [], env);
    total.passed += result.passed;
    total.failed += result.failed;
    console.log(
      `── ${name}: ${result.passed} passed, ${result.failed} failed in ${((Date.now() - started) / 1000).toFixed(0)} s`,
    );
  }
  return total;
}

async function startServices() {
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  const postgres = await startPostgres({ folder, port: await freePort(), throwAway: true });
  services.push(postgres.child);
  const redis = await startRedis({ folder, port: await freePort() });
  services.push(redis.child);
  return { TEST_DATABASE_SUPERUSER_URL: postgres.superuserUrl, TEST_REDIS_URL: redis.url };
}

/**
 * @param {string[][]} commands
 * @param {NodeJS.ProcessEnv} env
 */
async function runCommands(commands, env) {
  for (const command of commands) {
    const { code } = await runCommand('npx', ['--no-install', ...command], { env, show: true });
    if (code !== 0) return { passed: 0, failed: 1 };
  }
  return { passed: 1, failed: 0 };
}

/**
 * @param {string} name
 * @param {string[]} projects
 * @param {NodeJS.ProcessEnv} env
 */
async function runProjects(name, projects, env) {
  const report = path.join(folder, `${name}.json`);
  const choice = projects.flatMap((project) => ['--project', project]);
  const { code } = await runCommand(
    'npx',
    [
      '--no-install',
      'vitest',
      'run',
      ...choice,
      '--passWithNoTests',
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${report}`,
    ],
    { env, show: true },
  );
  if (!existsSync(report)) return { passed: 0, failed: code === 0 ? 0 : 1 };
  const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(report, 'utf8'));
  // A file that fails to load has no failed test of its own, yet the run has failed.
  return { passed: numPassedTests, failed: numFailedTests === 0 && code !== 0 ? 1 : numFailedTests };
}

async function stopServices() {
  for (const child of services.reverse()) await child.stop('SIGINT');
}

let total = { passed: 0, failed: 1 };
try {
  total = await main();
} catch (error) {
  console.error(error instanceof LaunchProblem ? error.message : error);
} finally {
  await stopServices();
}
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 && total.passed > 0 ? 0 : 1);
