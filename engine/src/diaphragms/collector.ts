/** Axial force along a line of resistance at a level, from its equilibrium: N' = −(what pushes the line forward per length). */
import type { Interval } from '../geometry/profile.js';
import { totalLength } from '../geometry/profile.js';

/** A force along the line between two places, positive along t [force]. */
export type Flow = { readonly from: number; readonly to: number; readonly force: number };

export type AxialPoint = { readonly t: number; readonly axial: number };

export type Axial = {
  /** Linear between points; tension positive [force] */
  readonly points: readonly AxialPoint[];
  /** What is left at the far end: zero in equilibrium [force] */
  readonly closing: number;
  /** Sum of the sizes of all flows [force] */
  readonly scale: number;
};

/**
 * @param flows what the floor on both sides, the piers above (+) and the piers below (−) put into the line
 * @param tolerance places closer than this are one [length]
 * Source: equilibrium of a bar under forces along it.
 */
export function axialAlong(flows: readonly Flow[], tolerance: number): Axial {
  const events: { t: number; slope: number; jump: number }[] = [];
  let scale = 0;
  for (const { from, to, force } of flows) {
    if (force === 0) continue;
    scale += Math.abs(force);
    const a = Math.min(from, to);
    const b = Math.max(from, to);
    if (b - a <= tolerance) events.push({ t: a, slope: 0, jump: force });
    else {
      const flow = force / (b - a);
      events.push({ t: a, slope: flow, jump: 0 }, { t: b, slope: -flow, jump: 0 });
    }
  }
  events.sort((a, b) => a.t - b.t);
  const points: AxialPoint[] = [];
  let axial = 0;
  let flow = 0;
  let at = events[0]?.t ?? 0;
  for (let i = 0; i < events.length;) {
    const start = (events[i] as { t: number }).t;
    axial -= flow * (start - at);
    at = start;
    points.push({ t: at, axial });
    let jumped = false;
    while (i < events.length && (events[i] as { t: number }).t - start <= tolerance) {
      const event = events[i] as { t: number; slope: number; jump: number };
      flow += event.slope;
      if (event.jump !== 0) {
        axial -= event.jump;
        jumped = true;
      }
      i += 1;
    }
    if (jumped) points.push({ t: at, axial });
  }
  const closing = axial;
  const last = points[points.length - 1];
  if (last !== undefined && Math.abs(closing) <= 1e-9 * scale) points[points.length - 1] = { t: last.t, axial: 0 };
  return { points, closing, scale };
}

/**
 * The sum of axial forces along one line, each with its factor, at every place where one of them bends or jumps.
 *
 * @param parts an absent one is zero throughout
 */
export function axialSum(
  parts: readonly { readonly axial: Axial | undefined; readonly factor: number }[],
  tolerance: number,
): AxialPoint[] {
  const there = parts.flatMap(({ axial, factor }) => (axial === undefined ? [] : [{ points: axial.points, factor }]));
  const places = there.flatMap(({ points }) => points.map(({ t }) => t)).sort((a, b) => a - b);
  const out: AxialPoint[] = [];
  let last = -Infinity;
  for (const t of places) {
    if (t - last <= tolerance) continue;
    last = t;
    let before = 0;
    let after = 0;
    for (const { points, factor } of there) {
      const limits = limitsAt(points, t, tolerance);
      before += factor * limits.before;
      after += factor * limits.after;
    }
    out.push({ t, axial: before });
    if (after !== before) out.push({ t, axial: after });
  }
  return out;
}

function limitsAt(points: readonly AxialPoint[], t: number, tolerance: number): { before: number; after: number } {
  const next = points.findIndex((point) => point.t >= t - tolerance);
  const here = points[next];
  if (here === undefined) return { before: 0, after: 0 };
  if (here.t > t + tolerance) {
    const previous = points[next - 1];
    if (previous === undefined) return { before: 0, after: 0 };
    const axial = previous.axial + ((here.axial - previous.axial) * (t - previous.t)) / (here.t - previous.t);
    return { before: axial, after: axial };
  }
  let last = next;
  while ((points[last + 1]?.t ?? Infinity) <= t + tolerance) last += 1;
  return { before: here.axial, after: (points[last] as AxialPoint).axial };
}

/** A force that goes evenly into the floor's cut. */
export function flowsOver(intervals: readonly Interval[], force: number): Flow[] {
  const length = totalLength(intervals);
  if (force === 0 || length === 0) return [];
  return intervals.map(([from, to]) => ({ from, to, force: (force * (to - from)) / length }));
}
