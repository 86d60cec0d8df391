import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The checkout's own folder, whatever folder a command was called from. */
export const root = join(dirname(fileURLToPath(import.meta.url)), '..', '..');
