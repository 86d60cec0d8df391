/** What the standard of a case's basis asks for beyond its forces, given how the building stands. */
import type { Building } from '../building/definition.js';
import { seismicRules, type SeismicRules } from '../loads/asce7/overstrength.js';
import { basisOf, isAsce } from '../loads/basis-of.js';
import type { PostDescent } from '../walls/posts.js';
import type { Model } from './model.js';
import type { Finding } from './result.js';

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
