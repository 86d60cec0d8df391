import { describe, expect, test } from 'vitest';
import type { Point } from '@groundward/engine/building/definition';
import { displacementOf, springForce } from '@groundward/engine/diaphragms/rigid';
import { across, lengthwise, rectangle, solveFloor, turnedFloor, type Floor } from './semi-rigid-floor.js';

/** 40 × 10 under a load along y on stiff walls at 0, 15 and 40, with walls along x that steady it. */
const threeWalls = (k: number): Floor => ({
  outline: rectangle(0, 0, 40, 10),
  walls: [
    across('1', 0, 10, k),
    across('2', 15, 10, k),
    across('3', 40, 10, k),
    lengthwise('A', 0, 0, 40, k),
    lengthwise('B', 10, 0, 40, k),
  ],
  direction: 90,
});

const wingWithStair: Floor = {
  outline: [
    [0, 0],
    [30, 0],
    [30, 12],
    [12, 12],
    [12, 25],
    [0, 25],
  ],
  openings: [rectangle(4, 4, 8, 9)],
  walls: [
    across('1', 0, 25, 3000),
    {
      id: '2',
      axis: [
        [12, 12],
        [12, 25],
      ],
      k: 1500,
    },
    across('3', 30, 12, 4000),
    lengthwise('A', 0, 0, 30, 2500),
    lengthwise('B', 25, 0, 12, 2000),
    {
      id: 'C',
      axis: [
        [14, 12],
        [26, 12],
      ],
      k: 1000,
    },
    {
      id: 'S',
      axis: [
        [20, 0],
        [29, 12],
      ],
      k: 800,
    },
  ],
  above: [
    [16, 5],
    [24, 5],
  ],
  direction: 90,
};

function expectEquilibrium(solved: ReturnType<typeof solveFloor>): void {
  const { membrane, outcome, inertia, model, frame } = solved;
  const t = model.frames[frame]?.t as Point;
  const s = model.frames[frame]?.s as Point;
  const moment = ([x, y]: Point, [fx, fy]: Point): number => x * fy - y * fx;
  let [fx, fy, m] = [t[0], t[1], moment([s[0] * inertia.centre, s[1] * inertia.centre], t)];
  const above = membrane.lines.find(({ line }) => line.line.id === 'above')?.line;
  if (above !== undefined) {
    fx += above.along[0];
    fy += above.along[1];
    m += moment(above.line.axis[0], above.along);
  }
  for (const [line, force] of outcome.given) {
    fx -= (force[0] as number) * line.along[0];
    fy -= (force[0] as number) * line.along[1];
    m -= (force[0] as number) * moment(line.line.axis[0], line.along);
  }
  expect(Math.abs(fx)).toBeLessThan(1e-11);
  expect(Math.abs(fy)).toBeLessThan(1e-11);
  expect(Math.abs(m)).toBeLessThan(1e-11 * model.extent);
}

describe('limits of a semi-rigid diaphragm', () => {
  test('G·t → ∞ gives the rigid answer', () => {
    for (const floor of [threeWalls(1000), wingWithStair, turnedFloor(wingWithStair, 33)]) {
      const solved = solveFloor(floor, { shear: 1e9 });
      const motion = solved.outcome.motion[0] ?? [0, 0, 0];
      for (const spring of solved.rigid.springs) {
        expect(Math.abs((solved.given[spring.line.line.id] ?? 0) - springForce(spring, motion))).toBeLessThan(1e-4);
      }
      expect(displacementOf(solved.rigid, [0, 0, 0])).toEqual([0, 0, 0]);
      expectEquilibrium(solved);
    }
  });

  test('stiff walls under an evenly loaded shear-flexible floor of constant depth take simple-span reactions', () => {
    const { given, membrane } = solveFloor(threeWalls(1e9), { shear: 100 });
    expect(membrane.assumed.axial).toBe(true);
    expect(given['1']).toBeCloseTo(7.5 / 40, 4);
    expect(given['2']).toBeCloseTo(20 / 40, 4);
    expect(given['3']).toBeCloseTo(12.5 / 40, 4);
  });
});
