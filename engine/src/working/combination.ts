/** The factors of a load combination as a working shows them. */
import type { Building, GravityCase, LoadCase } from '../building/definition.js';
import { publishedTerms, type Published } from '../loads/asce7/combinations.js';
import type { SeismicRules } from '../loads/asce7/overstrength.js';
import { isAsce } from '../loads/basis-of.js';
import {
  combinationsFor,
  gravityCombinations,
  overstrengthFor,
  type FactoredCombination,
} from '../loads/combinations.js';
import type { Redundancy } from '../path/redundancy.js';
import { basisPlace } from './basis-path.js';
import { carriedCase, fromFile, fromFileOr, type Context } from './context.js';
import type { Steps, Value } from './steps.js';

export type Factors = {
  /** Only components that the combination holds. */
  readonly gravity: ReadonlyMap<GravityCase, Value>;
  /** Absent in a combination of gravity alone. */
  readonly lateral?: Value;
};

const GRAVITY: readonly GravityCase[] = ['D', 'L', 'Lr', 'S'];

/**
 * @param caseId the demand's case: a load case or sub-case, or `gravity`
 * @param id     of the combination
 */
export function factorsOf(context: Context, caseId: string, id: string, steps: Steps): Factors {
  const { building } = context;
  const run = carriedCase(context, caseId);
  const loadCase = run?.loadCase ?? caseOfGravity(building, id);
  const place = basisPlace(building, loadCase);
  const ofBasis = place?.basis.combinations;
  const named = ofBasis ?? building.combinations;
  const path = ofBasis === undefined ? 'combinations' : `${place?.path ?? ''}.combinations`;
  if (typeof named === 'object') {
    const index = named.findIndex((candidate) => candidate.id === id);
    return statedFactors(context, `${path}[${index}].factors`, named[index]?.factors ?? {});
  }
  if (named === undefined) throw new Error(`no combinations for ${loadCase.id}`);
  const clause = `${named}: ${id}`;
  const determined = context.redundancies.get(loadCase.id);
  const rules = context.requirements.get(loadCase.id);
  const raised = rules === undefined ? [] : overstrengthFor(building, loadCase, rules.overstrength);
  const overstrength = raised.find((candidate) => candidate.id === id);
  const combination =
    overstrength ??
    (run === undefined ? gravityCombinations(building) : combinationsFor(building, loadCase, determined?.factor)).find(
      (candidate) => candidate.id === id,
    );
  if (combination === undefined) throw new Error(`no combination ${id}`);
  if (named === 'EN 1990') return literalFactors(combination, clause, steps);
  const terms = publishedTerms(named, id);
  if (terms === undefined) throw new Error(`no combination ${id} in ${named}`);
  const seismic = isAsce(place?.basis) && place.basis.seismic !== undefined ? `${place.path}.seismic` : undefined;
  return asceFactors(
    context,
    terms,
    clause,
    seismic,
    steps,
    overstrength === undefined ? undefined : rules,
    determined,
  );
}

/** A combination of gravity alone stands in the set of the first load case that has it. */
function caseOfGravity(building: Building, id: string): LoadCase {
  const first = building.loadCases[0];
  const found = building.loadCases.find((loadCase) => {
    const named = basisPlace(building, loadCase)?.basis.combinations ?? building.combinations;
    if (named === undefined) return false;
    return gravityCombinations({ ...building, loadCases: [loadCase] }).some((combination) => combination.id === id);
  });
  const loadCase = found ?? first;
  if (loadCase === undefined) throw new Error(`no combination ${id}`);
  return loadCase;
}

function statedFactors(
  context: Context,
  path: string,
  stated: Readonly<Partial<Record<GravityCase | 'E' | 'W', number | undefined>>>,
): Factors {
  const gravity = new Map<GravityCase, Value>();
  for (const name of GRAVITY) {
    if ((stated[name] ?? 0) !== 0) gravity.set(name, fromFile(context, `f_${name}`, `${path}.${name}`, '1'));
  }
  const acts = stated.E !== undefined ? 'E' : stated.W !== undefined ? 'W' : undefined;
  return acts === undefined
    ? { gravity }
    : { gravity, lateral: fromFile(context, `f_${acts}`, `${path}.${acts}`, '1') };
}

/** A published combination whose factors are numbers alone. */
function literalFactors(combination: FactoredCombination, clause: string, steps: Steps): Factors {
  const gravity = new Map<GravityCase, Value>();
  for (const name of GRAVITY) {
    const factor = combination.gravity[name];
    if (factor !== 0) gravity.set(name, literal(`f_${name}`, factor, `factor on ${name}`, clause, steps));
  }
  if (combination.applies === 'gravity') return { gravity };
  const symbol = combination.applies === 'seismic' ? 'f_E' : 'f_W';
  return { gravity, lateral: literal(symbol, combination.lateral, 'factor on the lateral case', clause, steps) };
}

function literal(symbol: string, factor: number, what: string, clause: string, steps: Steps): Value {
  return steps.add(symbol, String(factor), [], '1', { what, clause });
}

/** With the vertical effect and the redundancy factor of the basis. */
function asceFactors(
  context: Context,
  { gravity: terms, lateral, applies, vertical = 0 }: Published,
  clause: string,
  seismic: string | undefined,
  steps: Steps,
  overstrength: SeismicRules | undefined,
  determined: Redundancy | undefined,
): Factors {
  const gravity = new Map<GravityCase, Value>();
  for (const name of GRAVITY) {
    const factor = terms[name] ?? 0;
    const up = name === 'D' ? vertical : 0;
    if (factor === 0 && up === 0) continue;
    const what = `factor on ${name}`;
    if (up === 0 || seismic === undefined) {
      gravity.set(name, literal(`f_${name}`, factor, what, clause, steps));
      continue;
    }
    const spectral = fromFile(context, 'S_DS', `${seismic}.SDS`, '1');
    const formula = `${factor} ${up < 0 ? '−' : '+'} ${Math.abs(up)}·0.2·S_DS`;
    const notes = { what, clause: `${clause}; ASCE 7-16 Eq. 12.4-4a` };
    gravity.set(name, steps.add(`f_${name}`, formula, [spectral], '1', notes));
  }
  if (applies === 'gravity') return { gravity };
  const what = 'factor on the lateral case';
  if (applies !== 'seismic') return { gravity, lateral: literal('f_W', lateral, what, clause, steps) };
  if (seismic === undefined) return { gravity, lateral: literal('f_E', lateral, what, clause, steps) };
  if (overstrength !== undefined) {
    const notes = { what: 'factor on the lateral case, with overstrength', clause: `${clause}; ASCE 7-16 Eq. 12.4-7` };
    const factor = overstrengthValue(context, seismic, overstrength, steps);
    return { gravity, lateral: steps.add('f_E', `${lateral}·Ω_0`, [factor], '1', notes) };
  }
  const redundancy =
    determined === undefined
      ? fromFileOr(context, 'ρ', `${seismic}.redundancy`, 1, '1')
      : literal('ρ', determined.factor, 'redundancy, as the finding says', 'ASCE 7-16 12.3.4', steps);
  const notes = { what, clause: `${clause}; ASCE 7-16 Eq. 12.4-3` };
  return { gravity, lateral: steps.add('f_E', `${lateral}·ρ`, [redundancy], '1', notes) };
}

/** Ω₀ of the file, less 0.5 where the basis takes it off for flexible diaphragms. */
function overstrengthValue(context: Context, seismic: string, rules: SeismicRules, steps: Steps): Value {
  const stated = fromFileOr(context, 'Ω_0', `${seismic}.overstrength`, 1, '1');
  if (stated.value === rules.overstrength) return stated;
  const notes = { what: 'overstrength with flexible diaphragms', clause: 'ASCE 7-16 Table 12.2-1, footnote b' };
  return steps.add('Ω_0', 'Ω_t − 0.5', [{ ...stated, symbol: 'Ω_t' }], '1', notes);
}
