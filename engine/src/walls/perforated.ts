/**
 * Perforated walls: full-height segments beside openings, held down at the two ends of the wall only.
 * Any one unit of length and of force. Source: SDPWS-2015 4.3.3.5, 4.3.6.1.1, 4.3.6.4.1.1.
 */
import type { Edition, Hazard } from './capacity.js';

export type PerforatedWall = {
  readonly height: number;
  /** L_tot, from end to end of the outermost full-height segments */
  readonly length: number;
  /** ΣL_i of the full-height segments, slender ones with their reduced length; see `segmentLength` */
  readonly segments: readonly number[];
  /** A_o, of all openings [length²] */
  readonly openingArea: number;
};

export type OpeningFactor = {
  /** r */
  readonly areaRatio: number;
  /** C_o, at most 1 */
  readonly factor: number;
  /** ΣL_i */
  readonly fullHeight: number;
};

/**
 * C_o.
 *
 * @throws RangeError when the wall has no height, length or full-height segment, or its segments are longer than itself
 * Source: SDPWS-2015 Eq. 4.3-5, 4.3-6; formula seen second-hand, its number in the document from memory.
 */
export function openingFactor({ height, length, segments, openingArea }: PerforatedWall): OpeningFactor {
  const fullHeight = segments.reduce((sum, segment) => sum + segment, 0);
  if (!(height > 0 && length > 0 && fullHeight > 0 && openingArea >= 0 && segments.every((segment) => segment >= 0))) {
    throw new RangeError('a perforated wall wants a height, a length and a full-height segment');
  }
  if (fullHeight > length * (1 + 1e-9)) throw new RangeError(`segments of ${fullHeight} in a wall of ${length}`);
  const areaRatio = 1 / (1 + openingArea / (height * fullHeight)); // SDPWS-2015 Eq. 4.3-6
  const factor = Math.min(1, ((areaRatio / (3 - 2 * areaRatio)) * length) / fullHeight); // SDPWS-2015 Eq. 4.3-5
  return { areaRatio, factor, fullHeight };
}

/**
 * C_o where all openings have one height and reach between full-height segments: the form of the table.
 *
 * @param fullHeightPart ΣL_i/L_tot, above 0 and at most 1
 * @param openingPart    height of the openings over height of the wall, 0 to 1
 * @throws RangeError outside those bounds
 * Source: SDPWS-2015 Table 4.3.3.5 by Eq. 4.3-5: C_o = 1/(B(1 − 3A) + 3A).
 */
export function openingFactorOfEqualOpenings(fullHeightPart: number, openingPart: number): number {
  const [B, A] = [fullHeightPart, openingPart];
  if (!(B > 0 && B <= 1 && A >= 0 && A <= 1)) throw new RangeError(`no wall with parts ${B} and ${A}`);
  return Math.min(1, 1 / (B * (1 - 3 * A) + 3 * A));
}

/**
 * What a full-height segment counts in ΣL_i: its length, reduced by 2b/h above h/b = 2, nothing above 3.5.
 *
 * Source: SDPWS-2015 4.3.4.3; from memory, not checked against the document.
 */
export function segmentLength(height: number, length: number): number {
  const ratio = height / length;
  if (ratio > 3.5 * (1 + 1e-9)) return 0;
  return ratio > 2 ? (length * 2) / ratio : length;
}

/** V = v·C_o·ΣL_i [force]. Source: P. Line, Perforated Shear Wall Design, Eq. 1; SDPWS-2015 4.3.3.5. */
export function perforatedCapacity(unitShear: number, wall: PerforatedWall): number {
  const { factor, fullHeight } = openingFactor(wall);
  return unitShear * factor * fullHeight;
}

export type PerforatedDemand = {
  /**
   * v_max = V/(C_o ΣL_i) [force/length]: shear at the foot and uplift between the ends, along every full-height segment; the unit shear of the
   * wall's deflection, with b = ΣL_i (SDPWS-2015 4.3.2.1)
   */
  readonly unitShear: number;
  /** T = C at both ends of the wall, from shear alone [force] */
  readonly endForce: number;
};

/**
 * @param shear V on the whole wall [force]
 * Source: SDPWS-2015 Eq. 4.3-8, 4.3-9 with 4.3.6.4.1, 4.3.6.4.2.1; equation numbers from memory, not checked against the document.
 */
export function perforatedDemand(shear: number, wall: PerforatedWall): PerforatedDemand {
  const { factor, fullHeight } = openingFactor(wall);
  const unitShear = Math.abs(shear) / (factor * fullHeight);
  return { unitShear, endForce: unitShear * wall.height };
}

/**
 * The nominal unit shear of a wall sheathed on one side that may be counted in a perforated wall [lb/ft].
 *
 * Source: SDPWS-2015 4.3.5.3: 1740 seismic, 2435 wind; in the 2021 edition the one nominal value is that of wind: derived. From memory, not checked
 * against the documents.
 */
export function perforatedNominalLimitPlf(hazard: Hazard, edition: Edition): number {
  return edition === '2015' && hazard === 'seismic' ? 1740 : 2435;
}
