/** The published JSON Schema of the building file, made from its definition. */
import { z } from 'zod';
import { Building } from './definition.js';

export function buildingSchema(): Record<string, unknown> {
  return { ...z.toJSONSchema(Building) };
}
