/** What the standard of a case's basis asks for beyond its forces, given how the building stands. */
import type { Building, LoadCase } from '../building/definition.js';
import { seismicRules, type SeismicRules } from '../loads/asce7/overstrength.js';
import { basisOf, isAsce } from '../loads/basis-of.js';
import type { PostDescent } from '../walls/posts.js';
import type { Model } from './model.js';
import { redundancyOf, type Redundancy } from './redundancy.js';
import type { Finding } from './result.js';
import type { CaseRun } from './run.js';

/** ρ of the cases whose basis has it determined, by id of the load case. */
export type Redundancies = ReadonlyMap<string, Redundancy>;

/** By id of the load case; cases that no such rule touches are left out. */
export type Requirements = ReadonlyMap<string, SeismicRules>;

/** Findings that are irregularities of ASCE 7-16 Tables 12.3-1 and 12.3-2 to which 12.3.3.4 points. */
const IRREGULARITIES: ReadonlyMap<string, string> = new Map([
  ['torsional-irregularity', 'horizontal 1a'],
  ['extreme-torsional-irregularity', 'horizontal 1b'],
  ['re-entrant-corner', 'horizontal 2'],
  ['diaphragm-discontinuity', 'horizontal 3'],
  ['wall-stops', 'horizontal 4'],
]);

/** @param findings of the plan and of torsion */
export function requirementsOf(
  building: Building,
  model: Model,
  findings: readonly Finding[],
  descent: PostDescent,
): Requirements {
  const allFlexible = model.levels.every(({ diaphragms }) =>
    diaphragms.every(({ behaviour }) => behaviour === 'flexible'),
  );
  const irregularities = irregularitiesOf(findings, descent);
  const out = new Map<string, SeismicRules>();
  for (const loadCase of building.loadCases) {
    const basis = basisOf(building, loadCase);
    if (loadCase.kind !== 'seismic' || !isAsce(basis) || basis.seismic === undefined) continue;
    const rules = seismicRules(basis.seismic, { allFlexible, irregularities });
    if (rules !== undefined) out.set(loadCase.id, rules);
  }
  return out;
}

function irregularitiesOf(findings: readonly Finding[], descent: PostDescent): string[] {
  const found = new Set<string>();
  for (const { code } of findings) {
    const name = IRREGULARITIES.get(code);
    if (name !== undefined) found.add(name);
  }
  // An offset in the wall's own plane bears on what stands below: ASCE 7-16 Table 12.3-2 type 4.
  const offset = descent.landings.some(
    ({ on, column, level }) => (on === 'within' || on === 'nothing') && column.line.storeys[level] !== undefined,
  );
  if (offset) found.add('vertical 4');
  return [...found].sort();
}

/** ρ of every case whose basis has it determined; a combined case takes the largest of its parts. */
export function redundanciesOf(
  building: Building,
  model: Model,
  runs: readonly CaseRun[],
  requirements: Requirements,
): Redundancies {
  const found = new Map<string, Redundancy>();
  const asks = (loadCase: LoadCase): SeismicRules | undefined => {
    const basis = basisOf(building, loadCase);
    return isAsce(basis) && basis.seismic?.redundancyRule === 'determined' ? requirements.get(loadCase.id) : undefined;
  };
  for (const { subCase, ...run } of runs) {
    const { loadCase } = subCase;
    const rules = asks(loadCase);
    if (rules === undefined || subCase.id !== loadCase.id) continue;
    const basis = basisOf(building, loadCase);
    const light = isAsce(basis) && basis.seismic?.lightFrame === true;
    found.set(loadCase.id, redundancyOf(model, { subCase, ...run }, rules, light));
  }
  for (const loadCase of building.loadCases) {
    if (loadCase.from !== 'combined' || asks(loadCase) === undefined) continue;
    const parts = loadCase.parts.flatMap((part) => found.get(part.case) ?? []);
    const largest = parts.reduce<Redundancy | undefined>(
      (most, each) => (most === undefined || each.factor > most.factor ? each : most),
      undefined,
    );
    if (largest !== undefined) found.set(loadCase.id, largest);
  }
  return found;
}

/** The rules with ρ as it was determined. */
export function withRedundancies(requirements: Requirements, redundancies: Redundancies): Requirements {
  return new Map(
    [...requirements].map(([id, rules]) => [
      id,
      { ...rules, redundancy: redundancies.get(id)?.factor ?? rules.redundancy },
    ]),
  );
}

/** What decided on ρ. */
export function redundancyFindings(redundancies: Redundancies): Finding[] {
  return [...redundancies].map(([id, { factor, because, worst, bays }]): Finding => {
    const without =
      worst === undefined
        ? 'no wall of a storey with more than 35 % of the base shear is taller than long'
        : `without pier ${worst.pier} the storey under ${worst.level} loses ${(worst.loss * 100).toFixed(1)} % of its strength (at most 33 %)` +
          (worst.torsion === undefined
            ? ''
            : ` and drifts ${worst.torsion.toPrecision(4)} times its average at an edge (at most 1.4)`);
    const sides = bays === undefined ? '' : `; the plan has at least ${bays.toPrecision(3)} bays of wall on every side`;
    const reason = {
      category: 'the design category asks for no more',
      removal: without,
      perimeter: without + sides,
      storey: without + sides,
    };
    return {
      code: 'redundancy',
      severity: factor > 1 ? 'warning' : 'note',
      member: id,
      case: id,
      sentence: `ρ of ${id} is ${factor}: ${reason[because]} (ASCE 7-16 12.3.4).`,
      numbers: {
        redundancy: factor,
        ...(worst === undefined ? {} : { loss: worst.loss }),
        ...(worst?.torsion === undefined ? {} : { torsion: worst.torsion }),
        ...(bays === undefined || !Number.isFinite(bays) ? {} : { bays }),
      },
    };
  });
}

/** What the rules change, and what they would change if the file stated more. */
export function requirementFindings(building: Building, requirements: Requirements, supporting: boolean): Finding[] {
  const findings: Finding[] = [];
  for (const loadCase of building.loadCases) {
    const basis = basisOf(building, loadCase);
    if (loadCase.kind !== 'seismic' || !isAsce(basis) || basis.seismic === undefined) continue;
    const rules = requirements.get(loadCase.id);
    const head = { severity: 'note' as const, member: loadCase.id, case: loadCase.id };
    if (basis.seismic.designCategory === undefined) {
      findings.push({
        ...head,
        code: 'design-category-not-stated',
        sentence: `The basis of ${loadCase.id} states no seismic design category: collectors and what stands under walls that stop are shown without overstrength.`,
      });
    }
    if (rules === undefined) continue;
    if (rules.connections > 1) {
      findings.push({
        ...head,
        code: 'connections-raised',
        sentence: `In category ${rules.category} the irregularities found (${rules.irregularities.join(', ')}) raise the forces of ${loadCase.id} on connections of diaphragms to walls and collectors, and on collectors without overstrength, by 25 % (ASCE 7-16 12.3.3.4).`,
        numbers: { factor: rules.connections },
      });
    }
    const set = basis.combinations ?? building.combinations;
    if (supporting && set !== undefined && typeof set !== 'string') {
      findings.push({
        ...head,
        severity: 'warning',
        code: 'no-overstrength-combination',
        sentence: `Posts carry walls that stop above them, but the file’s own list of combinations has none with overstrength for ${loadCase.id}: add Ω₀ = ${rules.overstrength} on E for them (ASCE 7-16 12.3.3.3).`,
        numbers: { overstrength: rules.overstrength },
      });
    }
  }
  return findings;
}
