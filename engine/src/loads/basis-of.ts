/** Which basis of design a load case stands on. */
import type { AsceBasis, Basis } from '../building/basis.js';
import type { Building, LoadCase } from '../building/definition.js';
import { liveShareOf } from './en1998/live-share.js';

type Bases = {
  readonly basis?: Building['basis'];
  readonly bases?: Building['bases'];
  readonly loadCases: readonly (LoadCase | undefined)[];
};

/**
 * The basis that the case names; that of its first part where a combined case names none; else the file's `basis`, or the only one of
 * `bases` where the file has no other.
 *
 * @returns undefined where the case names one that is not there, or names none of several
 */
export function basisOf(file: Bases, loadCase: LoadCase): Basis | undefined {
  const { basis } = loadCase;
  if (basis !== undefined) return file.bases?.find(({ id }) => id === basis);
  if (loadCase.from === 'combined') {
    const first = file.loadCases.find((each) => each?.id === loadCase.parts[0]?.case);
    if (first !== undefined && first.from !== 'combined') return basisOf(file, first);
  }
  if (file.basis !== undefined) return file.basis;
  return file.bases?.length === 1 ? file.bases[0] : undefined;
}

/** Whether a basis is one of ASCE 7. */
export function isAsce(basis: Basis | undefined): basis is AsceBasis {
  return basis?.standard === 'ASCE 7-16' || basis?.standard === 'ASCE 7-22';
}

/** The part of live load that the forces of a case move; 0 for all but earthquake from EN 1998-1. */
export function liveShare(file: Bases, loadCase: LoadCase): number {
  if (loadCase.kind !== 'seismic') return 0;
  const basis = basisOf(file, loadCase);
  return basis?.standard === 'EN 1998-1' ? liveShareOf(basis.seismic) : 0;
}

/** Whether a basis states what a load case from it needs. */
export function hasBlock(basis: Basis | undefined, kind: 'seismic' | 'wind'): boolean {
  if (kind === 'seismic') return basis?.seismic !== undefined;
  return isAsce(basis) && basis.wind !== undefined;
}
