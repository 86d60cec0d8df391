/** The working behind a demand, computed on request. */
import type { Units } from '../building/definition.js';
import type { Fault, Result } from '../building/fault.js';
import type { Demand } from '../path/result.js';
import type { Context } from './context.js';
import { referenceOf } from './reference.js';
import { workingFor } from './registry.js';
import type { Working } from './result.js';
import { newSteps } from './steps.js';

/** What names a demand; what is left out is chosen by `demandFor`. */
export type Wanted = {
  readonly member: string;
  readonly quantity: string;
  readonly case?: string | undefined;
  readonly sense?: number | undefined;
  readonly combination?: string | undefined;
};

/**
 * The steps that give a demand.
 *
 * @throws Error where its kind and quantity have no working
 */
export function explain(context: Context, demand: Demand): Working {
  const fill = workingFor(demand.kind, demand.quantity);
  if (fill === undefined) throw new Error(`no working for ${demand.quantity} of a ${demand.kind}`);
  const steps = newSteps();
  fill(context, demand, steps);
  // Written out: the order of keys does not depend on where the file was kept.
  const units: Units =
    context.building.units.length === 'ft' ? { length: 'ft', force: 'kip' } : { length: 'm', force: 'kN' };
  return { schema: 'groundward.working/1', units, demand, steps: steps.list };
}

/**
 * The demand that is meant: sense 1 where none is named; the unfactored component where no combination is named and there is one; the
 * largest where several are left.
 */
export function demandFor({ analysis, demands }: Context, wanted: Wanted): Result<Demand> {
  const { member, quantity, case: caseId, sense = 1, combination } = wanted;
  const ofMember = analysis.demands.filter((row) => row.member === member);
  if (ofMember.length === 0) return missing('member', `no demand of member ${member}`, 'a member with a demand', []);
  const ofQuantity = ofMember.filter((row) => row.quantity === quantity);
  if (ofQuantity.length === 0) {
    return missing(
      'quantity',
      `no ${quantity} of ${member}`,
      'a quantity that it has',
      ofMember.map((row) => row.quantity),
    );
  }
  const ofCase = ofQuantity.filter((row) => (caseId === undefined || row.case === caseId) && row.sense === sense);
  if (ofCase.length === 0) {
    const have = ofQuantity.map((row) => `${row.case} ${row.sense}`);
    return missing(
      'case',
      `no ${quantity} of ${member} under ${caseId ?? 'any case'} with sense ${sense}`,
      'a case and sense that it has',
      have,
    );
  }
  const [first] = ofCase;
  if (first !== undefined && workingFor(first.kind, first.quantity) === undefined) {
    return missing('working', `no working for ${quantity} of a ${first.kind}`, 'a quantity with a working', []);
  }
  let rows = ofCase;
  if (combination !== undefined) {
    rows = ofCase.filter((row) => row.combination === combination);
    if (rows.length === 0) {
      const have = ofCase.flatMap((row) => row.combination ?? []);
      return missing(
        'combination',
        `no ${quantity} of ${member} with combination ${combination}`,
        'a combination that it has',
        have,
      );
    }
  } else if (ofCase.some((row) => row.combination === undefined)) {
    rows = ofCase.filter((row) => row.combination === undefined);
  }
  let largest = rows[0] as Demand;
  for (const row of rows) if (Math.abs(row.value) > Math.abs(largest.value)) largest = row;
  return { ok: true, value: demands.get(referenceOf(largest)) ?? largest };
}

function missing(
  what: string,
  found: string,
  expected: string,
  have: readonly string[],
): { ok: false; faults: Fault[] } {
  const names = [...new Set(have)];
  const hint = names.length === 0 ? undefined : `it has ${names.slice(0, 20).join(', ')}`;
  return {
    ok: false,
    faults: [{ code: `no-${what}`, path: '', found, expected, ...(hint === undefined ? {} : { hint }) }],
  };
}
