/**
 * Deflection at mid-span of a wood-framed diaphragm, simply supported and evenly loaded, by the published equations.
 * Clauses in feet, pounds and inches.
 */

/** A splice in a chord: distance to the nearer support [ft], slip under the chord force there [in]. */
export type ChordSplice = { readonly distanceFt: number; readonly slipIn: number };

type DiaphragmSpan = {
  /** v, at the support [lb/ft] */
  readonly unitShearPlf: number;
  /** L, between supports [ft] */
  readonly lengthFt: number;
  /** W, depth along the load [ft] */
  readonly widthFt: number;
  /** E·A of one chord [lb]; Infinity leaves bending out */
  readonly chordStiffnessLb: number;
  /** Of both chords. */
  readonly chordSplices: readonly ChordSplice[];
};

export type ThreeTermDiaphragm = DiaphragmSpan & {
  /** G_a [kip/in] */
  readonly apparentShearStiffnessKipPerIn: number;
};

export type FourTermDiaphragm = DiaphragmSpan & {
  /** G_v·t_v through the thickness of the panel [lb/in] */
  readonly panelRigidityLbPerIn: number;
  /** e_n, slip of a nail at the panel edge under v [in] */
  readonly nailSlipIn: number;
};

/** Terms of a diaphragm's deflection [in]; nail slip is 0 where it is part of the apparent shear stiffness. */
export type DiaphragmDeflection = {
  readonly bendingIn: number;
  readonly shearIn: number;
  readonly nailSlipIn: number;
  readonly chordSlipIn: number;
  readonly totalIn: number;
};

/** Source: SDPWS-2015 Eq. 4.2-1 (SDPWS-2021 the same); from memory, not checked against the document. */
export function threeTermDiaphragmDeflection(span: ThreeTermDiaphragm): DiaphragmDeflection {
  const shearIn = (0.25 * span.unitShearPlf * span.lengthFt) / (1000 * span.apparentShearStiffnessKipPerIn); // SDPWS-2015 Eq. 4.2-1
  return summed(span, shearIn, 0);
}

/** Source: SDPWS commentary Eq. C4.2.2-1; IBC-2021 Eq. 23-1 has the same form for staples. From memory, not checked against the commentary. */
export function fourTermDiaphragmDeflection(span: FourTermDiaphragm): DiaphragmDeflection {
  const shearIn = (span.unitShearPlf * span.lengthFt) / (4 * span.panelRigidityLbPerIn); // SDPWS Eq. C4.2.2-1
  return summed(span, shearIn, 0.188 * span.lengthFt * span.nailSlipIn); // SDPWS Eq. C4.2.2-1
}

function summed(span: DiaphragmSpan, shearIn: number, nailSlipIn: number): DiaphragmDeflection {
  const { unitShearPlf, lengthFt, widthFt, chordStiffnessLb, chordSplices } = span;
  const bendingIn = (5 * unitShearPlf * lengthFt ** 3) / (8 * chordStiffnessLb * widthFt); // SDPWS-2015 Eq. 4.2-1, first term
  const chordSlipIn =
    chordSplices.reduce((sum, { distanceFt, slipIn }) => sum + distanceFt * slipIn, 0) / (2 * widthFt); // SDPWS-2015 Eq. 4.2-1, third term
  return { bendingIn, shearIn, nailSlipIn, chordSlipIn, totalIn: bendingIn + shearIn + nailSlipIn + chordSlipIn };
}
