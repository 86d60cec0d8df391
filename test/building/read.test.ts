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

  test('the place in the text is told', () => {
    const result = readBuildingText('{\n  "name": "x",\n}');
    expect(result.ok ? '' : faultSentence(result.faults[0] as Fault)).toContain('line 3, column 1');
  });
});

test('a file full of faults lists the first 500 and says how many more', () => {
  const faults = faultsOf((b) => {
    for (let i = 0; i < 700; i++) b[`key${i}`] = i;
  });
  expect(faults).toHaveLength(501);
  expect(faults[500]?.found).toBe('200 more faults');
});
