/** Pressures on the walls of the main wind force resisting system, directional procedure, ASCE 7-16 and 7-22 27.3. */
import type { WindEdition } from './velocity-pressure.js';

/** ASCE 7-16 27.1.5: least pressure on the walls of an enclosed building [lb/ft²]; from memory, not checked against the document. */
export const LEAST_WALL_PRESSURE_PSF = 16;

/** Windward wall. Source: ASCE 7-16 Fig. 27.3-1. */
export const WINDWARD = 0.8;

/** Windward and leeward parapet together, GC_pn 1.5 and −1.0. Source: ASCE 7-16 27.3.4; from memory, not checked against the document. */
export const PARAPET = 2.5;

/**
 * C_p of the leeward wall, as a positive number: 0.5 up to L/B = 1, 0.3 at 2, 0.2 from 4 on, linear between.
 *
 * @param ratio L/B, the plan's dimension along the wind over that across it
 * Source: ASCE 7-16 Fig. 27.3-1; from memory, not checked against the document.
 */
export function leeward(ratio: number): number {
  if (ratio <= 1) return 0.5;
  if (ratio <= 2) return 0.5 - 0.2 * (ratio - 1);
  return ratio >= 4 ? 0.2 : 0.3 - 0.05 * (ratio - 2);
}

export type WallPressure = {
  /** Windward and leeward together; internal pressure acts on both and cancels [lb/ft²] */
  readonly netPsf: number;
  readonly windwardPsf: number;
  readonly leewardPsf: number;
  /** Whether the least pressure governs. */
  readonly least: boolean;
};

/**
 * p = q·G·C_p, windward with q_z and leeward with q_h; K_d enters here in 7-22.
 *
 * @param qz velocity pressure at the height [lb/ft²]
 * @param qh velocity pressure at mean roof height [lb/ft²]
 * Source: ASCE 7-16 Eq. 27.3-1, ASCE 7-22 Eq. 27.3-1; from memory, not checked against the documents.
 */
export function wallPressure(
  edition: WindEdition,
  {
    qz,
    qh,
    gust,
    Kd,
    ratio,
  }: { readonly qz: number; readonly qh: number; readonly gust: number; readonly Kd: number; readonly ratio: number },
): WallPressure {
  const direct = edition === 'ASCE 7-22' ? Kd : 1;
  const windwardPsf = direct * qz * gust * WINDWARD;
  const leewardPsf = direct * qh * gust * leeward(ratio);
  const sum = windwardPsf + leewardPsf;
  return {
    windwardPsf,
    leewardPsf,
    netPsf: Math.max(sum, LEAST_WALL_PRESSURE_PSF),
    least: sum < LEAST_WALL_PRESSURE_PSF,
  };
}
