/** Ends with 0 when the service on this machine answers that it and its database are well; for containers. */
import { readSettings } from './start/settings.mjs';

const { port } = readSettings(process.env);
const response = await fetch(`http://127.0.0.1:${port}/api/health`);
process.exitCode = response.ok ? 0 : 1;
