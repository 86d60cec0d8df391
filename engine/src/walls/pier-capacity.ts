/** What a pier may carry: the design unit shear of its assembly, with the factor of slender piers. */
import { designUnitShear, type DesignUnitShear, type Format, type Hazard } from './capacity.js';
import type { PierModel } from './pier.js';
import { slenderness, type Sharing, type Slenderness } from './slender.js';
import type { StoreyModel } from './wall-line.js';

/**
 * @returns undefined where no nominal unit shear is stated for the load, or where the pier is more slender than permitted
 * Source: see `designUnitShear` and `slenderness`.
 */
export function pierCapacity(
  storey: StoreyModel,
  pier: PierModel,
  hazard: Hazard,
  format: Format,
): DesignUnitShear | undefined {
  const { wall } = pier;
  if (wall === undefined) return undefined;
  const slender = pierSlenderness(storey, pier);
  if (slender?.permitted === false) return undefined;
  return designUnitShear(wall.nominalUnitShear, hazard, wall.edition, format, {
    specificGravity: wall.specificGravity,
    aspectFactor: slender?.factor ?? 1,
  });
}

/** h/b of a pier against the limit of its sheathing; undefined where its assembly has none. */
export function pierSlenderness(storey: StoreyModel, { wall, height, length }: PierModel): Slenderness | undefined {
  if (wall === undefined || wall.sheathing === 'other') return undefined;
  return slenderness(height, length, wall.sheathing, sharingOf(storey), wall.edition);
}

/** A pier alone on its line moves as it must; several that share by length want the reduction that permits it. */
export function sharingOf({ line, piers }: StoreyModel): Sharing {
  return (line.line.shareBy ?? 'length') === 'length' && piers.length > 1 ? 'strength' : 'equal-deflection';
}
