/**
 * Steps and offsets in the outline. The laws follow from statics alone: the net unit shears of the panels, summed along every edge and every
 * interrupted chord, give bars that are in equilibrium with the moment at every cut and end in nothing.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Ring } from '@groundward/engine/building/definition';
import { holds } from './floor-equilibrium.js';
import { stepped, SteppedCase, unitShear, type SteppedFloor } from './stepped-floor.js';

const SKETCHES: Readonly<Record<string, SteppedFloor>> = {
  'an L': {
    outline: stepped(
      [
        [0, 0, 40],
        [30, 0, 20],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'a T': {
    outline: stepped(
      [
        [0, 0, 20],
        [30, 0, 45],
        [50, 0, 20],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'a notch': {
    outline: stepped(
      [
        [0, 0, 40],
        [30, 0, 25],
        [50, 0, 40],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'two steps in a row': {
    outline: stepped(
      [
        [0, 0, 40],
        [20, 0, 30],
        [35, 0, 15],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'two steps in a row, up and down': {
    outline: stepped(
      [
        [0, 0, 20],
        [20, 0, 30],
        [40, 0, 40],
        [60, 0, 10],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'steps on both edges at one place': {
    outline: stepped(
      [
        [0, 0, 40],
        [30, 8, 25],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'an offset: both edges step the same way': {
    outline: stepped(
      [
        [0, 0, 30],
        [30, 10, 40],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'steps on both edges at different places': {
    outline: stepped(
      [
        [0, 0, 40],
        [25, 10, 40],
        [45, 10, 30],
      ],
      80,
    ),
    lines: [0, 80],
  },
  'a step beside a wall line': {
    outline: stepped(
      [
        [0, 0, 40],
        [30, 0, 20],
      ],
      80,
    ),
    lines: [0, 22, 80],
  },
  'a step at a wall line': {
    outline: stepped(
      [
        [0, 0, 40],
        [30, 0, 20],
      ],
      80,
    ),
    lines: [0, 30, 80],
  },
  'a step on an overhang': {
    outline: stepped(
      [
        [0, 0, 40],
        [65, 0, 20],
      ],
      80,
    ),
    lines: [0, 50],
  },
  'a stated length': {
    outline: stepped(
      [
        [0, 0, 40],
        [30, 0, 20],
      ],
      80,
    ),
    lines: [0, 80],
    transferLength: 12,
  },
};

describe('edges, interrupted chords and drag struts are in equilibrium at every cut and close', () => {
  test.each(Object.entries(SKETCHES))('%s', (_, floor) => holds(floor));
  test.each(Object.entries(SKETCHES))('%s, held as a rigid body', (_, floor) =>
    holds({ ...floor, behaviour: 'rigid' }),
  );
  test.each(Object.entries(SKETCHES))('%s, upside down', (_, floor) =>
    holds({ ...floor, outline: floor.outline.map(([x, y]): [number, number] => [x, 50 - y]).reverse() }),
  );

  test('random outlines with steps on both edges, on two to four wall lines', () => {
    const part = fc.tuple(
      fc.integer({ min: 5, max: 30 }),
      fc.integer({ min: 0, max: 9 }),
      fc.integer({ min: 21, max: 30 }),
    );
    fc.assert(
      fc.property(
        fc.array(part, { minLength: 2, maxLength: 6 }),
        fc.uniqueArray(fc.integer({ min: 3, max: 97 }), { maxLength: 2 }),
        fc.option(fc.integer({ min: 2, max: 20 })),
        (widths, between, transferLength) => {
          let x = 0;
          const parts = widths.map(([width, low, high]): [number, number, number] => {
            const from = x;
            x += width;
            return [from, low, high];
          });
          const lines = [0, ...between.map((part) => (x * part) / 100).sort((a, b) => a - b), x];
          holds({ outline: stepped(parts, x), lines, ...(transferLength === null ? {} : { transferLength }) });
        },
      ),
      { numRuns: 150, seed: 41, endOnFailure: true },
    );
  });
});

describe('numbers by hand', () => {
  test('an L: the chord of the wing runs on into the deep part as a strut', () => {
    // w = 1, l = 80: R = 40; at x = 30: M = 40·30 − 30²/2 = 750, F = 750/20; the deep part is 40 across: half of F to each edge.
    const found = new SteppedCase(SKETCHES['an L'] as SteppedFloor);
    const F = 750 / 20;
    const [member] = found.transfers.map((each) => each.member);
    expect(found.value(`${member ?? ''}/strut`, 'axial-tension')).toBeCloseTo(F, 9);
    expect(found.value(`${member ?? ''}/strut`, 'axial-compression', -1)).toBeCloseTo(F, 9);
    expect(found.value(member ?? '', 'shear')).toBeCloseTo(F / 2, 9);
    // At the wall: V/d = 1 and F/2 over 30 on both sides of the strut.
    expect(found.value(member ?? '', 'net-unit-shear')).toBeCloseTo(40 / 40 + F / 2 / 30, 9);
    // Over the whole span the wing at its wall governs both: 40/20.
    expect(found.value('roof/d/1-2', 'net-unit-shear')).toBeCloseTo(2, 9);
    expect(found.value('roof/d/1-2', 'unit-shear')).toBeCloseTo(2, 9);
  });

  test('a T: the chord runs through the deep part from step to step, each transfer over the whole of it', () => {
    const found = new SteppedCase(SKETCHES['a T'] as SteppedFloor);
    expect(found.transfers.map(({ step, end }) => [step, end])).toEqual([
      [30, 50],
      [50, 30],
    ]);
    // By symmetry the strut carries 750/20 from end to end, nothing is given off along it: the net shears are the basic ones.
    expect(unitShear(found, 35, 10)).toBeCloseTo(5 / 45, 9);
    expect(unitShear(found, 35, 30)).toBeCloseTo(5 / 45, 9);
  });

  test('steps on both edges at one place: two chords into one transfer diaphragm', () => {
    const found = new SteppedCase(SKETCHES['steps on both edges at one place'] as SteppedFloor);
    expect(found.transfers).toHaveLength(1);
    const F = 750 / 17;
    expect(found.transfers[0]?.chords.map(({ t, axial }) => [t, axial])).toEqual([
      [8, expect.closeTo(-F, 9)],
      [25, expect.closeTo(F, 9)],
    ]);
    // Couple F·17 on a beam of 40: F·17/40 at both edges.
    expect(found.transfers[0]?.edges.map(({ axial }) => axial)).toEqual([
      expect.closeTo((F * 17) / 40, 9),
      expect.closeTo((-F * 17) / 40, 9),
    ]);
  });

  test('an offset: the common depth carries the moment, each side takes the chord that ends on it', () => {
    const found = new SteppedCase(SKETCHES['an offset: both edges step the same way'] as SteppedFloor);
    expect(found.transfers.map(({ step, end }) => [step, end])).toEqual([
      [30, 0],
      [30, 80],
    ]);
    for (const { chords } of found.transfers) expect(Math.abs(chords[0]?.axial ?? 0)).toBeCloseTo(750 / 20, 9);
  });

  test('a step at a wall line: the moment there is zero, and so is the strut', () => {
    const found = new SteppedCase(SKETCHES['a step at a wall line'] as SteppedFloor);
    const [transfer] = found.transfers;
    expect(transfer?.chords[0]?.axial).toBe(0);
    expect(found.value(`${transfer?.member ?? ''}/strut`, 'axial-tension')).toBe(0);
    expect(found.bars.some(({ member }) => member.endsWith('/drag'))).toBe(false);
  });

  test('a stated length ends the transfer diaphragm in the floor, with a drag strut along its end', () => {
    const found = new SteppedCase(SKETCHES['a stated length'] as SteppedFloor);
    const [transfer] = found.transfers;
    expect([transfer?.step, transfer?.end]).toEqual([30, 18]);
    // ±F/2/12 on 20 above and below.
    expect(found.value(`${transfer?.member ?? ''}/end`, 'axial-compression')).toBeCloseTo((750 / 20 / 2 / 12) * 20, 9);
    expect(found.codes()).toContain('transfer-without-line');
  });
});

describe('oblique edges', () => {
  // Deep part 0 to 30 with its upper edge falling from 50 to 40, then a wing of 20.
  const outline: Ring = [
    [0, 0],
    [80, 0],
    [80, 20],
    [30, 20],
    [30, 40],
    [0, 50],
  ];

  test('the beam across takes its arms at every cut', () => {
    const found = new SteppedCase({ outline, lines: [0, 80] });
    const F = 750 / 20;
    const flow = F / 30;
    expect(unitShear(found, 0, 10)).toBeCloseTo(40 / 50 + (flow * 30) / 50, 9);
    expect(unitShear(found, 0, 35)).toBeCloseTo(40 / 50 - (flow * 20) / 50, 9);
    expect(unitShear(found, 15, 10)).toBeCloseTo(25 / 45 + (flow * 25) / 45, 9);
    expect(unitShear(found, 15, 35)).toBeCloseTo(25 / 45 - (flow * 20) / 45, 9);
    expect(found.analysis.certificate.worstResidual).toBeLessThan(1e-9);
  });

  test('where the chord meets a falling edge the transfer diaphragm ends', () => {
    // The upper edge falls from 30 at x = 30 to 10 at x = 0: the chord at 20 meets it at x = 15.
    const narrowing: Ring = [
      [0, 0],
      [80, 0],
      [80, 20],
      [30, 20],
      [30, 30],
      [0, 10],
    ];
    const found = new SteppedCase({ outline: narrowing, lines: [0, 80] });
    expect(found.transfers.map(({ end }) => end)).toEqual([expect.closeTo(15, 9)]);
    expect(found.analysis.certificate.worstResidual).toBeLessThan(1e-9);
  });
});

describe('openings and room', () => {
  const L = stepped(
    [
      [0, 0, 40],
      [30, 0, 20],
    ],
    80,
  );
  const rectangle = (x0: number, y0: number, x1: number, y1: number): Ring => [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ];

  test('an opening on the chord ends the transfer diaphragm; without room it is told', () => {
    const found = new SteppedCase({ outline: L, lines: [0, 80], openings: [rectangle(10, 15, 25, 25)] });
    expect(found.transfers.filter(({ step }) => step === 30).map(({ end }) => end)).toEqual([25]);
    expect(found.codes()).toContain('transfer-slender'); // 40 across on 5
    expect(found.analysis.findings.find(({ code }) => code === 'transfer-slender')?.numbers?.['ratio']).toBeCloseTo(
      8,
      9,
    );
    expect(found.analysis.certificate.worstResidual).toBeLessThan(1e-9);
  });

  test('an opening beside the chord leaves the shears of every cut in equilibrium with V', () => {
    const found = new SteppedCase({ outline: L, lines: [0, 80], openings: [rectangle(10, 25, 20, 35)] });
    expect(found.codes()).toContain('opening-in-transfer');
    const V = 40 - 15;
    const sum = unitShear(found, 15, 10) * 20 + unitShear(found, 15, 22) * 5 + unitShear(found, 15, 37) * 5;
    expect(sum).toBeCloseTo(V, 9);
    expect(found.analysis.certificate.worstResidual).toBeLessThan(1e-9);
  });

  test('a ratio of 4 passes, one beyond it is told', () => {
    const codes = (x: number): string[] =>
      new SteppedCase({
        outline: stepped(
          [
            [0, 0, 40],
            [x, 0, 20],
          ],
          80,
        ),
        lines: [0, 80],
      }).codes();
    expect(codes(10)).not.toContain('transfer-slender');
    expect(codes(9.9)).toContain('transfer-slender');
  });
});

describe('a U: two wings', () => {
  // Web 60 deep up to x = 30, wings of 20 and 10 beyond, 30 apart.
  const outline: Ring = [
    [0, 0],
    [80, 0],
    [80, 20],
    [30, 20],
    [30, 50],
    [80, 50],
    [80, 60],
    [0, 60],
  ];
  const found = new SteppedCase({ outline, lines: [0, 80] });

  test('the wings share by depth, with chords of their own, which run on into the web', () => {
    // M = 750 at the step, of the wings' 30 of depth: 25 in every chord of both wings.
    expect(found.transfers).toHaveLength(1);
    expect(found.transfers[0]?.chords.map(({ t, axial }) => [t, axial])).toEqual([
      [20, expect.closeTo(25, 9)],
      [50, expect.closeTo(-25, 9)],
    ]);
    // Edges of the web: 750/60 = 12.5 and what the couple 25·30 adds over 60.
    expect(found.transfers[0]?.edges.map(({ axial }) => axial)).toEqual([
      expect.closeTo(-12.5, 9),
      expect.closeTo(12.5, 9),
    ]);
    holds({ outline, lines: [0, 80] });
  });

  test('the finding says how the wings share', () => {
    const finding = found.analysis.findings.find(({ code }) => code === 'cut-in-parts');
    expect(finding?.numbers).toEqual({ parts: 2, depth1: 20, depth2: 10 });
    expect(finding?.sentence).toContain('20 deep takes 67 %');
  });

  test('wings that change their depths are not carried over, and it is told', () => {
    const bent: Ring = [
      [0, 0],
      [80, 0],
      [80, 15],
      [60, 15],
      [60, 20],
      [30, 20],
      [30, 50],
      [80, 50],
      [80, 60],
      [0, 60],
    ];
    const changed = new SteppedCase({ outline: bent, lines: [0, 80] });
    expect(changed.analysis.findings.find(({ code }) => code === 'wings-change')?.severity).toBe('open-end');
  });
});
