/** Load combinations as factors on components. */
import type { Building, GravityCase } from '../building/definition.js';

export type FactoredCombination = {
  readonly id: string;
  readonly applies: 'gravity' | 'seismic' | 'wind';
  readonly gravity: Readonly<Record<GravityCase, number>>;
  readonly lateral: number;
};

/** The combinations that the building names or lists. */
export function combinationsOf(building: Building): readonly FactoredCombination[] {
  const named = building.combinations;
  if (named === undefined || typeof named === 'string') return [];
  return named.map(({ id, factors }) => ({
    id,
    applies: factors.E !== undefined ? 'seismic' : factors.W !== undefined ? 'wind' : 'gravity',
    gravity: { D: factors.D ?? 0, L: factors.L ?? 0, Lr: factors.Lr ?? 0, S: factors.S ?? 0 },
    lateral: factors.E ?? factors.W ?? 0,
  }));
}
