import { describe, expect, test } from 'vitest';
import type { Point } from '@groundward/engine/building/definition';
import { axesOf } from '@groundward/engine/diaphragms/semi-rigid/axes';
import { membraneElements } from '@groundward/engine/diaphragms/semi-rigid/membrane';
import type { Mesh } from '@groundward/engine/diaphragms/semi-rigid/mesh';
import { alongLine } from '@groundward/engine/diaphragms/semi-rigid/response';
import { factorise, solve, times } from '@groundward/engine/statics/frontal-cholesky';
import { gauss, skewFloor, solveFloor, turnedFloor } from './semi-rigid-floor.js';

/** u_x = a + b·x + c·y, u_y = d + e·x + f·y */
function linearField({ x, y }: Mesh, [a, b, c, d, e, f]: readonly number[]): Float64Array {
  const u = new Float64Array(2 * x.length);
  for (let n = 0; n < x.length; n++) {
    u[2 * n] = (a ?? 0) + (b ?? 0) * (x[n] as number) + (c ?? 0) * (y[n] as number);
    u[2 * n + 1] = (d ?? 0) + (e ?? 0) * (x[n] as number) + (f ?? 0) * (y[n] as number);
  }
  return u;
}

/** Nodes on outline, openings. */
function borderNodes(mesh: Mesh): Set<number> {
  return new Set(mesh.border.flatMap((stretch) => [...stretch]));
}

describe('patch test: a mesh of rectangles and triangles holds constant strain exactly', () => {
  const { membrane } = solveFloor(skewFloor, { shear: 3, axial: 7, size: 3 });
  const { mesh } = membrane;
  const elements = membraneElements(mesh, { axial: 7, shear: 3 });
  const border = borderNodes(mesh);

  test('both kinds of elements take part', () => {
    expect(mesh.rectangles.length).toBeGreaterThan(10);
    expect(mesh.triangles.length).toBeGreaterThan(10);
  });

  test.each([
    ['stretched along x', [0, 1, 0, 0, 0, 0]],
    ['stretched along y', [0, 0, 0, 0, 0, 1]],
    ['sheared', [0, 0, 1, 0, 1, 0]],
    ['turned as a body', [2, 0, -1, 3, 1, 0]],
    ['all at once', [1, 0.3, -0.7, 2, 0.4, 0.9]],
  ])('%s: no force on inner nodes, and the energy of the strain', (_, field) => {
    const u = linearField(mesh, field);
    const force = times(elements, u);
    for (let n = 0; n < mesh.x.length; n++) {
      if (border.has(n)) continue;
      expect(Math.abs(force[2 * n] as number)).toBeLessThan(1e-11);
      expect(Math.abs(force[2 * n + 1] as number)).toBeLessThan(1e-11);
    }
    const [, b = 0, c = 0, , e = 0, f = 0] = field;
    const energy = u.reduce((sum, value, i) => sum + value * (force[i] as number), 0);
    const { area } = solveFloor(skewFloor, { shear: 3, size: 30 }).diaphragm.mass;
    expect(energy).toBeCloseTo(area * (7 * (b * b + f * f) + 3 * (c + e) ** 2), 8);
  });

  test('with the border moved along, the inside follows', () => {
    const stiff = 1e6;
    const field = linearField(mesh, [1, 0.3, -0.7, 2, 0.4, 0.9]);
    const held = [...border].map((node) => ({
      nodes: Int32Array.of(node),
      matrix: Float64Array.of(stiff, 0, 0, stiff),
      x: mesh.x[node] as number,
      y: mesh.y[node] as number,
    }));
    const all = [...elements, ...held];
    const reaction = times(elements, field);
    const load = new Float64Array(field.length);
    for (const node of border)
      for (const i of [2 * node, 2 * node + 1]) load[i] = stiff * (field[i] as number) + (reaction[i] as number);
    const factor = factorise(all, mesh.x.length);
    if (factor === undefined) throw new Error('singular');
    const u = solve(factor, load);
    u.forEach((value, i) => expect(Math.abs(value - (field[i] as number))).toBeLessThan(1e-9));
  });
});

describe('the sparse solution', () => {
  test('is that of plain elimination on the dense matrix', () => {
    const { membrane } = solveFloor(skewFloor, { shear: 300, size: 6 });
    const n = 2 * membrane.mesh.x.length;
    expect(n).toBeLessThan(800);
    const dense = Array.from({ length: n }, () => new Float64Array(n));
    for (const { nodes, matrix } of membrane.elements) {
      const width = 2 * nodes.length;
      for (let i = 0; i < width; i++) {
        const row = dense[2 * (nodes[i >> 1] as number) + (i & 1)] as Float64Array;
        for (let j = 0; j < width; j++) {
          const column = 2 * (nodes[j >> 1] as number) + (j & 1);
          row[column] = (row[column] as number) + (matrix[i * width + j] as number);
        }
      }
    }
    const wall = membrane.lines[0];
    if (wall === undefined) throw new Error('no wall');
    const { load } = alongLine(membrane, wall.line);
    const expected = gauss(dense, load);
    const found = solve(membrane.factor, load);
    const scale = expected.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
    found.forEach((value, i) => expect(Math.abs(value - (expected[i] as number))).toBeLessThan(1e-9 * scale));
  });

  test('is the same to the last byte on repetition', () => {
    const a = solveFloor(skewFloor, { shear: 300 });
    const b = solveFloor(skewFloor, { shear: 300 });
    expect(a.outcome.displacement[0]).toEqual(b.outcome.displacement[0]);
    expect(a.given).toEqual(b.given);
  });

  test('a stiffness without walls is singular and says so', () => {
    const { membrane } = solveFloor(skewFloor, { shear: 1, axial: 2, size: 6 });
    const loose = membraneElements(membrane.mesh, { axial: 0, shear: 1 });
    expect(factorise(loose, membrane.mesh.x.length)).toBeUndefined();
  });
});

test('a turned plan has the same mesh', () => {
  const plain = solveFloor(skewFloor, { shear: 300 }).membrane.mesh;
  for (const degrees of [17, 90, 123.4]) {
    const turned = solveFloor(turnedFloor(skewFloor, degrees), { shear: 300 }).membrane.mesh;
    expect(turned.rectangles).toEqual(plain.rectangles);
    expect(turned.triangles).toEqual(plain.triangles);
    turned.x.forEach((x, n) => expect(Math.abs(x - (plain.x[n] as number))).toBeLessThan(1e-8));
    turned.y.forEach((y, n) => expect(Math.abs(y - (plain.y[n] as number))).toBeLessThan(1e-8));
  }
});

test('a diaphragm’s axes run along most of its outline', () => {
  const outline: Point[] = [
    [0, 0],
    [10, 0],
    [10, 6],
    [4, 12],
    [0, 12],
  ];
  expect(axesOf(outline).x).toEqual([1, 0]);
  expect(axesOf([...outline].reverse()).x.map(Math.abs)).toEqual([1, 0]);
});
