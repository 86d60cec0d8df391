/** Demands of openings in a diaphragm. */
import { openingForces } from '../diaphragms/opening.js';
import type { InnerForces } from '../diaphragms/inner-forces.js';
import { cross } from '../geometry/frame.js';
import type { Point } from '../building/definition.js';
import type { Quantity } from './result.js';
import { addBoth, type Table } from './table.js';

export function openingDemands(table: Table, inner: InnerForces, caseId: string): void {
  for (const opening of inner.diaphragm.diaphragm.openings ?? []) {
    const forces = openingForces(inner, opening);
    if (forces === undefined) continue;
    const member = `${inner.diaphragm.key}/${opening.id}`;
    const at = centroid(opening.outline);
    const add = (quantity: Quantity, value: number, unit: string): void =>
      addBoth(table, { member, kind: 'opening', quantity, case: caseId, value, unit, at });
    add('secondary-moment', forces.secondaryMoment, table.units.moment);
    add('chord-force', forces.chordForce, table.units.force);
    add('corner-force', forces.cornerForce, table.units.force);
  }
}

function centroid(ring: readonly Point[]): Point {
  const origin = ring[0] as Point;
  let area = 0;
  let x = 0;
  let y = 0;
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i] as Point;
    const b = ring[(i + 1) % ring.length] as Point;
    const u: Point = [a[0] - origin[0], a[1] - origin[1]];
    const v: Point = [b[0] - origin[0], b[1] - origin[1]];
    const twice = cross(u, v);
    area += twice;
    x += (u[0] + v[0]) * twice;
    y += (u[1] + v[1]) * twice;
  }
  return [origin[0] + x / (3 * area), origin[1] + y / (3 * area)];
}
