/** The published JSON Schemas, made from the engine's own definitions. */
import { z } from 'zod';
import { Building } from './definition.js';

export function buildingSchema(): Record<string, unknown> {
  return jsonSchemaOf(Building);
}

/**
 * The JSON Schema of a definition (draft 2020-12). A definition with an id of its own stands in place, with `$id`, not behind a reference.
 */
export function jsonSchemaOf(definition: z.ZodType): Record<string, unknown> {
  const { $ref, $defs, ...rest } = z.toJSONSchema(definition, { unrepresentable: 'any', io: 'input' });
  const definitions = Object.entries($defs ?? {});
  const [only] = definitions;
  if ($ref === undefined || only === undefined || definitions.length > 1) {
    return { ...rest, ...($ref === undefined ? {} : { $ref }), ...($defs === undefined ? {} : { $defs }) };
  }
  const [id, body] = only;
  return { ...rest, $id: `urn:${id.replaceAll(/[./]/g, ':')}`, ...body };
}
