/** Many small random buildings: at most two storeys, one load case, one combination; each floor's behaviour drawn anew. */
import fc from 'fast-check';
import type { Behaviour, Building } from '@groundward/engine/building/definition';
import { buildings } from '../laws/random-building.js';

/**
 * @param behaviours from which every floor takes one
 * @returns `count` valid buildings, the same for the same seed
 */
export function smallBuildings(seed: number, count: number, behaviours: readonly Behaviour[]): Building[] {
  const drawn = fc.tuple(buildings(), fc.infiniteStream(fc.nat())).map(([building, numbers]): Building => {
    const draw = <T>(from: readonly T[]): T => from[numbers.next().value % from.length] as T;
    const levels = building.levels.slice(0, 3);
    const kept = new Set(levels.map(({ id }) => id));
    const { accidental, ...loadCase } = draw(building.loadCases.filter((each) => each.from !== 'combined'));
    const eccentric = accidental === undefined || draw([true, true, false]) ? {} : { accidental };
    return {
      ...building,
      levels: levels.map((level) => ({
        ...level,
        ...(level.diaphragms === undefined
          ? {}
          : {
              diaphragms: level.diaphragms.map((floor) => ({
                ...floor,
                behaviour: draw(behaviours),
                assembly: 'sheet',
                meshSize: 20,
              })),
            }),
      })),
      wallLines: building.wallLines
        .map((line) => ({ ...line, storeys: line.storeys.filter(({ under }) => kept.has(under)) }))
        .filter(({ storeys }) => storeys.length > 0),
      assemblies: { diaphragms: [{ id: 'sheet', apparentShearStiffness: draw([10, 1000, 1e5]) }] },
      loadCases: [
        loadCase.from === 'stated'
          ? { ...loadCase, ...eccentric, forces: loadCase.forces.filter(({ level }) => kept.has(level)) }
          : loadCase,
      ],
      combinations: [{ id: '0.6D+0.7E', factors: { D: 0.6, E: 0.7 } }],
    };
  });
  return fc.sample(drawn, { seed, numRuns: count });
}
