/** Weight, area and centres of a diaphragm, exact from its strips. */
import type { Diaphragm, Point } from '../building/definition.js';
import { dot } from './frame.js';
import { toPlan, type Profile } from './profile.js';

export type Mass = {
  /** Seismic weight with zones and lines [force] */
  readonly weight: number;
  /** Net floor area [length²] */
  readonly area: number;
  /** Centre of weight; of area where nothing is weighed [length] */
  readonly centre: Point;
};

/**
 * @param diaphragm gives the weight lines
 * @param profile   its profile, in any frame
 */
export function massOf(diaphragm: Diaphragm, profile: Profile): Mass {
  let area = 0;
  let weight = 0;
  const moments = { areaS: 0, areaT: 0, weightS: 0, weightT: 0 };
  for (const slab of profile.slabs) {
    const length = slab.to - slab.from;
    for (const strip of slab.strips) {
      const d0 = strip.upper0 - strip.lower0;
      const d1 = strip.upper1 - strip.lower1;
      const a = ((d0 + d1) / 2) * length;
      // ∫ d ds and ∫ d·s ds for linear d; ∫ (u² − l²)/2 ds for linear edges
      const s = slab.from * a + (length * length * (d0 + 2 * d1)) / 6;
      const square = (x0: number, x1: number): number => (x0 * x0 + x0 * x1 + x1 * x1) / 3;
      const t = ((square(strip.upper0, strip.upper1) - square(strip.lower0, strip.lower1)) / 2) * length;
      area += a;
      weight += a * strip.area;
      moments.areaS += s;
      moments.areaT += t;
      moments.weightS += s * strip.area;
      moments.weightT += t * strip.area;
    }
  }
  for (const line of diaphragm.weight?.lines ?? []) {
    for (let i = 0; i + 1 < line.along.length; i++) {
      const a = line.along[i] as Point;
      const b = line.along[i + 1] as Point;
      const w = line.perLength * Math.hypot(b[0] - a[0], b[1] - a[1]);
      const middle: Point = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
      weight += w;
      moments.weightS += w * dot(middle, profile.frame.s);
      moments.weightT += w * dot(middle, profile.frame.t);
    }
  }
  const centre =
    weight > 0
      ? toPlan(profile.frame, moments.weightS / weight, moments.weightT / weight)
      : toPlan(profile.frame, moments.areaS / area, moments.areaT / area);
  return { weight, area, centre };
}
