/** The load combinations of EN 1990 for buildings, ultimate limit states. */
import type { FactoredCombination } from '../combinations.js';

type Term = { readonly D?: number; readonly L?: number; readonly Lr?: number; readonly S?: number };

const set = (
  id: string,
  applies: FactoredCombination['applies'],
  { D = 0, L = 0, Lr = 0, S = 0 }: Term,
  lateral: number,
): FactoredCombination => ({ id, applies, gravity: { D, L, Lr, S }, lateral });

/**
 * Persistent and transient situations by Eq. 6.10 with γ_G 1.35 or 1.0 (Table A1.2(B)) and 0.9 for the loss of equilibrium
 * (Table A1.2(A)), γ_Q 1.5; seismic situations by Eq. 6.12b. ψ₀ 0.7 for L of categories A to D, 0 for roofs that are only maintained
 * (Lr), 0.5 for S below 1000 m, 0.6 for W; ψ₂ 0.3 for L of categories A and B, 0 for Lr and S (Table A1.1).
 *
 * Source: EN 1990:2002; from memory, not checked against the document.
 */
export function en1990Combinations(): readonly FactoredCombination[] {
  return SET;
}

const SET: readonly FactoredCombination[] = [
  set('1.35D', 'gravity', { D: 1.35 }, 0),
  set('1.35D+1.5L+0.75S', 'gravity', { D: 1.35, L: 1.5, S: 0.75 }, 0),
  set('1.35D+1.05L+1.5S', 'gravity', { D: 1.35, L: 1.05, S: 1.5 }, 0),
  set('1.35D+1.05L+1.5Lr', 'gravity', { D: 1.35, L: 1.05, Lr: 1.5 }, 0),
  set('1.35D+1.5W+1.05L+0.75S', 'wind', { D: 1.35, L: 1.05, S: 0.75 }, 1.5),
  set('1.35D+0.9W+1.5L+0.75S', 'wind', { D: 1.35, L: 1.5, S: 0.75 }, 0.9),
  set('1.35D+0.9W+1.05L+1.5S', 'wind', { D: 1.35, L: 1.05, S: 1.5 }, 0.9),
  set('D+1.5W', 'wind', { D: 1 }, 1.5),
  set('0.9D+1.5W', 'wind', { D: 0.9 }, 1.5),
  set('D+E+0.3L', 'seismic', { D: 1, L: 0.3 }, 1),
  set('D+E', 'seismic', { D: 1 }, 1),
];
