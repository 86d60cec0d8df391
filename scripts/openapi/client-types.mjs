/** The dashboard's client types, made from an OpenAPI document. */
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { root } from '../build/root.mjs';

/** Where they stand. */
export const CLIENT_TYPES = join(root, 'web/src/api-types.ts');

/**
 * @param {unknown} document
 * @returns {Promise<string>} TypeScript
 */
export async function clientTypes(document) {
  // The generator stands in web's own modules, beside the compiler that it needs.
  const generator = createRequire(join(root, 'web/package.json')).resolve('openapi-typescript');
  const { default: openapiTS, astToString } = createRequire(join(root, 'web/package.json'))(generator);
  return astToString(await openapiTS(JSON.stringify(document)));
}
