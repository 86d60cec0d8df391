/** One floor on wall lines, for the laws of semi-rigid diaphragms. */
import { expect } from 'vitest';
import { Building, type Point, type Ring } from '@groundward/engine/building/definition';
import type { DiaphragmModel } from '@groundward/engine/diaphragms/diaphragm';
import { cutOf } from '@groundward/engine/diaphragms/inner-forces';
import { shiftedBy, spreadOver, type Inertia, type Spread } from '@groundward/engine/diaphragms/inertia';
import { rigidModel } from '@groundward/engine/diaphragms/rigid';
import { membraneModel, type Stiffnesses } from '@groundward/engine/diaphragms/semi-rigid/membrane-model';
import { semiRigidBody, throughSemiRigid } from '@groundward/engine/diaphragms/semi-rigid/semi-rigid';
import { unitVector } from '@groundward/engine/geometry/frame';
import { buildModel } from '@groundward/engine/path/model';
import type { LineModel } from '@groundward/engine/walls/wall-line';

export type Wall = { readonly id: string; readonly axis: readonly [Point, Point]; readonly k: number };

export type Floor = {
  readonly outline: Ring;
  readonly openings?: readonly Ring[];
  readonly walls: readonly Wall[];
  /** A wall of the storey above that stops at this floor. */
  readonly above?: readonly [Point, Point];
  readonly weight?: NonNullable<Building['levels'][number]['diaphragms']>[number]['weight'];
  readonly direction: number;
};

export function buildingOf(floor: Floor): Building {
  const wall = (id: string, axis: readonly [Point, Point], under: string, k: number) => ({
    id,
    axis,
    storeys: [{ under, piers: [{ id: 'a', from: 0, to: lengthOf(axis), stiffness: k }] }],
  });
  return Building.parse({
    schema: 'groundward.building/1',
    name: 'One floor',
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      {
        id: 'floor',
        elevation: 4,
        diaphragms: [
          {
            id: 'd',
            outline: floor.outline,
            openings: (floor.openings ?? []).map((outline, i) => ({ id: `o${i}`, outline })),
            behaviour: 'semi-rigid',
            ...(floor.weight === undefined ? {} : { weight: floor.weight }),
          },
        ],
      },
      { id: 'roof', elevation: 8 },
    ],
    wallLines: [
      ...floor.walls.map(({ id, axis, k }) => wall(id, axis, 'floor', k)),
      ...(floor.above === undefined ? [] : [wall('above', floor.above, 'roof', 1)]),
    ],
    loadCases: [
      { id: 'E', kind: 'seismic', direction: floor.direction, from: 'stated', forces: [{ level: 'floor', force: 1 }] },
    ],
  });
}

function lengthOf([a, b]: readonly [Point, Point]): number {
  return Math.hypot(b[0] - a[0], b[1] - a[1]);
}

/** The floor under a level force, with a spread and an eccentricity [length], and 1 from the wall above where there is one. */
export function solveFloor(
  floor: Floor,
  stiffnesses: Stiffnesses,
  spread: Spread = 'area',
  eccentricity = 0,
  levelForce = 1,
) {
  const model = buildModel(buildingOf(floor));
  const diaphragm = model.levels[1]?.diaphragms[0] as DiaphragmModel;
  const rigid = rigidModel(diaphragm, model.extent);
  const membrane = membraneModel(diaphragm, rigid, stiffnesses, (line) => cutOf(diaphragm, line));
  const frame = model.frameOf(unitVector(floor.direction));
  const inertia = shiftedBy(spreadOver([diaphragm], frame, spread)[0] as Inertia, eccentricity);
  const above = model.lines.find((line) => line.line.id === 'above');
  const taken = new Map<LineModel, Float64Array>();
  if (above !== undefined) taken.set(above, Float64Array.of(1));
  const body = semiRigidBody(membrane);
  const outcome = throughSemiRigid(body, inertia, Float64Array.of(levelForce), taken);
  const given = Object.fromEntries([...outcome.given].map(([line, force]) => [line.line.id, force[0] as number]));
  return { model, diaphragm, frame, rigid, membrane, body, inertia, outcome, given };
}

/** The plan turned about the origin by an angle [degrees]. */
export function turnedFloor(floor: Floor, degrees: number): Floor {
  const angle = (degrees * Math.PI) / 180;
  const turn = ([x, y]: Point): Point => [
    x * Math.cos(angle) - y * Math.sin(angle),
    x * Math.sin(angle) + y * Math.cos(angle),
  ];
  return {
    ...floor,
    outline: floor.outline.map(turn),
    openings: (floor.openings ?? []).map((ring) => ring.map(turn)),
    walls: floor.walls.map((wall) => ({ ...wall, axis: [turn(wall.axis[0]), turn(wall.axis[1])] })),
    ...(floor.above === undefined ? {} : { above: [turn(floor.above[0]), turn(floor.above[1])] }),
    direction: floor.direction + degrees,
  };
}

export function rectangle(x0: number, y0: number, x1: number, y1: number): Ring {
  return [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ];
}

/** A wall across a rectangle of the given depth at x, along y. */
export function across(id: string, x: number, depth: number, k: number): Wall {
  return {
    id,
    axis: [
      [x, 0],
      [x, depth],
    ],
    k,
  };
}

/** A wall along x at y. */
export function lengthwise(id: string, y: number, x0: number, x1: number, k: number): Wall {
  return {
    id,
    axis: [
      [x0, y],
      [x1, y],
    ],
    k,
  };
}

/** Plain elimination with row exchanges. The matrix is spent. */
export function gauss(matrix: Float64Array[], load: Float64Array): Float64Array {
  const n = load.length;
  const u = Float64Array.from(load);
  for (let k = 0; k < n; k++) {
    let pivot = k;
    for (let i = k + 1; i < n; i++)
      if (Math.abs(matrix[i]?.[k] as number) > Math.abs(matrix[pivot]?.[k] as number)) pivot = i;
    [matrix[k], matrix[pivot]] = [matrix[pivot] as Float64Array, matrix[k] as Float64Array];
    [u[k], u[pivot]] = [u[pivot] as number, u[k] as number];
    const row = matrix[k] as Float64Array;
    for (let i = k + 1; i < n; i++) {
      const other = matrix[i] as Float64Array;
      const factor = (other[k] as number) / (row[k] as number);
      if (factor === 0) continue;
      for (let j = k; j < n; j++) other[j] = (other[j] as number) - factor * (row[j] as number);
      u[i] = (u[i] as number) - factor * (u[k] as number);
    }
  }
  for (let i = n - 1; i >= 0; i--) {
    const row = matrix[i] as Float64Array;
    let sum = u[i] as number;
    for (let j = i + 1; j < n; j++) sum -= (row[j] as number) * (u[j] as number);
    u[i] = sum / (row[i] as number);
  }
  return u;
}

/** An L-shaped plan with a stair, a cut-off corner, a wall askew and a wall above that stops. */
export const skewFloor: Floor = {
  outline: [
    [0, 0],
    [24, 0],
    [30, 6],
    [30, 12],
    [12, 12],
    [12, 25],
    [0, 25],
  ],
  openings: [rectangle(4, 4, 8, 9)],
  walls: [
    across('1', 0, 25, 3000),
    {
      id: '2',
      axis: [
        [12, 12],
        [12, 25],
      ],
      k: 1500,
    },
    {
      id: '3',
      axis: [
        [30, 6],
        [30, 12],
      ],
      k: 4000,
    },
    lengthwise('A', 0, 0, 24, 2500),
    lengthwise('B', 25, 0, 12, 2000),
    lengthwise('C', 12, 14, 26, 1000),
    {
      id: 'S',
      axis: [
        [18, 0],
        [25, 12],
      ],
      k: 800,
    },
  ],
  above: [
    [16, 5],
    [24, 5],
  ],
  direction: 90,
};

/** All forces on the floor along x and y, and their moment about the origin, add up to nothing. */
export function expectEquilibrium(solved: ReturnType<typeof solveFloor>): void {
  const { membrane, outcome, inertia, model, frame } = solved;
  const t = model.frames[frame]?.t as Point;
  const s = model.frames[frame]?.s as Point;
  const moment = ([x, y]: Point, [fx, fy]: Point): number => x * fy - y * fx;
  let [fx, fy, m] = [t[0], t[1], moment([s[0] * inertia.centre, s[1] * inertia.centre], t)];
  const above = membrane.lines.find(({ line }) => line.line.id === 'above')?.line;
  if (above !== undefined) {
    fx += above.along[0];
    fy += above.along[1];
    m += moment(above.line.axis[0], above.along);
  }
  for (const [line, force] of outcome.given) {
    fx -= (force[0] as number) * line.along[0];
    fy -= (force[0] as number) * line.along[1];
    m -= (force[0] as number) * moment(line.line.axis[0], line.along);
  }
  expect(Math.abs(fx)).toBeLessThan(1e-11);
  expect(Math.abs(fy)).toBeLessThan(1e-11);
  expect(Math.abs(m)).toBeLessThan(1e-11 * model.extent);
}
