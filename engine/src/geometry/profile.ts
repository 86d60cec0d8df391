/**
 * Depth profile of a diaphragm: the outline with openings and weight zones cut by lines across the plan.
 * Between two neighbouring breaks every cut is a fixed row of strips whose edges are linear in `s`: nothing is sampled.
 */
import type { Diaphragm, Point, Ring } from '../building/definition.js';
import { dot, type Frame } from './frame.js';

/** A strip of floor between two edges, linear over its slab. */
export type Strip = {
  /** t of the lower edge at the slab's start and end [length] */
  readonly lower0: number;
  readonly lower1: number;
  readonly upper0: number;
  readonly upper1: number;
  /** Area weight [force/length²] */
  readonly area: number;
  /** Live load [force/length²] */
  readonly live: number;
};

export type Slab = {
  readonly from: number;
  readonly to: number;
  /** Floor, ascending in t; an opening is the gap between two strips. */
  readonly strips: readonly Strip[];
  /** Net depth d at start and end [length] */
  readonly depth0: number;
  readonly depth1: number;
  /** Chord depth D at start and end: between the outermost edges, of several wings the sum [length] */
  readonly chord0: number;
  readonly chord1: number;
  /** Parts of the outline that the cut consists of, openings left out of account; more than one where wings stand side by side. */
  readonly wings: readonly Wing[];
};

/** A part of the outline between two of its edges, linear over its slab: t at start and end [length] */
export type Wing = {
  readonly lower0: number;
  readonly lower1: number;
  readonly upper0: number;
  readonly upper1: number;
};

export type Profile = {
  readonly frame: Frame;
  readonly from: number;
  readonly to: number;
  readonly slabs: readonly Slab[];
  /** Coordinates closer than this are one [length] */
  readonly tolerance: number;
};

type AreaWeight = { readonly area: number; readonly live: number };
type Edge = { s0: number; t0: number; s1: number; t1: number; ring: number };
const OUTLINE = 0;

/**
 * @param diaphragm outline, openings and zones on plan [length]
 * @param frame     `t` along the cuts, `s` across them
 */
export function profileOf(diaphragm: Diaphragm, frame: Frame): Profile {
  const rings: Ring[] = [diaphragm.outline];
  for (const opening of diaphragm.openings ?? []) rings.push(opening.outline);
  const firstZone = rings.length;
  const zones = diaphragm.weight?.zones ?? [];
  for (const zone of zones) rings.push(zone.outline);

  const s = rings.map((ring) => ring.map((point) => dot(point, frame.s)));
  const t = rings.map((ring) => ring.map((point) => dot(point, frame.t)));
  const outline = s[OUTLINE] ?? [];
  const from = Math.min(...outline);
  const to = Math.max(...outline);
  const tolerance = 1e-9 * Math.max(to - from, Math.abs(from), Math.abs(to), ...(t[OUTLINE] ?? []).map(Math.abs));
  const breaks = gather(s.flat(), tolerance);
  for (const row of s) for (let i = 0; i < row.length; i++) row[i] = nearest(breaks, row[i] as number);

  const edges = edgesOf(s, t);
  if (zones.length > 0) addCrossings(edges, breaks, firstZone, tolerance);

  const inside = breaks.filter((b) => b >= from - tolerance && b <= to + tolerance);
  const own: AreaWeight = { area: diaphragm.weight?.area ?? 0, live: diaphragm.weight?.live ?? 0 };
  const ofZone = zones.map((zone): AreaWeight => ({ area: zone.area, live: zone.live ?? own.live }));
  const slabs: Slab[] = [];
  for (let i = 0; i + 1 < inside.length; i++) {
    const slab = slabOf(
      inside[i] as number,
      inside[i + 1] as number,
      edges,
      firstZone,
      (ring) => ofZone[ring - firstZone] ?? own,
    );
    if (slab !== undefined) slabs.push(slab);
  }
  return { frame, from: inside[0] ?? from, to: inside[inside.length - 1] ?? to, slabs, tolerance };
}

/** Sorted values without near-repetitions. */
function gather(values: readonly number[], tolerance: number): number[] {
  const sorted = Float64Array.from(values).sort();
  const out: number[] = [];
  for (const value of sorted) {
    const last = out[out.length - 1];
    if (last === undefined || value - last > tolerance) out.push(value);
  }
  return out;
}

/** The largest break that is not above the value by more than rounding: the representative of its cluster. */
function nearest(breaks: readonly number[], value: number): number {
  let low = 0;
  let high = breaks.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if ((breaks[middle] as number) <= value) low = middle;
    else high = middle - 1;
  }
  return breaks[low] as number;
}

function edgesOf(s: readonly number[][], t: readonly number[][]): Edge[] {
  const edges: Edge[] = [];
  for (let ring = 0; ring < s.length; ring++) {
    const rs = s[ring] as number[];
    const rt = t[ring] as number[];
    for (let i = 0; i < rs.length; i++) {
      const j = i + 1 === rs.length ? 0 : i + 1;
      const a = rs[i] as number;
      const b = rs[j] as number;
      if (a < b) edges.push({ s0: a, t0: rt[i] as number, s1: b, t1: rt[j] as number, ring });
      else if (b < a) edges.push({ s0: b, t0: rt[j] as number, s1: a, t1: rt[i] as number, ring });
    }
  }
  return edges;
}

/** Zones may cross the outline, openings and one another's borders: each crossing is a break too. */
function addCrossings(edges: readonly Edge[], breaks: number[], firstZone: number, tolerance: number): void {
  const crossings: number[] = [];
  for (const zoneEdge of edges) {
    if (zoneEdge.ring < firstZone) continue;
    for (const other of edges) {
      if (other.ring === zoneEdge.ring) continue;
      const from = Math.max(zoneEdge.s0, other.s0);
      const to = Math.min(zoneEdge.s1, other.s1);
      if (to - from <= tolerance) continue;
      const gap0 = edgeAt(zoneEdge, from) - edgeAt(other, from);
      const gap1 = edgeAt(zoneEdge, to) - edgeAt(other, to);
      if (gap0 * gap1 < 0) crossings.push(from + ((to - from) * gap0) / (gap0 - gap1));
    }
  }
  if (crossings.length === 0) return;
  const all = gather([...breaks, ...crossings], tolerance);
  // Vertices keep the breaks that they were gathered to.
  const kept = [...breaks];
  let next = 0;
  for (const value of all) {
    while (next < kept.length && (kept[next] as number) < value - tolerance) next += 1;
    const near = kept[next];
    if (near === undefined || near > value + tolerance) breaks.push(value);
  }
  breaks.sort((a, b) => a - b);
}

function edgeAt(edge: Edge, s: number): number {
  if (s === edge.s0) return edge.t0;
  if (s === edge.s1) return edge.t1;
  return edge.t0 + ((edge.t1 - edge.t0) * (s - edge.s0)) / (edge.s1 - edge.s0);
}

function slabOf(
  from: number,
  to: number,
  edges: readonly Edge[],
  firstZone: number,
  weightIn: (ring: number) => AreaWeight,
): Slab | undefined {
  const crossing = edges
    .filter((edge) => edge.s0 <= from && edge.s1 >= to)
    .map((edge) => ({ ring: edge.ring, t0: edgeAt(edge, from), t1: edgeAt(edge, to) }))
    .sort((a, b) => a.t0 + a.t1 - (b.t0 + b.t1) || a.ring - b.ring);
  const strips: Strip[] = [];
  let inOutline = false;
  const wings: Wing[] = [];
  const within = new Set<number>();
  let holes = 0;
  let open: { t0: number; t1: number } | undefined;
  for (let i = 0; i < crossing.length; i++) {
    const edge = crossing[i] as { ring: number; t0: number; t1: number };
    if (edge.ring === OUTLINE) {
      inOutline = !inOutline;
      if (inOutline) open = edge;
      else if (open !== undefined) wings.push({ lower0: open.t0, lower1: open.t1, upper0: edge.t0, upper1: edge.t1 });
    } else if (within.has(edge.ring)) {
      within.delete(edge.ring);
      if (edge.ring < firstZone) holes -= 1;
    } else {
      within.add(edge.ring);
      if (edge.ring < firstZone) holes += 1;
    }
    const next = crossing[i + 1];
    if (next === undefined || !inOutline || holes > 0) continue;
    if (next.t0 - edge.t0 <= 0 && next.t1 - edge.t1 <= 0) continue;
    let weight = weightIn(OUTLINE);
    for (const ring of within) if (ring >= firstZone) weight = weightIn(ring);
    strips.push({ lower0: edge.t0, lower1: edge.t1, upper0: next.t0, upper1: next.t1, ...weight });
  }
  if (wings.length === 0) return undefined;
  let depth0 = 0;
  let depth1 = 0;
  let chord0 = 0;
  let chord1 = 0;
  for (const strip of strips) {
    depth0 += strip.upper0 - strip.lower0;
    depth1 += strip.upper1 - strip.lower1;
  }
  for (const wing of wings) {
    chord0 += wing.upper0 - wing.lower0;
    chord1 += wing.upper1 - wing.lower1;
  }
  return { from, to, strips, depth0, depth1, chord0, chord1, wings };
}

export type Interval = readonly [number, number];

/** A cut at one place: the floor just left and just right of it, as intervals of t. */
export type Cut = { readonly left: readonly Interval[]; readonly right: readonly Interval[] };

/** @param s where the diaphragm is cut [length] */
export function cutAt(profile: Profile, s: number): Cut {
  let left: readonly Interval[] = [];
  let right: readonly Interval[] = [];
  for (const slab of profile.slabs) {
    if (s < slab.from - profile.tolerance || s > slab.to + profile.tolerance) continue;
    const atStart = Math.abs(s - slab.from) <= profile.tolerance;
    const atEnd = Math.abs(s - slab.to) <= profile.tolerance;
    const share = atStart ? 0 : atEnd ? 1 : (s - slab.from) / (slab.to - slab.from);
    const intervals = join(slab.strips, share);
    if (!atStart) left = intervals;
    if (!atEnd) right = intervals;
  }
  return { left, right };
}

/** Strips at a place, neighbours that touch joined to one interval. */
function join(strips: readonly Strip[], share: number): Interval[] {
  const out: [number, number][] = [];
  for (const strip of strips) {
    const lower = strip.lower0 + (strip.lower1 - strip.lower0) * share;
    const upper = strip.upper0 + (strip.upper1 - strip.upper0) * share;
    const last = out[out.length - 1];
    if (last !== undefined && lower <= last[1]) last[1] = Math.max(last[1], upper);
    else if (upper > lower) out.push([lower, upper]);
  }
  return out;
}

export function totalLength(intervals: readonly Interval[]): number {
  let sum = 0;
  for (const [a, b] of intervals) sum += b - a;
  return sum;
}

/** A point on plan from its coordinates in a frame. */
export function toPlan(frame: Frame, s: number, t: number): Point {
  return [frame.s[0] * s + frame.t[0] * t, frame.s[1] * s + frame.t[1] * t];
}
