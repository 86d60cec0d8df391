import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Building } from '@groundward/engine/building/definition';
import { analyse } from '@groundward/engine/path/analyse';
import type { Analysis, Demand } from '@groundward/engine/path/result';
import { buildings } from './random-building.js';

function analysed(building: Building): Analysis {
  const result = analyse(building);
  if (!result.ok) throw new Error(JSON.stringify(result.faults));
  return result.value;
}

/** Seismic cases whose diaphragm forces are the storey forces, so that both sets of forces are one. */
function oneSet(building: Building, basis: Building['basis']): Building {
  const { basis: _, ...rest } = building;
  return {
    ...rest,
    ...(basis === undefined ? {} : { basis }),
    loadCases: building.loadCases.map((loadCase) =>
      loadCase.from === 'stated'
        ? { ...loadCase, kind: 'seismic', forces: loadCase.forces.map(({ level, force }) => ({ level, force })) }
        : loadCase,
    ),
  };
}

test('collectors of one set of forces with Ω₀ are Ω₀ times those without: inertia and transfers add up in every building', () => {
  const seismic = { SDS: 1, SD1: 0.6, R: 6.5, overstrength: 2.5, designCategory: 'D' } as const;
  let compared = 0;
  fc.assert(
    fc.property(buildings(), (building) => {
      const plain = analysed(oneSet(building, undefined)).demands.filter(({ kind }) => kind === 'collector');
      const raised = analysed(oneSet(building, { standard: 'ASCE 7-16', seismic })).demands;
      const key = ({ member, case: id, sense }: Demand, quantity: string): string =>
        `${member}|${quantity}|${id}|${sense}`;
      const design = new Map(raised.map((row) => [key(row, row.quantity), row]));
      const scale = Math.max(...plain.map(({ value }) => value), 1);
      for (const row of plain) {
        const found = design.get(key(row, row.quantity === 'axial-tension' ? 'design-tension' : 'design-compression'));
        if (found === undefined) throw new Error(`no design force of ${row.member} under ${row.case}`);
        if (Math.abs(found.value - 2.5 * row.value) > 1e-9 * scale)
          throw new Error(`${row.member} ${row.quantity} ${row.case}: ${found.value} against 2.5 · ${row.value}`);
        compared += 1;
      }
    }),
    { numRuns: 25, seed: 20267, endOnFailure: true },
  );
  expect(compared).toBeGreaterThan(1000);
});
