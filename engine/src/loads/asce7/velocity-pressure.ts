/** Velocity pressure of ASCE 7-16 and 7-22, 26.10. */

export type Exposure = 'B' | 'C' | 'D';
export type WindEdition = 'ASCE 7-16' | 'ASCE 7-22';

type Profile = { readonly factor: number; readonly alpha: number; readonly zgFt: number };

/** ASCE 7-16 Table 26.11-1 and note 1 of Table 26.10-1; from memory, not checked against the document. */
const PROFILE_2016: Readonly<Record<Exposure, Profile>> = {
  B: { factor: 2.01, alpha: 7, zgFt: 1200 },
  C: { factor: 2.01, alpha: 9.5, zgFt: 900 },
  D: { factor: 2.01, alpha: 11.5, zgFt: 700 },
};

/** ASCE 7-22 Table 26.11-1 and note 1 of Table 26.10-1; from memory, not checked against the document. */
const PROFILE_2022: Readonly<Record<Exposure, Profile>> = {
  B: { factor: 2.41, alpha: 7.5, zgFt: 3280 },
  C: { factor: 2.41, alpha: 9.8, zgFt: 2460 },
  D: { factor: 2.41, alpha: 11.5, zgFt: 1935 },
};

/** Below this height K_z stays what it is there [ft] */
const LEAST_HEIGHT_FT = 15;

export function profileOf(edition: WindEdition, exposure: Exposure): Profile {
  return (edition === 'ASCE 7-16' ? PROFILE_2016 : PROFILE_2022)[exposure];
}

/**
 * K_z = 2.01·(z/z_g)^(2/α) (2.41 in 7-22), z not less than 15 ft.
 *
 * @param heightFt z [ft]
 * Source: ASCE 7-16 and 7-22 Table 26.10-1, note 1; from memory, not checked against the documents.
 */
export function exposureCoefficient(edition: WindEdition, exposure: Exposure, heightFt: number): number {
  const { factor, alpha, zgFt } = profileOf(edition, exposure);
  return factor * (Math.max(heightFt, LEAST_HEIGHT_FT) / zgFt) ** (2 / alpha);
}

/** The mean of K_z between two heights [ft], by the integral of the power law. */
export function meanExposureCoefficient(
  edition: WindEdition,
  exposure: Exposure,
  lowFt: number,
  highFt: number,
): number {
  const { factor, alpha, zgFt } = profileOf(edition, exposure);
  const power = 2 / alpha;
  const integral = (heightFt: number): number => {
    const least = factor * (LEAST_HEIGHT_FT / zgFt) ** power;
    if (heightFt <= LEAST_HEIGHT_FT) return least * heightFt;
    const above = (h: number): number => (factor * zgFt * (h / zgFt) ** (power + 1)) / (power + 1);
    return least * LEAST_HEIGHT_FT + above(heightFt) - above(LEAST_HEIGHT_FT);
  };
  if (highFt === lowFt) return exposureCoefficient(edition, exposure, lowFt);
  return (integral(highFt) - integral(lowFt)) / (highFt - lowFt);
}

export type WindSpeed = {
  /** V [mi/h] */
  readonly speedMph: number;
  readonly Kzt: number;
  readonly Kd: number;
  readonly Ke: number;
};

/**
 * q = 0.00256·K_z·K_zt·K_d·K_e·V² in 7-16; 7-22 leaves K_d to the pressure.
 *
 * @returns q [lb/ft²]
 * Source: ASCE 7-16 Eq. 26.10-1, ASCE 7-22 Eq. 26.10-1; from memory, not checked against the documents.
 */
export function velocityPressurePsf(edition: WindEdition, { speedMph, Kzt, Kd, Ke }: WindSpeed, Kz: number): number {
  const q = 0.00256 * Kz * Kzt * Ke * speedMph * speedMph;
  return edition === 'ASCE 7-16' ? q * Kd : q;
}
