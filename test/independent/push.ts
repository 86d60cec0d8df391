/** What a level's force puts on a floor, as point loads across the load: each stretch between two breaks by two Gauss points. */
import type { Point, Ring } from '@groundward/engine/building/definition';
import { cross, distinct, dot, edgesOf, inside, minus, onFloor, ringsOf, type Floor } from './plan.js';

export type Spread = 'weight' | 'area' | 'even';

/** A force along the load at a distance across it. */
export type Push = { readonly s: number; readonly force: number };

/** The direction across a load, pointing to +x, or to +y where the load acts along x. */
export function acrossOf([x, y]: Point): Point {
  const s: Point = [y, -x];
  return s[0] > 5e-7 || (s[0] >= -5e-7 && s[1] > 0) ? s : [-s[0], -s[1]];
}

/** Reach of a floor across a load. */
export function reachOf(floor: Floor, s: Point): readonly [number, number] {
  const at = floor.outline.map((point) => dot(point, s));
  return [Math.min(...at), Math.max(...at)];
}

/**
 * The loads of all floors of a level, which together make its force. Shares of simple spans are linear between the supports, widths between
 * the breaks: two Gauss points a stretch are exact.
 *
 * @param kinks places across the load where what is made of the loads may have a kink
 */
export function pushesOf(
  floors: readonly Floor[],
  spread: Spread,
  t: Point,
  force: number,
  kinks: readonly number[],
): Push[][] {
  const weighed = floors.some(
    (floor) => weightOf(floor, t) > 0 || (floor.weight?.lines ?? []).some((line) => line.perLength > 0),
  );
  const how = spread === 'weight' && !weighed ? 'area' : spread;
  const raw = floors.map((floor) => rawPushes(floor, how, t, kinks));
  const whole = raw.flat().reduce((sum, push) => sum + push.force, 0);
  return raw.map((pushes) => pushes.map((push) => ({ s: push.s, force: (push.force * force) / whole })));
}

/** Area weight of a floor, its façades and partitions aside [force] */
function weightOf(floor: Floor, t: Point): number {
  return areaPushes(floor, 'weight', t, []).reduce((sum, push) => sum + push.force, 0);
}

/** Seismic weight of a floor with its façades and partitions [force] */
export function seismicWeight(floor: Floor): number {
  return rawPushes(floor, 'weight', [0, 1], []).reduce((sum, push) => sum + push.force, 0);
}

function rawPushes(floor: Floor, spread: Spread, t: Point, kinks: readonly number[]): Push[] {
  const s = acrossOf(t);
  const [from, to] = reachOf(floor, s);
  if (spread === 'even') return gauss([from, to, ...kinks], from, to, () => 1);
  const pushes = areaPushes(floor, spread, t, kinks);
  if (spread === 'area') return pushes;
  for (const line of floor.weight?.lines ?? []) {
    line.along.slice(1).forEach((b, i) => {
      const a = line.along[i] as Point;
      const weight = line.perLength * Math.hypot(...minus(b, a));
      const ends = [dot(a, s), dot(b, s)].map((at) => Math.min(to, Math.max(from, at)));
      const [near, far] = [Math.min(...ends), Math.max(...ends)];
      if (far - near < 1e-9 * (to - from)) pushes.push({ s: near, force: weight });
      else pushes.push(...gauss([near, far, ...kinks], near, far, () => weight / (far - near)));
    });
  }
  return pushes;
}

function areaPushes(floor: Floor, spread: 'weight' | 'area', t: Point, kinks: readonly number[]): Push[] {
  const s = acrossOf(t);
  const zones = floor.weight?.zones ?? [];
  const rings = [...ringsOf(floor), ...zones.map((zone) => zone.outline)];
  const [from, to] = reachOf(floor, s);
  const corners = [...rings.flat(), ...crossings(rings)].map((point) => dot(point, s));
  return gauss([from, to, ...kinks, ...corners], from, to, (at) => {
    const cuts: number[] = [];
    for (const ring of rings) {
      for (const [p, q] of edgesOf(ring)) {
        const [sp, sq] = [dot(p, s), dot(q, s)];
        if (sp > at === sq > at) continue;
        cuts.push(dot(p, t) + ((dot(q, t) - dot(p, t)) * (at - sp)) / (sq - sp));
      }
    }
    cuts.sort((a, b) => a - b);
    return cuts.slice(1).reduce((sum, end, i) => {
      const start = cuts[i] as number;
      const middle = (start + end) / 2;
      const place: Point = [s[0] * at + t[0] * middle, s[1] * at + t[1] * middle];
      if (!onFloor(floor, place)) return sum;
      const zone = zones.find(({ outline }) => inside(outline, place));
      return sum + (end - start) * (spread === 'area' ? 1 : (zone?.area ?? floor.weight?.area ?? 0));
    }, 0);
  });
}

/** Places where edges of two rings cross. */
function crossings(rings: readonly Ring[]): Point[] {
  const edges = rings.flatMap(edgesOf);
  return edges.flatMap(([a, b], i) =>
    edges.slice(0, i).flatMap(([c, d]): Point[] => {
      const [u, v] = [minus(b, a), minus(d, c)];
      const determinant = cross(u, v);
      if (Math.abs(determinant) < 1e-12) return [];
      const p = cross(minus(c, a), v) / determinant;
      const q = cross(minus(c, a), u) / determinant;
      return p >= 0 && p <= 1 && q >= 0 && q <= 1 ? [[a[0] + p * u[0], a[1] + p * u[1]]] : [];
    }),
  );
}

/** Two Gauss points on every stretch between breaks. */
function gauss(breaks: readonly number[], from: number, to: number, w: (s: number) => number): Push[] {
  const stations = distinct(breaks.filter((at) => at >= from && at <= to));
  return stations.slice(1).flatMap((end, i) => {
    const start = stations[i] as number;
    const [middle, half] = [(start + end) / 2, (end - start) / 2];
    return [-1, 1].map((side) => {
      const s = middle + (side * half) / Math.sqrt(3);
      return { s, force: w(s) * half };
    });
  });
}
