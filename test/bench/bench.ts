/** Times and heap of analyses of generated buildings, and their ratio to parsing and printing the same documents in the same run. */
import type { Building, Point, WallLine } from '@groundward/engine/building/definition';
import { readBuilding } from '@groundward/engine/building/read';
import { analyse } from '@groundward/engine/path/analyse';
import { benchSemiRigid } from './semi-rigid.js';
import { median } from './timing.js';

const SIZES = [
  { storeys: 4, lines: 8 },
  { storeys: 4, lines: 24 },
  { storeys: 12, lines: 8 },
  { storeys: 12, lines: 24 },
  { storeys: 12, lines: 60 },
  { storeys: 40, lines: 24 },
  { storeys: 40, lines: 60 },
];

type Behaviour = 'flexible' | 'rigid';

/** Half of the lines along each direction, two piers a line and storey, an opening, a zone and a façade on every level. */
function building(storeys: number, lines: number, behaviour: Behaviour): Building {
  const half = lines / 2;
  const [width, depth] = [half * 6, 24];
  const ring = (x0: number, y0: number, x1: number, y1: number): Point[] => [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ];
  const ids = Array.from({ length: storeys }, (_, i) => `L${i + 2}`);
  const line = (id: string, axis: [Point, Point], length: number): WallLine => ({
    id,
    axis,
    storeys: ids.map((under) => ({
      under,
      piers: [
        { id: 'a', from: 1, to: 0.4 * length, stiffness: 100, endOffset: 0.1, gravity: [{ case: 'D', perLength: 3 }] },
        { id: 'b', from: 0.6 * length, to: length - 1, stiffness: 120, gravity: [{ case: 'D', perLength: 3 }] },
      ],
    })),
  });
  return {
    schema: 'groundward.building/1',
    name: `${storeys} storeys, ${lines} lines`,
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      ...ids.map((id, i) => ({
        id,
        elevation: 3 * (i + 1),
        diaphragms: [
          {
            id: 'd',
            outline: ring(0, 0, width, depth),
            behaviour,
            openings: [{ id: 'o', outline: ring(width / 2 - 2, 10, width / 2 + 2, 14) }],
            weight: {
              area: 2,
              zones: [{ id: 'z', outline: ring(0, 11, width, 13), area: 3 }],
              lines: [{ id: 'f', along: [...ring(0, 0, width, depth), [0, 0] as Point], perLength: 2 }],
            },
          },
        ],
      })),
    ],
    wallLines: [
      ...Array.from({ length: half }, (_, i) => {
        const x = (width * i) / (half - 1);
        return line(
          `${i + 1}`,
          [
            [x, 0],
            [x, depth],
          ],
          depth,
        );
      }),
      ...Array.from({ length: half }, (_, i) => {
        const y = (depth * i) / (half - 1);
        return line(
          `A${i + 1}`,
          [
            [0, y],
            [width, y],
          ],
          width,
        );
      }),
    ],
    loadCases: [0, 90].map((direction) => ({
      id: direction === 0 ? 'EX' : 'EY',
      kind: 'seismic' as const,
      direction,
      from: 'stated' as const,
      forces: ids.map((level, i) => ({ level, force: 10 + i, diaphragmForce: 15 + i })),
    })),
    combinations: 'ASCE 7-22 allowable',
  };
}

function heapOf(work: () => unknown): number {
  global.gc?.();
  const before = process.memoryUsage().heapUsed;
  const kept = work();
  const after = process.memoryUsage().heapUsed;
  return kept === undefined ? NaN : (after - before) / 2 ** 20;
}

/** `npm run bench -- semi-rigid` times that behaviour alone. */
const only = process.argv[2];
const cell = (value: number, digits = 1): string => value.toFixed(digits).padStart(9);
console.log(
  'behaviour  storeys  lines     rows   read ms  analyse ms  parse+print ms  ratio  heap MiB  µs a storey·line',
);
for (const behaviour of ['flexible', 'rigid'] as const) {
  if (only !== undefined && only !== behaviour) continue;
  for (const { storeys, lines } of SIZES) {
    const file = building(storeys, lines, behaviour);
    const input = JSON.stringify(file);
    const read = readBuilding(JSON.parse(input));
    if (!read.ok) throw new Error(JSON.stringify(read.faults));
    const result = analyse(read.value);
    if (!result.ok) throw new Error(JSON.stringify(result.faults));
    const output = JSON.stringify(result.value);
    const repeats = storeys * lines > 1000 ? 7 : 15;
    const reading = median(() => readBuilding(JSON.parse(input)), repeats);
    const analysing = median(() => analyse(read.value), repeats);
    const printing = median(() => [JSON.stringify(JSON.parse(input)), JSON.stringify(JSON.parse(output))], repeats);
    const heap = heapOf(() => analyse(read.value));
    console.log(
      [
        behaviour.padEnd(9),
        String(storeys).padStart(8),
        String(lines).padStart(6),
        String(result.value.demands.length).padStart(8),
        cell(reading),
        cell(analysing).padStart(11),
        cell(printing).padStart(15),
        ((reading + analysing) / printing).toFixed(2).padStart(6),
        cell(heap),
        cell((1000 * analysing) / (storeys * lines)).padStart(17),
      ].join(' '),
    );
  }
}

if (only === undefined || only === 'semi-rigid') benchSemiRigid(semiRigid);

function semiRigid(meshSize: number): Building {
  const file = building(12, 24, 'rigid');
  return {
    ...file,
    assemblies: { diaphragms: [{ id: 'sheet', apparentShearStiffness: 3000, chordStiffness: 50_000 }] },
    levels: file.levels.map((level) => ({
      ...level,
      ...(level.diaphragms === undefined
        ? {}
        : {
            diaphragms: level.diaphragms.map((floor) => ({
              ...floor,
              behaviour: 'semi-rigid' as const,
              assembly: 'sheet',
              meshSize,
            })),
          }),
    })),
  };
}
