import { execFile, spawn } from 'node:child_process';
import { once } from 'node:events';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { promisify } from 'node:util';
import { expect, test } from 'vitest';

const run = promisify(execFile);
const root = fileURLToPath(new URL('../..', import.meta.url));
const command = join(root, 'scripts', 'groundward.mjs');
const demo = join(root, 'prisma', 'demo', '1-first-design.json');

/** What the command says on standard output, whole. */
async function output(...args: string[]): Promise<string> {
  return (await run(process.execPath, [command, ...args], { maxBuffer: 2 ** 28 })).stdout;
}

test('standard output holds nothing but the answer, whole, however long it is', async () => {
  const analysis = JSON.parse(await output('analyse', demo, '--json')) as { schema: string };
  expect(analysis.schema).toBe('groundward.analysis/1');
});

test('a path is meant from where the person stands, also through npm', async () => {
  const { stdout } = await run('npm', ['run', '-s', 'groundward', '--', 'check', 'demo/1-first-design.json'], {
    cwd: dirname(dirname(demo)),
  });
  expect(stdout).toContain('no fault');
});

test('the exit code is the command’s own', async () => {
  await expect(output('check', join(root, 'package.json'))).rejects.toMatchObject({ code: 1 });
  await expect(output('dance')).rejects.toMatchObject({ code: 2 });
});

test('a reader that goes away early is no error', async () => {
  const child = spawn(process.execPath, [command, 'analyse', demo, '--json'], { stdio: ['ignore', 'pipe', 'pipe'] });
  const said: string[] = [];
  child.stderr.on('data', (chunk: Buffer) => said.push(chunk.toString()));
  child.stdout.once('data', () => child.stdout.destroy());
  const [code] = (await once(child, 'close')) as [number | null];
  expect({ code, said: said.join('') }).toEqual({ code: 0, said: '' });
});
