import { mkdir, readdir, readFile, rm, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { fingerprint } from './fingerprint.mjs';
import { alone } from './lock.mjs';
import { root } from './root.mjs';
import { runQuietly, step } from './step.mjs';

/**
 * One part of the build: what it reads, what it leaves, and the program that does it.
 * @typedef {{ title: string, inputs: string[], output: string, run: () => Promise<void> }} BuildStep
 * @typedef {'engine' | 'client' | 'api' | 'web'} BuildName
 */

const everywhere = ['package-lock.json', 'tsconfig.base.json', 'scripts/build/steps.mjs'];
const engine = ['engine/src', 'engine/command', 'engine/package.json', 'engine/tsconfig.json'];
const client = ['prisma/schema.prisma', 'prisma.config.ts', 'prisma/prisma.config.ts'];
const api = ['api/src', 'api/package.json', 'api/tsconfig.json'];
// Without its tsconfig.json, which its own build completes.
const web = ['web/app', 'web/src', 'web/public', 'web/package.json', 'web/next.config.mjs', 'web/postcss.config.mjs'];

/** In the order in which they need each other. @type {Record<BuildName, BuildStep>} */
const steps = {
  engine: {
    title: 'Building the engine',
    inputs: [...everywhere, ...engine],
    output: 'engine/dist/src',
    run: () => compile('engine'),
  },
  client: {
    title: 'Generating the database client',
    inputs: [...everywhere, ...client],
    output: 'api/src/generated',
    run: generateClient,
  },
  api: {
    title: 'Building the service',
    inputs: [...everywhere, ...engine, ...client, ...api],
    output: 'api/dist/main.js',
    run: () => compile('api'),
  },
  web: {
    title: 'Building the dashboard',
    inputs: [...everywhere, ...engine, ...web],
    output: 'web/.next/BUILD_ID',
    run: buildDashboard,
  },
};

/** All parts, in the order in which they need each other. */
export const everything = /** @type {BuildName[]} */ (Object.keys(steps));

/**
 * Builds those of the named parts whose sources changed since they were last built, one after the other.
 *
 * @param {readonly BuildName[]} names
 * @param {{ progress: import('./step.mjs').Progress }} options
 * @throws Fault with the compiler's output when a part doesn't build
 */
export async function ensureBuilt(names, { progress }) {
  if (!(await anyStale(names))) return;
  await alone(join(records, 'lock'), async () => {
    for (const name of names) {
      const digest = await fingerprint(root, steps[name].inputs);
      if (!(await isStale(name, digest))) continue;
      await rm(recordOf(name), { force: true });
      await step(steps[name].title, progress, steps[name].run);
      await writeFile(recordOf(name), digest);
    }
  });
}

const records = join(root, 'node_modules', '.cache', 'groundward-build');

/** @param {BuildName} name */
const recordOf = (name) => join(records, name);

/** @param {readonly BuildName[]} names */
async function anyStale(names) {
  await mkdir(records, { recursive: true });
  for (const name of names) {
    if (await isStale(name, await fingerprint(root, steps[name].inputs))) return true;
  }
  return false;
}

/**
 * @param {BuildName} name
 * @param {string} digest of its inputs now
 */
async function isStale(name, digest) {
  const built = await readFile(recordOf(name), 'utf8').catch(() => null);
  const output = await stat(join(root, steps[name].output)).catch(() => null);
  return built !== digest || output === null;
}

/**
 * Compiles a workspace and removes from its `dist` what no source stands behind any more.
 *
 * @param {string} workspace
 */
async function compile(workspace) {
  const args = [join(root, 'node_modules/typescript/bin/tsc'), '-p', workspace, '--listEmittedFiles'];
  const output = await runQuietly(process.execPath, args, { cwd: root });
  const emitted = new Set([...output.matchAll(/^TSFILE: (.+)$/gm)].map((match) => match[1]));
  const dist = join(root, workspace, 'dist');
  for (const file of await readdir(dist, { recursive: true, withFileTypes: true })) {
    const path = join(file.parentPath, file.name);
    if (file.isFile() && !emitted.has(path)) await rm(path);
  }
}

async function generateClient() {
  await runQuietly(process.execPath, [join(root, 'node_modules/prisma/build/index.js'), 'generate'], {
    cwd: root,
    env: {
      // `generate` needs no schema engine, but would fetch one from the network if it weren't named.
      PRISMA_SCHEMA_ENGINE_BINARY: process.execPath,
      PRISMA_HIDE_UPDATE_MESSAGE: '1',
      CHECKPOINT_DISABLE: '1',
    },
  });
}

async function buildDashboard() {
  await runQuietly(process.execPath, [join(root, 'node_modules/next/dist/bin/next'), 'build'], {
    cwd: join(root, 'web'),
    env: { NEXT_TELEMETRY_DISABLED: '1', NODE_ENV: 'production' },
  });
}
