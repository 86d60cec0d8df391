import { spawn } from 'node:child_process';

/** Waits for the end of its standard input: the end of the process that started it, even of a killed one. */
const SCRIPT = `
read -r _
pid=$(head -n 1 "$1/cluster/postmaster.pid" 2>/dev/null)
if [ -n "$pid" ]; then
  kill -QUIT "$pid" 2>/dev/null
  n=0
  while kill -0 "$pid" 2>/dev/null && [ "$n" -lt 100 ]; do sleep 0.1; n=$((n + 1)); done
fi
rm -rf -- "$1"
`;

/**
 * Removes an ephemeral database, its server and its folder, when this process ends, however it ends.
 *
 * @param {import('./home.mjs').Home} home
 * @returns {{ finish: () => Promise<void> }} `finish` does so at once
 */
export function watchOver({ folder }) {
  const child = spawn('/bin/sh', ['-c', SCRIPT, 'sh', folder], {
    cwd: '/',
    stdio: ['pipe', 'ignore', 'ignore'],
    detached: true,
  });
  child.unref();
  if ('unref' in child.stdin && typeof child.stdin.unref === 'function') child.stdin.unref();
  const gone = new Promise((resolve) => child.once('close', resolve));
  return {
    async finish() {
      child.ref();
      child.stdin.end();
      await gone;
    },
  };
}
