/** The published JSON Schema of a working, made from its definition. */
import { jsonSchemaOf } from '../building/json-schema.js';
import { Working } from './result.js';

export function workingSchema(): Record<string, unknown> {
  return jsonSchemaOf(Working);
}
