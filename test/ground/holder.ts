import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { createInterface } from 'node:readline';
import { fileURLToPath } from 'node:url';

/** Another process that holds a database, or was refused one. */
export interface Holder {
  readonly url: string | null;
  readonly refused: string | null;
  readonly pid: number;
  /** Ends the process in the given way and waits until it is gone. */
  end(signal: 'SIGTERM' | 'SIGKILL'): Promise<void>;
}

/** Starts a process of its own that opens the database in a folder; an ephemeral one when no folder is given. */
export async function holdDatabase(dataDir?: string): Promise<Holder> {
  const script = fileURLToPath(new URL('./hold-database.mjs', import.meta.url));
  const child = spawn(process.execPath, [script, ...(dataDir === undefined ? [] : [dataDir])], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const { url, refused } = JSON.parse(await firstLine(child)) as { url?: string; refused?: string };
  return {
    url: url ?? null,
    refused: refused ?? null,
    pid: child.pid ?? 0,
    async end(signal) {
      if (child.exitCode !== null || child.signalCode !== null) return;
      child.kill(signal);
      await once(child, 'exit');
    },
  };
}

async function firstLine(child: ChildProcess): Promise<string> {
  if (child.stdout === null) throw new Error('The process has no output.');
  for await (const line of createInterface({ input: child.stdout })) return line;
  throw new Error('The process ended without a word.');
}
