import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { chmod, mkdtemp, readFile, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { isAlive } from '../../scripts/build/alive.mjs';
import { freePort } from '../../scripts/database/port.mjs';

const script = fileURLToPath(new URL('../../scripts/start.mjs', import.meta.url));

let folder: string;
let port: number;
let started: ChildProcess[];

beforeEach(async () => {
  started = [];
  folder = await mkdtemp(join(tmpdir(), 'groundward whole '));
  await chmod(folder, 0o711);
  port = await freePort();
});

afterEach(async () => {
  for (const child of started) await end(child, 'SIGTERM');
  await rm(folder, { recursive: true, force: true });
});

/** Starts all of it from a folder that isn't the checkout, and waits until it says that it is ready. */
async function start(): Promise<{ child: ChildProcess; lines: string[]; url: string; seconds: number }> {
  const begun = performance.now();
  const child = spawn(process.execPath, [script], {
    cwd: folder,
    env: { PATH: process.env['PATH'], HOME: folder, GROUNDWARD_DATA: join(folder, 'data'), PORT: String(port) },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  started.push(child);
  let said = '';
  child.stdout.setEncoding('utf8').on('data', (chunk: string) => (said += chunk));
  await expect.poll(() => said, { timeout: 120_000, interval: 20 }).toMatch(/^Groundward is ready: http\S+$/m);
  const seconds = (performance.now() - begun) / 1000;
  const url = /^Groundward is ready: (\S+)$/m.exec(said)?.[1] ?? '';
  return { child, lines: said.split('\n'), url, seconds };
}

async function end(child: ChildProcess, signal: 'SIGINT' | 'SIGTERM' | 'SIGKILL'): Promise<number | null> {
  if (child.exitCode === null && child.signalCode === null) {
    child.kill(signal);
    await once(child, 'exit');
  }
  return child.exitCode;
}

async function databasePid(): Promise<number> {
  return Number((await readFile(join(folder, 'data', 'cluster', 'postmaster.pid'), 'utf8')).split('\n')[0]);
}

async function health(url: string): Promise<unknown> {
  return (await fetch(`${url}/api/health`)).json();
}

test('one process serves dashboard and service on one port, and Ctrl-C stops all of it', async () => {
  const first = await start();
  expect(first.url).toBe(`http://127.0.0.1:${port}`);
  expect(await health(first.url)).toMatchObject({ status: 'ok', database: 'ok' });
  const page = await fetch(first.url);
  expect(page.headers.get('content-type')).toMatch(/^text\/html/);
  const database = await databasePid();
  expect(await end(first.child, 'SIGINT')).toBe(0);
  expect(isAlive(database)).toBe(false);
  await expect(fetch(first.url)).rejects.toThrow('fetch failed');

  const second = await start();
  expect(second.lines.filter((line) => /Installing|Building/.test(line))).toEqual([]);
});

test('the first start gives a link that makes an owner, whose account outlives kill -9', async () => {
  const first = await start();
  const link = first.lines.map((line) => /works once: (\S+)$/.exec(line)?.[1]).find((found) => found !== undefined);
  const token = new URL(link ?? '').searchParams.get('token');
  const account = { name: 'Ada', email: 'ada@example.org', password: 'a long enough password' };
  const made = await fetch(`${first.url}/api/owner`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: first.url },
    body: JSON.stringify({ token, ...account }),
  });
  expect(made.ok).toBe(true);
  await end(first.child, 'SIGKILL');

  const second = await start();
  expect(second.lines.join('\n')).not.toContain('works once');
  const { email, password } = account;
  const signedIn = await fetch(`${second.url}/api/auth/sign-in/email`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: second.url },
    body: JSON.stringify({ email, password }),
  });
  expect(signedIn.status).toBe(200);
});
