import { chmod, mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { fingerprint } from '../../scripts/build/fingerprint.mjs';
import { isInstalled } from '../../scripts/build/install.mjs';
import { alone } from '../../scripts/build/lock.mjs';
import { findChromium } from '../../scripts/test/chromium.mjs';
import { tallyOf } from '../../scripts/test/vitest.mjs';

let folder: string;

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'groundward-build-'));
});

afterEach(async () => {
  await rm(folder, { recursive: true, force: true });
});

async function write(path: string, content: string): Promise<void> {
  await mkdir(dirname(join(folder, path)), { recursive: true });
  await writeFile(join(folder, path), content);
}

describe('packages count as installed', () => {
  const zod = { version: '4.6.7', integrity: 'sha512-a' };
  const lock = {
    '': { name: 'groundward' },
    engine: { name: 'engine' },
    'node_modules/zod': zod,
    'node_modules/of-another-platform': { version: '1.0.0', optional: true },
  };

  async function installed(found: Record<string, object> | null): Promise<boolean> {
    await write('package-lock.json', JSON.stringify({ packages: lock }));
    if (found !== null) await write('node_modules/.package-lock.json', JSON.stringify({ packages: found }));
    return isInstalled(folder);
  }

  test('when all that the lock file names is there, but for other platforms’ binaries', async () => {
    expect(await installed({ 'node_modules/zod': zod })).toBe(true);
  });

  test('not in a fresh clone, nor where an installation was broken off', async () => {
    expect(await installed(null)).toBe(false);
  });

  test('not when one is missing', async () => {
    expect(await installed({})).toBe(false);
  });

  test('not when one has another version or content', async () => {
    expect(await installed({ 'node_modules/zod': { ...zod, version: '4.6.6' } })).toBe(false);
    expect(await installed({ 'node_modules/zod': { ...zod, integrity: 'sha512-b' } })).toBe(false);
  });
});

describe('the fingerprint of sources', () => {
  beforeEach(async () => {
    await write('engine/src/a.ts', 'one');
    await write('engine/src/b.ts', 'two');
  });

  const of = () => fingerprint(folder, ['engine']);

  test('changes with a content, a name, and a file more', async () => {
    const seen = [await of()];
    await write('engine/src/a.ts', 'other');
    seen.push(await of());
    await write('engine/src/c.ts', '');
    seen.push(await of());
    await rm(join(folder, 'engine/src/a.ts'));
    await write('engine/src/d.ts', 'other');
    seen.push(await of());
    expect(new Set(seen).size).toBe(4);
  });

  test('does not change with what a build writes', async () => {
    const before = await of();
    await write('engine/dist/a.js', 'one');
    await write('engine/node_modules/x/index.js', '');
    expect(await of()).toBe(before);
  });
});

describe('the lock of a build', () => {
  test('lets one in at a time', async () => {
    const lock = join(folder, 'lock');
    let inside = 0;
    const most = await Promise.all(
      [1, 2, 3].map(() =>
        alone(lock, async () => {
          inside += 1;
          const seen = inside;
          await new Promise((resolve) => setTimeout(resolve, 30));
          inside -= 1;
          return seen;
        }),
      ),
    );
    expect(most).toEqual([1, 1, 1]);
  });

  test('is void when its process is gone', async () => {
    await write('lock', '999999999');
    expect(await alone(join(folder, 'lock'), () => Promise.resolve('done'))).toBe('done');
  });

  test('is given back by work that fails', async () => {
    const lock = join(folder, 'lock');
    await expect(alone(lock, () => Promise.reject(new Error('no')))).rejects.toThrow('no');
    expect(await alone(lock, () => Promise.resolve('done'))).toBe('done');
  });
});

describe('the browser for the tests', () => {
  async function program(path: string, exitCode: number): Promise<string> {
    await write(path, `#!/bin/sh\nexit ${exitCode}\n`);
    await chmod(join(folder, path), 0o755);
    return join(folder, path);
  }

  test('is the one that CHROMIUM_PATH names, and no other', async () => {
    const named = await program('mine', 0);
    expect(findChromium({ CHROMIUM_PATH: named }).path).toBe(named);
    const missing = join(folder, 'missing');
    expect(findChromium({ CHROMIUM_PATH: missing, PATH: process.env['PATH'] })).toEqual({
      path: null,
      looked: [missing],
    });
  });

  test('is the first along the PATH that starts: a stub does not', async () => {
    await program('stubs/chromium', 1);
    const real = await program('real/google-chrome', 0);
    const path = ['stubs', 'real'].map((name) => join(folder, name)).join(':');
    expect(findChromium({ PATH: path }).path).toBe(real);
  });
});

describe('the closing line', () => {
  const report = (numbers: object, testResults: object[] = []) =>
    JSON.stringify({
      numPassedTests: 0,
      numFailedTests: 0,
      numPendingTests: 0,
      numTodoTests: 0,
      testResults,
      ...numbers,
    });

  test('counts what passed, failed and was skipped', () => {
    const ran = report({ numPassedTests: 5, numFailedTests: 2, numPendingTests: 1, numTodoTests: 1 });
    expect(tallyOf(ran, 1)).toEqual({ passed: 5, failed: 2, skipped: 2 });
  });

  test('counts a file that does not load as a failure', () => {
    const ran = report({ numPassedTests: 5 }, [{ status: 'failed', assertionResults: [] }]);
    expect(tallyOf(ran, 1)).toEqual({ passed: 5, failed: 1, skipped: 0 });
  });

  test('never tells of success when the runner failed', () => {
    expect(tallyOf(report({ numPassedTests: 5 }), 1)).toEqual({ passed: 5, failed: 1, skipped: 0 });
    expect(tallyOf(null, 1)).toEqual({ passed: 0, failed: 1, skipped: 0 });
  });
});
