/** What a semi-rigid diaphragm does under a load: displacements, and the force that it gives to each wall line. */
import { cross } from '../../geometry/frame.js';
import { solve, times } from '../../statics/frontal-cholesky.js';
import type { Vector3 } from '../../statics/small-matrix.js';
import type { LineModel } from '../../walls/wall-line.js';
import { displacementOf } from '../rigid.js';
import { toLocal } from './axes.js';
import { lengthOf, type MembraneModel, type MeshLine } from './membrane-model.js';

export type Response = {
  /** u_x, u_y of every node in the diaphragm's axes [length] */
  readonly displacement: Float64Array;
  /** Force into each line of the model along its axis [force] */
  readonly given: Float64Array;
  /** Largest force that is left on a node, relative to the sum of the load's forces. */
  readonly residual: number;
};

/**
 * Solves for one load as the motion of a rigid floor and what the membrane's deformation adds, so that a stiff membrane costs no digits.
 * The deformation is improved by one step of iterative refinement, and what is left of its three rigid motions is taken out by the
 * walls' own stiffness: the walls carry the load to the last digits.
 *
 * @param load F_x, F_y of every node in the diaphragm's axes [force]
 * @param resultant of the load: F_x, F_y on plan [force], moment about the rigid model's origin [force·length]
 */
export function responseTo(model: MembraneModel, load: Float64Array, resultant: Vector3): Response {
  const asRigid = rigidMotion(model, displacementOf(model.rigid, resultant));
  const rest = difference(load, times(model.springs, asRigid));
  const u = solve(model.factor, rest);
  add(u, solve(model.factor, difference(rest, times(model.elements, u))));
  removeRigidResidual(model, asRigid, u, resultant);
  const left = difference(rest, times(model.elements, u));
  const whole = load.reduce((sum, value) => sum + Math.abs(value), 0);
  const given = Float64Array.from(model.lines, (line) => forceInto(model, line, asRigid) + forceInto(model, line, u));
  add(u, asRigid);
  const most = left.reduce((size, value) => Math.max(size, Math.abs(value)), 0);
  return { displacement: u, given, residual: whole === 0 ? 0 : most / whole };
}

function difference(a: Float64Array, b: Float64Array): Float64Array {
  return a.map((value, i) => value - (b[i] as number));
}

function add(to: Float64Array, other: Float64Array): void {
  for (let i = 0; i < to.length; i++) to[i] = (to[i] as number) + (other[i] as number);
}

/** Displacements of the nodes under a motion on plan about the rigid model's origin. */
function rigidMotion({ rigid, axes, mesh }: MembraneModel, [dx, dy, turn]: Vector3): Float64Array {
  const ux = dx * axes.x[0] + dy * axes.x[1];
  const uy = dx * axes.y[0] + dy * axes.y[1];
  const origin = toLocal(axes, rigid.origin);
  const u = new Float64Array(2 * mesh.x.length);
  for (let n = 0; n < mesh.x.length; n++) {
    u[2 * n] = ux - turn * ((mesh.y[n] as number) - origin[1]);
    u[2 * n + 1] = uy + turn * ((mesh.x[n] as number) - origin[0]);
  }
  return u;
}

/** Moves the floor as a body until the walls carry the whole load. */
function removeRigidResidual(model: MembraneModel, asRigid: Float64Array, u: Float64Array, resultant: Vector3): void {
  const { rigid } = model;
  let [fx, fy, moment] = resultant;
  for (const { a, line } of rigid.springs) {
    const meshLine = model.lines.find((candidate) => candidate.line === line);
    if (meshLine === undefined) continue;
    const force = forceInto(model, meshLine, asRigid) + forceInto(model, meshLine, u);
    fx -= force * a[0];
    fy -= force * a[1];
    moment -= force * a[2];
  }
  add(u, rigidMotion(model, displacementOf(rigid, [fx, fy, moment])));
}

/** Stiffness of the line times the mean of the displacement along it. */
function forceInto({ mesh }: MembraneModel, { stretches, along, length, k }: MeshLine, u: Float64Array): number {
  if (k === 0) return 0;
  let sum = 0;
  for (const stretch of stretches) {
    const at = (i: number): number => {
      const node = stretch[i] as number;
      return (u[2 * node] as number) * along[0] + (u[2 * node + 1] as number) * along[1];
    };
    sum += ((at(0) + 4 * at(1) + at(2)) / 6) * lengthOf(mesh, stretch);
  }
  return (k * sum) / length;
}

/** A force of 1 along a line, evenly over its length: the load and its resultant. */
export function alongLine(model: MembraneModel, of: LineModel): { load: Float64Array; resultant: Vector3 } {
  const load = new Float64Array(2 * model.mesh.x.length);
  const meshLine = model.lines.find(({ line }) => line === of);
  if (meshLine === undefined) throw new RangeError(`wall line ${of.line.id} does not meet ${model.diaphragm.key}`);
  const { stretches, along, length } = meshLine;
  for (const stretch of stretches) {
    const part = lengthOf(model.mesh, stretch) / length;
    stretch.forEach((node, i) => {
      const share = part * (i === 1 ? 4 / 6 : 1 / 6);
      load[2 * node] = (load[2 * node] as number) + share * along[0];
      load[2 * node + 1] = (load[2 * node + 1] as number) + share * along[1];
    });
  }
  const [ax, ay] = of.along;
  const [px, py] = of.line.axis[0];
  const { origin } = model.rigid;
  return { load, resultant: [ax, ay, cross([px - origin[0], py - origin[1]], [ax, ay])] };
}
