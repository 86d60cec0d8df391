/** An analysis as the terminal shows it. */
import type { Building } from '../src/building/definition.js';
import { CAUTION } from '../src/foundation/csv.js';
import type { Analysis, DemandKind } from '../src/path/result.js';
import { figure, senseText, tableText } from './table.js';

const KINDS: readonly { readonly kind: DemandKind; readonly title: string }[] = [
  { kind: 'level', title: 'Levels' },
  { kind: 'diaphragm-span', title: 'Diaphragm spans' },
  { kind: 'opening', title: 'Openings' },
  { kind: 'collector', title: 'Collectors' },
  { kind: 'wall-line', title: 'Wall lines by storey' },
  { kind: 'pier', title: 'Piers' },
  { kind: 'support', title: 'Supports' },
];

export function analysisText(building: Building, analysis: Analysis): string {
  const { length, force } = analysis.units;
  const parts = [`${building.name}\nunits ${length}, ${force}\n`];
  for (const { kind, title } of KINDS) {
    const rows = analysis.demands.filter((row) => row.kind === kind);
    if (rows.length === 0) continue;
    parts.push(
      `${title}\n${tableText(
        [
          { head: 'member' },
          { head: 'quantity' },
          { head: 'case' },
          { head: 'sense' },
          { head: 'combination' },
          { head: 'value', align: 'right' },
          { head: 'unit' },
          { head: 'at x', align: 'right' },
          { head: 'y', align: 'right' },
        ],
        rows.map((row) => [
          row.member,
          row.quantity,
          row.case,
          senseText(row.sense),
          row.combination ?? '',
          figure(row.value),
          row.unit === '1' ? '' : row.unit,
          row.at === undefined ? '' : figure(row.at[0]),
          row.at === undefined ? '' : figure(row.at[1]),
        ]),
      )}`,
    );
  }
  parts.push(
    analysis.findings.length === 0
      ? 'Findings\nnone\n'
      : `Findings\n${tableText(
          [{ head: 'severity' }, { head: 'code' }, { head: 'member' }, { head: 'finding' }],
          analysis.findings.map((finding) => [finding.severity, finding.code, finding.member, finding.sentence]),
        )}`,
  );
  const { worstResidual, bound, worst } = analysis.certificate;
  parts.push(
    `Certificate\nlargest equilibrium residual ${worstResidual.toExponential(1)} (${worst}), bound ${bound.toExponential(0)}\n`,
  );
  parts.push(`${CAUTION}\n`);
  return parts.join('\n');
}
