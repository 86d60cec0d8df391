/** The finite element mesh of a diaphragm: rectangles of nine nodes on the grid, triangles of six where edges run askew. */
import type { Point, Ring } from '../../building/definition.js';
import type { Segment } from './arrangement.js';
import { constrainedTriangulation, type Triangulation } from './constrain.js';
import { cornersOf, inRing, type Corners } from './points.js';

export type Mesh = {
  /** Nodes in the diaphragm's axes [length] */
  readonly x: Float64Array;
  readonly y: Float64Array;
  /** Nine nodes each: node (i, j) of the rectangle at i + 3·j, i along x, j along y. */
  readonly rectangles: readonly Int32Array[];
  /** Six nodes each: corners anticlockwise, then the middles of sides 0–1, 1–2, 2–0. */
  readonly triangles: readonly Int32Array[];
  /** Start, middle and end node of every stretch of a wall line, by the index of the line. */
  readonly lines: readonly (readonly Int32Array[])[];
  /** The same along outline and openings. */
  readonly border: readonly Int32Array[];
};

export type Plan = {
  readonly outline: Ring;
  readonly openings: readonly Ring[];
  readonly zones: readonly Ring[];
  /** Stretches of each wall line. */
  readonly lines: readonly (readonly Segment[])[];
};

/** Triangles flatter than this have no area. */
const FLAT = 1e-7;

/** Floor that the mesh covers [length²] */
export function areaOf({ x, y, rectangles, triangles }: Mesh): number {
  let double = 0;
  const add = (a: number, b: number, c: number): void => {
    const [ax, ay] = [x[a] as number, y[a] as number];
    double += ((x[b] as number) - ax) * ((y[c] as number) - ay) - ((x[c] as number) - ax) * ((y[b] as number) - ay);
  };
  for (const nodes of rectangles) {
    add(nodes[0] as number, nodes[2] as number, nodes[8] as number);
    add(nodes[0] as number, nodes[8] as number, nodes[6] as number);
  }
  for (const nodes of triangles) add(nodes[0] as number, nodes[1] as number, nodes[2] as number);
  return double / 2;
}

/**
 * @param plan in the diaphragm's axes
 * @param size largest side of a rectangle [length]
 * @returns undefined where the edges cannot be kept
 */
export function meshOf(plan: Plan, extent: number, size: number): Mesh | undefined {
  const rings = [plan.outline, ...plan.openings];
  const floor = (x: number, y: number): boolean =>
    inRing(plan.outline, x, y) && plan.openings.every((ring) => !inRing(ring, x, y));
  const border = rings.flatMap(sidesOf);
  const walls = plan.lines.flat();
  const corners = cornersOf([...border, ...walls, ...plan.zones.flatMap(sidesOf)], extent, size, floor);
  const edges = new Map<number, [number, number]>();
  for (const chain of corners.chains) {
    for (let i = 0; i + 1 < chain.length; i++) {
      const [a, b] = [chain[i] as number, chain[i + 1] as number];
      edges.set(sideKey(a, b, corners.x.length), [a, b]);
    }
  }
  const triangulation = constrainedTriangulation(corners.x, corners.y, [...edges.values()]);
  if (triangulation === undefined) return undefined;
  return numbered(corners, triangulation, new Set(edges.keys()), floor, border.length, plan.lines);
}

function sidesOf(ring: Ring): Segment[] {
  return ring.map((a, i) => ({ a, b: ring[(i + 1) % ring.length] as Point }));
}

function sideKey(a: number, b: number, n: number): number {
  return a < b ? a * n + b : b * n + a;
}

/** Triangles on the floor, pairs that make up a rectangle joined, middle nodes added. */
function numbered(
  { x, y, chains }: Corners,
  { triangles, halfedges }: Triangulation,
  kept: ReadonlySet<number>,
  floor: (x: number, y: number) => boolean,
  borderSegments: number,
  lines: readonly (readonly Segment[])[],
): Mesh {
  const n = x.length;
  const corner = (e: number): number => triangles[e] as number;
  const count = triangles.length / 3;
  const onFloor = new Uint8Array(count);
  for (let t = 0; t < count; t++) {
    const [a, b, c] = [corner(3 * t), corner(3 * t + 1), corner(3 * t + 2)];
    const [ax, ay] = [x[a] as number, y[a] as number];
    const [bx, by, ex, ey] = [x[b] as number, y[b] as number, x[c] as number, y[c] as number];
    const double = Math.abs((bx - ax) * (ey - ay) - (ex - ax) * (by - ay));
    const longest = Math.max((bx - ax) ** 2 + (by - ay) ** 2, (ex - ax) ** 2 + (ey - ay) ** 2);
    // Between points that rounding moved off an outer edge lie triangles without area.
    if (double <= FLAT * longest) continue;
    const cx = (ax + bx + ex) / 3;
    const cy = (ay + by + ey) / 3;
    if (floor(cx, cy)) onFloor[t] = 1;
  }

  const nodeX: number[] = [];
  const nodeY: number[] = [];
  const cornerNode = new Int32Array(n).fill(-1);
  const nodeOf = (point: number): number => {
    if ((cornerNode[point] as number) < 0) {
      cornerNode[point] = nodeX.length;
      nodeX.push(x[point] as number);
      nodeY.push(y[point] as number);
    }
    return cornerNode[point] as number;
  };
  const middles = new Map<number, number>();
  const middleOf = (a: number, b: number): number => {
    const key = sideKey(a, b, n);
    let node = middles.get(key);
    if (node === undefined) {
      node = nodeX.length;
      middles.set(key, node);
      nodeX.push(((x[a] as number) + (x[b] as number)) / 2);
      nodeY.push(((y[a] as number) + (y[b] as number)) / 2);
    }
    return node;
  };

  const rectangles: Int32Array[] = [];
  const sixNoded: Int32Array[] = [];
  const joined = new Uint8Array(count);
  for (let t = 0; t < count; t++) {
    if (onFloor[t] === 0 || joined[t] === 1) continue;
    const rectangle = partner(t);
    if (rectangle !== undefined) {
      const [a, b, c, d] = rectangle;
      rectangles.push(
        Int32Array.of(
          nodeOf(a),
          middleOf(a, b),
          nodeOf(b),
          middleOf(a, d),
          middleOf(a, c),
          middleOf(b, c),
          nodeOf(d),
          middleOf(d, c),
          nodeOf(c),
        ),
      );
    } else {
      // The triangulation turns clockwise in these axes.
      const [a, c, b] = [corner(3 * t), corner(3 * t + 1), corner(3 * t + 2)];
      const turn =
        ((x[b] as number) - (x[a] as number)) * ((y[c] as number) - (y[a] as number)) -
        ((y[b] as number) - (y[a] as number)) * ((x[c] as number) - (x[a] as number));
      const [p, q] = turn > 0 ? [b, c] : [c, b];
      sixNoded.push(Int32Array.of(nodeOf(a), nodeOf(p), nodeOf(q), middleOf(a, p), middleOf(p, q), middleOf(q, a)));
    }
  }

  /** Corners of the rectangle that a triangle makes up with its neighbour, anticlockwise from the lowest left; marks the neighbour. */
  function partner(t: number): [number, number, number, number] | undefined {
    for (let k = 0; k < 3; k++) {
      const e = 3 * t + k;
      const opposite = halfedges[e] as number;
      if (opposite < 0) continue;
      const other = Math.floor(opposite / 3);
      if (onFloor[other] === 0 || joined[other] === 1) continue;
      const from = corner(e);
      const to = corner(3 * t + ((k + 1) % 3));
      if (kept.has(sideKey(from, to, n)) || x[from] === x[to] || y[from] === y[to]) continue;
      const apex = corner(3 * t + ((k + 2) % 3));
      const far = corner(3 * other + ((opposite + 2) % 3));
      const own = x[apex] === x[from] && y[apex] === y[to] && x[far] === x[to] && y[far] === y[from];
      const mirrored = x[apex] === x[to] && y[apex] === y[from] && x[far] === x[from] && y[far] === y[to];
      if (!own && !mirrored) continue;
      joined[other] = 1;
      const four = [from, to, apex, far];
      const left = Math.min(x[from] as number, x[to] as number);
      const low = Math.min(y[from] as number, y[to] as number);
      const find = (isLeft: boolean, isLow: boolean): number =>
        four.find((p) => (x[p] === left) === isLeft && (y[p] === low) === isLow) as number;
      return [find(true, true), find(false, true), find(false, false), find(true, false)];
    }
    return undefined;
  }

  const triples = (chain: readonly number[]): Int32Array[] => {
    const out: Int32Array[] = [];
    for (let i = 0; i + 1 < chain.length; i++) {
      const a = chain[i] as number;
      const b = chain[i + 1] as number;
      const middle = middles.get(sideKey(a, b, n));
      if (middle !== undefined) out.push(Int32Array.of(nodeOf(a), middle, nodeOf(b)));
    }
    return out;
  };
  let next = borderSegments;
  return {
    border: chains.slice(0, borderSegments).flatMap(triples),
    lines: lines.map((stretches) => stretches.flatMap(() => triples(chains[next++] as number[]))),
    rectangles,
    triangles: sixNoded,
    x: Float64Array.from(nodeX),
    y: Float64Array.from(nodeY),
  };
}
