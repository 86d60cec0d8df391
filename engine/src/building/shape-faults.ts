/** Faults of a file's shape: what the definition's schema finds, said in one sentence each. */
import { z } from 'zod';
import { Building } from './definition.js';
import type { Fault } from './fault.js';

/** `levels[1].diaphragms[0].outline` from a path of keys and indices. */
export function jsonPath(path: readonly PropertyKey[]): string {
  let out = '';
  for (const part of path) {
    if (typeof part === 'number') out += `[${part}]`;
    else if (/^[\p{L}\p{N}_$-]{1,64}$/u.test(String(part))) out += `${out === '' ? '' : '.'}${String(part)}`;
    else out += `[${shown(String(part))}]`;
  }
  return out;
}

/** @param most faults that are said in full; the ones beyond are only counted */
export function shapeFaults(error: z.ZodError, most: number): Fault[] {
  const faults: Fault[] = [];
  for (const issue of error.issues) {
    if (faults.length <= most) {
      for (const fault of faultsOf(issue, [], most)) faults.push(fault);
    } else faults.push(BEYOND);
  }
  return faults;
}

const BEYOND: Fault = { code: 'wrong-value', path: '', found: 'a fault beyond those listed', expected: 'none' };

function faultsOf(issue: z.core.$ZodIssue, above: readonly PropertyKey[], most: number): Fault[] {
  const path = [...above, ...issue.path];
  const where = jsonPath(path);
  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.map((key, i) => {
        if (i > most) return BEYOND;
        const near = nearestKey(key);
        return {
          code: 'unknown-key',
          path: jsonPath([...path, key]),
          found: `the unknown key ${shown(key)}`,
          expected: 'only keys of the format',
          ...(near === undefined ? {} : { hint: `did you mean "${near}"?` }),
        };
      });
    case 'invalid_union':
      return unionFaults(issue, path, most);
    case 'invalid_type':
      return [
        issue.input === undefined
          ? { code: 'missing', path: where, found: 'nothing', expected: typeName(issue.expected) }
          : { code: 'wrong-type', path: where, found: shown(issue.input), expected: typeName(issue.expected) },
      ];
    case 'invalid_value':
      return [
        {
          code: issue.input === undefined ? 'missing' : 'wrong-value',
          path: where,
          found: issue.input === undefined ? 'nothing' : shown(issue.input),
          expected: issue.values.map((value) => JSON.stringify(value)).join(' or '),
        },
      ];
    case 'too_small': {
      const least = `${issue.inclusive === false ? 'more than' : 'at least'} ${String(issue.minimum)}`;
      return [
        {
          code: 'out-of-range',
          path: where,
          found: sized(issue.input, issue.origin),
          expected: `${least}${counted(issue.origin)}`,
        },
      ];
    }
    case 'too_big': {
      const most = `${issue.inclusive === false ? 'less than' : 'at most'} ${String(issue.maximum)}`;
      return [
        {
          code: 'out-of-range',
          path: where,
          found: sized(issue.input, issue.origin),
          expected: `${most}${counted(issue.origin)}`,
        },
      ];
    }
    default:
      return [{ code: 'wrong-value', path: where, found: shown(issue.input), expected: issue.message }];
  }
}

/** A union's fault: the one of the branch that fits best, or that none fits. */
function unionFaults(issue: z.core.$ZodIssueInvalidUnion, path: readonly PropertyKey[], most: number): Fault[] {
  if (issue.discriminator !== undefined) return [discriminatorFault(issue, path, issue.discriminator)];
  const branches = issue.errors.map((errors) => errors.flatMap((inner) => faultsOf(inner, path, most)));
  const deep = branches.filter((faults) => faults.every((fault) => fault.path !== jsonPath(path)));
  const best = deep.sort((a, b) => a.length - b.length)[0];
  if (best !== undefined && best.length > 0) return best;
  const expected = [...new Set(branches.flatMap((faults) => faults.map((fault) => fault.expected)))].join(' or ');
  return [
    {
      code: issue.input === undefined ? 'missing' : 'wrong-value',
      path: jsonPath(path),
      found: issue.input === undefined ? 'nothing' : shown(issue.input),
      expected: expected === '' ? 'one of the allowed forms' : expected,
    },
  ];
}

/** A key whose value says which form an object has, such as `from` of a load case. */
function discriminatorFault(
  issue: z.core.$ZodIssueInvalidUnion,
  path: readonly PropertyKey[],
  discriminator: string,
): Fault {
  const { input } = issue;
  const options: readonly unknown[] = 'options' in issue && Array.isArray(issue.options) ? issue.options : [];
  const value =
    input !== null && typeof input === 'object' && Object.hasOwn(input, discriminator)
      ? (input as Record<string, unknown>)[discriminator]
      : undefined;
  return {
    code: value === undefined ? 'missing' : 'wrong-value',
    path: jsonPath(path),
    found: shown(value),
    expected: options.map((option) => JSON.stringify(option)).join(' or '),
  };
}

function typeName(expected: string): string {
  const names: Record<string, string> = {
    number: 'a finite number',
    string: 'a text',
    array: 'a list',
    tuple: 'a list',
    object: 'an object',
    boolean: 'true or false',
    record: 'an object',
  };
  return names[expected] ?? expected;
}

function counted(origin: string): string {
  return origin === 'array' ? ' entries' : origin === 'string' ? ' characters' : '';
}

function sized(input: unknown, origin: string): string {
  if (Array.isArray(input)) return `${input.length} entries`;
  if (typeof input === 'string' && origin === 'string') return `${input.length} characters`;
  return shown(input);
}

/** A value as the fault shows it, never longer than a line. */
export function shown(value: unknown): string {
  if (value === undefined) return 'nothing';
  if (typeof value === 'number') return String(value);
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (value !== null && typeof value === 'object') return 'an object';
  const text = typeof value === 'string' ? JSON.stringify(value) : `${value as boolean | null | bigint}`;
  return text.length > 60 ? `${text.slice(0, 57)}…` : text;
}

let keys: readonly string[] | undefined;

/** The key of the format that a mistyped one is nearest to, within two letters. */
function nearestKey(key: string): string | undefined {
  keys ??= [...new Set(propertyNames(z.toJSONSchema(Building)))];
  let best: { name: string; distance: number } | undefined;
  for (const name of keys) {
    const distance = editDistance(key.slice(0, 64).toLowerCase(), name.toLowerCase());
    if (distance <= 2 && distance < name.length && (best === undefined || distance < best.distance))
      best = { name, distance };
  }
  return best?.name;
}

function propertyNames(schema: unknown): string[] {
  if (schema === null || typeof schema !== 'object') return [];
  const own =
    'properties' in schema && typeof schema.properties === 'object' && schema.properties !== null
      ? Object.keys(schema.properties)
      : [];
  return [...own, ...Object.values(schema).flatMap(propertyNames)];
}

/** Levenshtein's distance. */
function editDistance(a: string, b: string): number {
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i++) {
    const next = [i];
    for (let j = 1; j <= b.length; j++) {
      const change = (row[j - 1] as number) + (a[i - 1] === b[j - 1] ? 0 : 1);
      next.push(Math.min(change, (row[j] as number) + 1, (next[j - 1] as number) + 1));
    }
    row = next;
  }
  return row[b.length] as number;
}
