/**
 * Semi-rigid floors: time a level of a building of twelve storeys, beside one pass of matrix assembly and a dense solution of the same
 * stiffness by a general-purpose package, all in one run.
 */
import { CholeskyDecomposition, Matrix } from 'ml-matrix';
import type { Building } from '@groundward/engine/building/definition';
import { cutOf } from '@groundward/engine/diaphragms/inner-forces';
import { rigidModel } from '@groundward/engine/diaphragms/rigid';
import { membraneElements } from '@groundward/engine/diaphragms/semi-rigid/membrane';
import {
  membraneModel,
  stiffnessesOf,
  type MembraneModel,
} from '@groundward/engine/diaphragms/semi-rigid/membrane-model';
import { analyse } from '@groundward/engine/path/analyse';
import { buildModel, type Model } from '@groundward/engine/path/model';
import { factorise, solve, type ElementStiffness } from '@groundward/engine/statics/frontal-cholesky';
import { median } from './timing.js';

/** Dense elimination of 5,000 unknowns takes minutes: it is measured up to here and carried on with the cube of the size. */
const DENSE = 1000;

/** @param building makes a building with semi-rigid floors of a mesh size [length] */
export function benchSemiRigid(building: (meshSize: number) => Building): void {
  const file = building(2.4);
  const levels = file.levels.length - 1;
  const analysing = median(() => analyse(file), 3);
  const { membrane, model } = floorOf(file);
  const unknowns = 2 * membrane.mesh.x.length;
  const meshing = median(() => membraneOf(model), 5);
  const factoring = median(() => factorise(membrane.elements, membrane.mesh.x.length), 9);
  const load = new Float64Array(unknowns).fill(1);
  const solving = median(() => solve(membrane.factor, load), 9);
  const assembling = assemblyTime(membrane);
  console.log(`\nsemi-rigid, ${levels} storeys, ${unknowns} unknowns a level, two load cases`);
  const ms = (value: number): string => `${value.toFixed(1)} ms`;
  console.log(`  a level of the analysis, all told           ${ms(analysing / levels)}`);
  console.log(`  mesh, element stiffnesses and factor        ${ms(meshing)}`);
  console.log(`  factor alone                                ${ms(factoring)}`);
  console.log(`  one solution with the factor                ${ms(solving)}`);
  console.log(`  one pass of matrix assembly                 ${ms(assembling)}`);
  console.log(`  factor and solution over one assembly       ${((factoring + solving) / assembling).toFixed(2)}`);

  const small = floorOf(building(2.4 * Math.sqrt(unknowns / DENSE))).membrane;
  const size = 2 * small.mesh.x.length;
  const sparse = median(
    () =>
      solve(factorise(small.elements, small.mesh.x.length) as MembraneModel['factor'], new Float64Array(size).fill(1)),
    9,
  );
  const dense = denseTime(small.elements, size);
  const carried = dense * (unknowns / size) ** 3;
  console.log(
    `  dense, ${size} unknowns, measured            ${ms(dense)}: ${(dense / sparse).toFixed(0)} times ${ms(sparse)}`,
  );
  console.log(
    `  dense, ${unknowns} unknowns, by the cube of the size ${ms(carried)}: ${(carried / (factoring + solving)).toFixed(0)} times ${ms(factoring + solving)} (not measured)`,
  );
}

function floorOf(building: Building): { model: Model; membrane: MembraneModel } {
  const model = buildModel(building);
  return { model, membrane: membraneOf(model) };
}

function membraneOf(model: Model): MembraneModel {
  const diaphragm = model.levels[1]?.diaphragms[0];
  if (diaphragm === undefined) throw new Error('no floor');
  const rigid = rigidModel(diaphragm, model.extent);
  return membraneModel(diaphragm, rigid, stiffnessesOf(model.building, diaphragm), (line) => cutOf(diaphragm, line));
}

/** Stiffnesses of all elements made and added to the rows of a sparse matrix whose pattern is known [ms] */
function assemblyTime({ mesh, sheet, springs, elements }: MembraneModel): number {
  const nodes = mesh.x.length;
  const neighbours = Array.from({ length: nodes }, () => new Set<number>());
  for (const element of elements) for (const a of element.nodes) for (const b of element.nodes) neighbours[a]?.add(b);
  const columns = neighbours.map((set) => Int32Array.from(set).sort());
  const starts = Int32Array.from(columns, () => 0);
  let total = 0;
  columns.forEach((row, n) => {
    starts[n] = total;
    total += row.length;
  });
  const values = new Float64Array(4 * total);
  return median(() => {
    values.fill(0);
    for (const { nodes: own, matrix } of [...membraneElements(mesh, sheet), ...springs]) {
      const width = 2 * own.length;
      for (let a = 0; a < own.length; a++) {
        const row = columns[own[a] as number] as Int32Array;
        const start = starts[own[a] as number] as number;
        for (let b = 0; b < own.length; b++) {
          const at = 4 * (start + placeOf(row, own[b] as number));
          const from = 2 * a * width + 2 * b;
          values[at] = (values[at] as number) + (matrix[from] as number);
          values[at + 1] = (values[at + 1] as number) + (matrix[from + 1] as number);
          values[at + 2] = (values[at + 2] as number) + (matrix[from + width] as number);
          values[at + 3] = (values[at + 3] as number) + (matrix[from + width + 1] as number);
        }
      }
    }
    return values;
  }, 9);
}

function placeOf(row: Int32Array, column: number): number {
  let low = 0;
  let high = row.length - 1;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((row[middle] as number) < column) low = middle + 1;
    else high = middle;
  }
  return low;
}

/** The same stiffness as a dense matrix, factored and solved once by the general-purpose package [ms] */
function denseTime(elements: readonly ElementStiffness[], unknowns: number): number {
  const matrix = Matrix.zeros(unknowns, unknowns);
  for (const { nodes, matrix: own } of elements) {
    const width = 2 * nodes.length;
    for (let a = 0; a < width; a++) {
      for (let b = 0; b < width; b++) {
        const [i, j] = [2 * (nodes[a >> 1] as number) + (a & 1), 2 * (nodes[b >> 1] as number) + (b & 1)];
        matrix.set(i, j, matrix.get(i, j) + (own[a * width + b] as number));
      }
    }
  }
  const start = process.hrtime.bigint();
  new CholeskyDecomposition(matrix).solve(Matrix.ones(unknowns, 1));
  return Number(process.hrtime.bigint() - start) / 1e6;
}
