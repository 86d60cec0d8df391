import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { readBuildingText } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';
import { compared } from './compared.js';
import { outOfScope } from './scope.js';

// The same buildings by dense matrices of a general-purpose package (ml-matrix), written without the engine: see `horizontal.ts`, `posts.ts`.

/** What is left between two ways of adding up the same forces, of the largest of its quantity. */
const ROUNDING = 1e-8;

const read = (path: string): Building => {
  const result = readBuildingText(readFileSync(new URL(path, import.meta.url), 'utf8'));
  if (!result.ok) throw new Error(`${path}: ${JSON.stringify(result.faults)}`);
  return result.value;
};

const files = ['../buildings/', '../../prisma/demo/'].flatMap((folder) =>
  readdirSync(new URL(folder, import.meta.url))
    .filter((name) => name.endsWith('.json') && name !== 'revisions.json')
    .map((name) => ({ name, building: read(`${folder}${name}`) })),
);
const answered = files.filter(({ building }) => outOfScope(building) === undefined);

describe('every demand of walls, piers and supports is the same', () => {
  test('most files are within what the independent solution reads', () => {
    expect(answered.length).toBeGreaterThanOrEqual(20);
  });

  test.each(answered)('$name', ({ building }) => {
    const result = analyse(building);
    if (!result.ok) throw new Error(JSON.stringify(result.faults));
    const { rows, worst } = compared(building, result.value);
    expect(rows).toBeGreaterThan(0);
    expect(worst.difference, JSON.stringify(worst)).toBeLessThan(ROUNDING);
  });
});
