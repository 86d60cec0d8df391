import { buildingSchema } from '@groundward/engine/building/json-schema';
import { describe, expect, test } from 'vitest';
import { asVariant, blank, helpOf, schemaAt, shapeOf, titleOf, variantName, variantOf, variantsOf } from './schema';
import type { SchemaNode } from './schema';

const schema: SchemaNode = buildingSchema();
const loadCase = schema.properties?.['loadCases']?.items ?? {};

describe('forms from the building file’s schema', () => {
  test('a load case is shown as the variant that its fixed keys name', () => {
    const stated = { id: 'EX', kind: 'seismic', direction: 0, from: 'stated', forces: [] };
    const fromBasis = { id: 'EX', kind: 'seismic', direction: 0, from: 'basis' };
    const properties = (value: unknown) => variantsOf(loadCase)[variantOf(loadCase, value)]?.properties ?? {};
    expect(properties(stated)['from']?.const).toBe('stated');
    expect(properties(fromBasis)['from']?.const).toBe('basis');
  });

  test('another variant takes over what both know, and starts what only it asks for', () => {
    const at = variantOf(loadCase, { from: 'stated', forces: [] });
    const next = asVariant(variantsOf(loadCase)[at] ?? {}, { id: 'EY', kind: 'seismic', direction: 90, from: 'basis' });
    expect(next).toMatchObject({ id: 'EY', kind: 'seismic', direction: 90, from: 'stated' });
    expect((next as { forces: unknown[] }).forces).toHaveLength(1);
  });

  test('every part of the definition has a form: no value of unknown shape', () => {
    const seen: string[] = [];
    const walk = (node: SchemaNode, where: string): void => {
      seen.push(where);
      const shape = shapeOf(node);
      if (shape === 'text') expect(node.type, where).toBe('string');
      if (shape === 'union') for (const each of variantsOf(node)) expect(variantName(each), where).not.toBe('');
      for (const [key, part] of Object.entries(node.properties ?? {})) walk(part, `${where}.${key}`);
      if (node.items !== undefined && shape === 'list') walk(node.items, `${where}[]`);
      for (const [i, part] of (node.prefixItems ?? []).entries()) walk(part, `${where}[${i}]`);
      for (const [i, part] of variantsOf(node).entries()) walk(part, `${where}|${i}`);
    };
    walk(schema, 'building');
    expect(seen.length).toBeGreaterThan(150);
  });

  test('the schema of a place in the file follows lists, points and variants', () => {
    const document = { loadCases: [{ id: 'EX', kind: 'seismic', direction: 0, from: 'stated', forces: [{}] }] };
    expect(schemaAt(schema, ['loadCases', 0, 'forces', 0, 'force'], document).type).toBe('number');
    expect(shapeOf(schemaAt(schema, ['wallLines', 0, 'axis', 1], document))).toBe('tuple');
    expect(blank(schemaAt(schema, ['levels', 0], document))).toEqual({});
  });

  test('titles and units read as an engineer writes them', () => {
    expect(titleOf('designCategory')).toBe('Design category');
    expect(titleOf('SDS')).toBe('SDS');
    const stiffness = schemaAt(schema, ['wallLines', 0, 'storeys', 0, 'piers', 0, 'stiffness'], {});
    expect(helpOf(stiffness, { length: 'ft', force: 'kip' })).toEqual({
      help: 'Lateral stiffness along the line',
      unit: 'kip/ft',
    });
  });
});
