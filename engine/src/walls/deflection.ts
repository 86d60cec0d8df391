/** Deflection at the top of a wood-framed shear wall that stands on its own foot, from its shear. Clauses in feet, pounds and inches. */

type WallOnItsFoot = {
  /** v [lb/ft] */
  readonly unitShearPlf: number;
  /** h [ft] */
  readonly heightFt: number;
  /** b [ft] */
  readonly lengthFt: number;
  /** E·A of one end post [lb]; Infinity leaves its shortening out */
  readonly endPostStiffnessLb: number;
  /** Δ_a, vertical elongation of the hold-down system at the force that v brings [in] */
  readonly anchorSlipIn: number;
};

export type ThreeTermWall = WallOnItsFoot & {
  /** G_a [kip/in] */
  readonly apparentShearStiffnessKipPerIn: number;
};

export type FourTermWall = WallOnItsFoot & {
  /** G_v·t_v through the thickness of the panel [lb/in] */
  readonly panelRigidityLbPerIn: number;
  /** e_n, slip of a nail at the panel edge under v; see `nailSlipIn` [in] */
  readonly nailSlipIn: number;
};

/** Terms of a wall's deflection [in]; nail slip is 0 where it is part of the apparent shear stiffness. */
export type WallDeflection = {
  readonly bendingIn: number;
  readonly shearIn: number;
  readonly nailSlipIn: number;
  readonly rotationIn: number;
  readonly totalIn: number;
};

/** Source: SDPWS-2008/2015 Eq. 4.3-1 (SDPWS-2021 the same), seen quoted. */
export function threeTermWallDeflection(wall: ThreeTermWall): WallDeflection {
  const shearIn = (wall.unitShearPlf * wall.heightFt) / (1000 * wall.apparentShearStiffnessKipPerIn); // SDPWS-2015 Eq. 4.3-1
  return summed(wall, shearIn, 0);
}

/** Source: APA Technical Topic TT-053A (Feb 2007); SDPWS commentary Eq. C4.3.2-1. */
export function fourTermWallDeflection(wall: FourTermWall): WallDeflection {
  const shearIn = (wall.unitShearPlf * wall.heightFt) / wall.panelRigidityLbPerIn; // TT-053A, second term
  return summed(wall, shearIn, 0.75 * wall.heightFt * wall.nailSlipIn); // TT-053A, third term
}

function summed(wall: WallOnItsFoot, shearIn: number, nailSlipIn: number): WallDeflection {
  const { unitShearPlf, heightFt, lengthFt, endPostStiffnessLb, anchorSlipIn } = wall;
  const bendingIn = (8 * unitShearPlf * heightFt ** 3) / (endPostStiffnessLb * lengthFt); // SDPWS-2015 Eq. 4.3-1, first term
  const rotationIn = (heightFt * anchorSlipIn) / lengthFt; // SDPWS-2015 Eq. 4.3-1, third term
  return { bendingIn, shearIn, nailSlipIn, rotationIn, totalIn: bendingIn + shearIn + nailSlipIn + rotationIn };
}
