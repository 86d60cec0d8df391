/** Faults of a wall line on its own: its axis, storeys, piers and collectors. */
import type { Pier, WallLine } from './definition.js';
import type { Fault } from './fault.js';

/** Distances along an axis that differ by less than this part of its length are one. */
const ROUNDING = 1e-9;

/** @param line a wall line whose shape is right, with its JSON path */
export function wallLineFaults(line: WallLine, path: string): Fault[] {
  const [a, b] = line.axis;
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (length === 0) {
    return [
      {
        code: 'no-length',
        path: `${path}.axis`,
        found: `wall line ${line.id} from [${a.join(', ')}] to the same point`,
        expected: 'two different points',
      },
    ];
  }
  const faults: Fault[] = [];
  const beyond = (value: number): boolean => value < -ROUNDING * length || value > length * (1 + ROUNDING);
  line.storeys.forEach((storey, s) => {
    const at = `${path}.storeys[${s}]`;
    storey.piers.forEach((pier, p) => faults.push(...pierFaults(line, pier, `${at}.piers[${p}]`, length, beyond)));
    faults.push(...overlaps(storey.piers, at, length));
  });
  faults.push(...collectorFaults(line.collectors ?? [], path));
  return faults;
}

function collectorFaults(collectors: NonNullable<WallLine['collectors']>, path: string): Fault[] {
  const faults: Fault[] = [];
  const reached = new Map<string, { to: number; index: number }>();
  const sorted = collectors.map((collector, index) => ({ ...collector, index })).sort((a, b) => a.from - b.from);
  for (const { level, from, to, index } of sorted) {
    const at = `${path}.collectors[${index}]`;
    const before = reached.get(level);
    if (!(to > from)) {
      faults.push({
        code: 'no-length',
        path: at,
        found: `from ${from} to ${to}`,
        expected: 'a collector with from less than to',
      });
    } else if (before !== undefined && from < before.to) {
      faults.push({
        code: 'collectors-overlap',
        path: at,
        found: `a collector at level ${level} from ${from}, where collectors[${before.index}] runs to ${before.to}`,
        expected: 'collectors of one level one after the other',
      });
    }
    if (before === undefined || to > before.to) reached.set(level, { to, index });
  }
  return faults;
}

function pierFaults(
  line: WallLine,
  pier: Pier,
  path: string,
  length: number,
  beyond: (value: number) => boolean,
): Fault[] {
  const faults: Fault[] = [];
  if (!(pier.to > pier.from)) {
    faults.push({
      code: 'no-length',
      path,
      found: `pier ${pier.id} from ${pier.from} to ${pier.to}`,
      expected: 'from less than to',
    });
    return faults;
  }
  for (const end of ['from', 'to'] as const) {
    if (!beyond(pier[end])) continue;
    faults.push({
      code: 'pier-beyond-line',
      path: `${path}.${end}`,
      found: `pier ${pier.id} at ${pier[end]}`,
      expected: `a distance along the axis of line ${line.id}, from 0 to ${Number(length.toPrecision(12))}`,
    });
  }
  const [near, far] =
    typeof pier.endOffset === 'number' ? [pier.endOffset, pier.endOffset] : (pier.endOffset ?? [0, 0]);
  if (!(pier.to - pier.from - near - far > ROUNDING * length)) {
    faults.push({
      code: 'no-arm',
      path: `${path}.endOffset`,
      found: `offsets of ${near} and ${far} on a pier of ${Number((pier.to - pier.from).toPrecision(12))}`,
      expected: 'offsets that leave an arm between the end posts',
    });
  }
  if (line.shareBy === 'stiffness' && pier.stiffness === undefined) {
    faults.push({
      code: 'no-stiffness',
      path: `${path}.stiffness`,
      found: `pier ${pier.id} without a stiffness on line ${line.id}, which shares by stiffness`,
      expected: 'a stiffness on every pier of the line',
    });
  }
  return faults;
}

function overlaps(piers: readonly Pier[], path: string, length: number): Fault[] {
  const faults: Fault[] = [];
  const sorted = piers.map((pier, index) => ({ pier, index })).sort((a, b) => a.pier.from - b.pier.from);
  let reach = sorted[0];
  for (const next of sorted.slice(1)) {
    if (reach !== undefined && next.pier.from < reach.pier.to - ROUNDING * length) {
      faults.push({
        code: 'piers-overlap',
        path: `${path}.piers[${next.index}]`,
        found: `pier ${next.pier.id} from ${next.pier.from}, where pier ${reach.pier.id} runs to ${reach.pier.to}`,
        expected: 'piers side by side',
      });
    }
    if (reach === undefined || next.pier.to > reach.pier.to) reach = next;
  }
  return faults;
}
