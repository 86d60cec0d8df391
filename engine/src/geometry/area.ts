/** Weight, area and centres of a diaphragm, exact from its strips. */
import type { Diaphragm, Point } from '../building/definition.js';
import { dot } from './frame.js';
import { toPlan, type Profile } from './profile.js';

export type Mass = {
  /** Seismic weight with zones and lines, without live load [force] */
  readonly weight: number;
  /** Net floor area [length²] */
  readonly area: number;
  /** Centre of weight; of area where nothing is weighed [length] */
  readonly centre: Point;
  /** Live load, and its centre [force], [length] */
  readonly live: number;
  readonly liveCentre: Point;
};

/** A part of a diaphragm's mass: a strip of floor, or a façade or partition. */
export type MassPart = {
  readonly weight: number;
  readonly live: number;
  readonly area: number;
  /** Centre in the profile's frame [length] */
  readonly s: number;
  readonly t: number;
};

/**
 * @param diaphragm gives the weight lines
 * @param profile   its profile, in any frame
 */
export function massOf(diaphragm: Diaphragm, profile: Profile): Mass {
  let area = 0;
  let weight = 0;
  let live = 0;
  const moments = { areaS: 0, areaT: 0, weightS: 0, weightT: 0, liveS: 0, liveT: 0 };
  for (const part of massParts(diaphragm, profile)) {
    area += part.area;
    weight += part.weight;
    live += part.live;
    moments.areaS += part.area * part.s;
    moments.areaT += part.area * part.t;
    moments.weightS += part.weight * part.s;
    moments.weightT += part.weight * part.t;
    moments.liveS += part.live * part.s;
    moments.liveT += part.live * part.t;
  }
  const centre =
    weight > 0
      ? toPlan(profile.frame, moments.weightS / weight, moments.weightT / weight)
      : toPlan(profile.frame, moments.areaS / area, moments.areaT / area);
  const liveCentre = live > 0 ? toPlan(profile.frame, moments.liveS / live, moments.liveT / live) : centre;
  return { weight, area, centre, live, liveCentre };
}

/** Weight and its centre with a part of the live load; the centre of area where nothing is weighed. */
export function massWith(mass: Mass, liveShare: number): { readonly weight: number; readonly centre: Point } {
  const live = liveShare * mass.live;
  if (live === 0) return mass;
  const weight = mass.weight + live;
  const at = (axis: 0 | 1): number => (mass.weight * mass.centre[axis] + live * mass.liveCentre[axis]) / weight;
  return { weight, centre: [at(0), at(1)] };
}

export function massParts(diaphragm: Diaphragm, profile: Profile): MassPart[] {
  const parts: MassPart[] = [];
  for (const slab of profile.slabs) {
    const length = slab.to - slab.from;
    for (const strip of slab.strips) {
      const d0 = strip.upper0 - strip.lower0;
      const d1 = strip.upper1 - strip.lower1;
      const area = ((d0 + d1) / 2) * length;
      if (area === 0) continue;
      // ∫ d·s ds for linear d, and ∫ (u² − l²)/2 ds for linear edges
      const s = slab.from + (length * length * (d0 + 2 * d1)) / (6 * area);
      const square = (x0: number, x1: number): number => (x0 * x0 + x0 * x1 + x1 * x1) / 3;
      const t = (((square(strip.upper0, strip.upper1) - square(strip.lower0, strip.lower1)) / 2) * length) / area;
      parts.push({ weight: area * strip.area, live: area * strip.live, area, s, t });
    }
  }
  for (const line of diaphragm.weight?.lines ?? []) {
    for (let i = 0; i + 1 < line.along.length; i++) {
      const a = line.along[i] as Point;
      const b = line.along[i + 1] as Point;
      const middle: Point = [(a[0] + b[0]) / 2, (a[1] + b[1]) / 2];
      const weight = line.perLength * Math.hypot(b[0] - a[0], b[1] - a[1]);
      parts.push({ weight, live: 0, area: 0, s: dot(middle, profile.frame.s), t: dot(middle, profile.frame.t) });
    }
  }
  return parts;
}
