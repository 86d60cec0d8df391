/** The demand table by key, and what pages ask of a building and its analysis. */
import type { Building, Level, WallLine } from '@groundward/engine/building/definition';
import type {
  Analysis,
  CollectorDiagram,
  Demand,
  DiaphragmDiagram,
  Quantity,
  Sense,
} from '@groundward/engine/path/result';

export type DemandIndex = {
  readonly of: (
    member: string,
    quantity: Quantity,
    caseId: string,
    sense: Sense,
    combination?: string,
  ) => Demand | undefined;
};

/** A revision's building with what was computed from it. */
export type Facts = { readonly building: Building; readonly analysis: Analysis; readonly index: DemandIndex };

/** What a view is looked at for. */
export type Loading = { readonly caseId: string; readonly sense: Sense };

export function indexOf(analysis: Analysis): DemandIndex {
  const rows = new Map<string, Demand>();
  for (const row of analysis.demands)
    rows.set(key(row.member, row.quantity, row.case, row.sense, row.combination), row);
  return { of: (member, what, caseId, sense, combination) => rows.get(key(member, what, caseId, sense, combination)) };
}

function key(member: string, what: string, caseId: string, sense: number, combination?: string): string {
  return `${member}|${what}|${caseId}|${sense}|${combination ?? ''}`;
}

/** Sub-cases in the order of the analysis. */
export function casesOf(analysis: Analysis): string[] {
  return [
    ...new Set(analysis.diagrams.filter((diagram) => diagram.kind === 'diaphragm').map((diagram) => diagram.case)),
  ];
}

/** Combinations in which demands of a kind are given for a case. */
export function combinationsOf(analysis: Analysis, kind: Demand['kind'], caseId: string): string[] {
  const names = new Set<string>();
  for (const row of analysis.demands)
    if (row.kind === kind && row.case === caseId && row.combination !== undefined) names.add(row.combination);
  return [...names];
}

export function levelsAscending(building: Building): Level[] {
  return [...building.levels].sort((a, b) => a.elevation - b.elevation);
}

export function levelName(building: Building, id: string): string {
  return building.levels.find((level) => level.id === id)?.name ?? id;
}

/** Unit vector of a wall line's axis and its length. */
export function axisOf(line: WallLine): { readonly u: readonly [number, number]; readonly length: number } {
  const [a, b] = line.axis;
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  return { u: [(b[0] - a[0]) / length, (b[1] - a[1]) / length], length };
}

/** Unit vector along which a case acts, with sense 1. */
export function directionOf(analysis: Analysis, caseId: string): readonly [number, number] | undefined {
  return analysis.diagrams.find(
    (diagram): diagram is DiaphragmDiagram => diagram.kind === 'diaphragm' && diagram.case === caseId,
  )?.along;
}

/** Diagrams of a level for a case. */
export function diagramsOf(analysis: Analysis, level: string, caseId: string): DiaphragmDiagram[] {
  return analysis.diagrams.filter(
    (diagram): diagram is DiaphragmDiagram =>
      diagram.kind === 'diaphragm' && diagram.level === level && diagram.case === caseId,
  );
}

export function collectorsOf(analysis: Analysis, level: string, caseId: string): CollectorDiagram[] {
  return analysis.diagrams.filter(
    (diagram): diagram is CollectorDiagram =>
      diagram.kind === 'collector' && diagram.level === level && diagram.case === caseId,
  );
}
