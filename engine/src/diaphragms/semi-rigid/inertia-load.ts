/** The inertia of a level on the mesh of its diaphragm, where the weight lies, along the load. */
import type { Point } from '../../building/definition.js';
import { cross, dot } from '../../geometry/frame.js';
import type { Profile, Slab } from '../../geometry/profile.js';
import type { LoadPiece } from '../../statics/span-load.js';
import type { Vector3 } from '../../statics/small-matrix.js';
import type { Inertia } from '../inertia.js';
import { fromLocal, toLocal, turned } from './axes.js';
import type { MembraneModel } from './membrane-model.js';
import { integrationPoints, locate, shapesAt } from './shapes.js';

/**
 * The load for a level force of 1: area weights over the elements, façades and partitions along their trace, an even spread and
 * a façade's load evenly over the depth of each cut, an eccentricity as a linear variation across the load. What numerical integration leaves of the resultant and
 * of its place across the load is spread over the floor, so that both are the inertia's own.
 */
export function inertiaLoad(model: MembraneModel, inertia: Inertia): { load: Float64Array; resultant: Vector3 } {
  const { mesh, axes, rigid } = model;
  const profile = inertia.diaphragm.profiles[inertia.frame] as Profile;
  const { s, t } = profile.frame;
  const nodes = mesh.x.length;
  // Along the load, one number a node; the load points along t everywhere.
  const along = new Float64Array(nodes);
  const even = new Float64Array(nodes);
  const across = new Float64Array(nodes);
  const middle = (profile.from + profile.to) / 2;
  const width = profile.to - profile.from;
  const density = densityOf(inertia, profile);
  for (const point of integrationPoints(mesh)) {
    const place = fromLocal(axes, [point.x, point.y]);
    const at = dot(place, s);
    const q = density(at, dot(place, t)) * point.weight;
    point.nodes.forEach((node, i) => {
      const shape = point.shapes[i] as number;
      along[node] = (along[node] as number) + q * shape;
      even[node] = (even[node] as number) + point.weight * shape;
      across[node] = (across[node] as number) + point.weight * shape * ((at - middle) / width);
    });
  }
  if (inertia.spread === 'weight') addTraces(model, inertia, along);

  const places = Float64Array.from(
    { length: nodes },
    (_, n) => (dot(fromLocal(axes, [mesh.x[n] as number, mesh.y[n] as number]), s) - middle) / width,
  );
  balance(along, even, across, places, inertia.share, (inertia.share * (inertia.centre - middle)) / width);
  const [ux, uy] = turned(axes, t);
  const load = new Float64Array(2 * nodes);
  for (let n = 0; n < nodes; n++) {
    load[2 * n] = (along[n] as number) * ux;
    load[2 * n + 1] = (along[n] as number) * uy;
  }
  const arm = inertia.centre - dot(rigid.origin, s);
  return {
    load,
    resultant: [inertia.share * t[0], inertia.share * t[1], inertia.share * arm * cross(s, t)],
  };
}

/** Load per floor area at a place (s, t), without façades and partitions [1/length²]. */
function densityOf(inertia: Inertia, profile: Profile): (s: number, t: number) => number {
  const { spread, perUnit, offset, share } = inertia;
  const width = profile.to - profile.from;
  const middle = (profile.from + profile.to) / 2;
  const slope = (12 * share * offset) / (width * width * width);
  return (s, t) => {
    const slab = slabAt(profile, s);
    if (slab === undefined) return 0;
    const depth = slab.depth0 + ((slab.depth1 - slab.depth0) * (s - slab.from)) / (slab.to - slab.from);
    const perDepth = depth > 0 ? 1 / depth : 0;
    const own =
      spread === 'weight'
        ? weightAt(slab, s, t, inertia.liveShare)
        : spread === 'area'
          ? 1
          : perDepth * (inertia.facade === undefined ? 1 : loadAt(inertia.facade, s));
    return own * perUnit + (depth > 0 ? (slope * (s - middle)) / depth : 0);
  };
}

/** Load along s of a façade at a place; between its parts there is none. */
function loadAt(facade: readonly LoadPiece[], s: number): number {
  const piece = facade.find(({ from, to }) => s >= from && s <= to);
  return piece === undefined ? 0 : (piece.w[0] ?? 0) + (piece.w[1] ?? 0) * (s - piece.from);
}

function slabAt({ slabs }: Profile, s: number): Slab | undefined {
  let low = 0;
  let high = slabs.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if ((slabs[middle] as Slab).from <= s) low = middle;
    else high = middle - 1;
  }
  return slabs[low];
}

/** Area weight at a place; on the edge of the floor that of the nearest strip. */
function weightAt(slab: Slab, s: number, t: number, liveShare: number): number {
  const part = (s - slab.from) / (slab.to - slab.from);
  let nearest = Infinity;
  let weight = 0;
  for (const strip of slab.strips) {
    const lower = strip.lower0 + (strip.lower1 - strip.lower0) * part;
    const upper = strip.upper0 + (strip.upper1 - strip.upper0) * part;
    const off = Math.max(lower - t, t - upper, 0);
    if (off < nearest) {
      nearest = off;
      weight = strip.area + liveShare * strip.live;
    }
  }
  return weight;
}

/** Façades and partitions as point loads close together; one beside the floor hangs on the edge next to it. */
function addTraces(model: MembraneModel, inertia: Inertia, along: Float64Array): void {
  const { mesh, axes, size } = model;
  for (const line of inertia.diaphragm.diaphragm.weight?.lines ?? []) {
    for (let i = 0; i + 1 < line.along.length; i++) {
      const a = toLocal(axes, line.along[i] as Point);
      const b = toLocal(axes, line.along[i + 1] as Point);
      const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
      const force = line.perLength * length * inertia.perUnit;
      if (force === 0) continue;
      const parts = Math.max(1, Math.ceil((2 * length) / size));
      for (let p = 0; p < parts; p++) {
        const share = (p + 0.5) / parts;
        const found = locate(mesh, a[0] + (b[0] - a[0]) * share, a[1] + (b[1] - a[1]) * share);
        shapesAt(found).forEach((shape, n) => {
          const node = found.nodes[n] as number;
          along[node] = (along[node] as number) + (force / parts) * shape;
        });
      }
    }
  }
}

/** Adds a load that is linear across the floor, so that the sum and the first moment are what they must be. */
function balance(
  along: Float64Array,
  even: Float64Array,
  across: Float64Array,
  places: Float64Array,
  force: number,
  moment: number,
): void {
  const sum = (of: Float64Array): number => of.reduce((total, value) => total + value, 0);
  const first = (of: Float64Array): number => of.reduce((total, value, n) => total + value * (places[n] as number), 0);
  const [e0, e1, a0, a1] = [sum(even), first(even), sum(across), first(across)];
  // Twice, since the first step leaves rounding of its own.
  for (let step = 0; step < 2; step++) {
    const df = force - sum(along);
    const dm = moment - first(along);
    const determinant = e0 * a1 - a0 * e1;
    const p = (df * a1 - dm * a0) / determinant;
    const q = (dm * e0 - df * e1) / determinant;
    for (let n = 0; n < along.length; n++)
      along[n] = (along[n] as number) + p * (even[n] as number) + q * (across[n] as number);
  }
}
