import { describe, expect, test } from 'vitest';
import { readBuilding, readBuildingText } from '@groundward/engine/building/read';
import { faultSentence, type Fault } from '@groundward/engine/building/fault';

type Json = Record<string, unknown>;

/** A small sound building, one storey, 20 × 10. */
function sound() {
  const line = (id: string, axis: number[][]) => ({
    id,
    axis,
    storeys: [{ under: 'roof', piers: [{ id: 'a', from: 1, to: 4 }] }],
  });
  return {
    schema: 'groundward.building/1',
    name: 'Gatehouse',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      {
        id: 'roof',
        elevation: 3,
        diaphragms: [
          {
            id: 'd',
            outline: [
              [0, 0],
              [20, 0],
              [20, 10],
              [0, 10],
            ],
            openings: [] as Json[],
            weight: { area: 1, zones: [] as Json[] },
          } as Json,
        ],
      },
    ] as Json[],
    wallLines: [
      line('1', [
        [0, 0],
        [0, 10],
      ]),
      line('2', [
        [20, 0],
        [20, 10],
      ]),
      line('A', [
        [0, 0],
        [20, 0],
      ]),
      line('B', [
        [0, 10],
        [20, 10],
      ]),
    ] as Json[],
    loadCases: [
      { id: 'EX', kind: 'seismic', direction: 0, from: 'stated', forces: [{ level: 'roof', force: 30 }] },
      { id: 'EY', kind: 'seismic', direction: 90, from: 'stated', forces: [{ level: 'roof', force: 30 }] },
    ] as Json[],
  };
}

type Sound = ReturnType<typeof sound>;

function faultsOf(change: (building: Sound & Json) => void): readonly Fault[] {
  const building = sound() as Sound & Json;
  change(building);
  const result = readBuilding(building);
  return result.ok ? [] : result.faults;
}

const roof = (building: Sound): Json => (building.levels[1] as { diaphragms: Json[] }).diaphragms[0] as Json;
const square = (x: number, y: number, size: number) => [
  [x, y],
  [x + size, y],
  [x + size, y + size],
  [x, y + size],
];
const setPier = (building: Sound, line: number, pier: Json): void => {
  (building.wallLines[line] as Json)['storeys'] = [{ under: 'roof', piers: [pier] }];
};

test('a sound building is read as it stands', () => {
  const result = readBuilding(sound());
  expect(result).toMatchObject({ ok: true, value: sound() });
});

describe('each fault says where, what was found and what was expected', () => {
  const cases: [string, (building: Sound & Json) => void, string, string][] = [
    [
      'an outline that crosses itself',
      (b) =>
        (roof(b)['outline'] = [
          [0, 0],
          [20, 10],
          [20, 0],
          [0, 10],
        ]),
      'outline-crosses-itself',
      'levels[1].diaphragms[0].outline',
    ],
    [
      'an outline that touches itself',
      (b) =>
        (roof(b)['outline'] = [
          [0, 0],
          [20, 0],
          [20, 10],
          [10, 0],
          [0, 10],
        ]),
      'outline-crosses-itself',
      'levels[1].diaphragms[0].outline',
    ],
    [
      'an edge that folds back',
      (b) =>
        (roof(b)['outline'] = [
          [0, 0],
          [20, 0],
          [10, 0],
          [10, 10],
        ]),
      'outline-crosses-itself',
      'levels[1].diaphragms[0].outline',
    ],
    [
      'a repeated last point',
      (b) =>
        (roof(b)['outline'] = [
          [0, 0],
          [20, 0],
          [20, 10],
          [0, 0],
        ]),
      'repeated-point',
      'levels[1].diaphragms[0].outline[0]',
    ],
    [
      'an opening outside',
      (b) => (roof(b)['openings'] = [{ id: 'o', outline: square(30, 2, 2) }]),
      'opening-outside',
      'levels[1].diaphragms[0].openings[0].outline',
    ],
    [
      'an opening across the edge',
      (b) => (roof(b)['openings'] = [{ id: 'o', outline: square(19, 2, 2) }]),
      'opening-meets-outline',
      'levels[1].diaphragms[0].openings[0].outline',
    ],
    [
      'openings that touch',
      (b) =>
        (roof(b)['openings'] = [
          { id: 'o', outline: square(2, 2, 2) },
          { id: 'p', outline: square(4, 2, 2) },
        ]),
      'openings-overlap',
      'levels[1].diaphragms[0].openings[1].outline',
    ],
    [
      'an opening within an opening',
      (b) =>
        (roof(b)['openings'] = [
          { id: 'o', outline: square(2, 2, 6) },
          { id: 'p', outline: square(4, 4, 1) },
        ]),
      'openings-overlap',
      'levels[1].diaphragms[0].openings[1].outline',
    ],
    [
      'zones that overlap',
      (b) =>
        (roof(b)['weight'] = {
          zones: [
            { id: 'y', outline: square(0, 0, 5), area: 1 },
            { id: 'z', outline: square(4, 0, 5), area: 1 },
          ],
        }),
      'zones-overlap',
      'levels[1].diaphragms[0].weight.zones[1].outline',
    ],
    [
      'a pier beyond its line',
      (b) => setPier(b, 0, { id: 'a', from: 8, to: 12 }),
      'pier-beyond-line',
      'wallLines[0].storeys[0].piers[0].to',
    ],
    [
      'a pier without length',
      (b) => setPier(b, 0, { id: 'a', from: 4, to: 4 }),
      'no-length',
      'wallLines[0].storeys[0].piers[0]',
    ],
    [
      'offsets without an arm',
      (b) => setPier(b, 0, { id: 'a', from: 1, to: 2, endOffset: 0.5 }),
      'no-arm',
      'wallLines[0].storeys[0].piers[0].endOffset',
    ],
    [
      'overlapping piers',
      (b) =>
        ((b.wallLines[0] as Json)['storeys'] = [
          {
            under: 'roof',
            piers: [
              { id: 'a', from: 0, to: 5 },
              { id: 'b', from: 4, to: 6 },
            ],
          },
        ]),
      'piers-overlap',
      'wallLines[0].storeys[0].piers[1]',
    ],
    [
      'a wall line without length',
      (b) =>
        ((b.wallLines[0] as Json)['axis'] = [
          [0, 0],
          [0, 0],
        ]),
      'no-length',
      'wallLines[0].axis',
    ],
    [
      'a wall line that meets no diaphragm',
      (b) =>
        ((b.wallLines[0] as Json)['axis'] = [
          [40, 0],
          [40, 10],
        ]),
      'line-meets-no-diaphragm',
      'wallLines[0].storeys[0]',
    ],
    [
      'a level with no wall line in a direction',
      (b) => b.wallLines.splice(2, 2),
      'no-wall-line-along',
      'levels[1].diaphragms[0]',
    ],
    ['an unknown key', (b) => (roof(b)['outlnie'] = []), 'unknown-key', 'levels[1].diaphragms[0].outlnie'],
    ['a missing key', (b) => Reflect.deleteProperty(b, 'name'), 'missing', 'name'],
    ['NaN', (b) => ((b.levels[1] as Json)['elevation'] = NaN), 'wrong-type', 'levels[1].elevation'],
    ['infinity', (b) => ((b.levels[1] as Json)['elevation'] = Infinity), 'wrong-type', 'levels[1].elevation'],
    ['a number as text', (b) => ((b.levels[1] as Json)['elevation'] = '3'), 'wrong-type', 'levels[1].elevation'],
    ['mixed units', (b) => (b.units = { length: 'm', force: 'kip' }), 'wrong-value', 'units.force'],
    [
      'two levels at one elevation',
      (b) => ((b.levels[1] as Json)['elevation'] = 0),
      'same-elevation',
      'levels[1].elevation',
    ],
    ['a duplicate id', (b) => ((b.wallLines[1] as Json)['id'] = '1'), 'duplicate-id', 'wallLines[1].id'],
    [
      'a storey under a level that is not there',
      (b) => ((b.wallLines[0] as Json)['storeys'] = [{ under: 'L9', piers: [{ id: 'a', from: 1, to: 4 }] }]),
      'unknown-level',
      'wallLines[0].storeys[0].under',
    ],
    [
      'a force on the base',
      (b) => ((b.loadCases[0] as Json)['forces'] = [{ level: 'base', force: 1 }]),
      'base-level',
      'loadCases[0].forces[0].level',
    ],
    [
      'an assembly that is not there',
      (b) => (roof(b)['assembly'] = 'x'),
      'unknown-assembly',
      'levels[1].diaphragms[0].assembly',
    ],
    [
      'forces from a basis that is not there',
      (b) => (b.loadCases[0] = { id: 'EX', kind: 'seismic', direction: 0, from: 'basis' }),
      'no-basis',
      'loadCases[0].from',
    ],
    [
      'an edge no longer than rounding',
      (b) =>
        (roof(b)['outline'] = [
          [0, 0],
          [20, 0],
          [20, 1e-12],
          [20, 10],
          [0, 10],
        ]),
      'short-edge',
      'levels[1].diaphragms[0].outline[2]',
    ],
    [
      'an outline without area',
      (b) =>
        (roof(b)['outline'] = [
          [0, 0],
          [10, 0],
          [20, 0],
        ]),
      'outline-crosses-itself',
      'levels[1].diaphragms[0].outline',
    ],
    [
      'diaphragms of a level that overlap',
      (b) => ((b.levels[1] as Json)['diaphragms'] = [roof(b), { id: 'e', outline: square(15, 5, 10) }]),
      'diaphragms-overlap',
      'levels[1].diaphragms[1].outline',
    ],
    [
      'a zone beside its diaphragm',
      (b) => (roof(b)['weight'] = { zones: [{ id: 'z', outline: square(20, 0, 5), area: 1 }] }),
      'zone-outside',
      'levels[1].diaphragms[0].weight.zones[0].outline',
    ],
    [
      'a diaphragm at the base',
      (b) => ((b.levels[0] as Json)['diaphragms'] = [{ id: 'd', outline: square(0, 0, 5) }]),
      'diaphragm-at-base',
      'levels[0].diaphragms',
    ],
    [
      'a force on a level without diaphragm',
      (b) => Reflect.deleteProperty(b.levels[1] as Json, 'diaphragms'),
      'no-diaphragm',
      'loadCases[0].forces[0].level',
    ],
    [
      'two forces on a level',
      (b) =>
        ((b.loadCases[0] as Json)['forces'] = [
          { level: 'roof', force: 1 },
          { level: 'roof', force: 2 },
        ]),
      'duplicate-force',
      'loadCases[0].forces[1].level',
    ],
    [
      'a storey under the base',
      (b) => ((b.wallLines[0] as Json)['storeys'] = [{ under: 'base', piers: [{ id: 'a', from: 1, to: 4 }] }]),
      'base-level',
      'wallLines[0].storeys[0].under',
    ],
    [
      'a hold-down that is not there',
      (b) => setPier(b, 0, { id: 'a', from: 1, to: 4, holdDown: 'x' }),
      'unknown-assembly',
      'wallLines[0].storeys[0].piers[0].holdDown',
    ],
    [
      'a collector that ends where it starts',
      (b) => ((b.wallLines[0] as Json)['collectors'] = [{ level: 'roof', from: 5, to: 5 }]),
      'no-length',
      'wallLines[0].collectors[0]',
    ],
    [
      'collectors of a level that overlap',
      (b) =>
        ((b.wallLines[0] as Json)['collectors'] = [
          { level: 'roof', from: 4, to: 8 },
          { level: 'roof', from: 0, to: 5 },
        ]),
      'collectors-overlap',
      'wallLines[0].collectors[0]',
    ],
    [
      'a collector beyond the floor',
      (b) => ((b.wallLines[0] as Json)['collectors'] = [{ level: 'roof', from: 10, to: 15 }]),
      'collector-meets-no-diaphragm',
      'wallLines[0].collectors[0]',
    ],
    [
      'a load case named like a component of gravity load',
      (b) => ((b.loadCases[0] as Json)['id'] = 'D'),
      'reserved-id',
      'loadCases[0].id',
    ],
    [
      'a combination of earthquake and wind',
      (b) => (b['combinations'] = [{ id: 'EW', factors: { E: 1, W: 1 } }]),
      'two-lateral-loads',
      'combinations[0].factors',
    ],
    ['a combination set that is not known', (b) => (b['combinations'] = 'some set'), 'wrong-value', 'combinations'],
    [
      'a load case that does not say where its forces come from',
      (b) => Reflect.deleteProperty(b.loadCases[0] as Json, 'from'),
      'missing',
      'loadCases[0].from',
    ],
    [
      'a load case with forces from somewhere else',
      (b) => ((b.loadCases[0] as Json)['from'] = 'elsewhere'),
      'wrong-value',
      'loadCases[0].from',
    ],
    [
      'a negative weight',
      (b) => (roof(b)['weight'] = { area: -1 }),
      'out-of-range',
      'levels[1].diaphragms[0].weight.area',
    ],
    ['a key that is no plain word', (b) => ((b.levels[1] as Json)['a.b'] = 1), 'unknown-key', 'levels[1]["a.b"]'],
    [
      'sharing by stiffness without one',
      (b) => ((b.wallLines[0] as Json)['shareBy'] = 'stiffness'),
      'no-stiffness',
      'wallLines[0].storeys[0].piers[0].stiffness',
    ],
  ];
  test.each(cases)('%s', (_, change, code, path) => {
    const faults = faultsOf(change);
    const fault = faults.find((candidate) => candidate.code === code);
    expect(faults.map((candidate) => `${candidate.code} ${candidate.path}`)).toContain(`${code} ${path}`);
    expect(fault?.found).not.toBe('');
    expect(fault?.expected).not.toBe('');
  });
});

test('a mistyped key is told with the key that was meant', () => {
  const [fault] = faultsOf((b) => (roof(b)['behavoiur'] = 'rigid'));
  expect(fault?.hint).toBe('did you mean "behaviour"?');
});

test('all faults come at once: of the shape, of the plan, of the walls and of references', () => {
  const codes = faultsOf((b) => {
    Reflect.deleteProperty(b, 'name');
    roof(b)['openings'] = [{ id: 'o', outline: square(30, 2, 2) }];
    setPier(b, 0, { id: 'a', from: 8, to: 12 });
    (b.wallLines[1] as Json)['storeys'] = [{ under: 'L9', piers: [{ id: 'a', from: 1, to: 4 }] }];
    (b.loadCases[0] as Json)['direction'] = 'north';
  }).map((fault) => fault.code);
  expect(new Set(codes)).toEqual(
    new Set(['missing', 'opening-outside', 'pier-beyond-line', 'unknown-level', 'wrong-type']),
  );
});

test('whether walls meet floors is judged beside faults that have nothing to do with it', () => {
  const codes = faultsOf((b) => {
    b.name = '';
    b.wallLines.splice(2, 2);
    roof(b)['assembly'] = 'x';
  }).map((fault) => fault.code);
  expect(new Set(codes)).toEqual(new Set(['out-of-range', 'unknown-assembly', 'no-wall-line-along']));
});

test('what an analysis may refuse, the reader accepts: behaviours and sharing', () => {
  for (const behaviour of ['rigid', 'semi-rigid', 'envelope']) {
    expect(faultsOf((b) => (roof(b)['behaviour'] = behaviour))).toEqual([]);
  }
  expect(faultsOf((b) => ((b.wallLines[0] as Json)['shareBy'] = 'deflection'))).toEqual([]);
});

test('diaphragms side by side, or one in the opening of another, do not overlap', () => {
  const beside = faultsOf(
    (b) => ((b.levels[1] as Json)['diaphragms'] = [roof(b), { id: 'e', outline: square(20, 0, 10) }]),
  );
  expect(beside.map((fault) => fault.code)).not.toContain('diaphragms-overlap');
  const within = faultsOf((b) => {
    roof(b)['openings'] = [{ id: 'o', outline: square(5, 2, 5) }];
    (b.levels[1] as Json)['diaphragms'] = [roof(b), { id: 'e', outline: square(5, 2, 5) }];
  });
  expect(within.map((fault) => fault.code)).not.toContain('diaphragms-overlap');
});

test('zones side by side are no fault', () => {
  expect(
    faultsOf(
      (b) =>
        (roof(b)['weight'] = {
          zones: [
            { id: 'y', outline: square(0, 0, 5), area: 1 },
            { id: 'z', outline: square(5, 0, 5), area: 2 },
          ],
        }),
    ),
  ).toEqual([]);
});

describe('text that is no building file', () => {
  test.each([
    ['empty', '', 'empty'],
    ['not JSON', '{"schema": }', 'not-json'],
    ['a list', '[]', 'wrong-type'],
    ['null', 'null', 'wrong-type'],
    ['a number', '7', 'wrong-type'],
    ['too large', `{"name": "${'x'.repeat(20_000_001)}"}`, 'too-large'],
    ['deeply nested', `{"schema": ${'['.repeat(100_000)}${']'.repeat(100_000)}}`, 'wrong-value'],
    ['a key that would change the prototype', '{"__proto__": {"polluted": 1}}', 'missing'],
  ])('%s', (_, text, code) => {
    const result = readBuildingText(text);
    expect(result.ok).toBe(false);
    expect(result.ok ? [] : result.faults.map((fault) => fault.code)).toContain(code);
    expect(({} as Json)['polluted']).toBeUndefined();
  });

  test.each([
    ['{\n  "name": "x",\n}', '"}" at line 3, column 1'],
    ['{\n  "name": tru\n}', '"\\n" at line 2, column 14'],
    ['{"force": NaN}', '"N" at line 1, column 11'],
    ['{"a": [1, 2}', '"}" at line 1, column 12'],
    ['{"a": 1', 'its end at line 1, column 8'],
    ['{} {}', '"{" at line 1, column 4'],
    ["{'a': 1}", '"\'" at line 1, column 2'],
    ['{"a" 1}', '"1" at line 1, column 6'],
    ['{"a": "\\x"}', '"x" at line 1, column 9'],
    ['\ufeff{"a": }', '"}" at line 1, column 7'],
  ])('the place in the text is told: %j', (text, place) => {
    const result = readBuildingText(text);
    expect(result.ok ? '' : faultSentence(result.faults[0] as Fault)).toContain(place);
  });
});

describe('a hostile file is answered, with a list that can be read', () => {
  const many = <T>(count: number, entry: (i: number) => T): T[] => Array.from({ length: count }, (_, i) => entry(i));
  /** A comb: every cut across its teeth meets all of them. */
  const comb = (teeth: number): number[][] => [
    ...many(teeth * 2, (i) => [(i * 20) / (teeth * 2), i % 2 === 0 ? 1 : 9]),
    [20, 0],
    [0, 0],
  ];
  const combAcross = (teeth: number) => comb(teeth).map(([x, y]) => [(y as number) * 2, (x as number) / 2]);
  const cases: [string, (building: Sound & Json) => void][] = [
    ['unknown keys', (b) => many(200_000, (i) => (b[`key${i}`] = i))],
    ['values without end', (b) => (b['key'] = many(600_000, () => 0))],
    ['a key as long as a file', (b) => (b['k'.repeat(5_000_000)] = 1)],
    ['openings without end', (b) => (roof(b)['openings'] = many(100_000, () => ({})))],
    ['diaphragms without end', (b) => ((b.levels[1] as Json)['diaphragms'] = many(100_000, () => ({ id: 'd' })))],
    [
      'piers without end',
      (b) => ((b.wallLines[0] as Json)['storeys'] = [{ under: 'roof', piers: many(60_000, () => ({})) }]),
    ],
    ['openings as combs', (b) => (roof(b)['openings'] = many(9, (i) => ({ id: `o${i}`, outline: comb(500) })))],
    [
      'zones as combs',
      (b) => (roof(b)['weight'] = { zones: many(9, (i) => ({ id: `z${i}`, area: 1, outline: combAcross(90) })) }),
    ],
    [
      'a floor and a zone as combs across each other',
      (b) => {
        roof(b)['outline'] = comb(400);
        roof(b)['weight'] = { zones: [{ id: 'z', area: 1, outline: combAcross(90) }] };
      },
    ],
    ['a floor as a comb', (b) => (roof(b)['outline'] = comb(990))],
    [
      'levels full of points',
      (b) => {
        b.levels = [
          { id: 'base', elevation: -1 },
          ...many(40, (i) => ({ id: `l${i}`, elevation: i, diaphragms: [{ id: 'd', outline: comb(900) }] })),
        ];
        b.loadCases = [{ id: 'X', kind: 'wind', direction: 0, from: 'stated', forces: [{ level: 'l0', force: 1 }] }];
        b.wallLines = [];
      },
    ],
  ];
  test.each(cases)('%s', (_, change) => {
    const faults = faultsOf(change);
    expect(faults.length).toBeGreaterThan(0);
    expect(faults.length).toBeLessThanOrEqual(501);
    expect(JSON.stringify(faults).length).toBeLessThan(1_000_000);
  });
});

test('a file full of faults lists the first 500 and says how many more', () => {
  const faults = faultsOf((b) => {
    for (let i = 0; i < 700; i++) b[`key${i}`] = i;
  });
  expect(faults).toHaveLength(501);
  expect(faults[500]?.found).toBe('at least 200 more faults');
});
