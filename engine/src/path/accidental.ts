/** Accidental torsion where the standard asks for it, and only there. */
import type { Building } from '../building/definition.js';
import { basisOf, isAsce } from '../loads/basis-of.js';
import { edgeDrifts, torsionalRatio } from './level-demands.js';
import type { Model } from './model.js';
import type { Finding } from './result.js';
import type { CaseRun } from './run.js';
import type { SubCase } from './cases.js';

/**
 * The eccentric sub-cases that a basis adds to a case without an eccentricity of its own: ±5 %, amplified in categories C to F.
 *
 * @returns nothing where the basis leaves accidental torsion to the case, where no diaphragm can turn, or in category A
 * Source: ASCE 7-16 12.8.4.2 and 12.8.4.3; from memory, not checked against the document.
 */
export function requiredEccentricities(building: Building, model: Model, whole: SubCase): SubCase[] {
  const basis = basisOf(building, whole.loadCase);
  const { kind, from } = whole.loadCase;
  if (kind !== 'seismic' || from !== 'basis' || !isAsce(basis)) return [];
  const category = basis.seismic?.designCategory;
  if (basis.seismic?.accidentalTorsion !== 'required' || category === 'A' || !turns(model)) return [];
  // Extreme irregularity alone asks for it in category B; without a category the others' rule is taken.
  const neededAbove = category === 'B' ? 1.4 : 1.2;
  return [0.05, -0.05].map((eccentricity) => ({
    ...whole,
    id: `${whole.id}/${eccentricity > 0 ? '+' : '-'}e`,
    eccentricity,
    amplified: category !== 'B',
    neededAbove,
  }));
}

function turns(model: Model): boolean {
  return model.levels.some(({ diaphragms }) => diaphragms.some(({ behaviour }) => behaviour !== 'flexible'));
}

/** Without the eccentric runs that no irregularity asks for, and what decided on them. */
export function neededRuns(runs: readonly CaseRun[]): { runs: CaseRun[]; findings: Finding[] } {
  const ratios = new Map<string, number>();
  for (const run of runs) {
    if (run.subCase.neededAbove === undefined) continue;
    const id = run.subCase.loadCase.id;
    ratios.set(id, Math.max(ratios.get(id) ?? 0, largestRatio(run)));
  }
  const kept = runs.filter(({ subCase: { neededAbove, loadCase } }) => {
    return neededAbove === undefined || (ratios.get(loadCase.id) ?? 0) > neededAbove;
  });
  const findings = [...ratios].flatMap(([id, ratio]): Finding[] => {
    const limit = runs.find(({ subCase }) => subCase.loadCase.id === id && subCase.neededAbove !== undefined)?.subCase
      .neededAbove;
    if (limit === undefined || ratio > limit) return [];
    return [
      {
        code: 'accidental-torsion-not-needed',
        severity: 'note',
        member: id,
        case: id,
        sentence: `With an eccentricity of 5 % the largest edge drift under ${id} is ${ratio.toPrecision(4)} times the average, not more than ${limit}: no accidental torsion in its forces (ASCE 7-16 12.8.4.2).`,
        numbers: { ratio, limit },
      },
    ];
  });
  return { runs: kept, findings };
}

function largestRatio(run: CaseRun): number {
  const ratios = (run.plain?.outcomes ?? run.outcomes).flatMap((outcome) =>
    (outcome?.diaphragms ?? []).map((diaphragm) => torsionalRatio(edgeDrifts(diaphragm, run.subCase)) ?? 0),
  );
  return Math.max(0, ...ratios);
}

/** Seismic cases of ASCE 7 that run without accidental torsion though a diaphragm can turn. */
export function withoutAccidental(building: Building, model: Model): Finding[] {
  if (!turns(model)) return [];
  return building.loadCases.flatMap((loadCase): Finding[] => {
    const basis = basisOf(building, loadCase);
    if (loadCase.kind !== 'seismic' || loadCase.from !== 'basis' || loadCase.accidental !== undefined) return [];
    if (!isAsce(basis) || basis.seismic?.accidentalTorsion === 'required' || basis.seismic?.designCategory === 'A')
      return [];
    return [
      {
        code: 'no-accidental-torsion',
        severity: 'note',
        member: loadCase.id,
        case: loadCase.id,
        sentence: `${loadCase.id} states no accidental eccentricity and its basis adds none: irregularity is judged, and forces are found, without it (ASCE 7-16 12.8.4.2).`,
      },
    ];
  });
}
