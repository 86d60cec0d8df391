/** The foundation demands as the terminal shows them: what governs at each support, and the totals. */
import { CAUTION } from '../src/foundation/csv.js';
import type { Foundation } from '../src/foundation/result.js';
import { figure, senseText, tableText } from './table.js';

/** Figures of one dimension; what is rounding beside the largest of them reads as 0. */
function plain(values: readonly number[]): string[] {
  const most = Math.max(...values.map(Math.abs));
  return values.map((value) => figure(Math.abs(value) <= 1e-12 * most ? 0 : value));
}

export function foundationText(foundation: Foundation): string {
  const { length, force } = foundation.units;
  const governing = foundation.supports.flatMap((support) =>
    support.demands
      .filter((demand) => demand.governing)
      .map((demand) => [
        support.label,
        support.member,
        figure(support.at[0]),
        figure(support.at[1]),
        demand.quantity,
        figure(demand.value),
        demand.unit,
        demand.case,
        senseText(demand.sense),
        demand.combination ?? 'unfactored',
      ]),
  );
  const totals = foundation.totals.map((total) => [
    total.case,
    senseText(total.sense),
    ...plain([total.fx, total.fy, total.fz]),
    ...plain([total.mx, total.my, total.mz]),
  ]);
  return [
    `${foundation.building}: foundation demands, the governing ones\nunits ${length}, ${force}\n`,
    tableText(
      [
        { head: 'support' },
        { head: 'member' },
        { head: 'x', align: 'right' },
        { head: 'y', align: 'right' },
        { head: 'quantity' },
        { head: 'value', align: 'right' },
        { head: 'unit' },
        { head: 'case' },
        { head: 'sense' },
        { head: 'combination' },
      ],
      governing,
    ),
    `Unfactored totals on the foundation; moments about the origin\n${tableText(
      [
        { head: 'case' },
        { head: 'sense' },
        ...['Fx', 'Fy', 'down', 'Mx', 'My', 'Mz'].map((head) => ({ head, align: 'right' as const })),
      ],
      totals,
    )}`,
    `${CAUTION}\n`,
  ].join('\n');
}
