import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Building, Point } from '@groundward/engine/building/definition';
import { readBuilding } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';
import { trace } from '@groundward/engine/path/trace';
import type { Analysis, Demand, DiaphragmDiagram } from '@groundward/engine/path/result';
import { buildings } from './random-building.js';

const runs = { numRuns: 150, seed: 20261, endOnFailure: true };

function analysed(building: Building): Analysis {
  const read = readBuilding(building);
  if (!read.ok) throw new Error(`the generator made a faulty building: ${JSON.stringify(read.faults.slice(0, 3))}`);
  const result = analyse(read.value);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

/** Nothing in it is shared, whatever the generator shared. */
const copyOf = (building: Building): Building => JSON.parse(JSON.stringify(building)) as Building;

const LATERAL = /^E[XY]/;

const keyOf = ({ member, quantity, case: caseId, sense, combination }: Demand): string =>
  `${member}|${quantity}|${caseId}|${sense}|${combination ?? ''}`;

/** Places and centres move with the plan; forces do not. */
const FORCES = (row: Demand): boolean => !row.quantity.startsWith('centre-of');

function forcesOf(analysis: Analysis, rename: (row: Demand) => string = keyOf): Map<string, number> {
  return new Map(analysis.demands.filter(FORCES).map((row) => [rename(row), row.value]));
}

/** Equal up to rounding against the largest of its quantity; rows that are zero may be missing on either side. */
function same(a: ReadonlyMap<string, number>, b: ReadonlyMap<string, number>, tolerance = 1e-9): void {
  const scale = Math.max(1, ...[...a.values(), ...b.values()].map(Math.abs));
  for (const key of new Set([...a.keys(), ...b.keys()])) {
    const difference = Math.abs((a.get(key) ?? 0) - (b.get(key) ?? 0));
    if (difference > tolerance * scale) throw new Error(`${key}: ${a.get(key)} against ${b.get(key)}`);
  }
}

const turned = (building: Building, move: (point: Point) => Point, turn: number): Building => {
  const copy = copyOf(building);
  const ring = (points: Point[]): Point[] => points.map(move);
  for (const level of copy.levels) {
    for (const diaphragm of level.diaphragms ?? []) {
      diaphragm.outline = ring(diaphragm.outline);
      for (const opening of diaphragm.openings ?? []) opening.outline = ring(opening.outline);
      for (const zone of diaphragm.weight?.zones ?? []) zone.outline = ring(zone.outline);
      for (const line of diaphragm.weight?.lines ?? []) line.along = ring(line.along);
    }
  }
  for (const line of copy.wallLines) line.axis = [move(line.axis[0]), move(line.axis[1])];
  for (const loadCase of copy.loadCases) {
    if (loadCase.from !== 'combined') loadCase.direction = (((loadCase.direction + turn) % 360) + 360) % 360;
  }
  return copy;
};

describe('equilibrium', () => {
  test('the certificate stays below its bound, and sums of demand rows agree with the applied forces', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        const analysis = analysed(building);
        expect(analysis.certificate.worstResidual).toBeLessThan(1e-9);
        const height = new Map(building.levels.map((level) => [level.id, level.elevation]));
        for (const loadCase of building.loadCases) {
          if (loadCase.from !== 'stated') continue;
          const total = loadCase.forces.reduce((sum, { force }) => sum + force, 0);
          const overturning = loadCase.forces.reduce(
            (sum, { level, force }) => sum + force * (height.get(level) ?? 0),
            0,
          );
          const size = loadCase.forces.reduce((sum, { force }) => sum + Math.abs(force), 0);
          const axis = loadCase.direction === 0 ? 0 : 1;
          const rows = analysis.demands.filter(
            (row) => row.case === loadCase.id && row.sense === 1 && row.combination === undefined,
          );
          const base = rows
            .filter((row) => row.kind === 'wall-line' && row.quantity === 'shear' && row.member.endsWith('/L2'))
            .reduce((sum, row) => {
              const line = building.wallLines.find((candidate) => candidate.id === row.member.split('/')[0]);
              const [a, b] = line?.axis ?? [
                [0, 0],
                [0, 0],
              ];
              return sum + row.value * Math.sign(b[axis] - a[axis]);
            }, 0);
          expect(Math.abs(base - total)).toBeLessThanOrEqual(1e-9 * size);
          const posts = rows.filter(
            (row) => row.kind === 'support' && (row.quantity === 'bearing' || row.quantity === 'uplift'),
          );
          const down = (row: Demand): number => (row.quantity === 'bearing' ? row.value : -row.value);
          expect(Math.abs(posts.reduce((sum, row) => sum + down(row), 0))).toBeLessThanOrEqual(1e-9 * size * 100);
          const moment = posts.reduce((sum, row) => sum + down(row) * (row.at?.[axis] ?? 0), 0);
          expect(Math.abs(moment - overturning)).toBeLessThanOrEqual(1e-8 * size * 100);
        }
        const dead = building.wallLines
          .flatMap((line) => line.storeys.flatMap((storey) => storey.piers))
          .reduce(
            (sum, pier) =>
              sum +
              (pier.gravity ?? [])
                .filter((load) => load.case === 'D')
                .reduce((each, load) => each + load.perLength, 0) *
                (pier.to - pier.from),
            0,
          );
        const arrived = analysis.demands
          .filter((row) => row.kind === 'support' && row.case === 'D')
          .reduce(
            (sum, row) => sum + (row.quantity === 'bearing' ? row.value : row.quantity === 'uplift' ? -row.value : 0),
            0,
          );
        expect(Math.abs(arrived - dead)).toBeLessThanOrEqual(1e-9 * Math.max(1, dead));
      }),
      runs,
    );
  });

  test('collectors and diagrams close at both ends', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        const { diagrams } = analysed(building);
        for (const diagram of diagrams) {
          if (diagram.kind !== 'collector') continue;
          const largest = Math.max(1, ...diagram.points.map((point) => Math.abs(point.axial)));
          expect(Math.abs(diagram.points[0]?.axial ?? 0)).toBeLessThanOrEqual(1e-9 * largest);
          expect(Math.abs(diagram.points[diagram.points.length - 1]?.axial ?? 0)).toBeLessThanOrEqual(1e-9 * largest);
        }
      }),
      { ...runs, numRuns: 60 },
    );
  });
});

describe('linearity', () => {
  const withForces = (building: Building, forces: (force: number, i: number) => number): Building => {
    const copy = copyOf(building);
    for (const loadCase of copy.loadCases) {
      if (loadCase.from !== 'stated') continue;
      loadCase.forces = loadCase.forces.map(({ level, force }, i) => ({ level, force: forces(force, i) }));
    }
    return copy;
  };
  const SIGNED = (row: Demand): boolean => row.kind === 'wall-line' && row.quantity !== 'overturning-moment';
  const signed = (analysis: Analysis): Map<string, number> =>
    new Map(analysis.demands.filter(SIGNED).map((row) => [keyOf(row), row.value]));

  test('superposition: the shears of the sum are the sum of the shears', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        const one = signed(analysed(withForces(building, (force) => force)));
        const two = signed(analysed(withForces(building, (_, i) => 17 - 5 * i)));
        const both = signed(analysed(withForces(building, (force, i) => force + 17 - 5 * i)));
        const sum = new Map(
          [...new Set([...one.keys(), ...two.keys()])].map((key) => [key, (one.get(key) ?? 0) + (two.get(key) ?? 0)]),
        );
        same(both, sum);
      }),
      { ...runs, numRuns: 80 },
    );
  });

  test('reversal: a case that acts the other way swaps the senses', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        const reversed = turned(building, (point) => point, 180);
        const swap = (row: Demand): string =>
          keyOf(LATERAL.test(row.case) ? { ...row, sense: row.sense === 1 ? -1 : 1 } : row);
        same(forcesOf(analysed(building)), forcesOf(analysed(reversed), swap));
      }),
      { ...runs, numRuns: 80 },
    );
  });
});

describe('symmetry', () => {
  /** Spans and the signs of eccentricities follow the direction of s, which a turn may reverse. */
  const INVARIANT = (row: Demand): boolean => FORCES(row) && row.kind !== 'diaphragm-span' && !row.case.includes('/');
  const plain = (analysis: Analysis): Map<string, number> =>
    new Map(analysis.demands.filter(INVARIANT).map((row) => [keyOf(row), row.value]));
  const spans = (analysis: Analysis, quantity: string): number[] =>
    analysis.demands
      .filter((row) => row.kind === 'diaphragm-span' && row.quantity === quantity && !row.case.includes('/'))
      .map((row) => row.value)
      .sort((a, b) => a - b);
  const alike = (a: Analysis, b: Analysis, tolerance: number): void => {
    same(plain(a), plain(b), tolerance);
    for (const quantity of ['shear', 'unit-shear', 'moment', 'chord-force']) {
      const [x, y] = [spans(a, quantity), spans(b, quantity)];
      expect(y).toHaveLength(x.length);
      const scale = Math.max(1, ...x);
      x.forEach((value, i) => expect(Math.abs(value - (y[i] as number))).toBeLessThanOrEqual(tolerance * scale));
    }
  };

  test('rotation of the whole plan by any angle, and translation far away', () => {
    fc.assert(
      fc.property(
        buildings(),
        fc.double({ min: -180, max: 180, noNaN: true }),
        fc.integer({ min: -5000, max: 5000 }),
        (building, angle, shift) => {
          const radians = (angle * Math.PI) / 180;
          const [c, s] = [Math.cos(radians), Math.sin(radians)];
          const moved = turned(building, ([x, y]) => [c * x - s * y + shift, s * x + c * y - shift], angle);
          alike(analysed(building), analysed(moved), 1e-8);
        },
      ),
      { ...runs, numRuns: 120 },
    );
  });

  test('mirror of the plan', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        const mirrored = turned(building, ([x, y]) => [-x, y], 0);
        // A push along x becomes one against it.
        const swap = (row: Demand): string =>
          keyOf({ ...row, sense: row.case === 'EX' ? (row.sense === 1 ? -1 : 1) : row.sense });
        const a = new Map(
          analysed(building)
            .demands.filter(INVARIANT)
            .map((row) => [keyOf(row), row.value]),
        );
        const b = new Map(
          analysed(mirrored)
            .demands.filter(INVARIANT)
            .map((row) => [swap(row), row.value]),
        );
        same(a, b);
      }),
      { ...runs, numRuns: 80 },
    );
  });

  test('renaming and reordering', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        const copy = copyOf(building);
        const renamed = (id: string): string => `n-${id.slice(1)}-${id.slice(0, 1)}`;
        for (const level of copy.levels) {
          level.id = renamed(level.id);
          for (const diaphragm of level.diaphragms ?? []) diaphragm.id = renamed(diaphragm.id);
        }
        for (const line of copy.wallLines) {
          line.id = renamed(line.id);
          line.storeys.reverse();
          for (const storey of line.storeys) {
            storey.under = renamed(storey.under);
            storey.piers.reverse();
            for (const pier of storey.piers) pier.id = renamed(pier.id);
          }
        }
        for (const loadCase of copy.loadCases) {
          if (loadCase.from === 'stated') for (const force of loadCase.forces) force.level = renamed(force.level);
        }
        copy.levels.reverse();
        copy.wallLines.reverse();
        copy.loadCases.reverse();
        const values = (analysis: Analysis): number[] =>
          analysis.demands
            .filter(FORCES)
            .map((row) => row.value)
            .sort((a, b) => a - b);
        const [a, b] = [values(analysed(building)), values(analysed(copy))];
        expect(b).toHaveLength(a.length);
        const scale = Math.max(1, ...a.map(Math.abs));
        a.forEach((value, i) => expect(Math.abs(value - (b[i] as number))).toBeLessThanOrEqual(1e-9 * scale));
      }),
      { ...runs, numRuns: 80 },
    );
  });
});

describe('the same file', () => {
  test('gives the same bytes', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        expect(JSON.stringify(analysed(copyOf(building)))).toBe(JSON.stringify(analysed(building)));
      }),
      { ...runs, numRuns: 40 },
    );
  });
});

describe('maxima', () => {
  const at = (c: readonly number[], x: number): number => c.reduceRight((sum, coefficient) => sum * x + coefficient, 0);

  test('the closed form is never exceeded by dense sampling, and reached', () => {
    fc.assert(
      fc.property(buildings(), (building) => {
        const analysis = analysed(building);
        const row = new Map(analysis.demands.map((demand) => [keyOf(demand), demand.value]));
        for (const diagram of analysis.diagrams) {
          if (diagram.kind !== 'diaphragm') continue;
          for (const span of diagram.spans) {
            const sampled = sample(diagram, span.from, span.to);
            for (const [quantity, value] of Object.entries(sampled)) {
              const found = row.get(`${span.member}|${quantity}|${diagram.case}|1|`) ?? 0;
              expect(value, `${span.member} ${quantity}`).toBeLessThanOrEqual(found * (1 + 1e-9) + 1e-9);
              expect(value, `${span.member} ${quantity}`).toBeGreaterThanOrEqual(found * 0.98 - 1e-6);
            }
          }
        }
      }),
      { ...runs, numRuns: 40 },
    );
  });

  function sample(diagram: DiaphragmDiagram, from: number, to: number): Record<string, number> {
    const most = { shear: 0, 'unit-shear': 0, moment: 0, 'chord-force': 0 };
    for (const piece of diagram.pieces) {
      const middle = (piece.from + piece.to) / 2;
      if (middle < from || middle > to) continue;
      for (let i = 0; i <= 200; i++) {
        const x = ((piece.to - piece.from) * i) / 200;
        const [V, M] = [Math.abs(at(piece.shear, x)), Math.abs(at(piece.moment, x))];
        const [d, D] = [at(piece.depth, x), at(piece.chordDepth, x)];
        most.shear = Math.max(most.shear, V);
        most.moment = Math.max(most.moment, M);
        if (d > 1e-6) most['unit-shear'] = Math.max(most['unit-shear'], V / d);
        if (D > 1e-6) most['chord-force'] = Math.max(most['chord-force'], M / D);
      }
    }
    return most;
  }
});

describe('shares', () => {
  test('up and down from any wall line, pier or post add up to its demand', () => {
    fc.assert(
      fc.property(buildings(), fc.nat(), (building, pick) => {
        const analysis = analysed(building);
        const rows = analysis.demands.filter(
          (row) => row.kind === 'wall-line' && row.quantity === 'shear' && row.sense === 1,
        );
        const row = rows[pick % Math.max(1, rows.length)];
        if (row === undefined) return;
        const result = trace(building, row.member, row.case);
        if (!result.ok) throw new Error(JSON.stringify(result.faults));
        const { up, down, force } = result.value;
        const scale = 1e-9 * Math.max(1, ...up.map((part) => Math.abs(part.force)), Math.abs(row.value));
        expect(Math.abs(force - row.value)).toBeLessThanOrEqual(scale);
        expect(Math.abs(up.reduce((sum, part) => sum + part.force, 0) - row.value)).toBeLessThanOrEqual(scale);
        expect(Math.abs(down.reduce((sum, part) => sum + part.force, 0) - row.value)).toBeLessThanOrEqual(scale);
      }),
      { ...runs, numRuns: 100 },
    );
  });
});
