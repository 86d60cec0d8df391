import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Point } from '@groundward/engine/building/definition';
import { areaOf } from '@groundward/engine/diaphragms/semi-rigid/mesh';
import { Refusal } from '@groundward/engine/building/refusal';
import { cutOf } from '@groundward/engine/diaphragms/inner-forces';
import { expectEquilibrium, rectangle, solveFloor, type Floor, type Wall } from './semi-rigid-floor.js';

const part = fc.integer({ min: 0, max: 1000 }).map((value) => value / 1000);

/** A star-shaped outline about the origin, an opening near its middle, walls square and askew. */
const floor: fc.Arbitrary<Floor> = fc
  .record({
    radii: fc.array(fc.tuple(part, part), { minLength: 6, maxLength: 30 }),
    opening: fc.option(fc.tuple(part, part, part), { nil: undefined }),
    walls: fc.array(fc.tuple(fc.boolean(), part, part, part, part, part), { maxLength: 10 }),
    direction: fc.integer({ min: 0, max: 359 }),
  })
  .map(({ radii, opening, walls, direction }) => {
    const outline = radii.map(([shift, reach], i): Point => {
      const angle = ((i + 0.8 * shift) / radii.length) * 2 * Math.PI;
      return [(10 + 10 * reach) * Math.cos(angle), (10 + 10 * reach) * Math.sin(angle)];
    });
    const wall = (
      [askew, turn, x, y, length, k]: readonly [boolean, number, number, number, number, number],
      i: number,
    ) => {
      const angle = askew ? turn * Math.PI : turn < 0.5 ? 0 : Math.PI / 2;
      const reach = 3 + 20 * length;
      const [cx, cy] = [10 * (x - 0.5), 10 * (y - 0.5)];
      const [dx, dy] = [reach * Math.cos(angle), reach * Math.sin(angle)];
      const axis: [Point, Point] = [
        [cx - dx, cy - dy],
        [cx + dx, cy + dy],
      ];
      return { id: `w${i}`, axis, k: 100 + 1000 * k };
    };
    const steady: Wall[] = [
      {
        id: 'x',
        axis: [
          [-5, -4],
          [5, -4],
        ],
        k: 100,
      },
      {
        id: 'y',
        axis: [
          [-3, -5],
          [-3, 5],
        ],
        k: 100,
      },
      {
        id: 'z',
        axis: [
          [3, -5],
          [3, 5],
        ],
        k: 100,
      },
    ];
    return {
      outline,
      openings: opening === undefined ? [] : [rectangle(opening[0] - 2, -2, 1 + opening[1], 2 * opening[2] - 1)],
      walls: [...walls.map(wall), ...steady],
      direction,
    };
  });

describe('any simple plan', () => {
  test('is covered by its mesh, every wall line along its whole cut, in equilibrium', () => {
    fc.assert(
      fc.property(
        floor,
        fc.constantFrom('area' as const, 'even' as const),
        fc.double({ min: 0, max: 6, noNaN: true }),
        (plan, spread, stiffness) => {
          const solved = solveFloor(plan, { shear: 10 ** stiffness }, spread, 0.5);
          const { membrane, diaphragm } = solved;
          expect(areaOf(membrane.mesh) / diaphragm.mass.area).toBeCloseTo(1, 6);
          for (const { line, length } of membrane.lines) {
            const cut = cutOf(diaphragm, line).reduce((sum, [a, b]) => sum + b - a, 0);
            expect(length / cut).toBeCloseTo(1, 6);
          }
          expectEquilibrium(solved);
          for (const { residual } of solved.body.solved.values()) expect(residual).toBeLessThan(1e-6);
        },
      ),
      { seed: 20260, numRuns: 120 },
    );
  });
});

test('wall lines too close to each other for a mesh are refused, not lost', () => {
  const twice: Floor = {
    outline: rectangle(-10, -10, 10, 10),
    walls: [
      {
        id: 'a',
        axis: [
          [-8, -5],
          [-2, -5],
        ],
        k: 100,
      },
      {
        id: 'b',
        axis: [
          [-8, -5 + 1e-7],
          [-2, -5 + 1e-7],
        ],
        k: 100,
      },
      {
        id: 'y',
        axis: [
          [-3, -5],
          [-3, 5],
        ],
        k: 100,
      },
      {
        id: 'z',
        axis: [
          [3, -5],
          [3, 5],
        ],
        k: 100,
      },
    ],
    direction: 0,
  };
  const solve = () => expectEquilibrium(solveFloor(twice, { shear: 100 }));
  try {
    solve();
  } catch (error) {
    expect(error).toBeInstanceOf(Refusal);
  }
});
