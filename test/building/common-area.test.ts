import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Ring } from '@groundward/engine/building/definition';
import { commonArea } from '@groundward/engine/geometry/common-area';

const rectangle = (x: number, y: number, width: number, depth: number): Ring => [
  [x, y],
  [x + width, y],
  [x + width, y + depth],
  [x, y + depth],
];

const turned = (ring: Ring, degrees: number): Ring => {
  const [c, s] = [Math.cos((degrees * Math.PI) / 180), Math.sin((degrees * Math.PI) / 180)];
  return ring.map(([x, y]): [number, number] => [c * x - s * y, s * x + c * y]);
};

test('an L and a square across its re-entrant corner', () => {
  const l: Ring = [
    [0, 0],
    [30, 0],
    [30, 10],
    [12, 10],
    [12, 20],
    [0, 20],
  ];
  expect(commonArea({ outline: l }, { outline: rectangle(10, 8, 4, 4) })).toBeCloseTo(2 * 4 + 2 * 2, 12);
  expect(commonArea({ outline: l }, { outline: rectangle(12, 10, 5, 5) })).toBeCloseTo(0, 12);
});

test('a square and the same square turned by 45° have a regular octagon in common', () => {
  const square = rectangle(-1, -1, 2, 2);
  // Regular octagon about a circle of radius 1: area 8·tan(22.5°)
  expect(commonArea({ outline: square }, { outline: turned(square, 45) })).toBeCloseTo(8 * Math.tan(Math.PI / 8), 12);
});

test('openings count on neither side', () => {
  const a = { outline: rectangle(0, 0, 10, 10), openings: [{ outline: rectangle(2, 2, 4, 4) }] };
  const b = { outline: rectangle(3, 3, 10, 10), openings: [{ outline: rectangle(5, 5, 2, 2) }] };
  // 7 × 7, less 3 × 3 of the first opening and 2 × 2 of the second, of which 1 × 1 is both
  expect(commonArea(a, b)).toBeCloseTo(49 - 9 - 4 + 1, 12);
});

test('rectangles in any place, turn and order', () => {
  const side = fc.double({ min: 0.1, max: 20, noNaN: true });
  const place = fc.double({ min: -20, max: 20, noNaN: true });
  const common = (a: number, b: number, c: number, d: number): number =>
    Math.max(0, Math.min(a + b, c + d) - Math.max(a, c));
  fc.assert(
    fc.property(
      fc.tuple(place, place, side, side),
      fc.tuple(place, place, side, side),
      fc.integer({ min: 0, max: 359 }),
      (first, second, degrees) => {
        const expected =
          common(first[0], first[2], second[0], second[2]) * common(first[1], first[3], second[1], second[3]);
        const a = { outline: turned(rectangle(...first), degrees) };
        const b = { outline: turned(rectangle(...second), degrees).reverse() };
        expect(Math.abs(commonArea(a, b) - expected)).toBeLessThan(1e-9);
        expect(Math.abs(commonArea(b, a) - expected)).toBeLessThan(1e-9);
      },
    ),
  );
});
