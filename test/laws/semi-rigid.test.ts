import { describe, expect, test } from 'vitest';
import type { Point } from '@groundward/engine/building/definition';
import { springForce } from '@groundward/engine/diaphragms/rigid';
import {
  across,
  expectEquilibrium,
  gauss,
  lengthwise,
  rectangle,
  skewFloor,
  solveFloor,
  turnedFloor,
  type Floor,
} from './semi-rigid-floor.js';

/** 40 × 10 under a load along y on stiff walls at 0, 15 and 40, with walls along x that steady it. */
const threeWalls = (k: number): Floor => ({
  outline: rectangle(0, 0, 40, 10),
  walls: [
    across('1', 0, 10, k),
    across('2', 15, 10, k),
    across('3', 40, 10, k),
    lengthwise('A', 0, 0, 40, k),
    lengthwise('B', 10, 0, 40, k),
  ],
  direction: 90,
});

describe('limits of a semi-rigid diaphragm', () => {
  test('G·t → ∞ gives the rigid answer', () => {
    for (const floor of [threeWalls(1000), skewFloor, turnedFloor(skewFloor, 33)]) {
      const solved = solveFloor(floor, { shear: 1e9 });
      const motion = solved.outcome.motion[0] ?? [0, 0, 0];
      for (const spring of solved.rigid.springs) {
        expect(Math.abs((solved.given[spring.line.line.id] ?? 0) - springForce(spring, motion))).toBeLessThan(1e-4);
      }
      expectEquilibrium(solved);
    }
  });

  test('stiff walls under an evenly loaded shear-flexible floor of constant depth take simple-span reactions', () => {
    const { given, membrane } = solveFloor(threeWalls(1e9), { shear: 100 });
    expect(membrane.assumed.axial).toBe(true);
    expect(given['1']).toBeCloseTo(7.5 / 40, 4);
    expect(given['2']).toBeCloseTo(20 / 40, 4);
    expect(given['3']).toBeCloseTo(12.5 / 40, 4);
  });
});

describe('beams on springs in closed form', () => {
  const [depth, length] = [10, 40];
  const onThree = (at: number, k: readonly [number, number, number]): Floor => ({
    outline: rectangle(0, 0, length, depth),
    walls: [
      across('1', 0, depth, k[0]),
      across('2', at, depth, k[1]),
      across('3', length, depth, k[2]),
      lengthwise('A', depth / 2, 0, length, 500),
    ],
    direction: 90,
  });

  test('a beam that only shears, on three even springs', () => {
    const [k0, k1, shear] = [80, 300, 15];
    const { given } = solveFloor(onThree(20, [k0, k1, k0]), { shear, axial: 1e7 * shear });
    // R₁/k₁ − R₀/k₀ = (R₀·a − w·a²/2)/(G·t·d) with 2·R₀ + R₁ = 1, w = 1/(2·a)
    const ga = shear * depth;
    const end = (1 / k1 + 20 / (4 * ga)) / (2 / k1 + 1 / k0 + 20 / ga);
    expect(given['1']).toBeCloseTo(end, 5);
    expect(given['3']).toBeCloseTo(end, 5);
    expect(given['2']).toBeCloseTo(1 - 2 * end, 5);
  });

  test('a beam that only shears, on uneven springs at uneven places', () => {
    const k = [80, 300, 120] as const;
    const shear = 15;
    const a = 12;
    const b = length - a;
    const ga = shear * depth;
    const w = 1 / length;
    // Unknowns v₁, v₂, v₃ and the turn θ of the cross-sections, one for all where nothing bends.
    // Forces and moments balance; v₂ − v₁ − θ·a = ∫V/GA over the first span, and so over the second.
    const matrix = [
      [k[0], k[1], k[2], 0],
      [0, k[1] * a, k[2] * length, 0],
      [-1 - (k[0] * a) / ga, 1, 0, -a],
      [-(k[0] * b) / ga, -1 - (k[1] * b) / ga, 1, -b],
    ].map((row) => Float64Array.from(row));
    const right = [1, length / 2, (-w * a * a) / 2 / ga, (-w * (length ** 2 - a ** 2)) / 2 / ga];
    const v = gauss(matrix, Float64Array.from(right));
    const { given } = solveFloor(onThree(a, k), { shear, axial: 1e7 * shear });
    expect(given['1']).toBeCloseTo(k[0] * (v[0] as number), 5);
    expect(given['2']).toBeCloseTo(k[1] * (v[1] as number), 5);
    expect(given['3']).toBeCloseTo(k[2] * (v[2] as number), 5);
  });

  test('a beam that shears and bends on its chords (S. Timoshenko), on three springs', () => {
    const [k0, k1, shear, chord] = [80, 300, 60, 4000];
    const axial = 1;
    const { given } = solveFloor(onThree(20, [k0, k1, k0]), { shear, axial, chord });
    const ei = (chord * depth ** 2) / 2 + (axial * depth ** 3) / 12;
    const ga = shear * depth;
    const underLoad = (5 * length ** 3) / (384 * ei) + length / (8 * ga);
    const underPoint = length ** 3 / (48 * ei) + length / (4 * ga);
    const middle = (1 / (2 * k0) + underLoad) / (1 / k1 + 1 / (2 * k0) + underPoint);
    expect(Math.abs((given['2'] ?? 0) - middle)).toBeLessThan(1e-3);
    // Without bending it would be another.
    const sheared = (1 / (2 * k0) + length / (8 * ga)) / (1 / k1 + 1 / (2 * k0) + length / (4 * ga));
    expect(Math.abs(sheared - middle)).toBeGreaterThan(0.01);
  });
});

describe('laws of a semi-rigid floor', () => {
  const flexible = { shear: 300 };

  test.each(['area', 'even'] as const)('equilibrium, spread %s, with and without eccentricity', (spread) => {
    for (const floor of [skewFloor, turnedFloor(skewFloor, 21), { ...skewFloor, direction: 30 }]) {
      expectEquilibrium(solveFloor(floor, flexible, spread));
      expectEquilibrium(solveFloor(floor, { ...flexible, size: 5 }, spread, 1.5));
    }
  });

  test('equilibrium under zones, façades and partitions', () => {
    const weight = {
      area: 2,
      zones: [{ id: 'z', outline: rectangle(2, 10, 9, 20), area: 5 }],
      lines: [
        {
          id: 'f',
          along: [
            [0, 0],
            [24, 0],
            [30, 6],
            [30, 12],
          ] as Point[],
          perLength: 4,
        },
        { id: 'p', along: [[9, 3] as Point, [20, 10] as Point], perLength: 1 },
      ],
    };
    for (const direction of [90, 0, 40])
      expectEquilibrium(solveFloor({ ...skewFloor, weight, direction }, flexible, 'weight'));
  });

  test('a weight on one wing goes to the walls beside it', () => {
    const weight = { zones: [{ id: 'z', outline: rectangle(0, 20, 12, 25), area: 1 }] };
    const floor = { ...skewFloor, above: undefined, weight, direction: 0 };
    const { above: _, ...plain } = floor;
    const near = solveFloor(plain, { shear: 30 }, 'weight').given['B'] ?? 0;
    const even = solveFloor(plain, { shear: 30 }, 'area').given['B'] ?? 0;
    expect(near).toBeGreaterThan(0.7);
    expect(even).toBeLessThan(0.5);
  });

  test('a turned plan has the same forces', () => {
    const plain = solveFloor(skewFloor, flexible, 'area', 1).given;
    for (const degrees of [17, 90, 123.4, -60]) {
      // The eccentricity keeps its side of the load where s turns with the plan.
      const floor = turnedFloor(skewFloor, degrees);
      const probe = solveFloor(floor, flexible);
      const s = probe.model.frames[probe.frame]?.s as Point;
      const angle = (degrees * Math.PI) / 180;
      const side = s[0] * Math.cos(angle) + s[1] * Math.sin(angle) > 0 ? 1 : -1;
      const t = probe.model.frames[probe.frame]?.t as Point;
      const sense = -t[0] * Math.sin(angle) + t[1] * Math.cos(angle) > 0 ? 1 : -1;
      const solved = solveFloor(floor, flexible, 'area', side, sense).given;
      for (const [id, force] of Object.entries(plain)) expect(Math.abs((solved[id] ?? 0) - force)).toBeLessThan(1e-6);
    }
  });

  test('a mirrored plan has mirrored forces', () => {
    const floor: Floor = { ...threeWalls(200), openings: [rectangle(5, 2, 9, 6)] };
    const mirrored: Floor = {
      ...threeWalls(200),
      openings: [rectangle(31, 2, 35, 6)],
      walls: [across('1', 40, 10, 200), across('2', 25, 10, 200), across('3', 0, 10, 200), ...floor.walls.slice(3)],
    };
    const a = solveFloor(floor, { shear: 50 }).given;
    const b = solveFloor(mirrored, { shear: 50 }).given;
    for (const id of ['1', '2', '3']) expect(Math.abs((a[id] ?? 0) - (b[id] ?? 0))).toBeLessThan(1e-9);
  });

  test('loads superpose', () => {
    const both = solveFloor(skewFloor, flexible);
    const { above: _, ...without } = skewFloor;
    const own = solveFloor(without, flexible).given;
    const taken = solveFloor(skewFloor, flexible, 'area', 0, 0).given;
    // The wall above changes the mesh a little: it is a line that the mesh follows.
    for (const [id, force] of Object.entries(both.given))
      expect(Math.abs(force - (own[id] ?? 0) - (taken[id] ?? 0))).toBeLessThan(2e-4);
  });

  test('half the mesh size changes no reaction by more than 0.1 % of the load', () => {
    for (const stiffnesses of [{ shear: 300 }, { shear: 300, axial: 900 }, { shear: 300, chord: 20000 }]) {
      const coarse = solveFloor(skewFloor, stiffnesses);
      const fine = solveFloor(skewFloor, { ...stiffnesses, size: coarse.membrane.size / 2 });
      for (const [id, force] of Object.entries(coarse.given))
        expect(Math.abs((fine.given[id] ?? 0) - force), `${id} ${JSON.stringify(stiffnesses)}`).toBeLessThan(1e-3);
    }
  });
});
