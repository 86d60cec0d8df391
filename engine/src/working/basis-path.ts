/** Where the file says which basis of design a load case stands on. */
import type { Basis } from '../building/basis.js';
import type { Building, LoadCase } from '../building/definition.js';
import { basisOf } from '../loads/basis-of.js';

/** The basis and its path: `basis`, or `bases[i]`; undefined where the case stands on none. */
export function basisPlace(building: Building, loadCase: LoadCase): { basis: Basis; path: string } | undefined {
  const basis = basisOf(building, loadCase);
  if (basis === undefined) return undefined;
  const index = building.bases?.findIndex((candidate) => candidate === basis) ?? -1;
  return { basis, path: index < 0 ? 'basis' : `bases[${index}]` };
}
