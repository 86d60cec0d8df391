/**
 * `npm run bench`: times the built engine. The benchmark is compiled first, so that what is timed is what runs in the
 * service, not a test runner's rewriting of it. Arguments after `--` go to the benchmark.
 */
import { spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { ensureInstalled } from './build/install.mjs';
import { root } from './build/root.mjs';
import { runQuietly, step } from './build/step.mjs';
import { ensureBuilt } from './build/steps.mjs';
import { sentenceOf } from './fault.mjs';

const progress = (/** @type {string} */ line) => console.error(line);
const compiled = join(root, 'node_modules', '.cache', 'groundward-bench', 'bench', 'bench.js');

try {
  await ensureInstalled({ progress });
  await ensureBuilt(['engine'], { progress });
  await step('Compiling the benchmark', progress, () =>
    runQuietly(process.execPath, [join(root, 'node_modules/typescript/bin/tsc'), '-p', 'test/bench'], { cwd: root }),
  );
  const { status } = spawnSync(process.execPath, ['--expose-gc', compiled, ...process.argv.slice(2)], {
    cwd: root,
    stdio: 'inherit',
  });
  process.exitCode = status ?? 1;
} catch (error) {
  console.error(sentenceOf(error));
  process.exitCode = 1;
}
