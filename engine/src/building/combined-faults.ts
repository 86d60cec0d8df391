/** Faults of load cases that combine others. */
import type { LoadCase } from './definition.js';
import type { Fault } from './fault.js';

export function combinedFaults(loadCases: readonly (LoadCase | undefined)[]): Fault[] {
  const complete = loadCases.every((each) => each !== undefined);
  return loadCases.flatMap((loadCase, c) => {
    if (loadCase?.from !== 'combined') return [];
    const seen = new Set<string>();
    return loadCase.parts.flatMap(({ case: id, factor }, p): Fault[] => {
      const path = `loadCases[${c}].parts[${p}]`;
      const faults: Fault[] = [];
      const part = loadCases.find((each) => each?.id === id);
      if (part === undefined ? complete : part.from === 'combined' || part.kind !== loadCase.kind) {
        faults.push({
          code: 'unknown-part',
          path: `${path}.case`,
          found:
            part === undefined ? `"${id}"` : `"${id}", ${part.from === 'combined' ? 'a combined case' : part.kind}`,
          expected: `the id of a ${loadCase.kind} load case with forces of its own`,
        });
      } else if (seen.has(id)) {
        faults.push({ code: 'part-twice', path: `${path}.case`, found: `"${id}" again`, expected: 'each part once' });
      }
      if (factor === 0) {
        faults.push({ code: 'out-of-range', path: `${path}.factor`, found: '0', expected: 'a factor other than 0' });
      }
      seen.add(id);
      return faults;
    });
  });
}
