/** From a nominal unit shear to the one that a design may use: by edition and format of SDPWS, and by species of the framing. */

/** Edition of the AWC Special Design Provisions for Wind and Seismic. */
export type Edition = '2015' | '2021';

/** Allowable stress design, or load and resistance factor design. */
export type Format = 'allowable' | 'strength';

export type Hazard = 'seismic' | 'wind';

/** By load; in the 2021 edition both are the one nominal value that it prints. */
export type NominalUnitShear = { readonly seismic?: number; readonly wind?: number };

export type DesignUnitShear = {
  /** [force/length], in the units of the nominal value */
  readonly unitShear: number;
  readonly nominal: number;
  /** The nominal value is multiplied by it. */
  readonly formatFactor: number;
  readonly speciesFactor: number;
  readonly aspectFactor: number;
  readonly clause: string;
};

/**
 * @param nominal      as the edition in use prints it, or as the engineer states it [force/length]
 * @param specificGravity  of the framing; default 0.50, for which the tables are made
 * @param aspectFactor of a slender pier, see `slenderness`; default 1
 * @returns undefined where no nominal value is stated for this load
 * @throws RangeError when specific gravity is not between 0 and 1.5
 * Source: SDPWS-2015 4.2.3, 4.3.3; SDPWS-2021 4.1.4; from memory, not checked against the documents.
 */
export function designUnitShear(
  nominal: NominalUnitShear,
  hazard: Hazard,
  edition: Edition,
  format: Format,
  {
    specificGravity = 0.5,
    aspectFactor = 1,
  }: { readonly specificGravity?: number; readonly aspectFactor?: number } = {},
): DesignUnitShear | undefined {
  const value = nominal[hazard];
  if (value === undefined) return undefined;
  const { factor, clause } = formatFactor(hazard, edition, format);
  const species = speciesFactor(specificGravity);
  return {
    unitShear: value * factor * species * aspectFactor,
    nominal: value,
    formatFactor: factor,
    speciesFactor: species,
    aspectFactor,
    clause,
  };
}

/**
 * What a nominal unit shear is multiplied by.
 *
 * Source: SDPWS-2015 4.2.3, 4.3.3: allowable v/2.0, strength 0.80 v; SDPWS-2021 4.1.4: allowable v/2.0 for wind and v/2.8 for seismic,
 * strength 0.80 v for wind and 0.50 v for seismic. From memory, not checked against the documents.
 */
export function formatFactor(hazard: Hazard, edition: Edition, format: Format): { factor: number; clause: string } {
  if (edition === '2015') {
    const clause = 'SDPWS-2015 4.2.3, 4.3.3';
    return { factor: format === 'allowable' ? 1 / 2 : 0.8, clause };
  }
  const clause = 'SDPWS-2021 4.1.4';
  if (hazard === 'wind') return { factor: format === 'allowable' ? 1 / 2 : 0.8, clause };
  return { factor: format === 'allowable' ? 1 / 2.8 : 0.5, clause };
}

/**
 * Factor on nominal unit shear for framing other than the tables' (specific gravity 0.50), never above 1.
 *
 * @throws RangeError when specific gravity is not between 0 and 1.5
 * Source: SDPWS-2008/2015 Table 4.2A note 2, Table 4.3A note 3.
 */
export function speciesFactor(specificGravity: number): number {
  if (!(specificGravity > 0 && specificGravity < 1.5)) {
    throw new RangeError(`specific gravity ${specificGravity} is not between 0 and 1.5`);
  }
  return Math.min(1, 1 - (0.5 - specificGravity));
}
