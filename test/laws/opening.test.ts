import fc from 'fast-check';
import { expect, test } from 'vitest';
import { Building, type Ring } from '@groundward/engine/building/definition';
import { analyse } from '@groundward/engine/path/analyse';
import { holds } from './floor-equilibrium.js';
import { stepped, SteppedCase } from './stepped-floor.js';

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
const momentMiddle = 40 * 36 - 36 ** 2 / 2;

test('an opening at mid-depth: two equal strips share the shear and bend between its sides and its middle', () => {
  const found = opening(floorWithOpening(20));
  const local = areaNear / 2 / 15;
  expect(found['secondary-moment']).toBeCloseTo(areaNear / 2, 9);
  expect(found['corner-force']).toBeCloseTo(local, 9);
  // The outer edges carry M/D of the middle; at the far side the strip's own moment adds to it, at the near side it relieves it.
  const far = Math.abs((40 * 6 - (42 ** 2 - 36 ** 2) / 2) / 2 / 15);
  expect(found['chord-force']).toBeCloseTo(momentMiddle / 40 + far, 9);
});

test('an opening off the middle: strips share by depth, so their edge forces are equal and the deeper one bends more', () => {
  const found = opening(floorWithOpening(15)); // strips of 10 and 20
  expect(found['secondary-moment']).toBeCloseTo((areaNear * 20) / 30, 9);
  expect(found['corner-force']).toBeCloseTo(areaNear / 30, 9);
});

const rectangle = (x0: number, y0: number, x1: number, y1: number): Ring => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];
const plain = stepped([[0, 0, 40]], 80);

test('all corners with their signs: the edges of the strips carry the moment at both sides of the opening', () => {
  const found = new SteppedCase({ outline: plain, lines: [0, 80], openings: [rectangle(30, 10, 42, 20)] });
  const [opening] = found.openings;
  const local = areaNear / 30;
  const whole = momentMiddle / 40;
  const near = opening?.ends.filter(({ s }) => s === 30) ?? [];
  expect(near.map(({ lower, upper }) => [lower.t, lower.axial, upper.t, upper.axial])).toEqual([
    [0, expect.closeTo(local - whole, 9), 10, expect.closeTo(-local, 9)],
    [20, expect.closeTo(local, 9), 40, expect.closeTo(whole - local, 9)],
  ]);
  const moment = near.reduce((sum, { lower, upper }) => sum + lower.axial * lower.t + upper.axial * upper.t, 0);
  expect(moment).toBeCloseTo(momentNear, 9);
});

test('corner ties run half the floor’s depth into it, and its net shears take them', () => {
  const found = new SteppedCase({ outline: plain, lines: [0, 80], openings: [rectangle(30, 10, 42, 20)] });
  expect(found.transfers.map(({ step, end }) => [step, end])).toEqual([
    [30, 10],
    [42, 62],
  ]);
  const [near] = found.transfers;
  expect(found.value('roof/d/o1/corner-1/strut', 'axial-compression')).toBeCloseTo(areaNear / 30, 9);
  expect(found.value('roof/d/o1/corner-4/strut', 'axial-tension')).toBeCloseTo(areaNear / 30, 9);
  // A couple A/d·10 on a beam of 40 over 20: A/d/4 at its edges.
  expect(near?.edges.map(({ axial }) => axial)).toEqual([
    expect.closeTo(areaNear / 30 / 4, 9),
    expect.closeTo(-areaNear / 30 / 4, 9),
  ]);
});

test.each([
  ['one opening', [rectangle(30, 10, 42, 20)]],
  ['one near mid-span', [rectangle(35, 15, 45, 30)]],
  ['two in one cut', [rectangle(30, 5, 42, 12), rectangle(30, 20, 42, 30)]],
  ['two along the span', [rectangle(12, 10, 18, 20), rectangle(60, 15, 66, 32)]],
  ['near a wall line', [rectangle(4, 10, 10, 20)]],
])('%s: edges, ties and struts are in equilibrium at every cut and close', (_, openings) => {
  holds({ outline: plain, lines: [0, 80], openings });
  holds({ outline: plain, lines: [0, 55, 80], openings, behaviour: 'rigid' });
});

test('at the edge of a step the ties end there', () => {
  const outline = stepped(
    [
      [0, 0, 40],
      [30, 0, 30],
    ],
    80,
  );
  const floor = { outline, lines: [0, 80], openings: [rectangle(35, 8, 45, 18)] };
  const found = new SteppedCase(floor);
  expect(found.transfers.filter(({ member }) => member.includes('/o1/')).map(({ end }) => end)).toEqual([30, 60]);
  expect(found.codes()).toContain('opening-near-line'); // 30 deep on 5
  holds(floor, found);
});

test('random rectangles in stepped floors, where no opening lies in the transfer diaphragm of another', () => {
  const opening = fc.record({
    x: fc.integer({ min: 1, max: 70 }),
    y: fc.integer({ min: 11, max: 16 }),
    width: fc.integer({ min: 1, max: 9 }),
    depth: fc.integer({ min: 1, max: 3 }),
  });
  let tried = 0;
  fc.assert(
    fc.property(opening, fc.integer({ min: 5, max: 75 }), fc.boolean(), (o, x, deepFirst) => {
      const outline = stepped(
        [
          [0, deepFirst ? 0 : 10, 30],
          [x, deepFirst ? 10 : 0, deepFirst ? 30 : 20],
        ],
        80,
      );
      const floor = { outline, lines: [0, 80], openings: [rectangle(o.x, o.y, o.x + o.width, o.y + o.depth)] };
      // An opening across the step is a shape of its own.
      if (o.x < x && x < o.x + o.width) return;
      const found = new SteppedCase(floor);
      if (found.codes().some((code) => ['opening-in-transfer', 'opening-at-step'].includes(code))) return;
      tried += 1;
      holds(floor, found);
    }),
    { numRuns: 150, seed: 7, endOnFailure: true },
  );
  expect(tried).toBeGreaterThan(20);
});

test('a side in line with a step of the outline is an open end', () => {
  const outline = stepped(
    [
      [0, 0, 40],
      [30, 0, 30],
    ],
    80,
  );
  const found = new SteppedCase({ outline, lines: [0, 80], openings: [rectangle(30, 8, 45, 18)] });
  expect(found.analysis.findings.find(({ code }) => code === 'opening-at-step')?.severity).toBe('open-end');
});

test.each([
  ['opening-strip-slender', [rectangle(20, 2, 32, 20)], [0, 80]],
  ['opening-near-line', [rectangle(6, 10, 16, 20)], [0, 80]],
  ['openings-staggered', [rectangle(20, 5, 32, 12), rectangle(25, 20, 40, 30)], [0, 80]],
  ['line-through-opening', [rectangle(30, 10, 42, 20)], [0, 36, 80]],
])('where the method meets its limits it is told: %s', (code, openings, lines) => {
  expect(new SteppedCase({ outline: plain, lines, openings }).codes()).toContain(code);
  const inside = new SteppedCase({ outline: plain, lines: [0, 80], openings: [rectangle(30, 10, 42, 20)] });
  expect(inside.codes()).not.toContain(code);
});
