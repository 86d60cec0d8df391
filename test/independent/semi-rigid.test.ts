import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Building, Point } from '@groundward/engine/building/definition';
import { analyse } from '@groundward/engine/path/analyse';
import { buildings } from '../laws/random-building.js';
import { compared } from './compared.js';

// Semi-rigid floors as sheets of bilinear rectangles (`sheet.ts`) against the engine's nine-node rectangles and six-node triangles: two
// meshes that come together as they become finer, the bilinear one with an error of the order of its size squared.

/** Of the largest of its quantity in the building, with cells of 5 m on floors of 60 × 30 m. */
const WITHIN = 0.01;

/** A random building whose floors are rectangles with an opening, semi-rigid, with façades along the edges of the grid. */
function semiRigid(building: Building, shear: number, chord: number | undefined): Building {
  const outline: Point[] = [
    [0, 0],
    [60, 0],
    [60, 30],
    [0, 30],
  ];
  return {
    ...building,
    levels: building.levels.map((level) => ({
      ...level,
      ...(level.diaphragms === undefined
        ? {}
        : {
            diaphragms: level.diaphragms.map(({ weight, ...floor }) => ({
              ...floor,
              outline,
              behaviour: 'semi-rigid' as const,
              assembly: 'sheet',
              meshSize: 3,
              weight: { ...weight, lines: (weight?.lines ?? []).filter(({ id }) => id === 'f') },
            })),
          }),
    })),
    assemblies: {
      diaphragms: [
        { id: 'sheet', apparentShearStiffness: shear, ...(chord === undefined ? {} : { chordStiffness: chord }) },
      ],
    },
    loadCases: building.loadCases
      .filter((each) => each.from !== 'combined')
      .map(({ accidental: _, ...loadCase }) => ({ ...loadCase, spread: 'weight' as const })),
  };
}

const low = fc
  .record({
    building: buildings({ behaviours: 'rigid' }).filter(({ levels }) => levels.length <= 3),
    shear: fc.constantFrom(100, 1000, 1e4),
    chord: fc.constantFrom(undefined, 1e5),
  })
  .map(({ building, shear, chord }) => semiRigid(building, shear, chord));

test('every demand of 10 random buildings comes closer to the independent one as its mesh becomes finer', () => {
  fc.assert(
    fc.property(low, (building) => {
      const result = analyse(building);
      if (!result.ok) throw new Error(JSON.stringify(result.faults));
      const [coarse, fine] = [10, 5].map((size) => compared(building, result.value, size).worst);
      expect(fine?.difference, JSON.stringify(fine)).toBeLessThan(WITHIN);
      expect(fine?.difference).toBeLessThan(0.9 * (coarse?.difference ?? NaN));
    }),
    { seed: 1904, numRuns: 10, endOnFailure: true },
  );
});
