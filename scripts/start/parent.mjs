/** How often the parent is looked for [ms]. */
const INTERVAL = 300;

/**
 * Calls back when the process that started this one has ended. `npm start` puts a shell between npm and the service,
 * which a SIGTERM to npm ends without passing it on.
 *
 * @param {() => void} gone
 */
export function watchParent(gone) {
  const parent = process.ppid;
  const timer = setInterval(() => {
    if (process.ppid === parent) return;
    clearInterval(timer);
    gone();
  }, INTERVAL);
  timer.unref();
}
