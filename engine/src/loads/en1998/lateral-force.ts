/** The lateral force method of analysis of EN 1998-1, 4.3.3.2. */
import type { EnSeismic } from '../../building/basis.js';
import { designSpectrum, spectrumOf, type DesignOrdinate } from './spectrum.js';

export type BaseShear = {
  /** T₁ [s] */
  readonly period: number;
  readonly spectrum: DesignOrdinate;
  readonly lambda: number;
  /** F_b over the weight. */
  readonly coefficient: number;
};

/**
 * Base shear F_b = S_d(T₁)·m·λ, over the weight m·g.
 *
 * @param heightM height of the building above the base [m]
 * @param storeys number of storeys
 * Source: EN 1998-1:2004 4.3.3.2.2; from memory, not checked against the document.
 */
export function baseShear(basis: EnSeismic, heightM: number, storeys: number): BaseShear {
  const period = basis.period ?? (basis.Ct ?? 0.05) * heightM ** 0.75; // Eq. 4.6
  const { TC } = spectrumOf(basis);
  const lambda = basis.lambda ?? (period <= 2 * TC && storeys > 2 ? 0.85 : 1); // 4.3.3.2.2(1)
  const spectrum = designSpectrum(basis, period);
  return { period, spectrum, lambda, coefficient: spectrum.ratio * lambda }; // Eq. 4.5
}

/**
 * F_i = F_b·z_i·m_i / Σ z_j·m_j.
 *
 * @param shear base shear F_b [force]
 * @returns one force a level [force]
 * Source: EN 1998-1:2004 Eq. 4.11.
 */
export function verticalDistribution(
  levels: readonly { readonly weight: number; readonly height: number }[],
  shear: number,
): number[] {
  const total = levels.reduce((sum, { weight, height }) => sum + weight * height, 0);
  return levels.map(({ weight, height }) => (shear * weight * height) / total);
}
