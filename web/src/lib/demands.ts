/** The demand table by key, and the words that say where a number comes from. */
import type { Building } from '@groundward/engine/building/definition';
import type { Analysis, Demand, DiaphragmDiagram, Quantity, Sense } from '@groundward/engine/path/result';
import { quantity, senseSign } from './format';

export type DemandIndex = {
  readonly of: (
    member: string,
    quantity: Quantity,
    caseId: string,
    sense: Sense,
    combination?: string,
  ) => Demand | undefined;
};

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

export function levelsAscending(building: Building): Building['levels'] {
  return [...building.levels].sort((a, b) => a.elevation - b.elevation);
}

export function levelName(building: Building, id: string): string {
  return building.levels.find((level) => level.id === id)?.name ?? id;
}

/** Diagrams of a level along the load of a case. */
export function diagramsOf(analysis: Analysis, level: string, caseId: string): DiaphragmDiagram[] {
  return analysis.diagrams.filter(
    (diagram): diagram is DiaphragmDiagram =>
      diagram.kind === 'diaphragm' && diagram.level === level && diagram.case === caseId,
  );
}

const ORIGINS: Partial<Record<`${Demand['kind']}/${Quantity}`, string>> = {
  'level/force': 'storey force of the load case on this level',
  'level/diaphragm-force': 'diaphragm design force of the load case on this level',
  'level/storey-shear': 'sum of the storey forces of this level and all above',
  'level/overturning-moment': 'storey shears times storey heights, down to the foot of the storey under this level',
  'level/torsion': 'moment about the centre of rigidity of all that acts on the rigid diaphragm',
  'level/torsional-ratio': 'largest over average displacement of the two edges across the load',
  'level/torsional-amplification': 'square of the largest over 1.2 times the average edge displacement, from 1 to 3',
  'diaphragm-span/shear': 'largest shear V along the span, from the diaphragm design force and transfers',
  'diaphragm-span/unit-shear': 'largest V over the net depth of the cut',
  'diaphragm-span/moment': 'largest moment M along the span',
  'diaphragm-span/chord-force': 'largest M over the distance between the outermost edges',
  'opening/secondary-moment': 'shear of the strip beside the opening times half its length',
  'opening/chord-force': 'chord force of the diaphragm and of the strip on its own',
  'opening/corner-force': 'edge force of the strip, to be tied into the floor beyond the corner',
  'collector/axial-tension': 'floor shear on both sides and piers above and below, summed along the line',
  'collector/axial-compression': 'floor shear on both sides and piers above and below, summed along the line',
  'wall-line/reaction': 'what the level’s diaphragm gives to the line',
  'wall-line/shear': 'shear of the storey above and the reaction of this level',
  'wall-line/overturning-moment': 'moment of the storey above and the shear times the storey height',
  'pier/shear': 'the line’s shear, shared by length or stiffness of its piers',
  'pier/unit-shear': 'shear over the pier’s length',
  'pier/end-tension': 'couple of the shear at the arm of the end posts, what stands on them from above, and gravity',
  'pier/end-compression':
    'couple of the shear at the arm of the end posts, what stands on them from above, and gravity',
  'support/shear': 'shear of the lowest pier',
  'support/moment': 'couple of the end-post forces at the foot of the lowest pier',
  'support/uplift': 'tension of the end post at the base',
  'support/bearing': 'compression of the end post at the base',
};

/** Where a demand comes from, in a sentence. */
export function originOf(demand: Demand): string {
  const from = ORIGINS[`${demand.kind}/${demand.quantity}`] ?? demand.quantity.replaceAll('-', ' ');
  const combination = demand.combination === undefined ? 'unfactored' : demand.combination;
  return `${demand.member} · ${demand.quantity.replaceAll('-', ' ')} ${quantity(demand.value, demand.unit, 5)} · case ${demand.case}, sense ${senseSign(demand.sense)}, ${combination}. From: ${from}.`;
}
