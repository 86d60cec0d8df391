/** Where the person stands: `npm run` changes into the checkout, but relative paths are meant from here. */
export const calledFrom =
  process.env['npm_lifecycle_event'] === undefined ? process.cwd() : (process.env['INIT_CWD'] ?? process.cwd());
