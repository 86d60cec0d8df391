import { expect, test } from 'vitest';
import { Building } from '@groundward/engine/building/definition';
import { analyse } from '@groundward/engine/path/analyse';

/** A floor of 80 × 40 under 1 per unit span, with an opening of 12 × 10 whose middle is at x = 36, y = `middle`. */
function floorWithOpening(middle: number): Building {
  const line = (id: string, x: number) => ({
    id,
    axis: [
      [x, 0],
      [x, 40],
    ],
    storeys: [{ under: 'roof', piers: [{ id: 'a', from: 0, to: 40 }] }],
  });
  return Building.parse({
    schema: 'groundward.building/1',
    name: 'Floor with an opening',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      {
        id: 'roof',
        elevation: 4,
        diaphragms: [
          {
            id: 'd',
            outline: [
              [0, 0],
              [80, 0],
              [80, 40],
              [0, 40],
            ],
            openings: [
              {
                id: 'o',
                outline: [
                  [30, middle - 5],
                  [42, middle - 5],
                  [42, middle + 5],
                  [30, middle + 5],
                ],
              },
            ],
          },
        ],
      },
    ],
    wallLines: [line('1', 0), line('2', 80)],
    loadCases: [
      {
        id: 'EY',
        kind: 'seismic',
        direction: 90,
        from: 'stated',
        spread: 'even',
        forces: [{ level: 'roof', force: 80 }],
      },
    ],
  });
}

function opening(building: Building): Record<string, number> {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  const rows = result.value.demands.filter((row) => row.kind === 'opening' && row.sense === 1);
  return Object.fromEntries(rows.map((row) => [row.quantity, row.value]));
}

// Statics of a simple span under w = 1: V = 40 − s, M = 40·s − s²/2.
const areaNear = 40 * 6 - (36 ** 2 - 30 ** 2) / 2; // ∫V from 30 to 36
const momentNear = 40 * 30 - 30 ** 2 / 2;
const momentFar = 40 * 42 - 42 ** 2 / 2;

test('an opening at mid-depth: two equal strips share the shear and bend between its sides and its middle', () => {
  const found = opening(floorWithOpening(20));
  const local = areaNear / 2 / 15;
  expect(found['secondary-moment']).toBeCloseTo(areaNear / 2, 9);
  expect(found['corner-force']).toBeCloseTo(local, 9);
  const far = Math.abs((40 * 6 - (42 ** 2 - 36 ** 2) / 2) / 2 / 15);
  expect(found['chord-force']).toBeCloseTo(Math.max(momentNear / 40 + local, momentFar / 40 + far), 9);
});

test('an opening off the middle: strips share by depth, so their edge forces are equal and the deeper one bends more', () => {
  const found = opening(floorWithOpening(15)); // strips of 10 and 20
  expect(found['secondary-moment']).toBeCloseTo((areaNear * 20) / 30, 9);
  expect(found['corner-force']).toBeCloseTo(areaNear / 30, 9);
});
