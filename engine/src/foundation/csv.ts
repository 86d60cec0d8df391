/** The foundation schedule as comma-separated values, RFC 4180. */
import type { Foundation } from './result.js';

/** The caution that goes with every export. */
export const CAUTION =
  'These demands support the judgement of a licensed engineer; local codes and licensed practice govern.';

const HEAD = [
  'support',
  'member',
  'line',
  'x',
  'y',
  'length unit',
  'quantity',
  'case',
  'sense',
  'combination',
  'value',
  'unit',
  'governing',
];

export function foundationCsv(foundation: Foundation): string {
  const rows = foundation.supports.flatMap((support) =>
    support.demands.map((demand) => [
      support.label,
      support.member,
      support.line,
      String(support.at[0]),
      String(support.at[1]),
      foundation.units.length,
      demand.quantity,
      demand.case,
      String(demand.sense),
      demand.combination ?? '',
      String(demand.value),
      demand.unit,
      demand.governing ? 'yes' : '',
    ]),
  );
  const note = [CAUTION, ...HEAD.slice(1).map(() => '')];
  return [HEAD, ...rows, note].map((row) => row.map(field).join(',')).join('\r\n') + '\r\n';
}

/** Quoted where it must be; a text that a spreadsheet would take for a formula is kept a text. */
function field(value: string): string {
  const number = /^-?\d+(?:\.\d+)?(?:e[+-]?\d+)?$/.test(value);
  const safe = !number && /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
