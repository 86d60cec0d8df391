/** The equivalent lateral force procedure of ASCE 7-16 and 7-22, 12.8, and diaphragm design forces, 12.10. */
import type { AsceSeismic } from '../../building/basis.js';

/** A level with the weight that goes with it. */
export type WeighedLevel = {
  readonly level: string;
  /** Effective seismic weight [force] */
  readonly weight: number;
  /** Height above the base [ft] */
  readonly heightFt: number;
};

export type BaseShear = {
  /** Period used [s] */
  readonly period: number;
  readonly coefficient: number;
  /** S_DS used: that of the basis, or the one that 12.8.1.3 permits. */
  readonly spectral: number;
  /** Which equation gave the coefficient. */
  readonly governs: '12.8-2' | '12.8-3' | '12.8-4' | '12.8-5' | '12.8-6';
  /** Exponent of the vertical distribution. */
  readonly k: number;
};

/**
 * Seismic response coefficient.
 *
 * @param heightFt structural height h_n [ft]
 * @param storeys  above the base
 * Source: ASCE 7-16 12.8.1.1, 12.8.2, 12.8.3 (the same in 7-22); the equations from memory, not checked against the document.
 */
export function baseShear(basis: AsceSeismic, heightFt: number, storeys = Infinity): BaseShear {
  const importance = basis.importance ?? 1;
  const ratio = basis.R / importance;
  const { Ct, x } = approximatePeriod(basis);
  const approximate = Ct * heightFt ** x; // Eq. 12.8-7
  const period = basis.period === undefined ? approximate : Math.min(basis.period, upperLimit(basis.SD1) * approximate); // 12.8.2
  const longPeriod = basis.TL ?? 8;
  const spectral = spectralAcceleration(basis, period, storeys);
  let coefficient = spectral / ratio; // Eq. 12.8-2
  let governs: BaseShear['governs'] = '12.8-2';
  const most =
    period <= longPeriod
      ? basis.SD1 / (period * ratio) // Eq. 12.8-3
      : (basis.SD1 * longPeriod) / (period * period * ratio); // Eq. 12.8-4
  if (most < coefficient) {
    coefficient = most;
    governs = period <= longPeriod ? '12.8-3' : '12.8-4';
  }
  const least = Math.max(0.044 * basis.SDS * importance, 0.01); // Eq. 12.8-5
  if (least > coefficient) {
    coefficient = least;
    governs = '12.8-5';
  }
  const near = (basis.S1 ?? 0) >= 0.6 ? (0.5 * (basis.S1 ?? 0)) / ratio : 0; // Eq. 12.8-6
  if (near > coefficient) {
    coefficient = near;
    governs = '12.8-6';
  }
  const k = period <= 0.5 ? 1 : period >= 2.5 ? 2 : 0.5 * period + 0.75; // 12.8.3
  return { period, coefficient, spectral, governs, k };
}

/** Source: ASCE 7-16 Table 12.8-2, for h_n in feet; from memory, not checked against the document. */
const PERIODS = {
  'steel moment frames': { Ct: 0.028, x: 0.8 },
  'concrete moment frames': { Ct: 0.016, x: 0.9 },
  'eccentrically or buckling-restrained braced': { Ct: 0.03, x: 0.75 },
  'all other': { Ct: 0.02, x: 0.75 },
} as const;

/** C_t and x of the approximate period: as stated, else those of the system. */
export function approximatePeriod(basis: Pick<AsceSeismic, 'Ct' | 'x' | 'periodSystem'>): { Ct: number; x: number } {
  const system = PERIODS[basis.periodSystem ?? 'all other'];
  return { Ct: basis.Ct ?? system.Ct, x: basis.x ?? system.x };
}

/**
 * S_DS for C_s: 1.0, but not less than 70 % of S_DS, for a regular structure of up to five storeys with T ≤ 0.5 s and ρ = 1. What the
 * file cannot show (regular, risk category, site class) is stated by `shortPeriodCap`.
 *
 * Source: ASCE 7-16 12.8.1.3; from memory, not checked against the document.
 */
function spectralAcceleration(basis: AsceSeismic, period: number, storeys: number): number {
  const permitted =
    basis.shortPeriodCap === true &&
    storeys <= 5 &&
    period <= 0.5 &&
    (basis.redundancy ?? 1) === 1 &&
    basis.redundancyRule !== 'determined';
  return permitted ? Math.min(basis.SDS, Math.max(1, 0.7 * basis.SDS)) : basis.SDS;
}

/** C_u, linear between the table's values. Source: ASCE 7-16 Table 12.8-1; from memory, not checked against the document. */
export function upperLimit(sd1: number): number {
  const rows: readonly (readonly [number, number])[] = [
    [0.1, 1.7],
    [0.15, 1.6],
    [0.2, 1.5],
    [0.3, 1.4],
  ];
  if (sd1 <= 0.1) return 1.7;
  for (let i = 1; i < rows.length; i++) {
    const [x0, y0] = rows[i - 1] as readonly [number, number];
    const [x1, y1] = rows[i] as readonly [number, number];
    if (sd1 <= x1) return y0 + ((y1 - y0) * (sd1 - x0)) / (x1 - x0);
  }
  return 1.4;
}

/**
 * F_x = C_vx·V, C_vx = w·h^k / Σ w·h^k.
 *
 * @param shear base shear V [force]
 * @returns one force a level [force]
 * Source: ASCE 7-16 Eqs. 12.8-11 and 12.8-12.
 */
export function verticalDistribution(levels: readonly WeighedLevel[], shear: number, k: number): number[] {
  const moments = levels.map(({ weight, heightFt }) => weight * heightFt ** k);
  const total = moments.reduce((sum, moment) => sum + moment, 0);
  return moments.map((moment) => (total === 0 ? 0 : (shear * moment) / total));
}

/** A diaphragm's design force with what it lies between [force] */
export type DiaphragmForce = {
  /** F_px = (ΣF_i/Σw_i)·w_px, without floor and cap */
  readonly inertial: number;
  /** 0.2·S_DS·I_e·w_px */
  readonly least: number;
  /** 0.4·S_DS·I_e·w_px */
  readonly most: number;
};

/**
 * Diaphragm design forces with their floor and cap.
 *
 * @param levels ascending
 * @param forces storey forces F_x of the same levels [force]
 * @returns F_px [force]
 * Source: ASCE 7-16 Eqs. 12.10-1 to 12.10-3.
 */
export function diaphragmForces(
  levels: readonly { readonly weight: number }[],
  forces: readonly number[],
  basis: { readonly SDS: number; readonly importance?: number | undefined },
): number[] {
  return diaphragmLimits(levels, forces, basis).map(({ inertial, least, most }) =>
    Math.min(Math.max(inertial, least), most),
  );
}

/** What the design force of each diaphragm is chosen from; the arguments as in {@link diaphragmForces}. */
export function diaphragmLimits(
  levels: readonly { readonly weight: number }[],
  forces: readonly number[],
  basis: { readonly SDS: number; readonly importance?: number | undefined },
): DiaphragmForce[] {
  const unit = basis.SDS * (basis.importance ?? 1);
  const out: DiaphragmForce[] = [];
  let force = 0;
  let weight = 0;
  for (let i = levels.length - 1; i >= 0; i--) {
    const own = levels[i]?.weight ?? 0;
    force += forces[i] ?? 0;
    weight += own;
    out.push({
      inertial: weight === 0 ? 0 : (force / weight) * own, // Eq. 12.10-1
      least: 0.2 * unit * own, // Eq. 12.10-2
      most: 0.4 * unit * own, // Eq. 12.10-3
    });
  }
  return out.reverse();
}
