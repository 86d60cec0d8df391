/** What a working goes back to: the prepared building, its demands by key, and where the file says a number. */
import type { Result } from '../building/fault.js';
import type { Building, LoadCase } from '../building/definition.js';
import { Refusal } from '../building/refusal.js';
import { analysisOf, prepare, type Prepared } from '../path/analyse.js';
import type { LevelModel } from '../path/model.js';
import type { Analysis, Demand, Quantity } from '../path/result.js';
import type { CaseRun } from '../path/run.js';
import { unitNames, type UnitNames } from '../path/table.js';
import type { LineModel, PierModel } from '../walls/wall-line.js';
import { atPath } from './file-path.js';
import { referenceOf, type DemandKey } from './reference.js';
import type { Value } from './steps.js';

/** What a load case does to walls and posts. */
export type Carried = { readonly loadCase: LoadCase; readonly outcomes: CaseRun['outcomes'] };

export type Context = Prepared & {
  readonly analysis: Analysis;
  readonly units: UnitNames;
  readonly demands: ReadonlyMap<string, Demand>;
};

/** One preparation serves the workings of all demands of a building. */
export function workingContext(building: Building): Result<Context> {
  try {
    const prepared = prepare(building);
    const analysis = analysisOf(prepared);
    const demands = new Map(analysis.demands.map((row) => [referenceOf(row), row]));
    return { ok: true, value: { ...prepared, analysis, units: unitNames(building), demands } };
  } catch (error) {
    if (error instanceof Refusal) return { ok: false, faults: error.faults };
    throw error;
  }
}

export function runOf(context: Context, caseId: string): CaseRun {
  const run = context.runs.find((candidate) => candidate.subCase.id === caseId);
  if (run === undefined) throw new Error(`no load case ${caseId}`);
  return run;
}

/** A load case or sub-case as walls and posts carry it, made of others or not; undefined for gravity. */
export function carriedCase(context: Context, caseId: string): Carried | undefined {
  const run = context.runs.find((candidate) => candidate.subCase.id === caseId);
  if (run !== undefined) return { loadCase: run.subCase.loadCase, outcomes: run.outcomes };
  return context.combined.find((candidate) => candidate.id === caseId);
}

/** Another demand of the same case and sense as a value; undefined where the table has no such row: it is zero throughout. */
export function fromDemand(
  context: Context,
  symbol: string,
  of: Pick<Demand, 'case' | 'sense'>,
  member: string,
  quantity: Quantity,
): Value | undefined {
  const key: DemandKey = { member, quantity, case: of.case, sense: of.sense };
  const from = referenceOf(key);
  const demand = context.demands.get(from);
  return demand === undefined ? undefined : { symbol, value: demand.value, unit: demand.unit, from };
}

/** A number of the file. */
export function fromFile(context: Context, symbol: string, path: string, unit: string, what?: string): Value {
  const value = atPath(context.building, path);
  if (typeof value !== 'number') throw new Error(`no number at ${path}`);
  return { symbol, value, unit, from: path, what };
}

/** A number of the file, or what stands for it where the file leaves it out. */
export function fromFileOr(
  context: Context,
  symbol: string,
  path: string,
  byDefault: number,
  unit: string,
  what?: string,
): Value {
  return typeof atPath(context.building, path) === 'number'
    ? fromFile(context, symbol, path, unit, what)
    : { symbol, value: byDefault, unit, from: `default ${path}`, what };
}

/** What is read off a drawing in the file, such as the depth of an outline, or off the solution of a body there. */
export function readOff(
  context: Context,
  symbol: string,
  path: string,
  value: number,
  unit: string,
  what: string,
): Value {
  if (atPath(context.building, path) === undefined) throw new Error(`nothing at ${path}`);
  return { symbol, value, unit, from: path, what };
}

export function levelOf(context: Context, id: string): LevelModel {
  const level = context.model.levels.find((candidate) => candidate.id === id);
  if (level === undefined) throw new Error(`no level ${id}`);
  return level;
}

export function levelPath(context: Context, id: string): string {
  return `levels[${context.building.levels.findIndex((level) => level.id === id)}]`;
}

export function elevationOf(context: Context, symbol: string, id: string): Value {
  return fromFile(context, symbol, `${levelPath(context, id)}.elevation`, context.units.length);
}

export function casePath(context: Context, caseId: string): string {
  const { loadCase } = runOf(context, caseId).subCase;
  return `loadCases[${context.building.loadCases.indexOf(loadCase)}]`;
}

export function linePath(line: LineModel): string {
  return `wallLines[${line.index}]`;
}

export function pierPath(line: LineModel, pier: PierModel): string {
  const storey = line.line.storeys.findIndex((candidate) => candidate.piers.includes(pier.pier));
  const index = line.line.storeys[storey]?.piers.indexOf(pier.pier) ?? -1;
  return `${linePath(line)}.storeys[${storey}].piers[${index}]`;
}
