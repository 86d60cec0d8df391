/** The published JSON Schema of an analysis, made from its definition. */
import { jsonSchemaOf } from '../building/json-schema.js';
import { Analysis } from './result.js';

export function analysisSchema(): Record<string, unknown> {
  return jsonSchemaOf(Analysis);
}
