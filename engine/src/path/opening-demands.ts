/** Demands of openings in a diaphragm. */
import { openingForces } from '../diaphragms/openings/opening.js';
import type { InnerForces } from '../diaphragms/inner-forces.js';
import { cross } from '../geometry/frame.js';
import type { Point } from '../building/definition.js';
import type { Diagram, Quantity } from './result.js';
import { addBoth, type Table } from './table.js';

export function openingDemands(
  table: Table,
  diagrams: Diagram[],
  inner: InnerForces,
  where: { readonly level: string; readonly case: string },
): void {
  for (const plan of inner.diaphragm.openings[inner.frame] ?? []) {
    const forces = openingForces(inner, plan);
    if (forces === undefined) continue;
    const member = `${inner.diaphragm.key}/${plan.opening.id}`;
    const at = centroid(plan.opening.outline);
    const add = (quantity: Quantity, value: number, unit: string): void =>
      addBoth(table, { member, kind: 'opening', quantity, case: where.case, value, unit, at });
    add('secondary-moment', forces.secondaryMoment, table.units.moment);
    add('chord-force', forces.chordForce, table.units.force);
    add('corner-force', forces.cornerForce, table.units.force);
    const { frame } = inner.profile;
    diagrams.push({
      kind: 'opening',
      member,
      level: where.level,
      case: where.case,
      along: frame.t,
      across: frame.s,
      ends: forces.ends.map(({ strip, side, moment, lower, upper }) => ({
        s: side,
        lower: { t: strip[0], axial: zero(lower) },
        upper: { t: strip[1], axial: zero(upper) },
        moment: zero(moment),
      })),
    });
  }
}

function zero(value: number): number {
  return value === 0 ? 0 : value;
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
