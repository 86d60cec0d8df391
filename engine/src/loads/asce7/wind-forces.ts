/** Storey forces and line loads of wind on the main system, from the outlines and the basis of design. */
import type { AsceWind } from '../../building/basis.js';
import type { Building, Point } from '../../building/definition.js';
import type { LoadPiece } from '../../statics/span-load.js';
import { facadeAcross, type FacadePart, type LevelFacade } from '../facade.js';
import { feetPer, psfIn, speedInMph } from '../units.js';
import {
  exposureCoefficient,
  meanExposureCoefficient,
  velocityPressurePsf,
  type WindEdition,
  type WindSpeed,
} from './velocity-pressure.js';
import { PARAPET, wallPressure, type WallPressure } from './wind-pressure.js';

export type WindStrip = {
  readonly part: FacadePart;
  readonly Kz: number;
  /** q at the strip and at mean roof height [lb/ft²] */
  readonly qz: number;
  readonly pressure: WallPressure;
  /** Of the parapet, where there is one [lb/ft²] */
  readonly parapetPsf: number;
  /** Load per unit span [force/length] */
  readonly load: number;
};

export type WindLevel = {
  readonly facade: LevelFacade;
  readonly strips: readonly WindStrip[];
  /** Load per unit span along s, windward and leeward together [force/length] */
  readonly line: readonly LoadPiece[];
  /** [force] */
  readonly force: number;
};

export type Wind = {
  /** q at mean roof height [lb/ft²] */
  readonly qh: number;
  readonly heightFt: number;
  readonly levels: readonly WindLevel[];
};

/**
 * @param direction unit vector of the wind
 * @returns levels above the ground with a floor, ascending
 */
export function windOn(building: Building, edition: WindEdition, basis: AsceWind, direction: Point): Wind {
  const { units } = building;
  const ground = basis.ground ?? Math.min(...building.levels.map((level) => level.elevation));
  const feet = feetPer(units);
  const facades = facadeAcross(building, direction, ground);
  const { Kzt = 1, Kd = 0.85, Ke = 1, G: gust = 0.85, exposure } = basis; // ASCE 7-16 26.8.2, Table 26.6-1, 26.9, 26.11.1
  const speed: WindSpeed = { speedMph: speedInMph(units, basis.V), Kzt, Kd, Ke };
  const heightFt = (basis.roofHeight ?? facades[facades.length - 1]?.height ?? 0) * feet;
  const pressureAt = (Kz: number): number => velocityPressurePsf(edition, speed, Kz);
  const qh = pressureAt(exposureCoefficient(edition, exposure, heightFt));
  const perPsf = psfIn(units);
  const levels = facades.map((facade): WindLevel => {
    const ratio = facade.along / facade.across;
    const strips = facade.parts.map((part): WindStrip => {
      const Kz =
        basis.heightRule === 'mean'
          ? meanExposureCoefficient(edition, exposure, part.low * feet, part.high * feet)
          : exposureCoefficient(edition, exposure, facade.height * feet);
      const qz = pressureAt(Kz);
      const pressure = wallPressure(edition, { qz, qh, gust, Kd, ratio });
      const parapet = part.roof ? (basis.parapet ?? 0) : 0;
      const top = pressureAt(exposureCoefficient(edition, exposure, (facade.height + parapet) * feet));
      const parapetPsf = parapet === 0 ? 0 : top * PARAPET * (edition === 'ASCE 7-22' ? Kd : 1);
      const load = perPsf * (pressure.netPsf * (part.high - part.low) + parapetPsf * parapet);
      return { part, Kz, qz, pressure, parapetPsf, load };
    });
    const line = strips.map(({ part: { from, to }, load }): LoadPiece => ({ from, to, w: [load] }));
    return {
      facade,
      strips,
      line,
      force: strips.reduce((sum, { part, load }) => sum + load * (part.to - part.from), 0),
    };
  });
  return { qh, heightFt, levels };
}
