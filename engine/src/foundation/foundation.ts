/** The foundation demands: what arrives at every support, by component and combination, and the totals that it must add up to. */
import type { Building, Point } from '../building/definition.js';
import type { Analysis, Demand, Sense } from '../path/result.js';
import type { Foundation, FoundationTotal, Support, SupportDemand, SupportQuantity } from './result.js';

/**
 * @param building the building that was analysed
 * @param analysis its analysis
 */
export function foundation(building: Building, analysis: Analysis): Foundation {
  const byMember = new Map<string, Demand[]>();
  for (const row of analysis.demands) {
    if (row.kind !== 'support') continue;
    const rows = byMember.get(row.member);
    if (rows === undefined) byMember.set(row.member, [row]);
    else rows.push(row);
  }
  const places = [...byMember].map(([member, rows]) => ({ member, rows, at: rows[0]?.at ?? ([0, 0] as Point) }));
  places.sort((a, b) => a.at[0] - b.at[0] || a.at[1] - b.at[1] || (a.member < b.member ? -1 : 1));
  return {
    schema: 'groundward.foundation/1',
    units: building.units,
    building: building.name,
    supports: places.map(({ member, rows, at }, i): Support => ({
      member,
      label: `F${i + 1}`,
      line: member.slice(0, member.indexOf('/')),
      at,
      demands: demandsOf(rows),
    })),
    totals: totalsOf(building, analysis),
  };
}

function demandsOf(rows: readonly Demand[]): SupportDemand[] {
  const governing = new Map<string, Demand>();
  for (const row of rows) {
    const known = governing.get(row.quantity);
    // A combination goes before an unfactored component; among equals the first one stands.
    const stronger =
      known === undefined ||
      (known.combination === undefined && row.combination !== undefined) ||
      ((known.combination === undefined) === (row.combination === undefined) && row.value > known.value);
    if (stronger) governing.set(row.quantity, row);
  }
  return rows.map((row): SupportDemand => ({
    quantity: row.quantity as SupportQuantity,
    case: row.case,
    sense: row.sense,
    ...(row.combination === undefined ? {} : { combination: row.combination }),
    value: row.value,
    unit: row.unit,
    governing: governing.get(row.quantity) === row && row.value > 0,
  }));
}

type Sum = { fx: number; fy: number; fz: number; mx: number; my: number; mz: number };

/** Unfactored totals by case and sense, about the origin of the plan. Forces act on the foundation, vertical ones downwards. */
function totalsOf(building: Building, analysis: Analysis): FoundationTotal[] {
  const sums = new Map<string, { caseId: string; sense: Sense; sum: Sum }>();
  const sumOf = (row: Demand): Sum => {
    const key = `${row.case} ${row.sense}`;
    let entry = sums.get(key);
    if (entry === undefined) {
      entry = { caseId: row.case, sense: row.sense, sum: { fx: 0, fy: 0, fz: 0, mx: 0, my: 0, mz: 0 } };
      sums.set(key, entry);
    }
    return entry.sum;
  };
  const feet = lowestPiers(building);
  for (const row of analysis.demands) {
    if (row.combination !== undefined) continue;
    if (row.kind === 'support' && (row.quantity === 'bearing' || row.quantity === 'uplift')) {
      const [x, y] = row.at ?? [0, 0];
      const down = row.quantity === 'bearing' ? row.value : -row.value;
      const sum = sumOf(row);
      sum.fz += down;
      sum.mx -= y * down;
      sum.my += x * down;
    } else if (row.kind === 'pier' && row.quantity === 'shear') {
      const foot = feet.get(row.member);
      if (foot === undefined) continue;
      const sum = sumOf(row);
      const fx = row.value * foot.along[0];
      const fy = row.value * foot.along[1];
      sum.fx += fx;
      sum.fy += fy;
      sum.mz += foot.at[0] * fy - foot.at[1] * fx;
    }
  }
  return [...sums.values()].map(({ caseId, sense, sum }) => ({ case: caseId, sense, ...sum }));
}

/** Direction and place of every pier of the lowest storey, by its key. */
function lowestPiers(building: Building): Map<string, { along: Point; at: Point }> {
  const lowest = [...building.levels].sort((a, b) => a.elevation - b.elevation)[1]?.id;
  const feet = new Map<string, { along: Point; at: Point }>();
  for (const line of building.wallLines) {
    const [a, b] = line.axis;
    const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
    const along: Point = [(b[0] - a[0]) / length, (b[1] - a[1]) / length];
    for (const storey of line.storeys) {
      if (storey.under !== lowest) continue;
      for (const pier of storey.piers) feet.set(`${line.id}/${storey.under}/${pier.id}`, { along, at: a });
    }
  }
  return feet;
}
