import fc from 'fast-check';
import { expect, test } from 'vitest';
import { analyse } from '@groundward/engine/path/analyse';
import { buildings } from '../laws/random-building.js';
import { compared } from './compared.js';

/** What is left between two ways of adding up the same forces, of the largest of its quantity. */
const ROUNDING = 1e-8;

test.each(['flexible', 'rigid', 'mixed'] as const)('80 random buildings, floors %s', (behaviours) => {
  let rows = 0;
  fc.assert(
    fc.property(buildings({ behaviours }), (building) => {
      const result = analyse(building);
      if (!result.ok) throw new Error(JSON.stringify(result.faults));
      const found = compared(building, result.value);
      rows += found.rows;
      expect(found.worst.difference, JSON.stringify(found.worst)).toBeLessThan(ROUNDING);
    }),
    { seed: 1904, numRuns: 80, endOnFailure: true },
  );
  expect(rows).toBeGreaterThan(10_000);
});
