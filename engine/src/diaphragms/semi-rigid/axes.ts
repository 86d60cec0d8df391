/** A diaphragm's own axes: along the direction in which most of its outline runs, so that a turned plan is the same plan. */
import type { Point, Ring } from '../../building/definition.js';
import { cross, dot } from '../../geometry/frame.js';

export type Axes = { readonly origin: Point; readonly x: Point; readonly y: Point };

/** Directions closer than this, or square to each other within it, are one [rad]. */
const SAME = 1e-6;

/** Where several directions carry the same length of outline, the one that the ring names first. */
export function axesOf(outline: Ring): Axes {
  const turn = Math.sign(
    outline.reduce((sum, point, i) => sum + cross(point, outline[(i + 1) % outline.length] as Point), 0),
  );
  const groups: { along: Point; length: number }[] = [];
  outline.forEach((a, i) => {
    const b = outline[(i + 1) % outline.length] as Point;
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
    if (length === 0) return;
    const along: Point = [(turn * (b[0] - a[0])) / length, (turn * (b[1] - a[1])) / length];
    const group = groups.find(
      (other) => Math.min(Math.abs(dot(other.along, along)), Math.abs(cross(other.along, along))) < SAME,
    );
    if (group === undefined) groups.push({ along, length });
    else group.length += length;
  });
  const longest = Math.max(...groups.map((group) => group.length));
  const chosen = groups.find((group) => group.length > longest * (1 - 1e-9));
  const [cx, sx] = chosen?.along ?? [1, 0];
  const origin = outline[0] ?? [0, 0];
  return { origin: [origin[0], origin[1]], x: [cx, sx], y: [0 - sx, cx] };
}

export function toLocal(axes: Axes, point: Point): Point {
  const d: Point = [point[0] - axes.origin[0], point[1] - axes.origin[1]];
  return [dot(d, axes.x), dot(d, axes.y)];
}

export function fromLocal({ origin, x, y }: Axes, [u, v]: Point): Point {
  return [origin[0] + u * x[0] + v * y[0], origin[1] + u * x[1] + v * y[1]];
}

/** A direction on plan in the diaphragm's axes. */
export function turned({ x, y }: Axes, direction: Point): Point {
  return [dot(direction, x), dot(direction, y)];
}
