import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { readBuilding, readBuildingText } from '@groundward/engine/building/read';
import { compareWithCauses } from '@groundward/engine/compare/causes';
import type { Compared } from '@groundward/engine/compare/compare';
import { applyEdits } from '@groundward/engine/compare/edits';
import type { Change } from '@groundward/engine/compare/result';
import { shapley } from '@groundward/engine/compare/shapley';
import { analyse } from '@groundward/engine/path/analyse';

function demo(name: string): Building {
  const result = readBuildingText(readFileSync(new URL(`../../prisma/demo/${name}.json`, import.meta.url), 'utf8'));
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

function analysed(building: unknown): Compared {
  const read = readBuilding(building);
  if (!read.ok) throw new Error(JSON.stringify(read.faults));
  const result = analyse(read.value);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return { building: read.value, analysis: result.value };
}

const [first, second, third] = ['1-first-design', '2-client-changes', '3-engineers-answer'].map(demo) as [
  Building,
  Building,
  Building,
];

const difference = (change: Change): number => (change.after ?? 0) - (change.before ?? 0);
const sum = (change: Change): number => change.causes.reduce((total, { share }) => total + share, 0);

/** One room, two walls each way, two storeys, forces as stated. */
function small(change: (building: SmallBuilding) => void = () => undefined): SmallBuilding {
  const line = (id: string, axis: number[][], piers: Pier[]) => ({
    id,
    axis,
    storeys: [
      { under: 'L2', piers },
      { under: 'roof', piers },
    ],
  });
  const outline = [
    [0, 0],
    [12, 0],
    [12, 10],
    [0, 10],
  ];
  const whole = (): Pier[] => [{ id: 'p', from: 0, to: 10 }];
  const building: SmallBuilding = {
    schema: 'groundward.building/1',
    name: 'One room',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      { id: 'L2', elevation: 3, diaphragms: [{ id: 'd', outline }] },
      { id: 'roof', elevation: 6, diaphragms: [{ id: 'd', outline }] },
    ],
    wallLines: [
      line('1', [[0, 0], [0, 10]], [{ id: 'a', from: 0, to: 5 }, { id: 'b', from: 6, to: 10 }]), // prettier-ignore
      line('2', [[12, 0], [12, 10]], whole()), // prettier-ignore
      line('A', [[0, 0], [12, 0]], whole()), // prettier-ignore
      line('B', [[0, 10], [12, 10]], whole()), // prettier-ignore
    ],
    loadCases: [
      {
        id: 'WY',
        kind: 'wind',
        direction: 90,
        from: 'stated',
        spread: 'even',
        forces: [
          { level: 'L2', force: 20 },
          { level: 'roof', force: 10 },
        ],
      },
    ],
  };
  change(building);
  return structuredClone(building);
}

type Pier = { id: string; from: number; to: number };
type SmallBuilding = {
  schema: string;
  name: string;
  units: { length: string; force: string };
  levels: { id: string; name?: string; elevation: number; diaphragms?: { id: string; outline: number[][] }[] }[];
  wallLines: { id: string; axis: number[][]; storeys: { under: string; piers: Pier[] }[] }[];
  loadCases: { id: string; kind: string; direction: number; from: string; spread: string; forces: object[] }[];
};

describe('shares of causes', () => {
  test('the glove game: one left glove is worth two thirds of the pair, each of two right gloves a sixth', () => {
    // The usual textbook example of the Shapley value; from memory, not checked against a document.
    const pair = (set: bigint): Float64Array => Float64Array.of((set & 1n) !== 0n && (set & 6n) !== 0n ? 1 : 0);
    const { shares, method } = shapley(3, 1, pair);
    expect(shares.map(([share]) => share)).toEqual([2 / 3, 1 / 6, 1 / 6].map((v) => expect.closeTo(v, 14) as number));
    expect(method).toEqual({ kind: 'exact' });
  });

  test('of a product each factor gets its own change times the mean of the other', () => {
    const [a0, a1, b0, b1] = [3, 5, 7, 13];
    const product = (set: bigint) => Float64Array.of(((set & 1n) !== 0n ? a1 : a0) * ((set & 2n) !== 0n ? b1 : b0));
    const { shares } = shapley(2, 1, product);
    expect(shares[0]?.[0]).toBeCloseTo(((a1 - a0) * (b0 + b1)) / 2, 12);
    expect(shares[1]?.[0]).toBeCloseTo(((b1 - b0) * (a0 + a1)) / 2, 12);
  });

  test('sampled beyond ten causes: exact where effects only add up, else within the standard error that is stated', () => {
    const weights = Array.from({ length: 12 }, (_, i) => Math.sin(i + 1));
    const has = (set: bigint, i: number) => ((set >> BigInt(i)) & 1n) === 1n;
    const total = (set: bigint) => weights.reduce((all, weight, i) => all + (has(set, i) ? weight : 0), 0);
    const { shares, errors, method } = shapley(12, 2, (set) => Float64Array.of(total(set), total(set) ** 3), 200);
    expect(method).toEqual({ kind: 'sampled', pairs: 200, seed: 1 });
    const all = (1n << 12n) - 1n;
    for (const row of [0, 1]) {
      const whole = shares.reduce((sum, share) => sum + (share[row] as number), 0);
      expect(whole).toBeCloseTo(total(all) ** (row === 0 ? 1 : 3), 9);
    }
    weights.forEach((weight, i) => {
      expect(shares[i]?.[0]).toBeCloseTo(weight, 12);
      expect(errors?.[i]?.[0]).toBeCloseTo(0, 12);
    });
    // Of a cube the share is known: w_i·(…) summed over all pairs and triples of weights.
    weights.forEach((w, i) => {
      const others = weights.filter((_, j) => j !== i);
      const s1 = others.reduce((a, b) => a + b, 0);
      const s2 = others.reduce((a, b) => a + b * b, 0);
      // E over orders of the others before i: E[P] = s1/2, E[P²] = s2/2 + (s1² − s2)/3.
      const expected = w ** 3 + (3 * w * w * s1) / 2 + 3 * w * (s2 / 2 + (s1 * s1 - s2) / 3);
      expect(Math.abs((shares[i]?.[1] as number) - expected)).toBeLessThan(5 * (errors?.[i]?.[1] as number) + 1e-12);
    });
  });
});

describe('causes of changes', () => {
  test('shares add up to every change between any two revisions of the demo', () => {
    const [one, two, three] = [first, second, third].map(analysed) as [Compared, Compared, Compared];
    for (const [before, after] of [
      [one, two],
      [two, three],
      [three, one],
    ] as const) {
      const comparison = compareWithCauses(before, after);
      expect(comparison.method).toEqual({ kind: 'exact' });
      expect(applyEdits(before.building, comparison.edits)).toEqual(after.building);
      for (const change of comparison.changes) {
        if (change.class === 'unchanged') expect(change.causes).toEqual([]);
        else {
          const size = Math.max(Math.abs(change.before ?? 0), Math.abs(change.after ?? 0), 1e-3);
          expect(Math.abs(sum(change) - difference(change)) / size, change.member).toBeLessThan(1e-9);
        }
      }
    }
  });

  test('forces raised on two levels: each answers for its own part of the base shear, and one for all of the upper storey', () => {
    const after = small((building) => {
      (building.loadCases[0] as { forces: object[] }).forces = [
        { level: 'L2', force: 26 },
        { level: 'roof', force: 13 },
      ];
      (building.levels[0] as { name?: string }).name = 'Footings';
    });
    const before = analysed(small());
    const { edits, changes } = compareWithCauses(before, analysed(after));
    // Forces of one case are one change to whoever made them; a new name is a change without effect.
    expect(edits).toHaveLength(2);
    expect(edits[1]?.what).toContain('name');
    for (const change of changes) expect(change.causes.every(({ edit }) => edit === 'e1')).toBe(true);
  });

  test('a pier that grows and a floor that is lifted share the change of a hold-down', () => {
    const after = small((building) => {
      for (const storey of building.wallLines[1]?.storeys ?? []) storey.piers = [{ id: 'p', from: 0, to: 8 }];
      (building.levels[2] as { elevation: number }).elevation = 7;
    });
    const { edits, changes } = compareWithCauses(analysed(small()), analysed(after));
    expect(edits.map(({ what }) => what)).toEqual([
      'level roof, elevation: 6 → 7 m',
      'wall line 2, storey under L2 and roof, pier p, to: 10 → 8 m',
    ]);
    const uplift = changes.find(({ member, quantity }) => member === '2/p/from' && quantity === 'uplift');
    // M = 5·h_roof + 10·3 (half of each level’s force), T = M / b: closed form of a product of two factors.
    const tension = (roof: number, b: number) => (5 * roof + 10 * 3) / b;
    expect(uplift?.before).toBeCloseTo(tension(6, 10), 9);
    expect(uplift?.after).toBeCloseTo(tension(7, 8), 9);
    const byFloor = (tension(7, 10) - tension(6, 10) + tension(7, 8) - tension(6, 8)) / 2;
    const byPier = (tension(6, 8) - tension(6, 10) + tension(7, 8) - tension(7, 10)) / 2;
    expect(uplift?.causes).toEqual([
      { edit: 'e1', share: expect.closeTo(byFloor, 9) as number },
      { edit: 'e2', share: expect.closeTo(byPier, 9) as number },
    ]);
  });

  test('edits that make no valid building without each other become one', () => {
    const after = small((building) => {
      const piers = [
        { id: 'a', from: 0, to: 8 },
        { id: 'b', from: 9, to: 10 },
      ];
      for (const storey of building.wallLines[0]?.storeys ?? []) storey.piers = piers;
    });
    const { edits } = compareWithCauses(analysed(small()), analysed(after));
    expect(edits.map(({ what }) => what)).toEqual([
      'wall line 1, storey under L2 and roof, pier a, to: 5 → 8 m; pier b, from: 6 → 9 m',
    ]);
  });

  test('a new storey with its walls and its force is one change', () => {
    const after = small((building) => {
      building.levels.push({
        id: 'L4',
        elevation: 9,
        diaphragms: structuredClone(building.levels[1]?.diaphragms ?? []),
      });
      for (const { storeys } of building.wallLines)
        storeys.push({ ...(storeys[1] as (typeof storeys)[number]), under: 'L4' });
      building.loadCases[0]?.forces.push({ level: 'L4', force: 5 });
    });
    const { edits } = compareWithCauses(analysed(small()), analysed(after));
    expect(edits).toHaveLength(1);
  });
});
