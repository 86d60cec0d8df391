/** Load combinations as factors on components. */
import type { Building, GravityCase, LoadCase } from '../building/definition.js';
import type { Combinations } from '../building/combination.js';
import { asceCombinations, overstrengthCombinations } from './asce7/combinations.js';
import { basisOf, isAsce } from './basis-of.js';
import { en1990Combinations } from './en1990/combinations.js';

export type FactoredCombination = {
  readonly id: string;
  readonly applies: 'gravity' | 'seismic' | 'wind';
  /** With ±0.2·S_DS on D where a published set of ASCE 7 meets a basis that states it. */
  readonly gravity: Readonly<Record<GravityCase, number>>;
  /** On the lateral case's own effect; with ρ in the published sets of ASCE 7. */
  readonly lateral: number;
};

/**
 * The combinations that a load case enters: of the set of its basis, or of the file's where the basis names none.
 *
 * @param redundancy ρ where it is not the one that the basis states
 */
export function combinationsFor(
  building: Building,
  loadCase: LoadCase,
  redundancy?: number,
): readonly FactoredCombination[] {
  return setOf(building, loadCase, redundancy).filter(({ applies }) => applies === loadCase.kind);
}

/** The forms with overstrength of the combinations that a load case enters; none where the set is the file's own list. */
export function overstrengthFor(
  building: Building,
  loadCase: LoadCase,
  factor: number,
): readonly FactoredCombination[] {
  const basis = basisOf(building, loadCase);
  const named = basis?.combinations ?? building.combinations;
  if (!isAsce(basis) || basis.seismic === undefined || loadCase.kind !== 'seismic') return [];
  if (named === undefined || typeof named !== 'string' || named === 'EN 1990') return [];
  return overstrengthCombinations(named, basis.seismic, factor);
}

/** Combinations of gravity alone: of every set that a load case takes, each once. */
export function gravityCombinations(building: Building): readonly FactoredCombination[] {
  const found = new Map<string, FactoredCombination>();
  for (const loadCase of building.loadCases) {
    for (const combination of setOf(building, loadCase)) {
      if (combination.applies === 'gravity' && !found.has(combination.id)) found.set(combination.id, combination);
    }
  }
  return [...found.values()];
}

/**
 * The format of the combinations that a load case enters: allowable stress or strength.
 *
 * @returns undefined where they are a list of the file's own, or none
 */
export function formatFor(building: Building, loadCase: LoadCase): 'allowable' | 'strength' | undefined {
  const named = basisOf(building, loadCase)?.combinations ?? building.combinations;
  if (typeof named !== 'string') return undefined;
  return named.endsWith('allowable') ? 'allowable' : 'strength';
}

function setOf(building: Building, loadCase: LoadCase, redundancy?: number): readonly FactoredCombination[] {
  const basis = basisOf(building, loadCase);
  const named: Combinations | undefined = basis?.combinations ?? building.combinations;
  if (named === undefined) return [];
  if (named === 'EN 1990') return en1990Combinations();
  if (typeof named === 'string') {
    const seismic = isAsce(basis) ? basis.seismic : undefined;
    return asceCombinations(
      named,
      seismic === undefined || redundancy === undefined ? seismic : { ...seismic, redundancy },
    );
  }
  return named.map(({ id, factors }) => ({
    id,
    applies: factors.E !== undefined ? 'seismic' : factors.W !== undefined ? 'wind' : 'gravity',
    gravity: { D: factors.D ?? 0, L: factors.L ?? 0, Lr: factors.Lr ?? 0, S: factors.S ?? 0 },
    lateral: factors.E ?? factors.W ?? 0,
  }));
}
