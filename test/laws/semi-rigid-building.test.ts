import { describe, expect, test } from 'vitest';
import { Building } from '@groundward/engine/building/definition';
import { analyse } from '@groundward/engine/path/analyse';
import type { Analysis } from '@groundward/engine/path/result';
import { trace } from '@groundward/engine/path/trace';

type Behaviour = 'rigid' | 'semi-rigid' | 'flexible';

/** Three storeys of 24 × 12 with a stair; line 2 stops under the second level, line D runs askew. */
function tower(behaviour: Behaviour, assembly: Record<string, number> = { apparentShearStiffness: 4000 }): Building {
  const levels = ['L2', 'L3', 'roof'];
  const line = (id: string, axis: number[][], from: number, to: number, under = levels, stiffness = 5000) => ({
    id,
    axis,
    storeys: under.map((level) => ({ under: level, piers: [{ id: 'a', from, to, stiffness }] })),
  });
  return Building.parse({
    schema: 'groundward.building/1',
    name: 'Tower',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      ...levels.map((id, i) => ({
        id,
        elevation: 3 * (i + 1),
        diaphragms: [
          {
            id: 'd',
            outline: [
              [0, 0],
              [24, 0],
              [24, 12],
              [0, 12],
            ],
            openings: [
              {
                id: 'stair',
                outline: [
                  [9, 4],
                  [13, 4],
                  [13, 8],
                  [9, 8],
                ],
              },
            ],
            behaviour,
            assembly: 'floor',
            weight: {
              area: 2,
              lines: [
                {
                  id: 'south',
                  along: [
                    [0, 0],
                    [24, 0],
                  ],
                  perLength: 3,
                },
              ],
            },
          },
        ],
      })),
    ],
    wallLines: [
      line(
        '1',
        [
          [0, 0],
          [0, 12],
        ],
        2,
        10,
      ),
      line(
        '2',
        [
          [16, 0],
          [16, 12],
        ],
        3,
        8,
        ['L3', 'roof'],
      ),
      line(
        '3',
        [
          [24, 0],
          [24, 12],
        ],
        1,
        9,
      ),
      line(
        'A',
        [
          [0, 0],
          [24, 0],
        ],
        4,
        16,
      ),
      line(
        'B',
        [
          [0, 12],
          [24, 12],
        ],
        6,
        20,
      ),
      line(
        'D',
        [
          [17, 12],
          [23, 0],
        ],
        2,
        8,
        levels,
        2000,
      ),
    ],
    assemblies: { diaphragms: [{ id: 'floor', ...assembly }] },
    loadCases: [
      {
        id: 'EY',
        kind: 'seismic',
        direction: 90,
        from: 'stated',
        accidental: { ratio: 0.05 },
        forces: levels.map((level, i) => ({ level, force: 50 * (i + 1), diaphragmForce: 60 * (i + 1) })),
      },
      {
        id: 'EX',
        kind: 'seismic',
        direction: 0,
        from: 'stated',
        forces: levels.map((level, i) => ({ level, force: 50 * (i + 1) })),
      },
    ],
  });
}

function analysed(building: Building): Analysis {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

function valueOf(analysis: Analysis, member: string, quantity: string, caseId = 'EY'): number {
  const row = analysis.demands.find(
    (d) => d.member === member && d.quantity === quantity && d.case === caseId && d.sense === 1,
  );
  if (row === undefined) throw new Error(`no ${quantity} of ${member}`);
  return row.value;
}

describe('a building with semi-rigid floors', () => {
  test('is analysed whole, in equilibrium far below the bound for finite elements', () => {
    const { certificate, findings, demands } = analysed(tower('semi-rigid'));
    expect(certificate.bound).toBe(1e-6);
    expect(certificate.worstResidual).toBeLessThan(1e-9);
    expect(certificate.checks.map((check) => check.what)).toContain('membrane: forces on nodes');
    const codes = new Set(findings.map((finding) => finding.code));
    for (const code of [
      'axial-stiffness-assumed',
      'mesh-size-assumed',
      'diaphragm-deflection',
      'diaphragm-against-rigid',
    ])
      expect(codes).toContain(code);
    for (const quantity of ['drift', 'deflection', 'deflection-ratio', 'torsional-ratio'])
      expect(demands.some((d) => d.member === 'L3' && d.quantity === quantity)).toBe(true);
    expect(demands.some((d) => d.case === 'EY/+e')).toBe(true);
  });

  test('nothing is assumed where the file states it', () => {
    const building = tower('semi-rigid', { apparentShearStiffness: 4000, axialStiffness: 9000, chordStiffness: 1e5 });
    for (const level of building.levels) for (const diaphragm of level.diaphragms ?? []) diaphragm.meshSize = 2;
    const codes = analysed(building).findings.map((finding) => finding.code);
    expect(codes).not.toContain('axial-stiffness-assumed');
    expect(codes).not.toContain('mesh-size-assumed');
  });

  test('with a very stiff floor has every demand of the rigid building', () => {
    const rigid = analysed(tower('rigid'));
    const stiff = analysed(tower('semi-rigid', { apparentShearStiffness: 1e9 }));
    const keyOf = (d: Analysis['demands'][number]): string =>
      [d.member, d.quantity, d.case, d.sense, d.combination].join(' ');
    const found = new Map(stiff.demands.map((d) => [keyOf(d), d.value]));
    const scale: Record<string, number> = { kN: 300, 'kN·m': 3000, 'kN/m': 30, m: 24, '1': 1 };
    for (const demand of rigid.demands) {
      const value = found.get(keyOf(demand));
      expect(value, keyOf(demand)).toBeDefined();
      expect(Math.abs((value ?? 0) - demand.value), keyOf(demand)).toBeLessThan(1e-4 * (scale[demand.unit] ?? 1));
    }
    expect(valueOf(stiff, 'L3', 'drift')).toBeCloseTo(valueOf(rigid, 'L3', 'drift'), 6);
    expect(valueOf(stiff, 'L3', 'deflection-ratio')).toBeLessThan(1e-4);
    for (const finding of stiff.findings.filter((each) => each.code === 'diaphragm-against-rigid'))
      expect(finding.numbers?.['over']).toBeLessThan(1e-4);
  });

  test('a softer floor bows out more and takes more to the walls beside the load', () => {
    const soft = analysed(tower('semi-rigid', { apparentShearStiffness: 400 }));
    const stiff = analysed(tower('semi-rigid', { apparentShearStiffness: 40000 }));
    expect(valueOf(soft, 'roof', 'deflection')).toBeGreaterThan(10 * valueOf(stiff, 'roof', 'deflection'));
    expect(valueOf(soft, '2/roof', 'shear')).not.toBeCloseTo(valueOf(stiff, '2/roof', 'shear'), 1);
  });

  test('shares of a member’s force by their origin add up to it', () => {
    const building = tower('semi-rigid');
    const analysis = analysed(building);
    for (const [member, quantity] of [
      ['1/L2', 'shear'],
      ['3/L2/a', 'shear'],
      ['D/L2', 'shear'],
    ] as const) {
      const traced = trace(building, member, 'EY');
      if (!traced.ok) throw new Error(JSON.stringify(traced.faults));
      const { up, down, force } = traced.value;
      expect(force).toBeCloseTo(valueOf(analysis, member, quantity), 8);
      expect(up.reduce((sum, part) => sum + part.force, 0)).toBeCloseTo(force, 9);
      expect(down.reduce((sum, part) => sum + part.force, 0)).toBeCloseTo(force, 9);
      expect(up.length).toBe(3);
    }
  });

  test('has the same bytes on repetition', () => {
    expect(JSON.stringify(analysed(tower('semi-rigid')))).toBe(JSON.stringify(analysed(tower('semi-rigid'))));
  });

  test('is refused without a shear stiffness, or on walls without one, and says what is missing', () => {
    const bare = analyse(tower('semi-rigid', {}));
    expect(bare.ok ? [] : bare.faults.map((fault) => fault.code)).toEqual(['no-shear-stiffness']);
    const building = tower('semi-rigid');
    delete building.wallLines[0]?.storeys[0]?.piers[0]?.stiffness;
    const loose = analyse(building);
    expect(loose.ok ? [] : loose.faults.map((fault) => fault.code)).toEqual(['no-wall-stiffness']);
    const fine = tower('semi-rigid');
    for (const level of fine.levels) for (const diaphragm of level.diaphragms ?? []) diaphragm.meshSize = 0.01;
    const refused = analyse(fine);
    expect(refused.ok ? [] : refused.faults.map((fault) => fault.code)).toEqual(['mesh-too-fine']);
  });

  test('may stand beside flexible and rigid levels', () => {
    const building = tower('semi-rigid');
    const [, second, third] = building.levels;
    for (const diaphragm of second?.diaphragms ?? []) diaphragm.behaviour = 'flexible';
    for (const diaphragm of third?.diaphragms ?? []) diaphragm.behaviour = 'rigid';
    expect(analysed(building).certificate.worstResidual).toBeLessThan(1e-9);
  });
});
