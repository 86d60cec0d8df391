/** Faults of what is drawn on plan: outlines, openings, zones. */
import { frameAlong } from '../geometry/frame.js';
import { massOf } from '../geometry/area.js';
import { bordersMeet, contains, selfMeeting, twiceArea } from '../geometry/polygon.js';
import { profileOf } from '../geometry/profile.js';
import type { Diaphragm, Level, Point, Ring } from './definition.js';
import type { Fault } from './fault.js';

/** @param level a level whose shape is right, with its JSON path */
export function levelFaults(level: Level, path: string): Fault[] {
  return (level.diaphragms ?? []).flatMap((diaphragm, d) => diaphragmFaults(diaphragm, `${path}.diaphragms[${d}]`));
}

function diaphragmFaults(diaphragm: Diaphragm, path: string): Fault[] {
  const faults = ringFaults(diaphragm.outline, `${path}.outline`);
  const outlineGood = faults.length === 0;
  const openings = diaphragm.openings ?? [];
  const goodOpenings: { ring: Ring; id: string; path: string }[] = [];
  openings.forEach((opening, o) => {
    const at = `${path}.openings[${o}].outline`;
    const own = ringFaults(opening.outline, at);
    faults.push(...own);
    if (own.length > 0) return;
    if (outlineGood) {
      if (bordersMeet(opening.outline, diaphragm.outline)) {
        faults.push({
          code: 'opening-meets-outline',
          path: at,
          found: `opening ${opening.id} that touches or crosses the outline of its diaphragm`,
          expected: 'an opening inside the outline',
          hint: 'draw an opening at the edge as a step of the outline',
        });
      } else if (!contains(diaphragm.outline, opening.outline[0] as Point)) {
        faults.push({
          code: 'opening-outside',
          path: at,
          found: `opening ${opening.id} outside the outline of its diaphragm`,
          expected: 'an opening inside the outline',
        });
      }
    }
    for (const other of goodOpenings) {
      if (
        bordersMeet(opening.outline, other.ring) ||
        contains(other.ring, opening.outline[0] as Point) ||
        contains(opening.outline, other.ring[0] as Point)
      ) {
        faults.push({
          code: 'openings-overlap',
          path: at,
          found: `opening ${opening.id} that touches or overlaps opening ${other.id}`,
          expected: 'openings apart from one another',
        });
      }
    }
    goodOpenings.push({ ring: opening.outline, id: opening.id, path: at });
  });
  faults.push(...zoneFaults(diaphragm, path));
  (diaphragm.weight?.lines ?? []).forEach((line, l) => {
    line.along.slice(1).forEach((point, i) => {
      if (same(line.along[i] as Point, point)) {
        faults.push(repeated(`${path}.weight.lines[${l}].along[${i + 1}]`, point));
      }
    });
  });
  return faults;
}

function zoneFaults(diaphragm: Diaphragm, path: string): Fault[] {
  const faults: Fault[] = [];
  const good: { ring: Ring; id: string }[] = [];
  (diaphragm.weight?.zones ?? []).forEach((zone, z) => {
    const at = `${path}.weight.zones[${z}].outline`;
    const own = ringFaults(zone.outline, at);
    faults.push(...own);
    if (own.length > 0) return;
    for (const other of good) {
      const share = overlap(zone.outline, other.ring);
      if (share > 1e-9 * Math.abs(twiceArea(zone.outline))) {
        faults.push({
          code: 'zones-overlap',
          path: at,
          found: `zone ${zone.id} that overlaps zone ${other.id} by an area of ${share.toPrecision(4)}`,
          expected: 'zones apart from one another, or side by side',
        });
      }
    }
    good.push({ ring: zone.outline, id: zone.id });
  });
  return faults;
}

/** Area that two simple polygons have in common [length²] */
function overlap(a: Ring, b: Ring): number {
  const diaphragm: Diaphragm = { id: 'a', outline: a, weight: { area: 0, zones: [{ id: 'b', outline: b, area: 1 }] } };
  return massOf(diaphragm, profileOf(diaphragm, frameAlong([0, 1]))).weight;
}

/** A ring must be a simple polygon with an area. */
function ringFaults(ring: Ring, path: string): Fault[] {
  const faults: Fault[] = [];
  ring.forEach((point, i) => {
    const next = (i + 1) % ring.length;
    if (same(point, ring[next] as Point)) faults.push(repeated(`${path}[${next}]`, point));
  });
  if (faults.length > 0) return faults;
  const meeting = selfMeeting(ring);
  if (meeting !== undefined) {
    const [i, j] = meeting;
    return [
      {
        code: 'outline-crosses-itself',
        path,
        found: `edge ${i} (${edge(ring, i)}) that meets edge ${j} (${edge(ring, j)})`,
        expected: 'a simple polygon, whose edges meet at common ends alone',
      },
    ];
  }
  if (twiceArea(ring) === 0) {
    return [{ code: 'no-area', path, found: 'an outline without area', expected: 'a polygon with area' }];
  }
  return [];
}

function same(a: Point, b: Point): boolean {
  return a[0] === b[0] && a[1] === b[1];
}

function repeated(path: string, point: Point): Fault {
  return {
    code: 'repeated-point',
    path,
    found: `the point [${point.join(', ')}] twice in a row`,
    expected: 'each point once, the last one not a repetition of the first',
  };
}

function edge(ring: Ring, i: number): string {
  const a = ring[i] as Point;
  const b = ring[(i + 1) % ring.length] as Point;
  return `[${a.join(', ')}] to [${b.join(', ')}]`;
}
