/** How much work the drawing of a diaphragm makes: what the reader refuses before it fills the memory. */
import { segmentsMeet } from '../geometry/polygon.js';
import type { Building, Diaphragm, Point, Ring } from './definition.js';
import type { Fault } from './fault.js';

/** Strips into which all floors together may fall when they are cut at every corner. */
const MOST_STRIPS = 500_000;

/** Crossings of zones with other edges that a diaphragm may have at the most. */
const MOST_CROSSINGS = 1000;

/** A floor that falls into strips without end is a fault before anything cuts it. */
export function sizeFaults(building: Building): Fault[] {
  let strips = 0;
  for (const [l, level] of building.levels.entries()) {
    for (const [d, diaphragm] of (level.diaphragms ?? []).entries()) {
      strips += stripsOf(diaphragm);
      if (strips <= MOST_STRIPS) continue;
      return [
        {
          code: 'too-large',
          path: `levels[${l}].diaphragms[${d}]`,
          found: 'outlines, openings and zones of too many corners beside and across one another',
          expected: `plans that fall into at most ${MOST_STRIPS} strips in all when cut at every corner`,
        },
      ];
    }
  }
  return [];
}

/** Strips of a diaphragm cut at every corner, along x or along y, whichever gives more; infinite beyond the most crossings. */
function stripsOf(diaphragm: Diaphragm): number {
  const zones = (diaphragm.weight?.zones ?? []).map((zone) => zone.outline);
  const rings = [diaphragm.outline, ...(diaphragm.openings ?? []).map((opening) => opening.outline), ...zones];
  const crossings = crossingsOf(zones, rings);
  if (crossings > MOST_CROSSINGS) return Infinity;
  return Math.max(stripsAlong(rings, 0, crossings), stripsAlong(rings, 1, crossings));
}

function stripsAlong(rings: readonly Ring[], axis: 0 | 1, crossings: number): number {
  const breaks = [...new Set(rings.flatMap((ring) => ring.map((point) => point[axis])))].sort((a, b) => a - b);
  const index = new Map(breaks.map((value, i) => [value, i]));
  const change = breaks.map(() => 0);
  for (const ring of rings) {
    ring.forEach((point, i) => {
      const a = index.get(point[axis]) as number;
      const b = index.get((ring[(i + 1) % ring.length] as Point)[axis]) as number;
      const [low, high] = [Math.min(a, b), Math.max(a, b)];
      change[low] = (change[low] as number) + 1;
      change[high] = (change[high] as number) - 1;
    });
  }
  let open = 0;
  let most = 0;
  let sum = 0;
  for (const step of change) {
    open += step;
    sum += open;
    most = Math.max(most, open);
  }
  return sum + crossings * most;
}

/** Pairs of a zone's edge and an edge of another ring that meet; counting ends beyond the most that may be. */
function crossingsOf(zones: readonly Ring[], rings: readonly Ring[]): number {
  let count = 0;
  for (const zone of zones) {
    for (const other of rings) {
      if (other === zone) continue;
      for (let i = 0; i < zone.length && count <= MOST_CROSSINGS; i++) {
        const a = zone[i] as Point;
        const b = zone[(i + 1) % zone.length] as Point;
        other.forEach((c, j) => {
          if (segmentsMeet(a, b, c, other[(j + 1) % other.length] as Point)) count += 1;
        });
      }
    }
  }
  return count;
}
