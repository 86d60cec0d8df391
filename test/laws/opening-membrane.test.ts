/**
 * The strips' shares of the shear beside an opening against an independent solution: a plane-stress membrane on stiff walls, whose shear
 * flow is read from its displacements. The method shares by depth: found
 * to be right within 2 % for strips not longer than about their depth, and within 6 % for one 12 long and 5 deep.
 */
import { expect, test } from 'vitest';
import { locate, shapesAt } from '@groundward/engine/diaphragms/semi-rigid/shapes';
import { toLocal } from '@groundward/engine/diaphragms/semi-rigid/axes';
import { rectangle, solveFloor } from './semi-rigid-floor.js';

const SHEAR = 1000;

/** Part of the shear of the cut at x = 36 that goes through the strip under an opening of 12 × 10, `low` deep, in a floor of 80 × 40. */
function lowerShare(low: number, axial: number): number {
  const { membrane, outcome } = solveFloor(
    {
      outline: rectangle(0, 0, 80, 40),
      openings: [rectangle(30, low, 42, low + 10)],
      walls: [
        {
          id: '1',
          axis: [
            [0, 0],
            [0, 40],
          ],
          k: 1e7,
        },
        {
          id: '2',
          axis: [
            [80, 0],
            [80, 40],
          ],
          k: 1e7,
        },
        {
          id: 'A',
          axis: [
            [0, 0],
            [80, 0],
          ],
          k: 1e5,
        },
        {
          id: 'B',
          axis: [
            [0, 40],
            [80, 40],
          ],
          k: 1e5,
        },
      ],
      direction: 90,
    },
    { shear: SHEAR, axial, size: 1 },
  );
  const displacement = outcome.displacement[0] as Float64Array;
  const moved = (x: number, y: number): [number, number] => {
    const [u, v] = toLocal(membrane.axes, [x, y]);
    const located = locate(membrane.mesh, u, v);
    const shapes = shapesAt(located);
    let ux = 0;
    let uy = 0;
    located.nodes.forEach((node, i) => {
      ux += (shapes[i] as number) * (displacement[2 * node] as number);
      uy += (shapes[i] as number) * (displacement[2 * node + 1] as number);
    });
    return [ux, uy];
  };
  const step = 1e-4;
  const flow = (x: number, y: number): number =>
    (SHEAR * (moved(x, y + step)[0] - moved(x, y - step)[0] + moved(x + step, y)[1] - moved(x - step, y)[1])) /
    (2 * step);
  const through = (from: number, to: number): number => {
    const n = 400;
    let sum = 0;
    for (let i = 0; i < n; i++) sum += flow(36.03, from + ((to - from) * (i + 0.5)) / n);
    return (sum * (to - from)) / n;
  };
  const [below, above] = [through(0, low), through(low + 10, 40)];
  return below / (below + above);
}

test.each([
  [15, 0.001],
  [10, 0.02],
  [5, 0.06],
])('a strip %d deep of 30 takes its part by depth within %d where the floor does not bend', (low, within) => {
  expect(Math.abs(lowerShare(low, 1000 * SHEAR) / (low / 30) - 1)).toBeLessThan(within);
});

test.each([
  [15, 0.001],
  [10, 0.02],
])(
  'a strip %d deep of 30 takes its part by depth within %d where the floor bends as an isotropic sheet',
  (low, within) => {
    expect(Math.abs(lowerShare(low, 2 * SHEAR) / (low / 30) - 1)).toBeLessThan(within);
  },
);
