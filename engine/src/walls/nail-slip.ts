/** Slip of panel-edge nails, and the apparent shear stiffness that follows from it. Source: SDPWS commentary C4.2.2, C4.3.2. */

export type Nail = '6d' | '8d' | '10d';
export type PanelGrade = 'structural-1' | 'sheathing';

/** e_n = (V_n/strength)^power for dry framing and Structural I panels [lb]. From memory; the table of G_a that follows from it was seen and agrees. */
const law: Readonly<Record<Nail, { readonly strengthLb: number; readonly power: number }>> = {
  '6d': { strengthLb: 456, power: 3.144 },
  '8d': { strengthLb: 616, power: 3.018 },
  '10d': { strengthLb: 769, power: 3.276 },
};

/**
 * e_n [in].
 *
 * @param nailForceLb V_n, on one nail [lb]
 * Source: SDPWS commentary C4.2.2 (nail slip, framing dry at fabrication): constants from memory, see above.
 */
export function nailSlipIn(nail: Nail, nailForceLb: number, grade: PanelGrade): number {
  const { strengthLb, power } = law[nail];
  const slip = (nailForceLb / strengthLb) ** power;
  return grade === 'structural-1' ? slip : 1.2 * slip;
}

/** Force on one nail at a panel edge [lb]. */
export function nailForceLb(unitShearPlf: number, edgeSpacingIn: number): number {
  return (unitShearPlf * edgeSpacingIn) / 12;
}

export type NailedPanel = {
  readonly nail: Nail;
  readonly grade: PanelGrade;
  readonly edgeSpacingIn: number;
  /** G_v·t_v [lb/in]; 83,500 for 7/16 and 15/32 in. oriented strand board (from memory) */
  readonly panelRigidityLbPerIn: number;
};

/**
 * G_a, by which the three-term deflection equals the four-term one at the strength level 1.4·v_allowable [kip/in].
 *
 * Source: SDPWS commentary Eq. C4.2.2-3, C4.3.2.
 */
export function apparentShearStiffnessKipPerIn(panel: NailedPanel, allowableUnitShearPlf: number): number {
  const unitShearPlf = 1.4 * allowableUnitShearPlf;
  const slipIn = nailSlipIn(panel.nail, nailForceLb(unitShearPlf, panel.edgeSpacingIn), panel.grade);
  return unitShearPlf / (1000 * (unitShearPlf / panel.panelRigidityLbPerIn + 0.75 * slipIn)); // SDPWS C4.2.2-3
}
