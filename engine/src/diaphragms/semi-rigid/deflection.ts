/** How far a semi-rigid diaphragm moves along the load, and how far it bows out between its wall lines. */
import type { Point } from '../../building/definition.js';
import { cross, dot } from '../../geometry/frame.js';
import type { Profile } from '../../geometry/profile.js';
import type { Vector3 } from '../../statics/small-matrix.js';
import type { Support } from '../flexible.js';
import { fromLocal, turned } from './axes.js';
import type { MembraneModel } from './membrane-model.js';

/** A place about which a rigid floor turns does not move: no ratio is taken there. */
const NEGLIGIBLE = 1e-3;

export type SpanDeflection = {
  /** Names of the supports at both ends. */
  readonly from: string;
  readonly to: string;
  /** Largest distance from the straight line between the wall lines' displacements [length] */
  readonly deflection: number;
  /** Mean of the displacements of the two wall lines [length] */
  readonly drift: number;
  readonly at: Point;
};

export type Motion = {
  /** Mean displacements along t of the two outermost edges across the load [length] */
  readonly near: number;
  readonly far: number;
  /** Largest displacement along t, and where [length] */
  readonly largest: number;
  readonly at: Point;
  readonly spans: readonly SpanDeflection[];
  /** Largest part by which a displacement along the load exceeds that of the same floor if it were rigid. */
  readonly overRigid: number;
};

/**
 * @param displacement of every node in the diaphragm's axes [length]
 * @param frame        index of the frame along the load
 * @param supports     wall lines along the load, ascending in s, with the displacement of each along t [length]
 * @param asRigid      motion of the same floor if it were rigid, about the rigid model's origin [length], [rad]
 * Source: ASCE 7-16 12.3.1.3 and Fig. 12.3-1: largest deflection of the diaphragm against the average drift of the walls beside it.
 * EN 1998-1 4.3.1(4): displacements against those of a rigid diaphragm.
 */
export function motionOf(
  model: MembraneModel,
  displacement: Float64Array,
  frame: number,
  supports: readonly (Support & { readonly moves: number })[],
  asRigid: Vector3,
): Motion {
  const { mesh, axes } = model;
  const profile = model.diaphragm.profiles[frame] as Profile;
  const { s, t } = profile.frame;
  const [tx, ty] = turned(axes, t);
  const n = mesh.x.length;
  const tolerance = Math.max(4 * profile.tolerance, 1e-8 * (profile.to - profile.from));
  const place = new Float64Array(n);
  const moved = new Float64Array(n);
  const near = { sum: 0, count: 0 };
  const far = { sum: 0, count: 0 };
  let most = 0;
  for (let i = 0; i < n; i++) {
    place[i] = dot(fromLocal(axes, [mesh.x[i] as number, mesh.y[i] as number]), s);
    moved[i] = (displacement[2 * i] as number) * tx + (displacement[2 * i + 1] as number) * ty;
    if (Math.abs(moved[i] as number) > Math.abs(moved[most] as number)) most = i;
    for (const [edge, at] of [
      [near, profile.from],
      [far, profile.to],
    ] as const) {
      if (Math.abs((place[i] as number) - at) > tolerance) continue;
      edge.sum += moved[i] as number;
      edge.count += 1;
    }
  }
  const at = (i: number): Point => fromLocal(axes, [mesh.x[i] as number, mesh.y[i] as number]);
  const spans: SpanDeflection[] = [];
  for (let i = 0; i + 1 < supports.length; i++) {
    const a = supports[i] as (typeof supports)[number];
    const b = supports[i + 1] as (typeof supports)[number];
    let deflection = 0;
    let where = 0;
    for (let node = 0; node < n; node++) {
      const part = ((place[node] as number) - a.s) / (b.s - a.s);
      if (part < 0 || part > 1) continue;
      const bow = Math.abs((moved[node] as number) - (a.moves + (b.moves - a.moves) * part));
      if (bow <= deflection) continue;
      deflection = bow;
      where = node;
    }
    spans.push({ from: a.name, to: b.name, deflection, drift: Math.abs(a.moves + b.moves) / 2, at: at(where) });
  }
  // u·t of a rigid motion is linear in s.
  const turn = cross(s, t) * asRigid[2];
  const start = asRigid[0] * t[0] + asRigid[1] * t[1] - turn * dot(model.rigid.origin, s);
  const rigidMost = place.reduce((size, at) => Math.max(size, Math.abs(start + turn * at)), 0);
  const overRigid = place.reduce((excess, at, i) => {
    const rigid = Math.abs(start + turn * at);
    return rigid > NEGLIGIBLE * rigidMost ? Math.max(excess, Math.abs(moved[i] as number) / rigid - 1) : excess;
  }, 0);
  const mean = ({ sum, count }: { sum: number; count: number }): number => (count === 0 ? 0 : sum / count);
  return { near: mean(near), far: mean(far), largest: Math.abs(moved[most] ?? 0), at: at(most), spans, overRigid };
}
