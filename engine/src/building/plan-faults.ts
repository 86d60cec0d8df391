/** Faults of what is drawn on plan: outlines, openings, zones. */
import { commonArea } from '../geometry/common-area.js';
import { bordersMeet, contains, selfMeeting, twiceArea } from '../geometry/polygon.js';
import type { Diaphragm, Level, Point, Ring } from './definition.js';
import type { Fault } from './fault.js';

/** Points that the drawings of a level may have at the most. */
const MOST_POINTS = 10_000;

/** Lengths that are less than this part of the coordinates are rounding; areas likewise. */
const ROUNDING = 1e-9;

/** @param level a level whose shape is right, with its JSON path */
export function levelFaults(level: Level, path: string): Fault[] {
  const diaphragms = level.diaphragms ?? [];
  const points = diaphragms.reduce((sum, diaphragm) => sum + pointsOf(diaphragm), 0);
  if (points > MOST_POINTS) {
    return [
      {
        code: 'too-large',
        path: `${path}.diaphragms`,
        found: `${points} points in outlines, openings and zones`,
        expected: `at most ${MOST_POINTS} points on a level`,
      },
    ];
  }
  const single = diaphragms.map((diaphragm, d) => diaphragmFaults(diaphragm, `${path}.diaphragms[${d}]`));
  return [...single.flat(), ...overlapFaults(diaphragms, single, path)];
}

function pointsOf(diaphragm: Diaphragm): number {
  const rings = [...(diaphragm.openings ?? []), ...(diaphragm.weight?.zones ?? [])];
  return rings.reduce((sum, { outline }) => sum + outline.length, diaphragm.outline.length);
}

/** Diaphragms of a level lie side by side, or one in the opening of another. */
function overlapFaults(diaphragms: readonly Diaphragm[], single: readonly (readonly Fault[])[], path: string): Fault[] {
  const faults: Fault[] = [];
  diaphragms.forEach((diaphragm, d) => {
    if (single[d]?.length !== 0) return;
    diaphragms.slice(0, d).forEach((other, o) => {
      if (single[o]?.length !== 0) return;
      const share = commonArea(diaphragm, other);
      if (share <= negligible(diaphragm.outline, other.outline)) return;
      faults.push({
        code: 'diaphragms-overlap',
        path: `${path}.diaphragms[${d}].outline`,
        found: `diaphragm ${diaphragm.id} that overlaps diaphragm ${other.id} by an area of ${share.toPrecision(4)}`,
        expected: 'diaphragms of a level apart from one another, or side by side',
      });
    });
  });
  return faults;
}

function negligible(a: Ring, b: Ring): number {
  return ROUNDING * Math.max(Math.abs(twiceArea(a)), Math.abs(twiceArea(b)));
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
  faults.push(...zoneFaults(diaphragm, path, outlineGood));
  (diaphragm.weight?.lines ?? []).forEach((line, l) => {
    line.along.slice(1).forEach((point, i) => {
      if (same(line.along[i] as Point, point)) {
        faults.push(repeated(`${path}.weight.lines[${l}].along[${i + 1}]`, point));
      }
    });
  });
  return faults;
}

function zoneFaults(diaphragm: Diaphragm, path: string, outlineGood: boolean): Fault[] {
  const faults: Fault[] = [];
  const good: { ring: Ring; id: string }[] = [];
  (diaphragm.weight?.zones ?? []).forEach((zone, z) => {
    const at = `${path}.weight.zones[${z}].outline`;
    const own = ringFaults(zone.outline, at);
    faults.push(...own);
    if (own.length > 0) return;
    const outline = { outline: diaphragm.outline };
    if (outlineGood && commonArea(zone, outline) <= ROUNDING * Math.abs(twiceArea(zone.outline))) {
      faults.push({
        code: 'zone-outside',
        path: at,
        found: `zone ${zone.id}, which lies outside the outline of its diaphragm`,
        expected: 'a zone that covers a part of the diaphragm',
      });
    }
    for (const other of good) {
      const share = commonArea(zone, { outline: other.ring });
      if (share > negligible(zone.outline, other.ring)) {
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

/** A ring must be a simple polygon with an area. */
function ringFaults(ring: Ring, path: string): Fault[] {
  const faults: Fault[] = [];
  const most = ring.reduce((largest, [x, y]) => Math.max(largest, Math.abs(x), Math.abs(y)), 0);
  ring.forEach((point, i) => {
    const next = (i + 1) % ring.length;
    const end = ring[next] as Point;
    if (same(point, end)) faults.push(repeated(`${path}[${next}]`, point));
    else if (Math.hypot(end[0] - point[0], end[1] - point[1]) <= ROUNDING * most) {
      faults.push({
        code: 'short-edge',
        path: `${path}[${next}]`,
        found: `an edge from [${point.join(', ')}] to [${end.join(', ')}]`,
        expected: 'points farther apart than rounding',
      });
    }
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
