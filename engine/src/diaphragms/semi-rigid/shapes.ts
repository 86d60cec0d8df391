/** Shape functions of the mesh: where they are integrated, and at any place on the floor. */
import type { Mesh } from './mesh.js';

export type IntegrationPoint = {
  readonly x: number;
  readonly y: number;
  /** Part of the floor's area [length²] */
  readonly weight: number;
  readonly nodes: Int32Array;
  readonly shapes: readonly number[];
};

const GAUSS = Math.sqrt(0.6);
const STATIONS = [(1 - GAUSS) / 2, 0.5, (1 + GAUSS) / 2];
const WEIGHTS = [5 / 18, 8 / 18, 5 / 18];

/** Six points of a triangle, exact for polynomials up to the fourth degree: G. R. Cowper, Int. J. Numer. Meth. Engng 7 (1973). */
const TRIANGLE = (
  [
    [0.445948490915965, 0.22338158967801147],
    [0.09157621350977073, 0.1099517436553218],
  ] as const
).flatMap(([a, weight]) =>
  [0, 1, 2].map((corner) => ({ l: [0, 1, 2].map((i) => (i === corner ? 1 - 2 * a : a)), weight })),
);

export function integrationPoints(mesh: Mesh): IntegrationPoint[] {
  const { x, y } = mesh;
  const out: IntegrationPoint[] = [];
  const values = STATIONS.map(quadratic);
  const products = values.flatMap((vy) => values.map((vx) => vy.flatMap((wy) => vx.map((wx) => wx * wy))));
  const inTriangle = TRIANGLE.map(({ l: [l0 = 0, l1 = 0, l2 = 0] }) => triangleShapes(l0, l1, l2));
  for (const nodes of mesh.rectangles) {
    const [first, last] = [nodes[0] as number, nodes[8] as number];
    const a = (x[last] as number) - (x[first] as number);
    const b = (y[last] as number) - (y[first] as number);
    for (let j = 0; j < 3; j++) {
      for (let i = 0; i < 3; i++) {
        out.push({
          x: (x[first] as number) + a * (STATIONS[i] as number),
          y: (y[first] as number) + b * (STATIONS[j] as number),
          weight: a * b * (WEIGHTS[i] as number) * (WEIGHTS[j] as number),
          nodes,
          shapes: products[3 * j + i] as number[],
        });
      }
    }
  }
  for (const nodes of mesh.triangles) {
    const c = cornersOf(mesh, nodes);
    const area = ((c.x1 - c.x0) * (c.y2 - c.y0) - (c.x2 - c.x0) * (c.y1 - c.y0)) / 2;
    for (const [p, { l, weight }] of TRIANGLE.entries()) {
      const [l0 = 0, l1 = 0, l2 = 0] = l;
      out.push({
        x: l0 * c.x0 + l1 * c.x1 + l2 * c.x2,
        y: l0 * c.y0 + l1 * c.y1 + l2 * c.y2,
        weight: area * weight,
        nodes,
        shapes: inTriangle[p] as number[],
      });
    }
  }
  return out;
}

function quadratic(p: number): number[] {
  return [(2 * p - 1) * (p - 1), 4 * p * (1 - p), p * (2 * p - 1)];
}

function triangleShapes(l0: number, l1: number, l2: number): number[] {
  return [l0 * (2 * l0 - 1), l1 * (2 * l1 - 1), l2 * (2 * l2 - 1), 4 * l0 * l1, 4 * l1 * l2, 4 * l2 * l0];
}

function cornersOf({ x, y }: Mesh, nodes: Int32Array) {
  const [i, j, k] = [nodes[0] as number, nodes[1] as number, nodes[2] as number];
  return {
    x0: x[i] as number,
    y0: y[i] as number,
    x1: x[j] as number,
    y1: y[j] as number,
    x2: x[k] as number,
    y2: y[k] as number,
  };
}

/** A place in an element: (ξ, η) of a rectangle, or area coordinates l1, l2 of a triangle. */
export type Located = { readonly nodes: Int32Array; readonly p: number; readonly q: number };

/** The element at a place; beside the floor the nearest place in one. */
export function locate(mesh: Mesh, x: number, y: number): Located {
  let best: Located | undefined;
  let nearest = Infinity;
  const take = (off: number, located: Located): void => {
    if (off >= nearest) return;
    nearest = off;
    best = located;
  };
  for (const nodes of mesh.rectangles) {
    if (nearest === 0) break;
    const [first, last] = [nodes[0] as number, nodes[8] as number];
    const [x0, x1] = [mesh.x[first] as number, mesh.x[last] as number];
    const [y0, y1] = [mesh.y[first] as number, mesh.y[last] as number];
    const px = Math.min(x1, Math.max(x0, x));
    const py = Math.min(y1, Math.max(y0, y));
    take(Math.hypot(x - px, y - py), { nodes, p: (px - x0) / (x1 - x0), q: (py - y0) / (y1 - y0) });
  }
  for (const nodes of mesh.triangles) {
    if (nearest === 0) break;
    const { off, p, q } = intoTriangle(cornersOf(mesh, nodes), x, y);
    take(off, { nodes, p, q });
  }
  if (best === undefined) throw new RangeError('a mesh without elements');
  return best;
}

type Triangle = ReturnType<typeof cornersOf>;

function intoTriangle(c: Triangle, x: number, y: number): { off: number; p: number; q: number } {
  const double = (c.x1 - c.x0) * (c.y2 - c.y0) - (c.x2 - c.x0) * (c.y1 - c.y0);
  const p = ((x - c.x0) * (c.y2 - c.y0) - (c.x2 - c.x0) * (y - c.y0)) / double;
  const q = ((c.x1 - c.x0) * (y - c.y0) - (x - c.x0) * (c.y1 - c.y0)) / double;
  if (p >= 0 && q >= 0 && p + q <= 1) return { off: 0, p, q };
  let best = { off: Infinity, p: 0, q: 0 };
  const sides = [
    [c.x0, c.y0, c.x1, c.y1],
    [c.x1, c.y1, c.x2, c.y2],
    [c.x2, c.y2, c.x0, c.y0],
  ] as const;
  sides.forEach(([ax, ay, bx, by], side) => {
    const dx = bx - ax;
    const dy = by - ay;
    const part = Math.min(1, Math.max(0, ((x - ax) * dx + (y - ay) * dy) / (dx * dx + dy * dy)));
    const off = Math.hypot(x - ax - part * dx, y - ay - part * dy);
    if (off >= best.off) return;
    const on = [
      { p: part, q: 0 },
      { p: 1 - part, q: part },
      { p: 0, q: 1 - part },
    ] as const;
    best = { off, ...(on[side] as { p: number; q: number }) };
  });
  return best;
}

export function shapesAt({ nodes, p, q }: Located): number[] {
  if (nodes.length === 6) return triangleShapes(1 - p - q, p, q);
  const vx = quadratic(p);
  return quadratic(q).flatMap((wy) => vx.map((wx) => wx * wy));
}
