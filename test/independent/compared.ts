/** An analysis beside the independent solution of the same building. */
import type { Building } from '@groundward/engine/building/definition';
import type { Analysis } from '@groundward/engine/path/result';
import { independentDemands, keyOf } from './demands.js';

export type Compared = {
  /** How many rows of the analysis were compared. */
  readonly rows: number;
  /** The largest difference, relative to the largest value of its quantity in the building. */
  readonly worst: {
    readonly key: string;
    readonly engine: number;
    readonly independent: number;
    readonly difference: number;
  };
};

const QUANTITIES = ['reaction', 'shear', 'overturning-moment', 'unit-shear', 'end-tension', 'end-compression'];
const KINDS = ['wall-line', 'pier', 'support'];

/**
 * Every row of walls, piers and supports; those with a combination where the file lists its own. A row that one side lacks is 0 there, but
 * for combinations of what the lateral case does not move at all: the analysis lists these once, as gravity.
 */
export function compared(building: Building, analysis: Analysis, meshSize?: number): Compared {
  const independent = independentDemands(building, meshSize);
  const listed = Array.isArray(building.combinations);
  const engine = new Map(
    analysis.demands
      .filter(({ kind, quantity }) => KINDS.includes(kind) && (kind === 'support' || QUANTITIES.includes(quantity)))
      .filter((row) => row.case !== 'gravity' && (listed || row.combination === undefined))
      .map((row) => [keyOf(row), row.value]),
  );
  const largest = new Map<string, number>();
  const quantityOf = (key: string): string => key.split(' | ')[1] as string;
  for (const [key, value] of [...engine, ...independent]) {
    largest.set(quantityOf(key), Math.max(largest.get(quantityOf(key)) ?? 0, Math.abs(value)));
  }
  const still = stillMembers(independent, (key) => 1e-10 * (largest.get(quantityOf(key)) as number));
  let worst = { key: '', engine: 0, independent: 0, difference: 0 };
  for (const key of new Set([...engine.keys(), ...independent.keys()])) {
    if (!engine.has(key) && !key.endsWith(' | ') && still(key)) continue;
    const [a, b] = [engine.get(key) ?? 0, independent.get(key) ?? 0];
    const scale = largest.get(quantityOf(key)) as number;
    const difference = scale === 0 ? 0 : Math.abs(a - b) / scale;
    if (!(difference <= worst.difference)) worst = { key, engine: a, independent: b, difference };
  }
  return { rows: engine.size, worst };
}

/** Whether a lateral case leaves a member without any force. */
function stillMembers(independent: ReadonlyMap<string, number>, negligible: (key: string) => number) {
  const moved = new Set<string>();
  const place = (key: string): string => {
    const [member, , name, sense] = key.split(' | ');
    return `${member} | ${name} | ${sense}`;
  };
  for (const [key, value] of independent) {
    if (key.endsWith(' | ') && Math.abs(value) > negligible(key)) moved.add(place(key));
  }
  return (key: string): boolean => !moved.has(place(key));
}
