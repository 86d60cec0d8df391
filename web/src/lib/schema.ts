/** The building file's JSON Schema as the forms read it: the part of the language that the engine's definitions use. */
import type { Units } from '@groundward/engine/building/definition';
import { getAt, type Path } from './edit';

export type SchemaNode = {
  readonly type?: string;
  readonly description?: string;
  readonly properties?: Readonly<Record<string, SchemaNode>>;
  readonly required?: readonly string[];
  readonly items?: SchemaNode;
  readonly prefixItems?: readonly SchemaNode[];
  readonly enum?: readonly (string | number | boolean)[];
  readonly const?: string | number | boolean;
  readonly anyOf?: readonly SchemaNode[];
  readonly oneOf?: readonly SchemaNode[];
  readonly minItems?: number;
};

/** How a value of the schema is put in. */
export type Shape = 'object' | 'list' | 'tuple' | 'union' | 'choice' | 'fixed' | 'number' | 'switch' | 'text';

export function shapeOf(node: SchemaNode): Shape {
  if (node.const !== undefined) return 'fixed';
  if (choicesOf(node) !== undefined) return 'choice';
  if (variantsOf(node).length > 0) return 'union';
  if (node.prefixItems !== undefined) return 'tuple';
  if (node.type === 'object') return 'object';
  if (node.type === 'array') return 'list';
  if (node.type === 'boolean') return 'switch';
  return node.type === 'number' || node.type === 'integer' ? 'number' : 'text';
}

export function isPlain(node: SchemaNode): boolean {
  return ['choice', 'fixed', 'number', 'switch', 'text'].includes(shapeOf(node));
}

/** What may be chosen, where nothing else may stand. */
export function choicesOf(node: SchemaNode): readonly string[] | undefined {
  if (node.enum !== undefined) return node.enum.map(String);
  const variants = variantsOf(node);
  if (variants.length === 0 || !variants.every((each) => each.const !== undefined)) return undefined;
  return variants.map((each) => String(each.const));
}

export function variantsOf(node: SchemaNode): readonly SchemaNode[] {
  return node.oneOf ?? node.anyOf ?? [];
}

/** The variant of a union that a value is nearest to: all fixed keys met, then as many known keys as possible. */
export function variantOf(node: SchemaNode, value: unknown): number {
  let best = { index: 0, score: -Infinity };
  variantsOf(node).forEach((variant, index) => {
    const score = likeness(variant, value);
    if (score > best.score) best = { index, score };
  });
  return best.index;
}

function likeness(node: SchemaNode, value: unknown): number {
  switch (shapeOf(node)) {
    case 'fixed':
      return value === node.const ? 2 : -10;
    case 'choice':
      return typeof value === 'string' && (choicesOf(node) ?? []).includes(value) ? 2 : -10;
    case 'union':
      return Math.max(...variantsOf(node).map((variant) => likeness(variant, value)));
    case 'tuple':
    case 'list':
      return Array.isArray(value) ? 1 : -10;
    case 'number':
      return typeof value === 'number' ? 1 : -10;
    case 'switch':
      return typeof value === 'boolean' ? 1 : -10;
    case 'text':
      return typeof value === 'string' ? 1 : -10;
    case 'object':
      return objectLikeness(node, value);
  }
}

function objectLikeness(node: SchemaNode, value: unknown): number {
  if (value === null || typeof value !== 'object' || Array.isArray(value)) return -10;
  const record = value as Readonly<Record<string, unknown>>;
  let score = 0;
  for (const [key, property] of Object.entries(node.properties ?? {})) {
    const shape = shapeOf(property);
    if (shape === 'fixed' || shape === 'choice') {
      if (key in record) score += likeness(property, record[key]);
      else if (node.required?.includes(key) === true) score -= 2;
    } else if (key in record) score += 0.1;
  }
  for (const key of Object.keys(record)) if (node.properties?.[key] === undefined) score -= 1;
  return score;
}

/** What tells a variant from its neighbours, in a word or two. */
export function variantName(node: SchemaNode): string {
  if (node.const !== undefined) return String(node.const);
  const fixed = Object.entries(node.properties ?? {})
    .filter(([, property]) => property.const !== undefined)
    .map(([, property]) => String(property.const));
  if (fixed.length > 0) return fixed.join(', ');
  switch (shapeOf(node)) {
    case 'number':
      return 'one number';
    case 'choice':
      return 'by name';
    case 'tuple':
      return `${node.prefixItems?.length ?? 0} values`;
    case 'list':
      return 'a list of its own';
    case 'switch':
      return 'yes or no';
    case 'object':
      return Object.keys(node.properties ?? {})
        .slice(0, 2)
        .map(titleOf)
        .join(', ');
    default:
      return 'text';
  }
}

/** The least value that the schema asks for; where it asks for a number or a text, nothing stands yet. */
export function blank(node: SchemaNode): unknown {
  switch (shapeOf(node)) {
    case 'fixed':
      return node.const;
    case 'choice':
      return choicesOf(node)?.[0];
    case 'union':
      return blank(variantsOf(node)[0] ?? {});
    case 'tuple':
      return (node.prefixItems ?? []).map((each) => (shapeOf(each) === 'number' ? 0 : blank(each)));
    case 'list':
      return Array.from({ length: node.minItems ?? 0 }, () => blank(node.items ?? {}) ?? 0);
    case 'object': {
      const value: Record<string, unknown> = {};
      for (const key of node.required ?? []) {
        const part = blank(node.properties?.[key] ?? {});
        if (part !== undefined) value[key] = part;
      }
      return value;
    }
    case 'switch':
      return false;
    default:
      return undefined;
  }
}

/** A value as another variant of its union takes it over: what both know is kept. */
export function asVariant(variant: SchemaNode, value: unknown): unknown {
  const next = blank(variant);
  if (shapeOf(variant) !== 'object' || value === null || typeof value !== 'object' || Array.isArray(value)) return next;
  const kept = Object.entries(value as Record<string, unknown>).filter(([key]) => {
    const property = variant.properties?.[key];
    return property !== undefined && likeness(property, (value as Record<string, unknown>)[key]) > -10;
  });
  return { ...(next as Record<string, unknown>), ...Object.fromEntries(kept) };
}

/** `designCategory` → `Design category`; symbols such as `SDS` or `Cd` stay as they are. */
export function titleOf(key: string): string {
  if (/^[A-Z]/.test(key) || key.length <= 2) return key;
  const words = key.replaceAll(/([a-z0-9])([A-Z])(?=[a-z])/g, (_, a: string, b: string) => `${a} ${b.toLowerCase()}`);
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** The sentence of help, and the unit which it closes with, in the file's own units. */
export function helpOf(node: SchemaNode, units: Units): { readonly help: string; readonly unit: string | undefined } {
  const text = node.description ?? '';
  const found = /\[((?:force|length|rad|s|°|kg|1|mi|h|m)[^\]]*)\]/.exec(text);
  if (found === null) return { help: text, unit: undefined };
  const unit = (found[1] ?? '').replaceAll('force', units.force).replaceAll('length', units.length);
  return {
    help: text
      .replace(found[0], '')
      .replaceAll(/\s+([;,.]|$)/g, '$1')
      .trim(),
    unit,
  };
}

/** The schema of a place in the document; unions are followed by the variant that the document holds. */
export function schemaAt(schema: SchemaNode, path: Path, document: unknown): SchemaNode {
  return path.reduce<SchemaNode>((node, key, depth) => {
    const variants = variantsOf(node);
    const known = variants.length === 0 ? node : variants[variantOf(node, getAt(document, path.slice(0, depth)))];
    if (typeof key === 'number') return known?.prefixItems?.[key] ?? known?.items ?? {};
    return known?.properties?.[key] ?? {};
  }, schema);
}
