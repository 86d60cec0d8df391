/** How far a semi-rigid diaphragm moves along the load, and how far it bows out between its wall lines. */
import type { Point } from '../../building/definition.js';
import { dot } from '../../geometry/frame.js';
import type { Profile } from '../../geometry/profile.js';
import type { Support } from '../flexible.js';
import { fromLocal, turned } from './axes.js';
import type { MembraneModel } from './membrane-model.js';

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
};

/**
 * @param displacement of every node in the diaphragm's axes [length]
 * @param frame        index of the frame along the load
 * @param supports     wall lines along the load, ascending in s, with the displacement of each along t [length]
 * Source: ASCE 7-16 12.3.1.3 and Fig. 12.3-1: largest deflection of the diaphragm against the average drift of the walls beside it.
 */
export function motionOf(
  model: MembraneModel,
  displacement: Float64Array,
  frame: number,
  supports: readonly (Support & { readonly moves: number })[],
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
  const mean = ({ sum, count }: { sum: number; count: number }): number => (count === 0 ? 0 : sum / count);
  return { near: mean(near), far: mean(far), largest: Math.abs(moved[most] ?? 0), at: at(most), spans };
}
