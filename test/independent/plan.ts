/** Plan geometry by crossing lines with every edge: nothing is sorted into strips beforehand, nothing is kept. */
import type { Building, Point, Ring } from '@groundward/engine/building/definition';

type Level = Building['levels'][number];
export type Floor = NonNullable<Level['diaphragms']>[number];

export function dot(a: Point, b: Point): number {
  return a[0] * b[0] + a[1] * b[1];
}

export function cross(a: Point, b: Point): number {
  return a[0] * b[1] - a[1] * b[0];
}

export function minus(a: Point, b: Point): Point {
  return [a[0] - b[0], a[1] - b[1]];
}

export function edgesOf(ring: Ring): [Point, Point][] {
  return ring.map((point, i) => [point, ring[(i + 1) % ring.length] as Point]);
}

/** Whether a place lies in a ring: an odd number of edges to the right of it. */
export function inside(ring: Ring, [x, y]: Point): boolean {
  let odd = false;
  for (const [[ax, ay], [bx, by]] of edgesOf(ring)) {
    if (ay > y !== by > y && x < ax + ((y - ay) * (bx - ax)) / (by - ay)) odd = !odd;
  }
  return odd;
}

export function onFloor(floor: Floor, place: Point): boolean {
  return inside(floor.outline, place) && !(floor.openings ?? []).some((opening) => inside(opening.outline, place));
}

/** Sorted numbers without repetitions. */
export function distinct(values: readonly number[], apart = 1e-9): number[] {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted.filter((value, i) => i === 0 || value - (sorted[i - 1] as number) > apart);
}

/** Length of the part of a line from a to b that lies on the floor, the line moved sideways by a little. */
export function lengthOnFloor(floor: Floor, a: Point, b: Point, sideways: number): number {
  const along = minus(b, a);
  const length = Math.hypot(...along);
  const unit: Point = [along[0] / length, along[1] / length];
  const from: Point = [a[0] - unit[1] * sideways, a[1] + unit[0] * sideways];
  const cuts = [0, length];
  for (const ring of ringsOf(floor)) {
    for (const [p, q] of edgesOf(ring)) {
      const [hp, hq] = [cross(unit, minus(p, from)), cross(unit, minus(q, from))];
      if (hp > 0 === hq > 0) continue;
      const place: Point = [p[0] + ((q[0] - p[0]) * hp) / (hp - hq), p[1] + ((q[1] - p[1]) * hp) / (hp - hq)];
      const at = dot(unit, minus(place, from));
      if (at > 0 && at < length) cuts.push(at);
    }
  }
  const stations = distinct(cuts);
  return stations.slice(1).reduce((sum, to, i) => {
    const start = stations[i] as number;
    const middle = (start + to) / 2;
    return sum + (onFloor(floor, [from[0] + unit[0] * middle, from[1] + unit[1] * middle]) ? to - start : 0);
  }, 0);
}

export function ringsOf(floor: Floor): Ring[] {
  return [floor.outline, ...(floor.openings ?? []).map((opening) => opening.outline)];
}

export function extentOf(building: Building): number {
  const points = building.levels.flatMap((level) => (level.diaphragms ?? []).flatMap((floor) => floor.outline));
  const span = (axis: 0 | 1): number =>
    Math.max(...points.map((p) => p[axis])) - Math.min(...points.map((p) => p[axis]));
  return Math.max(span(0), span(1), 1);
}
