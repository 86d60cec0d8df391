/** The part of live load that belongs to the seismic mass. */
import type { EnSeismic } from '../../building/basis.js';

/** ψ₂ = 0.3 of categories A and B, φ = 1: EN 1990:2002 Table A1.1, EN 1998-1:2004 4.2.4; from memory, not checked against the documents. */
export const DEFAULT_PSI_E = 0.3;

/** ψ_E = φ·ψ₂. Source: EN 1998-1:2004 Eq. 4.2. */
export function liveShareOf({ psiE = DEFAULT_PSI_E }: EnSeismic): number {
  return psiE;
}
