/** The design spectrum of EN 1998-1 for elastic analysis, and the recommended values of its elastic spectra. */
import type { EnSeismic } from '../../building/basis.js';

/** Corner periods [s] and soil factor of an elastic spectrum. */
export type Spectrum = { readonly S: number; readonly TB: number; readonly TC: number; readonly TD: number };

type GroundType = EnSeismic['groundType'];

const row = (S: number, TB: number, TC: number, TD: number): Spectrum => ({ S, TB, TC, TD });

/** EN 1998-1:2004 Table 3.2; from memory, not checked against the document. */
const TYPE_1: Readonly<Record<GroundType, Spectrum>> = {
  A: row(1, 0.15, 0.4, 2),
  B: row(1.2, 0.15, 0.5, 2),
  C: row(1.15, 0.2, 0.6, 2),
  D: row(1.35, 0.2, 0.8, 2),
  E: row(1.4, 0.15, 0.5, 2),
};

/** EN 1998-1:2004 Table 3.3; from memory, not checked against the document. */
const TYPE_2: Readonly<Record<GroundType, Spectrum>> = {
  A: row(1, 0.05, 0.25, 1.2),
  B: row(1.35, 0.05, 0.25, 1.2),
  C: row(1.5, 0.1, 0.25, 1.2),
  D: row(1.8, 0.1, 0.3, 1.2),
  E: row(1.6, 0.05, 0.25, 1.2),
};

export function spectrumOf({ groundType, spectrum = 'type 1' }: EnSeismic): Spectrum {
  return (spectrum === 'type 1' ? TYPE_1 : TYPE_2)[groundType];
}

export type DesignOrdinate = {
  /** S_d(T) over the acceleration of gravity. */
  readonly ratio: number;
  readonly governs: '3.13' | '3.14' | '3.15' | '3.16' | 'lower bound';
};

/**
 * Design spectrum S_d(T), over g.
 *
 * @param period T [s]
 * Source: EN 1998-1:2004 3.2.2.5(4); from memory, not checked against the document.
 */
export function designSpectrum(basis: EnSeismic, period: number): DesignOrdinate {
  const { S, TB, TC, TD } = spectrumOf(basis);
  const ground = (basis.importance ?? 1) * basis.agR; // a_g = γ_I·a_gR, 3.2.1(3)
  const plateau = (ground * S * 2.5) / basis.q;
  const { ratio, governs }: DesignOrdinate =
    period < TB
      ? { ratio: ground * S * (2 / 3 + (period / TB) * (2.5 / basis.q - 2 / 3)), governs: '3.13' } // Eq. 3.13
      : period <= TC
        ? { ratio: plateau, governs: '3.14' } // Eq. 3.14
        : period <= TD
          ? { ratio: (plateau * TC) / period, governs: '3.15' } // Eq. 3.15
          : { ratio: (plateau * TC * TD) / (period * period), governs: '3.16' }; // Eq. 3.16
  const least = (basis.beta ?? 0.2) * ground;
  return period > TC && least > ratio ? { ratio: least, governs: 'lower bound' } : { ratio, governs };
}
