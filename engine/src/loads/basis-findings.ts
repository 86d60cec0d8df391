/** What a basis of design reaches its limits in, and what of it governs without being stated. */
import type { Building, PlainCase } from '../building/definition.js';
import { unitVector } from '../geometry/frame.js';
import type { Finding } from '../path/result.js';
import { windOn } from './asce7/wind-forces.js';
import { LEAST_WALL_PRESSURE_PSF } from './asce7/wind-pressure.js';
import { basisOf, isAsce } from './basis-of.js';
import { baseShear } from './en1998/lateral-force.js';
import { spectrumOf } from './en1998/spectrum.js';
import { metresPer } from './units.js';

/** Findings of all load cases that take their forces from a basis. */
export function basisFindings(building: Building): Finding[] {
  return building.loadCases.flatMap((loadCase) => {
    if (loadCase.from !== 'basis') return [];
    return loadCase.kind === 'wind' ? windFindings(building, loadCase) : lateralForceFindings(building, loadCase);
  });
}

/** EN 1998-1:2004 4.3.3.2.1(2)a and 4.3.3.2.2(3); from memory, not checked against the document. */
function lateralForceFindings(building: Building, loadCase: PlainCase): Finding[] {
  const basis = basisOf(building, loadCase);
  if (basis?.standard !== 'EN 1998-1') return [];
  const { seismic } = basis;
  const elevations = building.levels.map((level) => level.elevation);
  const heightM = (Math.max(...elevations) - Math.min(...elevations)) * metresPer(building.units);
  const { period } = baseShear(seismic, heightM, building.levels.length - 1);
  const limit = Math.min(4 * spectrumOf(seismic).TC, 2);
  const head = { severity: 'warning' as const, member: loadCase.id, case: loadCase.id };
  const findings: Finding[] = [];
  if (period > limit) {
    findings.push({
      ...head,
      code: 'lateral-force-method-limit',
      sentence: `The period T₁ = ${period.toPrecision(4)} s of load case ${loadCase.id} is longer than the smaller of 4·T_C and 2 s, ${limit} s: the lateral force method does not cover it (EN 1998-1 4.3.3.2.1).`,
      numbers: { period, limit },
    });
  }
  if (seismic.period === undefined && heightM > 40) {
    findings.push({
      ...head,
      code: 'period-formula-limit',
      sentence: `The building is ${heightM.toPrecision(4)} m high: T₁ = Cₜ·H^0.75 of load case ${loadCase.id} holds up to 40 m (EN 1998-1 4.3.3.2.2). State the period.`,
      numbers: { height: heightM, limit: 40 },
    });
  }
  return findings;
}

function windFindings(building: Building, loadCase: PlainCase): Finding[] {
  const basis = basisOf(building, loadCase);
  if (!isAsce(basis) || basis.wind === undefined) return [];
  const { levels } = windOn(building, basis.standard, basis.wind, unitVector(loadCase.direction));
  return levels.flatMap(({ facade: { level }, strips }): Finding[] => {
    const governed = strips.find(({ pressure }) => pressure.least)?.pressure;
    if (governed === undefined) return [];
    const sum = governed.windwardPsf + governed.leewardPsf;
    return [
      {
        code: 'least-wind-pressure',
        severity: 'note',
        member: level,
        case: loadCase.id,
        sentence: `At level ${level} the least pressure of ${LEAST_WALL_PRESSURE_PSF} lb/ft² governs load case ${loadCase.id}; the walls would get ${sum.toPrecision(3)} lb/ft² (${basis.standard} 27.1.5).`,
        numbers: { pressurePsf: sum, leastPsf: LEAST_WALL_PRESSURE_PSF },
      },
    ];
  });
}
