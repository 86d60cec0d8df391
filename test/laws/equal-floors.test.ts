import { expect, test } from 'vitest';
import { bodiesOf } from '@groundward/engine/path/bodies';
import { buildModel } from '@groundward/engine/path/model';
import { analyse } from '@groundward/engine/path/analyse';
import type { Building } from '@groundward/engine/building/definition';
import { across, buildingOf, lengthwise, rectangle } from './semi-rigid-floor.js';

/** Two storeys of one plan; the upper floor as it is changed. */
function twoStoreys(k: number): Building {
  const walls = [across('a', 0, 10, 100), across('b', 20, 10, 100), lengthwise('c', 5, 0, 20, 100)];
  const one = buildingOf({ outline: rectangle(0, 0, 20, 10), walls, direction: 90 });
  const floor = one.levels[1]?.diaphragms?.[0];
  if (floor === undefined) throw new Error('no floor');
  const assembly = { ...floor, assembly: 'sheet' };
  return {
    ...one,
    levels: one.levels.map((level, i) => (i === 0 ? level : { ...level, diaphragms: [assembly] })),
    wallLines: one.wallLines.map((line) => ({
      ...line,
      storeys: line.storeys.flatMap((storey) => [
        storey,
        { under: 'roof', piers: storey.piers.map((pier) => ({ ...pier, stiffness: k })) },
      ]),
    })),
    assemblies: { diaphragms: [{ id: 'sheet', apparentShearStiffness: 500 }] },
  };
}

const factors = (building: Building) =>
  [...bodiesOf(buildModel(building)).values()].map((body) => body.semiRigid?.model.factor);

test('floors of one plan on equal walls are meshed and factored once, on other walls each for itself', () => {
  const [lower, upper] = factors(twoStoreys(100));
  expect(upper).toBe(lower);
  const [first, second] = factors(twoStoreys(50));
  expect(second).not.toBe(first);
});

test('a shared factor changes no demand', () => {
  const shears = (building: Building) => {
    const result = analyse(building);
    if (!result.ok) throw new Error(JSON.stringify(result.faults));
    return result.value.demands.filter(({ member, quantity }) => member.endsWith('/floor') && quantity === 'shear');
  };
  // A wall stiffer by next to nothing has a factor of its own.
  const [shared, own] = [shears(twoStoreys(100)), shears(twoStoreys(100 + 1e-9))];
  expect(shared.length).toBeGreaterThan(0);
  shared.forEach((row, i) => expect(row.value).toBeCloseTo(own[i]?.value ?? NaN, 9));
});
