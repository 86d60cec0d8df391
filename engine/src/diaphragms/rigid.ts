/** Rigid diaphragms: a body in its plane on wall lines of any orientation. */
import type { Point } from '../building/definition.js';
import type { Fault } from '../building/fault.js';
import { Refusal } from '../building/refusal.js';
import { cross } from '../geometry/frame.js';
import { solveSymmetric3, type Symmetric3, type Vector3 } from '../statics/small-matrix.js';
import type { LineModel, StoreyModel } from '../walls/wall-line.js';
import { pointOn } from '../walls/wall-line.js';
import type { DiaphragmModel } from './diaphragm.js';

export type RigidModel = {
  readonly diaphragm: DiaphragmModel;
  /** Origin of the motion: the centre of mass on plan [length] */
  readonly origin: Point;
  readonly springs: readonly Spring[];
  readonly stiffness: Symmetric3;
  /** Centre of rigidity on plan [length] */
  readonly centre: Point;
  /** Torsional stiffness about it [force·length] */
  readonly torsional: number;
  /** Whether displacements are meaningful: every stiffness stated or from an assembly. */
  readonly absolute: boolean;
};

type Spring = {
  readonly line: LineModel;
  /** Stiffness along the line [force/length], relative where not absolute */
  readonly k: number;
  /** (u_x, u_y, r × u) about the origin */
  readonly a: Vector3;
};

/** A stiffness smaller than this part of the largest does not count. */
const VANISHING = 1e-9;

/**
 * K = Σ k·a·aᵀ over the wall lines under a diaphragm.
 *
 * @throws Refusal `no-resistance` or `no-torsional-resistance` where K is singular
 */
export function rigidModel(diaphragm: DiaphragmModel, extent: number): RigidModel {
  const held = diaphragm.touches
    .map((touch) => touch.line)
    .filter((line) => line.storeys[diaphragm.level] !== undefined);
  const storeys = held.map((line) => line.storeys[diaphragm.level] as StoreyModel);
  const absolute = storeys.every((storey) => storey.stated);
  const origin = diaphragm.mass.centre;
  const springs = held.map((line, i): Spring => {
    const storey = storeys[i] as StoreyModel;
    const [x, y] = pointOn(line, 0);
    return {
      line,
      k: absolute ? storey.stiffness : storey.pierLength,
      a: [line.along[0], line.along[1], cross([x - origin[0], y - origin[1]], line.along)],
    };
  });
  let xx = 0;
  let xy = 0;
  let xr = 0;
  let yy = 0;
  let yr = 0;
  let rr = 0;
  for (const { k, a } of springs) {
    xx += k * a[0] * a[0];
    xy += k * a[0] * a[1];
    xr += k * a[0] * a[2];
    yy += k * a[1] * a[1];
    yr += k * a[1] * a[2];
    rr += k * a[2] * a[2];
  }
  const mean = (xx + yy) / 2;
  const half = Math.hypot((xx - yy) / 2, xy);
  if (!(mean - half > VANISHING * (mean + half))) {
    throw new Refusal([
      noResistance(diaphragm, mean === 0 ? undefined : Math.atan2(2 * xy, xx - yy) / 2 + Math.PI / 2),
    ]);
  }
  const determinant = xx * yy - xy * xy;
  const dx = (yy * xr - xy * yr) / determinant;
  const dy = (xx * yr - xy * xr) / determinant;
  const torsional = rr - (xr * dx + yr * dy);
  if (!(torsional > VANISHING * (mean + half) * extent * extent)) throw new Refusal([noTorsion(diaphragm)]);
  return {
    diaphragm,
    origin,
    springs,
    stiffness: [xx, xy, xr, yy, yr, rr],
    centre: [origin[0] + dy, origin[1] - dx],
    torsional,
    absolute,
  };
}

/**
 * @param force resultant about the model's origin: F_x, F_y [force], moment [force·length]
 * @returns the displacement u_x, u_y [length], rotation [rad]; of relative size where the model is not absolute
 */
export function displacementOf(model: RigidModel, force: Vector3): Vector3 {
  const u = solveSymmetric3(model.stiffness, force);
  if (u === undefined) throw new Refusal([noTorsion(model.diaphragm)]);
  return u;
}

/** Force of a spring along its line under a displacement [force] */
export function springForce(spring: Spring, u: Vector3): number {
  return spring.k * (spring.a[0] * u[0] + spring.a[1] * u[1] + spring.a[2] * u[2]);
}

function noResistance(diaphragm: DiaphragmModel, angle: number | undefined): Fault {
  const degrees = angle === undefined ? undefined : Math.round((((angle * 180) / Math.PI + 360) % 180) * 1e6) / 1e6;
  const along = degrees === undefined ? 'any direction' : degrees === 0 ? 'x' : degrees === 90 ? 'y' : `${degrees}°`;
  return {
    code: 'no-resistance',
    path: diaphragm.path,
    found: `rigid diaphragm ${diaphragm.key} without resistance along ${along}`,
    expected: 'wall lines that resist along x, along y and in torsion',
  };
}

function noTorsion(diaphragm: DiaphragmModel): Fault {
  return {
    code: 'no-torsional-resistance',
    path: diaphragm.path,
    found: `rigid diaphragm ${diaphragm.key} on wall lines that all meet in one point of the plan`,
    expected: 'wall lines that resist a rotation about any point',
  };
}
