/** The published JSON Schema of an analysis, made from its definition. */
import { z } from 'zod';
import { Analysis } from './result.js';

export function analysisSchema(): Record<string, unknown> {
  return { ...z.toJSONSchema(Analysis) };
}
