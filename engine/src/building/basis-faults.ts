/** Faults between load cases and bases of design: a basis that is not there, or that does not give the loads of the case. */
import { basisOf, hasBlock } from '../loads/basis-of.js';
import type { PlainCase } from './definition.js';
import type { Fault } from './fault.js';
import type { Parts } from './reference-faults.js';

export function basisFaults(parts: Parts): Fault[] {
  const bases = (parts.bases ?? []).flatMap((basis) => (basis === undefined ? [] : [basis]));
  const complete = bases.length === (parts.bases?.length ?? 0);
  const file = { basis: parts.basis, bases, loadCases: parts.loadCases };
  return parts.loadCases.flatMap((loadCase, c): Fault[] => {
    if (loadCase === undefined) return [];
    const basis = basisOf(file, loadCase);
    if (loadCase.basis !== undefined && basis === undefined) {
      if (!complete) return [];
      return [
        {
          code: 'unknown-basis',
          path: `loadCases[${c}].basis`,
          found: `"${loadCase.basis}"`,
          expected: 'the id of one of the file’s bases',
        },
      ];
    }
    if (loadCase.from !== 'basis') return [];
    if (hasBlock(basis, loadCase.kind)) return loadCase.kind === 'wind' ? windFaults(loadCase, c) : [];
    if (basis === undefined && bases.length > 1) {
      return [
        {
          code: 'basis-not-named',
          path: `loadCases[${c}].basis`,
          found: 'nothing, though the file has several bases of design',
          expected: 'the id of one of them',
        },
      ];
    }
    return [
      {
        code: 'no-basis',
        path: `loadCases[${c}].from`,
        found: `"basis", but ${basis === undefined ? 'the file has no basis of design' : `the basis of design has no ${loadCase.kind} block`}`,
        expected: `a basis of design that states ${loadCase.kind}, or stated forces`,
      },
    ];
  });
}

/** What wind from a basis brings with itself. */
function windFaults(loadCase: PlainCase, c: number): Fault[] {
  return (['spread', 'accidental'] as const)
    .filter((key) => loadCase[key] !== undefined)
    .map((key) => ({
      code: 'not-with-wind',
      path: `loadCases[${c}].${key}`,
      found: `"${key}" of a wind case from a basis`,
      expected: 'nothing: the load lies along the façade, and the torsional cases come with the basis',
    }));
}
