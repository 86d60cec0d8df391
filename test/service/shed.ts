/** The smallest building that goes all the way: one roof on four walls, forces stated. */
import type { Building } from '@groundward/engine/building/definition';

/** @param change.force the roof's force in both directions [kN] */
export function shed({
  force = 24,
  name = 'Shed',
}: { readonly force?: number; readonly name?: string } = {}): Building {
  const line = (
    id: string,
    axis: Building['wallLines'][number]['axis'],
    to: number,
  ): Building['wallLines'][number] => ({
    id,
    axis,
    storeys: [{ under: 'roof', piers: [{ id: 'a', from: 1, to }] }],
  });
  return {
    schema: 'groundward.building/1',
    name,
    units: { length: 'm', force: 'kN' },
    levels: [
      { id: 'base', elevation: 0 },
      {
        id: 'roof',
        elevation: 3,
        diaphragms: [
          {
            id: 'all',
            outline: [[0, 0], [12, 0], [12, 6], [0, 6]], // prettier-ignore
            behaviour: 'flexible',
            weight: { area: 0.5 },
          },
        ],
      },
    ],
    wallLines: [
      line('1', [[0, 0], [0, 6]], 4), // prettier-ignore
      line('2', [[12, 0], [12, 6]], 4), // prettier-ignore
      line('A', [[0, 0], [12, 0]], 7), // prettier-ignore
      line('B', [[0, 6], [12, 6]], 7), // prettier-ignore
    ],
    loadCases: [0, 90].map((direction) => ({
      id: direction === 0 ? 'EX' : 'EY',
      kind: 'seismic' as const,
      direction,
      from: 'stated' as const,
      forces: [{ level: 'roof', force }],
    })),
    combinations: 'ASCE 7-22 allowable',
  };
}
